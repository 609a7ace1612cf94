package whorl.notebook;

import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.report.NoteRecord;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;
import whorl.sheet.Step;

/**
 * A note that was run from its first cell to its last on a sheet of its own.
 *
 * <p>A cell in error does not keep the later ones from running, so that all that is wrong is known
 * after one run. What counts is how each cell stands at the end: a name may be defined below its
 * use.
 */
public final class NoteRun {
  private final List<CellRun> cells;

  private NoteRun(List<CellRun> cells) {
    this.cells = List.copyOf(cells);
  }

  /** Runs a note. */
  public static NoteRun of(Note note, JavaCells java) {
    var sheet = new Sheet();
    var outcomes = new LinkedHashMap<Cell, CellOutcome>();
    for (Cell cell : note.cells()) {
      if (cell.kind() == CellKind.SHEET) {
        outcomes.put(cell, sheet.run(id(cell), "cell " + cell.position(), cell.source()));
      }
    }
    var names = new LinkedHashSet<String>();
    outcomes.values().forEach(outcome -> names.addAll(outcome.attempted()));
    var runs = new ArrayList<CellRun>();
    for (Cell cell : note.cells()) {
      CellOutcome outcome = outcomes.get(cell);
      if (outcome != null) {
        runs.add(run(cell, outcome, sheet.steps(id(cell)), names));
      } else if (cell.kind().isCode()) {
        runs.add(foreign(cell, java));
      }
    }
    return new NoteRun(runs);
  }

  /** Ids of cells in the file may be missing or given twice; their positions are not. */
  private static CellId id(Cell cell) {
    return new CellId("cell " + cell.position());
  }

  private static CellRun run(Cell cell, CellOutcome outcome, List<Step> steps, Set<String> names) {
    if (!outcome.tookEffect()) {
      return CellRun.refused(cell, outcome.source(), outcome.errors());
    }
    var errors = new ArrayList<Diagnostic>();
    for (Step step : steps) {
      if (step instanceof Step.Broken broken) {
        errors.add(broken.diagnostic());
      } else if (step instanceof Step.Waiting waiting) {
        // What waits for a definition that is in error follows from that error.
        waiting.undefined(names).ifPresent(errors::add);
      }
    }
    List<String> notices = outcome.notices().stream().map(Diagnostic::problem).toList();
    return new CellRun(cell, outcome.source(), true, errors, steps, notices);
  }

  private static CellRun foreign(Cell cell, JavaCells java) {
    var source = new Source(cell.source());
    int line = source.line(source.text().length() - source.text().stripLeading().length());
    Span head = source.lineSpan(line);
    Diagnostic error =
        cell.kind() == CellKind.JAVA
            ? Diagnostic.of("java-cell", java.problem(), head, "", "")
            : Diagnostic.of(
                "foreign-cell",
                "This cell is written for another kernel.",
                head,
                "",
                "A cell holds statements of the sheet language; remove the first line, or the cell.");
    return CellRun.refused(cell, source, List.of(error));
  }

  /** The code cells in order, with what they came to. */
  public List<CellRun> cells() {
    return cells;
  }

  /** The record of the whole note for tools. */
  public JsonObject record() {
    var steps = new ArrayList<Step>();
    var faults = new ArrayList<NoteRecord.Fault>();
    for (CellRun cell : cells) {
      steps.addAll(cell.steps());
      faults.addAll(faults(cell));
    }
    return NoteRecord.of(steps, faults);
  }

  /** The record of one cell for tools. */
  static JsonObject record(CellRun cell) {
    return NoteRecord.of(cell.steps(), faults(cell));
  }

  private static List<NoteRecord.Fault> faults(CellRun cell) {
    return cell.errors().stream()
        .map(error -> new NoteRecord.Fault(cell.cell().position(), cell.source(), error))
        .toList();
  }

  /** What each code cell leaves in the file, by position. */
  public Map<Integer, Execution> executions() {
    var executions = new LinkedHashMap<Integer, Execution>();
    int count = 0;
    for (CellRun cell : cells) {
      // Front ends do not run blank cells and give them no number.
      boolean blank = cell.source().text().isBlank();
      count += blank ? 0 : 1;
      executions.put(cell.cell().position(), blank ? Execution.NONE : CellOutputs.of(cell, count));
    }
    return executions;
  }
}
