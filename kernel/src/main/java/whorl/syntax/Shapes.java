package whorl.syntax;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import whorl.syntax.Token.Kind;

/** What kind of statement a line looks like from its first tokens. */
final class Shapes {
  private Shapes() {}

  /** Whether it begins {@code name [bracket] =} or {@code name(…) [bracket] =}. */
  static boolean defines(List<Token> tokens) {
    return definesValue(tokens) || definesFunction(tokens);
  }

  /** Whether it begins {@code name [bracket] =}; the name may be a word that cannot be one. */
  static boolean definesValue(List<Token> tokens) {
    return kind(tokens, 0) == Kind.NAME && kind(tokens, behindBracket(tokens, 1)) == Kind.EQUALS;
  }

  /** Whether it begins {@code name(…) [bracket] =}. */
  static boolean definesFunction(List<Token> tokens) {
    if (kind(tokens, 0) != Kind.NAME
        || kind(tokens, 1) != Kind.OPEN
        || !tokens.get(0).touches(tokens.get(1))
        || Words.isReserved(tokens.get(0).text())) {
      return false;
    }
    int close = closing(tokens, 1);
    return close > 0 && kind(tokens, behindBracket(tokens, close + 1)) == Kind.EQUALS;
  }

  /** The parameters of a line that {@link #definesFunction}, in folded spelling. */
  static Set<String> parameters(List<Token> tokens) {
    return namesInList(tokens.subList(1, closing(tokens, 1)));
  }

  /** The columns of a line that begins with {@code cases}, in folded spelling. */
  static Set<String> columnNames(List<Token> tokens) {
    for (int i = 0; i < tokens.size(); i++) {
      if (tokens.get(i).is(Kind.COLON)) {
        return namesInList(tokens.subList(i, tokens.size()));
      }
    }
    return Set.of();
  }

  /** The free names right behind the first token or a comma, outside brackets. */
  private static Set<String> namesInList(List<Token> tokens) {
    var names = new HashSet<String>();
    boolean bracket = false;
    for (int i = 1; i < tokens.size(); i++) {
      Token token = tokens.get(i);
      boolean begins = i == 1 || tokens.get(i - 1).is(Kind.COMMA);
      if (begins && !bracket && token.isFreeName()) {
        names.add(token.name().name());
      }
      bracket = token.is(Kind.OPEN_BRACKET) || (bracket && !token.is(Kind.CLOSE_BRACKET));
    }
    return names;
  }

  /** The index behind a bracket, or the same index where none stands there. */
  private static int behindBracket(List<Token> tokens, int index) {
    if (kind(tokens, index) != Kind.OPEN_BRACKET) {
      return index;
    }
    int close = closing(tokens, index);
    return close < 0 ? index : close + 1;
  }

  /** The index of what closes the parenthesis or bracket at an index, or -1. */
  static int closing(List<Token> tokens, int open) {
    Kind opener = tokens.get(open).kind();
    Kind closer = opener == Kind.OPEN ? Kind.CLOSE : Kind.CLOSE_BRACKET;
    int depth = 0;
    for (int i = open; i < tokens.size(); i++) {
      Kind kind = tokens.get(i).kind();
      if (kind == opener) {
        depth++;
      } else if (kind == closer && --depth == 0) {
        return i;
      }
    }
    return -1;
  }

  private static Kind kind(List<Token> tokens, int index) {
    return index < tokens.size() ? tokens.get(index).kind() : Kind.END;
  }
}
