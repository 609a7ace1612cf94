package whorl.syntax;

import java.util.List;
import whorl.diagnostic.Diagnostic;

/**
 * What was read from a text.
 *
 * @param statements the statements that could be read, in order
 * @param remarks the remarks that stand alone on a line, in order
 * @param errors what is wrong, in order of the lines, at most {@link Parser#MOST_ERRORS}
 * @param unitWords words that would be read otherwise if the sheet had a name of that spelling
 */
public record Parsed(
    List<Statement> statements,
    List<Remark> remarks,
    List<Diagnostic> errors,
    List<UnitWord> unitWords) {
  /** Copies the lists. */
  public Parsed {
    statements = List.copyOf(statements);
    remarks = List.copyOf(remarks);
    errors = List.copyOf(errors);
    unitWords = List.copyOf(unitWords);
  }
}
