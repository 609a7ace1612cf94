package whorl.assist;

import java.util.List;
import java.util.stream.Collectors;
import whorl.syntax.Token;

/** The members of a unit that stand in front of a cursor, in their canonical form. */
final class UnitBeginning {
  private static final String RAISED_DIGITS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

  private UnitBeginning() {}

  /** A text that the next member goes on with, as {@code kg·m²/} or {@code J/(kg·}. */
  static String of(List<Token> tokens) {
    var text = new StringBuilder();
    for (Token token : tokens) {
      switch (token.kind()) {
        case NAME, UNIT_SIGN -> {
          join(text);
          text.append(token.text());
        }
        case OVER -> text.append('/');
        case TIMES, RAISED_DOT, DOT -> text.append('·');
        case OPEN -> text.append('(');
        case CLOSE -> text.append(')');
        case MINUS -> text.append('⁻');
        // A number is an exponent, but for the one of `1/s`.
        case NUMBER, RAISED -> text.append(text.isEmpty() ? token.text() : raised(token.text()));
        default -> {}
      }
    }
    join(text);
    return text.toString();
  }

  /** A blank between members multiplies. */
  private static void join(StringBuilder text) {
    if (!text.isEmpty() && "·/(".indexOf(text.charAt(text.length() - 1)) < 0) {
      text.append('·');
    }
  }

  private static String raised(String exponent) {
    return exponent
        .chars()
        .filter(c -> c == '-' || (c >= '0' && c <= '9'))
        .mapToObj(c -> c == '-' ? "⁻" : RAISED_DIGITS.substring(c - '0', c - '0' + 1))
        .collect(Collectors.joining());
  }
}
