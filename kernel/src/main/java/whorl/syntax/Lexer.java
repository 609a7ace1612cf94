package whorl.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.diagnostic.Source;
import whorl.syntax.Token.Kind;

/**
 * Text to tokens. A character or number that cannot stand becomes a token of its own that carries
 * its message, so that the parser reports it only where nothing in front of it is wrong.
 */
final class Lexer {
  private static final Map<String, Kind> PAIRS =
      Map.ofEntries(
          Map.entry("+-", Kind.PLUS_MINUS),
          Map.entry("<=", Kind.AT_MOST),
          Map.entry(">=", Kind.AT_LEAST),
          Map.entry("||", Kind.TWO_BARS),
          Map.entry("**", Kind.FOREIGN),
          Map.entry("==", Kind.FOREIGN),
          Map.entry("!=", Kind.FOREIGN),
          Map.entry("<>", Kind.FOREIGN),
          Map.entry("=<", Kind.FOREIGN),
          Map.entry("=>", Kind.FOREIGN),
          Map.entry(":=", Kind.FOREIGN),
          Map.entry("&&", Kind.FOREIGN),
          Map.entry("//", Kind.FOREIGN));

  private final Glyphs glyphs;
  private final SyntaxMessages messages;
  private final List<Token> tokens = new ArrayList<>();
  private boolean opensLine = true;
  private int next;

  private Lexer(Source source, SyntaxMessages messages) {
    this.glyphs = new Glyphs(source);
    this.messages = messages;
  }

  /** All tokens of a text; the last is {@link Kind#END}, in front of it a {@link Kind#LINE_END}. */
  static List<Token> tokens(Source source, SyntaxMessages messages) {
    var lexer = new Lexer(source, messages);
    while (lexer.next < lexer.glyphs.count()) {
      Interruption.poll();
      lexer.token();
    }
    lexer.add(Kind.LINE_END, lexer.next, "");
    lexer.add(Kind.END, lexer.next, "");
    return lexer.tokens;
  }

  private void token() {
    int c = glyphs.folded(next);
    if (Characters.isLineEnd(c)) {
      int end = next + (c == '\r' && glyphs.at(next + 1) == '\n' ? 2 : 1);
      add(Kind.LINE_END, end, "");
    } else if (Characters.isBlank(c)) {
      next++;
    } else if (c == '#') {
      remark();
    } else if (c == '"') {
      text();
    } else if (Characters.isDigit(c) || (c == '.' && startsNumber())) {
      number();
    } else if (c == 'Δ' && glyphs.folded(next + 1) == '°') {
      degrees(next + 1);
    } else if (Characters.isLetter(c)) {
      name();
    } else if (c == '°') {
      degrees(next);
    } else if (Characters.isRaised(c)) {
      raised();
    } else {
      sign(c);
    }
  }

  private void remark() {
    int end = next;
    while (end < glyphs.count() && !Characters.isLineEnd(glyphs.at(end))) {
      if (Characters.isDirectionMark(glyphs.at(end))) {
        wrong(end, end + 1, messages.character(glyphs.span(end, end + 1), glyphs.at(end)));
        skipLine();
        return;
      }
      end++;
    }
    add(Kind.REMARK, end, glyphs.text(next + 1, end).strip());
  }

  private void skipLine() {
    while (next < glyphs.count() && !Characters.isLineEnd(glyphs.at(next))) {
      next++;
    }
  }

  private void text() {
    int end = next + 1;
    while (end < glyphs.count() && glyphs.at(end) != '"' && !Characters.isLineEnd(glyphs.at(end))) {
      if (Characters.isDirectionMark(glyphs.at(end))) {
        wrong(end, end + 1, messages.character(glyphs.span(end, end + 1), glyphs.at(end)));
        skipLine();
        return;
      }
      end++;
    }
    if (glyphs.at(end) != '"') {
      boolean inches = next > 0 && Characters.isDigit(glyphs.at(next - 1));
      wrong(next, end, messages.textOpen(glyphs.span(next, end), inches));
      return;
    }
    add(Kind.TEXT, end + 1, glyphs.text(next + 1, end));
  }

  /** A point begins a number unless it stands tight behind something that has parts. */
  private boolean startsNumber() {
    if (!Characters.isDigit(glyphs.at(next + 1))) {
      return false;
    }
    if (opensLine) {
      return true;
    }
    Token last = tokens.get(tokens.size() - 1);
    return last.span().end() != glyphs.span(next, next).start()
        || !(last.is(Kind.NAME) || last.is(Kind.CLOSE) || last.is(Kind.PRIME));
  }

  // number = digits [ "." digits ] [ exponent ] | "." digits [ exponent ]
  private void number() {
    int end = digits(next);
    if (end < 0) {
      return;
    }
    if (glyphs.at(end) == '.') {
      if (!Characters.isDigit(glyphs.at(end + 1))) {
        wrong(next, end + 1, messages.numberPoint(glyphs.span(next, end + 1)));
        return;
      }
      end = digits(end + 1);
      if (end < 0) {
        return;
      }
    }
    int exponent = exponentDigits(end);
    if (exponent > 0) {
      end = digits(exponent);
      if (end < 0) {
        return;
      }
    }
    if (glyphs.at(end) == '.') {
      while (glyphs.at(end) == '.' || Characters.isDigit(glyphs.at(end))) {
        end++;
      }
      wrong(next, end, messages.numberForm(glyphs.span(next, end)));
      return;
    }
    String canonical = canonical(glyphs.text(next, end));
    double value = Double.parseDouble(canonical);
    if (Double.isInfinite(value) || (value == 0 && hasDigitOverZero(canonical))) {
      wrong(next, end, messages.numberRange(glyphs.span(next, end), value));
      return;
    }
    add(Kind.NUMBER, end, canonical);
  }

  /** The index behind digits, or -1 where an underscore stands wrong and was reported. */
  private int digits(int start) {
    int end = start;
    while (Characters.isDigit(glyphs.at(end)) || glyphs.at(end) == '_') {
      if (glyphs.at(end) == '_' && !Characters.isDigit(glyphs.at(end + 1))) {
        wrong(next, end + 1, messages.numberForm(glyphs.span(next, end + 1)));
        return -1;
      }
      end++;
    }
    return end;
  }

  /** The index of the first digit of an exponent that begins here, or -1. */
  private int exponentDigits(int start) {
    if (glyphs.at(start) != 'e' && glyphs.at(start) != 'E') {
      return -1;
    }
    int sign = glyphs.folded(start + 1);
    int first = start + (sign == '+' || sign == '-' ? 2 : 1);
    return Characters.isDigit(glyphs.at(first)) ? first : -1;
  }

  private static String canonical(String written) {
    String plain =
        written.replace("_", "").replace('E', 'e').replace('\u2212', '-').replace("+", "");
    return plain.startsWith(".") ? "0" + plain : plain;
  }

  private static boolean hasDigitOverZero(String digits) {
    int exponent = digits.indexOf('e');
    String mantissa = exponent < 0 ? digits : digits.substring(0, exponent);
    return mantissa.chars().anyMatch(c -> c >= '1' && c <= '9');
  }

  private void name() {
    int end = next;
    while (isNamePart(glyphs.folded(end))) {
      end++;
    }
    add(Kind.NAME, end, glyphs.foldedText(next, end));
  }

  private static boolean isNamePart(int c) {
    return c == '_' || Characters.isDigit(c) || (c > 0 && Characters.isLetter(c));
  }

  private void degrees(int sign) {
    int letter = glyphs.at(sign + 1);
    boolean scale = letter == 'C' || letter == 'F' || letter == 'R';
    int end = scale && !isNamePart(glyphs.folded(sign + 2)) ? sign + 2 : sign + 1;
    add(Kind.UNIT_SIGN, end, glyphs.foldedText(next, end));
  }

  private void raised() {
    var digits = new StringBuilder();
    int end = next;
    while (end < glyphs.count() && Characters.isRaised(glyphs.at(end))) {
      digits.append(Characters.onTheLine(glyphs.at(end++)));
    }
    add(Kind.RAISED, end, digits.toString());
  }

  private void sign(int c) {
    int behind = glyphs.folded(next + 1);
    if (c > 0 && behind > 0 && behind < 0x80) {
      String pair = Character.toString(c) + (char) behind;
      Kind kind = PAIRS.get(pair);
      if (kind != null) {
        add(kind, next + 2, pair);
        return;
      }
    }
    Kind kind = single(c);
    if (kind == null) {
      var span = glyphs.span(next, next + 1);
      wrong(
          next,
          next + 1,
          c == Glyphs.ACCENTED ? messages.accent(span) : messages.character(span, c));
    } else {
      add(kind, next + 1, Character.toString(c));
    }
  }

  private static @Nullable Kind single(int c) {
    return switch (c) {
      case '+' -> Kind.PLUS;
      case '-' -> Kind.MINUS;
      case '*' -> Kind.TIMES;
      case '/' -> Kind.OVER;
      case '×' -> Kind.CROSS;
      case '·' -> Kind.RAISED_DOT;
      case '±' -> Kind.PLUS_MINUS;
      case '^' -> Kind.CARET;
      case '<' -> Kind.LESS;
      case '≤' -> Kind.AT_MOST;
      case '>' -> Kind.MORE;
      case '≥' -> Kind.AT_LEAST;
      case '=' -> Kind.EQUALS;
      case '≠' -> Kind.FOREIGN;
      case '(' -> Kind.OPEN;
      case ')' -> Kind.CLOSE;
      case '[' -> Kind.OPEN_BRACKET;
      case ']' -> Kind.CLOSE_BRACKET;
      case ',' -> Kind.COMMA;
      case ':' -> Kind.COLON;
      case '.' -> Kind.DOT;
      case '\'' -> Kind.PRIME;
      case '@' -> Kind.AT;
      case '|' -> Kind.BAR;
      case '%', '‰', '′', '″' -> Kind.UNIT_SIGN;
      default -> null;
    };
  }

  private void add(Kind kind, int end, String text) {
    tokens.add(new Token(kind, glyphs.span(next, end), text, opensLine, null));
    opensLine = kind == Kind.LINE_END;
    next = end;
  }

  private void wrong(int start, int end, Diagnostic diagnostic) {
    tokens.add(new Token(Kind.WRONG, glyphs.span(start, end), "", opensLine, diagnostic));
    opensLine = false;
    next = end;
  }
}
