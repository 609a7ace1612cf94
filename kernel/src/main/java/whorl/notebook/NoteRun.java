package whorl.notebook;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import whorl.report.NoteRecord;
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

  /**
   * Runs a note.
   *
   * @param folder in which the note lies: its statements read files below it
   */
  public static NoteRun of(Note note, JavaCells java, Path folder) {
    try (var run = new Running(java, folder)) {
      note.cells().stream().filter(cell -> cell.kind().isCode()).forEach(run::run);
      return new NoteRun(run.cells());
    }
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
