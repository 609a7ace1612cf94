package whorl.units;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.units.UnitSyntaxException.Reason;

/**
 * Reads a unit as it stands in brackets or in the heading of a column: {@code kg·m²/s}, {@code
 * kg*m^2/s}, {@code N.m}, {@code J/(kg K)}, {@code s⁻¹}.
 *
 * <pre>
 * unit    = ( "1" | product ) [ "/" ( factor | "(" product ")" ) ]
 * product = factor { [ "·" | "." | "*" ] factor }
 * factor  = symbol [ "^" ["+"|"-"] digits | raised sign and digits ]
 * symbol  = letter { letter | digit | "_" } | "%" | "‰" | "′" | "″" | ["Δ"] "°" [ "C" | "F" | "R" ] | "℃"
 * </pre>
 *
 * Blanks may stand between the tokens, and multiply between two factors. Behind the slash a product
 * needs parentheses, since {@code W/m²·K} is read in two ways.
 */
public final class UnitReader {

  private static final int LONGEST_TEXT = 200;
  private static final int MOST_MEMBERS = 20;
  private static final int END = -1;

  private final String text;

  /** The text with look-alikes folded; one code point for each code point of the text. */
  private final int[] points;

  private int at;

  private UnitReader(String text) {
    this.text = text;
    this.points = points(text);
  }

  private static int[] points(String text) {
    int[] points = new int[text.codePointCount(0, text.length())];
    int count = 0;
    for (int i = 0; i < text.length(); i += Character.charCount(text.codePointAt(i))) {
      points[count++] = folded(text.codePointAt(i));
    }
    return points;
  }

  /**
   * Reads a unit.
   *
   * @throws UnitSyntaxException if the text is not of the form above
   */
  public static UnitText read(String text) {
    var reader = new UnitReader(text);
    if (reader.points.length > LONGEST_TEXT) {
      throw reader.refused(Reason.TOO_LONG, 0, reader.points.length, null);
    }
    return reader.unit();
  }

  /**
   * Reads a code of the Unified Code for Units of Measure, as {@code [lbf_av].[ft_i]} or {@code
   * circ/min}.
   *
   * @throws UnitSyntaxException if the text is no such code or has no counterpart in the catalogue
   */
  public static UnitText readUcum(String code) {
    return UnitCatalogue.standard().ucum().read(code);
  }

  /** Characters that look alike are one character here. */
  private static int folded(int point) {
    return switch (point) {
      case 'µ' -> 'μ'; // micro sign
      case 0x2126 -> 'Ω'; // ohm sign
      case '⋅', '•', '∙', '*', '∗', '.' -> '·';
      case '−' -> '-';
      case '\t', 0xA0, 0x2007, 0x2009, 0x202F -> ' ';
      default -> point;
    };
  }

  private UnitText unit() {
    skipBlanks();
    if (peek() == END) {
      throw refused(Reason.EMPTY, 0, points.length, null);
    }
    List<UnitText.Power> over = one() ? List.of() : product();
    List<UnitText.Power> under = new ArrayList<>();
    if (peek() == '/') {
      next();
      under = behindSlash();
    }
    if (peek() != END) {
      throw unexpected(over, under);
    }
    return new UnitText(over, under);
  }

  /** A one with nothing but a slash behind it. */
  private boolean one() {
    int start = at;
    if (peek() == '1') {
      next();
      if (peek() == END || peek() == '/') {
        return true;
      }
      at = start;
    }
    return false;
  }

  private List<UnitText.Power> behindSlash() {
    if (peek() != '(') {
      return List.of(factor());
    }
    int open = at;
    next();
    List<UnitText.Power> members = product();
    if (peek() != ')') {
      throw peek() == END
          ? refused(Reason.PARENTHESIS, open, 1, null)
          : unexpected(List.of(), List.of());
    }
    next();
    return members;
  }

  private List<UnitText.Power> product() {
    List<UnitText.Power> members = new ArrayList<>();
    members.add(factor());
    while (peek() == '·' || startsSymbol(peek())) {
      if (peek() == '·') {
        next();
      }
      if (members.size() == MOST_MEMBERS) {
        throw refused(Reason.TOO_LONG, 0, points.length, null);
      }
      members.add(factor());
    }
    return members;
  }

  private UnitText.Power factor() {
    if (!startsSymbol(peek())) {
      throw notASymbol();
    }
    String symbol = symbol();
    int start = at;
    int exponent = 1;
    if (peek() == '^') {
      next();
      exponent = exponent(start, '+', '-', "0123456789");
    } else if (isRaised(peek())) {
      exponent = exponent(start, '⁺', '⁻', "⁰¹²³⁴⁵⁶⁷⁸⁹");
    }
    return new UnitText.Power(symbol, exponent);
  }

  private int exponent(int start, char plus, char minus, String digits) {
    boolean negative = peek() == minus;
    if (negative || peek() == plus) {
      at++;
    }
    int first = at;
    int value = 0;
    while (at < points.length && digits.indexOf(points[at]) >= 0) {
      value = Math.min(10 * value + digits.indexOf(points[at]), UnitText.LARGEST_EXPONENT + 1);
      at++;
    }
    boolean whole = at > first && value != 0 && !fractionFollows();
    if (!whole) {
      throw refused(Reason.EXPONENT, start, Math.max(1, Math.min(at, points.length) - start), null);
    }
    if (value > UnitText.LARGEST_EXPONENT) {
      throw refused(Reason.EXPONENT_RANGE, start, at - start, null);
    }
    skipBlanks();
    return negative ? -value : value;
  }

  private boolean fractionFollows() {
    return at + 1 < points.length && points[at] == '·' && isDigit(points[at + 1]);
  }

  private String symbol() {
    int start = at;
    int first = points[at++];
    if (first == '°' || (first == 'Δ' && at < points.length && points[at] == '°')) {
      at = first == '°' ? at : at + 1;
      if (at < points.length && "CFR".indexOf(points[at]) >= 0) {
        at++;
      }
    } else if (isLetter(first)) {
      while (at < points.length
          && (isLetter(points[at]) || isDigit(points[at]) || points[at] == '_')) {
        at++;
      }
    }
    var symbol = new String(points, start, at - start);
    skipBlanks();
    return symbol;
  }

  private static boolean startsSymbol(int point) {
    return isLetter(point) || "%‰′″°℃".indexOf(point) >= 0;
  }

  private static boolean isLetter(int point) {
    if (point < 0x80) { // nearly always, and looking up a script is slow
      return (point >= 'a' && point <= 'z') || (point >= 'A' && point <= 'Z');
    }
    if (!Character.isLetter(point)) {
      return false;
    }
    var script = Character.UnicodeScript.of(point);
    return script == Character.UnicodeScript.LATIN || script == Character.UnicodeScript.GREEK;
  }

  private static boolean isDigit(int point) {
    return point >= '0' && point <= '9';
  }

  private static boolean isRaised(int point) {
    return "⁺⁻⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(point) >= 0;
  }

  private int peek() {
    return at < points.length ? points[at] : END;
  }

  private void next() {
    at++;
    skipBlanks();
  }

  private void skipBlanks() {
    while (at < points.length && points[at] == ' ') {
      at++;
    }
  }

  private UnitSyntaxException notASymbol() {
    int point = peek();
    if (point == END || "·/)".indexOf(point) >= 0) {
      String suggestion = text.contains("**") ? text.replace("**", "^") : null;
      return refused(Reason.MEMBER_MISSING, at, point == END ? 0 : 1, suggestion);
    }
    return wrongCharacter(null);
  }

  /** What stands behind a unit that could have ended. */
  private UnitSyntaxException unexpected(List<UnitText.Power> over, List<UnitText.Power> under) {
    int point = peek();
    if (!under.isEmpty() && point == '/') {
      return refused(Reason.SECOND_SLASH, at, 1, underOneSlash(over, under));
    }
    if (!under.isEmpty() && (point == '·' || startsSymbol(point))) {
      return refused(Reason.PRODUCT_BEHIND_SLASH, at, 1, underOneSlash(over, under));
    }
    return wrongCharacter(point == '-' ? withoutHyphens() : null);
  }

  private UnitSyntaxException wrongCharacter(@Nullable String suggestion) {
    int point = peek();
    Reason reason;
    if (point == '-') {
      reason = Reason.HYPHEN;
    } else if (isDigit(point)) {
      reason = Reason.NUMBER;
    } else if (point == '(' || point == ')') {
      reason = Reason.PARENTHESIS;
    } else if (point == '^' || isRaised(point)) {
      reason = Reason.EXPONENT;
    } else {
      reason = Reason.CHARACTER;
    }
    return refused(reason, at, 1, suggestion);
  }

  /** All that is left goes below the one slash; equal members become a power. */
  private @Nullable String underOneSlash(List<UnitText.Power> over, List<UnitText.Power> under) {
    int fault = at;
    var below = new Exponents();
    try {
      under.forEach(member -> below.add(member.symbol(), member.exponent()));
      while (peek() != END) {
        if (peek() == '·' || peek() == '/') {
          next();
        }
        (peek() == '(' ? behindSlash() : List.of(factor()))
            .forEach(member -> below.add(member.symbol(), member.exponent()));
      }
      return new UnitText(over, below.powers()).plain();
    } catch (IllegalArgumentException e) {
      return null; // a further fault: no way to write it can be given
    } finally {
      at = fault;
    }
  }

  /** {@code ft-lbf} as {@code ft·lbf}, {@code kg m-3} as {@code kg·m^-3}. */
  private @Nullable String withoutHyphens() {
    String repaired =
        text.replace('−', '-').replaceAll("-(?=[0-9])", "^-").replaceAll("(?<!\\^)-", "·");
    try {
      return read(repaired).plain();
    } catch (UnitSyntaxException e) {
      return null;
    }
  }

  private UnitSyntaxException refused(
      Reason reason, int offset, int length, @Nullable String suggestion) {
    return new UnitSyntaxException(reason, text, offset, length, suggestion);
  }
}
