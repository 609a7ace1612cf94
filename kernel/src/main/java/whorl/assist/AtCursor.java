package whorl.assist;

import java.util.List;
import java.util.Optional;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.syntax.LogicalLine;
import whorl.syntax.Token;

/**
 * The line of a text that the cursor stands in, and its word there. Where no word stands at the
 * cursor a stand-in is put there, so that the rules of the language tell which line it belongs to.
 *
 * @param source the text, with the stand-in
 * @param lines all lines of the text
 * @param line the line of the cursor
 * @param index the word at the cursor among the tokens of the line
 * @param start where the word begins in the text as it was, in UTF-16 units
 * @param typed the word in front of the cursor
 */
record AtCursor(
    Source source, List<LogicalLine> lines, LogicalLine line, int index, int start, String typed) {
  /** A letter joins the word at the cursor and is a word where there is none. */
  private static final String STAND_IN = "q";

  /** Looks at a place; empty inside a remark, a text in quotes or a number that is none. */
  static Optional<AtCursor> in(String text, int cursor) {
    var source = new Source(text.substring(0, cursor) + STAND_IN + text.substring(cursor));
    int place = text.codePointCount(0, cursor);
    List<LogicalLine> lines = LogicalLine.in(source);
    for (LogicalLine line : lines) {
      for (int i = 0; i < line.tokens().size(); i++) {
        Token token = line.tokens().get(i);
        if (token.is(Token.Kind.NAME) && holds(token.span(), place)) {
          int start = text.offsetByCodePoints(0, token.span().start());
          return Optional.of(
              new AtCursor(source, lines, line, i, start, text.substring(start, cursor)));
        }
      }
    }
    return Optional.empty();
  }

  private static boolean holds(Span span, int place) {
    return span.start() <= place && place < span.end();
  }

  /** All lines but the one that is being written, which defines nothing yet. */
  List<LogicalLine> otherLines() {
    return lines.stream().filter(other -> !other.equals(line)).toList();
  }

  List<Token> tokens() {
    return line.tokens();
  }

  Token word() {
    return tokens().get(index);
  }

  /** The text between two places of the line. */
  String between(int start, int end) {
    return source.slice(new Span(start, end));
  }

  /** The text behind one token and in front of another. */
  String inside(Token before, Token behind) {
    return source.slice(before.span().gapTo(behind.span()));
  }

  /** Where the line begins. */
  int lineStart() {
    return line.first().span().start();
  }

  /** Where the line ends, without its remark. */
  int lineEnd() {
    return line.last().span().end();
  }
}
