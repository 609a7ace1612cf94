package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import whorl.diagnostic.Source;
import whorl.syntax.LogicalLine;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;

/**
 * A token of a text that the cursor stands in or right behind.
 *
 * @param lines all lines of the text
 * @param line the line of the token
 * @param index the token among those of its line
 */
record WordAt(Source source, List<LogicalLine> lines, LogicalLine line, int index) {
  /**
   * Looks at a place. A name or sign of a unit that it touches goes before any other token.
   *
   * @param cursor in UTF-16 units
   */
  static Optional<WordAt> in(String text, int cursor) {
    var source = new Source(text);
    int place = text.codePointCount(0, cursor);
    List<LogicalLine> lines = LogicalLine.in(source);
    var touched = new ArrayList<WordAt>();
    for (LogicalLine line : lines) {
      for (int i = 0; i < line.tokens().size() - 1; i++) {
        Token token = line.tokens().get(i);
        if (token.span().start() <= place && place <= token.span().end()) {
          touched.add(new WordAt(source, lines, line, i));
        }
      }
    }
    // Of two words that meet at the cursor the second is the one it stands in.
    return touched.stream()
        .filter(WordAt::isWord)
        .reduce((first, second) -> second)
        .or(() -> touched.stream().findFirst());
  }

  boolean isWord() {
    return token().is(Kind.NAME) || token().is(Kind.UNIT_SIGN);
  }

  List<Token> tokens() {
    return line.tokens();
  }

  Token token() {
    return tokens().get(index);
  }

  /** The text behind one token and in front of another. */
  String inside(Token before, Token behind) {
    return source.slice(before.span().gapTo(behind.span()));
  }

  /** The text from one token to another, both included. */
  String text(int first, int last) {
    return source.slice(tokens().get(first).span().to(tokens().get(last).span()));
  }

  /** The functions of the calls whose parentheses the place stands in, the innermost first. */
  List<Token> calls() {
    var calls = new ArrayList<Token>();
    int depth = 0;
    for (int i = token().is(Kind.CLOSE) ? index - 1 : index; i > 0; i--) {
      Token token = tokens().get(i);
      if (token.is(Kind.CLOSE)) {
        depth++;
      } else if (token.is(Kind.OPEN) && depth > 0) {
        depth--;
      } else if (token.is(Kind.OPEN)) {
        Token function = tokens().get(i - 1);
        if (function.isFreeName() && function.touches(token)) {
          calls.add(function);
        }
      }
    }
    return calls;
  }
}
