package whorl.syntax;

import static java.util.Map.entry;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.Map;

/**
 * What single characters mean: which fold to which, which are letters and blanks, and which are
 * refused outside remarks and text literals, with what to type for them.
 */
final class Characters {
  /** What is wrong with a character. */
  enum Flaw {
    /** A form as wide as a Chinese character. */
    FULL_WIDTH,
    /** It takes no room on the screen, or steers the direction of writing. */
    INVISIBLE,
    /** A letter of another script. */
    FOREIGN_LETTER,
    /** It looks like, or stands for, something that is typed in another way. */
    LOOK_ALIKE,
    /** A lowered digit or letter. */
    LOWERED,
    /** It has no meaning here. */
    STRANGE
  }

  /**
   * A refusal.
   *
   * @param instead what to type, or empty
   */
  record Refused(Flaw flaw, String instead) {}

  private static final Map<Integer, Integer> FOLDS = folds();
  private static final Map<Integer, String> LOOK_ALIKES = lookAlikes();
  private static final String RAISED_DIGITS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
  private static final String LOWERED_DIGITS = "₀₁₂₃₄₅₆₇₈₉";

  private Characters() {}

  private static Map<Integer, Integer> folds() {
    var folds = new HashMap<Integer, Integer>();
    String from = "\u00B5\u2126\u2212⋅•∙∗’\u2206ϕϑϖϱϵϰϴ";
    String to = "μΩ-···*'Δφθπρεκ\u0398";
    for (int i = 0; i < from.length(); i++) {
      folds.put((int) from.charAt(i), (int) to.charAt(i));
    }
    return Map.copyOf(folds);
  }

  private static Map<Integer, String> lookAlikes() {
    var shapes =
        Map.ofEntries(
            entry("–—‐‑‒―", "-"),
            entry("º˚", "°"),
            entry("÷⁄∕", "/"),
            entry("“”„‟", "\""),
            entry("‘‚`´ʹ", "'"),
            entry("✕✖⨯", "×"),
            entry("≦⩽", "<="),
            entry("≧⩾", ">="),
            entry("∣│", "|"),
            entry("√", "sqrt( )"),
            entry("∛", "cbrt( )"),
            entry("ⁿ", "^n"),
            entry("Α", "A"),
            entry("Β", "B"),
            entry("Ε", "E"),
            entry("Ζ", "Z"),
            entry("Η", "H"),
            entry("Ι", "I"),
            entry("Κ", "K"),
            entry("Μ", "M"),
            entry("Ν", "N"),
            entry("Ο", "O"),
            entry("Ρ", "P"),
            entry("Τ", "T"),
            entry("Υ", "Y"),
            entry("Χ", "X"),
            entry("ο", "o"),
            entry("Аа", "a"),
            entry("Ее", "e"),
            entry("Оо", "o"),
            entry("Рр", "p"),
            entry("Сс", "c"),
            entry("Хх", "x"),
            entry("Тт", "t"),
            entry("Мм", "m"),
            entry("Нн", "n"),
            entry("Кк", "k"));
    var table = new HashMap<Integer, String>();
    shapes.forEach((from, to) -> from.codePoints().forEach(c -> table.put(c, to)));
    return Map.copyOf(table);
  }

  /** The character that a look-alike is read as, or the character itself. */
  static int fold(int c) {
    return c < 0x80 ? c : FOLDS.getOrDefault(c, c);
  }

  static boolean isDigit(int c) {
    return c >= '0' && c <= '9';
  }

  /** Whether a folded character is a letter that a name may hold. */
  static boolean isLetter(int c) {
    if (c < 0x80) {
      return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
    }
    int type = Character.getType(c);
    if (type != Character.UPPERCASE_LETTER && type != Character.LOWERCASE_LETTER) {
      return false;
    }
    var script = Character.UnicodeScript.of(c);
    return (script == Character.UnicodeScript.LATIN || script == Character.UnicodeScript.GREEK)
        && !LOOK_ALIKES.containsKey(c)
        && compatible(c).equals(Character.toString(c));
  }

  /** Whether a character is a blank: space, tab, and the spaces that text programs put in. */
  static boolean isBlank(int c) {
    return c == ' '
        || c == '\t'
        || (c > 0x80 && c != 0x3000 && Character.getType(c) == Character.SPACE_SEPARATOR);
  }

  static boolean isLineEnd(int c) {
    return c == '\n' || c == '\r';
  }

  /** Whether a character is part of a raised exponent. */
  static boolean isRaised(int c) {
    return c == '⁻' || c == '⁺' || (c > 0x80 && RAISED_DIGITS.indexOf(c) >= 0);
  }

  /** A part of a raised exponent on the line: {@code ⁻} is {@code -}. */
  static char onTheLine(int raised) {
    return switch (raised) {
      case '⁻' -> '-';
      case '⁺' -> '+';
      default -> (char) ('0' + RAISED_DIGITS.indexOf(raised));
    };
  }

  /** Whether a character combines with the one in front of it. */
  static boolean isMark(int c) {
    if (c < 0x300) {
      return false;
    }
    int type = Character.getType(c);
    return type == Character.NON_SPACING_MARK
        || type == Character.ENCLOSING_MARK
        || type == Character.COMBINING_SPACING_MARK;
  }

  /** Whether a character steers the direction of writing, so that a text can look like another. */
  static boolean isDirectionMark(int c) {
    return c == 0x061C
        || c == 0x200E
        || c == 0x200F
        || (c >= 0x202A && c <= 0x202E)
        || (c >= 0x2066 && c <= 0x2069);
  }

  /** Why a character that no rule of the language takes is refused. */
  static Refused refused(int c) {
    if (c >= 0xFF01 && c <= 0xFF5E) {
      return new Refused(Flaw.FULL_WIDTH, Character.toString(c - 0xFEE0));
    }
    if (c == 0x3000) {
      return new Refused(Flaw.FULL_WIDTH, " ");
    }
    if (isInvisible(c)) {
      return new Refused(Flaw.INVISIBLE, "");
    }
    String instead = LOOK_ALIKES.get(c);
    if (instead != null) {
      boolean foreign = Character.UnicodeScript.of(c) == Character.UnicodeScript.CYRILLIC;
      String letter =
          Character.isUpperCase(c) ? instead.toUpperCase(java.util.Locale.ROOT) : instead;
      return foreign
          ? new Refused(Flaw.FOREIGN_LETTER, letter)
          : new Refused(Flaw.LOOK_ALIKE, instead);
    }
    if (LOWERED_DIGITS.indexOf(c) >= 0) {
      return new Refused(Flaw.LOWERED, "_" + LOWERED_DIGITS.indexOf(c));
    }
    return byCompatibility(c);
  }

  private static Refused byCompatibility(int c) {
    if (Character.isDigit(c)) {
      return new Refused(Flaw.LOOK_ALIKE, Integer.toString(Character.digit(c, 10)));
    }
    String same = compatible(c);
    if (Character.getType(c) == Character.OTHER_NUMBER && same.indexOf('⁄') > 0) {
      return new Refused(Flaw.LOOK_ALIKE, "(" + same.replace('⁄', '/') + ")");
    }
    boolean typed = same.codePoints().map(Characters::fold).allMatch(Characters::isTyped);
    if (typed && !same.equals(Character.toString(c))) {
      boolean lowered = (c >= 0x2080 && c <= 0x209C) || (c >= 0x1D62 && c <= 0x1D6A);
      return lowered ? new Refused(Flaw.LOWERED, "_" + same) : new Refused(Flaw.LOOK_ALIKE, same);
    }
    return new Refused(Character.isLetter(c) ? Flaw.FOREIGN_LETTER : Flaw.STRANGE, "");
  }

  private static boolean isTyped(int c) {
    return (c > ' ' && c < 0x7F) || c == '°' || isLetter(c);
  }

  private static boolean isInvisible(int c) {
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          true;
      default -> c == 0x115F || c == 0x1160 || c == 0x2800 || c == 0x3164 || c == 0xFFA0;
    };
  }

  private static String compatible(int c) {
    return Normalizer.normalize(Character.toString(c), Normalizer.Form.NFKC);
  }
}
