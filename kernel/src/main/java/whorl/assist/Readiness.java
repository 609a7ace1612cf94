package whorl.assist;

import java.util.List;
import java.util.Set;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.syntax.CatalogueWords;
import whorl.syntax.LogicalLine;
import whorl.syntax.Parser;

/** Tells whether a text is ready to run or waits for its next line. */
final class Readiness {
  private static final String INDENT = "    ";

  /** Mistakes that more lines can mend. */
  private static final Set<String> OPEN = Set.of("paren-open", "block-empty");

  private final String text;
  private final Source source;
  private final List<LogicalLine> lines;

  private Readiness(String text) {
    this.text = text;
    this.source = new Source(text);
    this.lines = LogicalLine.in(source);
  }

  static Completeness of(String text) {
    return new Readiness(text).completeness();
  }

  private Completeness completeness() {
    List<Diagnostic> errors = Parser.parse(source, name -> false, CatalogueWords.STANDARD).errors();
    if (errors.isEmpty()) {
      return inBlock() ? new Completeness.Incomplete(indent()) : new Completeness.Complete();
    }
    return errors.size() == 1 && canBeMended(errors.get(0))
        ? new Completeness.Incomplete(inBlock() ? indent() : INDENT)
        : new Completeness.Invalid();
  }

  /** Whether the last line is a row of a block, to which no empty line has put an end. */
  private boolean inBlock() {
    return !lines.isEmpty() && last().isIndented() && !endsInEmptyLine();
  }

  private String indent() {
    return source.slice(last().indent());
  }

  private boolean canBeMended(Diagnostic error) {
    return !lines.isEmpty()
        && !endsInEmptyLine()
        && error.span().start() >= last().span().start()
        && (OPEN.contains(error.code()) || (isAtTheEnd(error) && goesOn()));
  }

  private boolean isAtTheEnd(Diagnostic error) {
    return error.span().end() >= last().span().end();
  }

  /** Whether a next line would belong to the last one. */
  private boolean goesOn() {
    return LogicalLine.in(new Source(text + "\nx")).size() == lines.size();
  }

  private LogicalLine last() {
    return lines.get(lines.size() - 1);
  }

  /** A console sends an empty last line when its user wants no more. */
  private boolean endsInEmptyLine() {
    return source.lineText(source.line(source.length())).isBlank();
  }
}
