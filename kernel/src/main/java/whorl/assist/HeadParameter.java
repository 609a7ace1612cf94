package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import whorl.syntax.LogicalLine;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;

/**
 * A parameter in the head of a function, whatever stands behind the head.
 *
 * @param name folded
 * @param unit its unit in brackets as written; empty for a plain number
 */
record HeadParameter(String name, String unit) {
  /**
   * The parameters of a line that defines a function; none of any other line.
   *
   * @param text the text between two tokens
   */
  static List<HeadParameter> of(LogicalLine line, BiFunction<Token, Token, String> text) {
    if (!line.definesFunction()) {
      return List.of();
    }
    var parameters = new ArrayList<HeadParameter>();
    List<Token> tokens = line.tokens();
    int last = line.closing(1);
    for (int i = 2; i < last; i++) {
      Token name = tokens.get(i);
      if (name.isFreeName() && (i == 2 || tokens.get(i - 1).is(Kind.COMMA))) {
        int close = tokens.get(i + 1).is(Kind.OPEN_BRACKET) ? line.closing(i + 1) : -1;
        String unit = close < 0 ? "" : text.apply(tokens.get(i + 1), tokens.get(close)).strip();
        parameters.add(new HeadParameter(name.name().name(), unit));
      }
    }
    return parameters;
  }

  /** The parameter as it would be written. */
  String text() {
    return unit.isEmpty() ? name : name + " [" + unit + "]";
  }
}
