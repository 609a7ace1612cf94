package whorl.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;

/** The indented lines below the head of a statement. All of them are indented alike. */
final class Blocks {
  static final String ROWS_OF_CASES = "the cases, one a line: a name and its values";
  static final String ROWS_OF_DATA = "the points, one a line, with a value for each column";
  static final String LINES_OF_MOTION = "how its quantities start and change";

  private Blocks() {}

  /** Reads every line; a line with a mistake is left out and reported. */
  static <T> List<T> read(
      List<LogicalLine> block, Reading reading, Function<LogicalLine, T> parser) {
    var rows = new ArrayList<T>();
    String indent = blanks(block.get(0), reading.messages());
    for (LogicalLine line : block) {
      try {
        String own = blanks(line, reading.messages());
        if (isMixed(own)) {
          throw new Refusal(reading.messages().indentMixed(line.indent()));
        }
        if (!own.equals(indent)) {
          throw new Refusal(reading.messages().blockUneven(line.indent(), block.get(0).indent()));
        }
        rows.add(parser.apply(line));
      } catch (Refusal refusal) {
        reading.errors().add(refusal.diagnostic());
      }
    }
    return rows;
  }

  /** What is wrong with an indented line that belongs to no block. */
  static Diagnostic unexpected(LogicalLine line, SyntaxMessages messages) {
    Span indent = line.indent();
    return isMixed(blanks(line, messages)) ? messages.indentMixed(indent) : messages.indent(indent);
  }

  private static String blanks(LogicalLine line, SyntaxMessages messages) {
    return messages.written(line.indent()).replaceAll("[^\t]", " ");
  }

  private static boolean isMixed(String blanks) {
    return blanks.indexOf('\t') >= 0 && blanks.indexOf(' ') >= 0;
  }
}
