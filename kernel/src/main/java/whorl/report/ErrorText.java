package whorl.report;

import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;

/**
 * The errors of a cell as a front end shows an error.
 *
 * @param summary the first in one line
 * @param lines all of them in full, line by line
 */
public record ErrorText(String summary, List<String> lines) {
  /** What the sort of error is called. */
  public static final String NAME = "SheetError";

  /** Copies the lines. */
  public ErrorText {
    lines = List.copyOf(lines);
  }

  /**
   * Sets the errors of a cell.
   *
   * @param errors at least one
   * @param source the text of the cell
   */
  public static ErrorText of(List<Diagnostic> errors, Source source) {
    var lines = new ArrayList<String>();
    for (Diagnostic error : errors) {
      if (!lines.isEmpty()) {
        lines.add("");
      }
      DiagnosticText.render(error, source).lines().forEach(lines::add);
    }
    String more = errors.size() == 1 ? "" : " (and " + (errors.size() - 1) + " more)";
    return new ErrorText(errors.get(0).problem() + more, lines);
  }
}
