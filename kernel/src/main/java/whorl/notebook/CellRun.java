package whorl.notebook;

import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.sheet.Step;

/**
 * What running a cell came to, at the end of the note.
 *
 * @param cell the cell
 * @param source its text, into which the errors point
 * @param tookEffect whether its definitions are part of the sheet
 * @param errors what is wrong in it, in the order in which it stands
 * @param steps its steps; none for a cell that did not take effect
 * @param notices what the author should know besides, one sentence each
 * @param printed what a cell in Java printed and showed
 * @param errorName what the sort of its errors is called
 */
public record CellRun(
    Cell cell,
    Source source,
    boolean tookEffect,
    List<Diagnostic> errors,
    List<Step> steps,
    List<String> notices,
    List<Output> printed,
    String errorName) {
  /** Copies the lists. */
  public CellRun {
    errors = List.copyOf(errors);
    steps = List.copyOf(steps);
    notices = List.copyOf(notices);
    printed = List.copyOf(printed);
  }

  /** A cell that did not take effect. */
  static CellRun refused(
      Cell cell, Source source, List<Diagnostic> errors, List<Output> printed, String errorName) {
    return new CellRun(cell, source, false, errors, List.of(), List.of(), printed, errorName);
  }
}
