package whorl.notebook;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.java.JavaOutcome;
import whorl.java.JavaSide;
import whorl.java.SheetReading;
import whorl.report.ErrorText;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;
import whorl.sheet.Step;

/** A note while it runs: its sheet, and Java beside it. */
final class Running implements AutoCloseable {
  private final JavaCells allowed;
  private final Sheet sheet;
  private final JavaSide java;
  private final Printed printed = new Printed();
  private final Map<Cell, Ran> ran = new LinkedHashMap<>();

  /** How a cell ended when it ran. */
  private sealed interface Ran {
    /** On the sheet. */
    record OnSheet(CellOutcome outcome) implements Ran {}

    /** With errors of another sort. */
    record Failed(Source source, List<Diagnostic> errors, String name) implements Ran {}
  }

  Running(JavaCells allowed, Path folder) {
    this.allowed = allowed;
    this.sheet = new Sheet(folder);
    this.java = new JavaSide(SheetReading.of(sheet));
  }

  /** Runs a code cell. */
  void run(Cell cell) {
    ran.put(
        cell,
        switch (cell.kind()) {
          case SHEET ->
              new Ran.OnSheet(sheet.run(id(cell), label(cell), CellKind.statements(cell.source())));
          case JAVA -> allowed == JavaCells.RUN ? java(cell) : refused(cell);
          default -> foreign(cell);
        });
  }

  /** Ids of cells in the file may be missing or given twice; their positions are not. */
  private static CellId id(Cell cell) {
    return new CellId(label(cell));
  }

  private static String label(Cell cell) {
    return "cell " + cell.position();
  }

  private Ran java(Cell cell) {
    JavaOutcome outcome = java.run(label(cell), cell.source(), printed.in(cell));
    if (outcome instanceof JavaOutcome.Done done) {
      return new Ran.OnSheet(sheet.publish(id(cell), label(cell), done.functions()));
    } else if (outcome instanceof JavaOutcome.Failed failed) {
      return new Ran.Failed(failed.source(), failed.errors(), failed.name());
    }
    return failed(cell, "interrupted", "This cell was interrupted.", "");
  }

  private static Ran refused(Cell cell) {
    return failed(
        cell,
        "java-cell",
        "Cells in Java are refused here.",
        "A program can do anything. If you trust the author of the note, let it run: without --no-java,"
            + " or with recheck --java.");
  }

  private static Ran foreign(Cell cell) {
    return failed(
        cell,
        "foreign-cell",
        "This cell is written for another kernel.",
        "A cell holds statements of the sheet language, or begins with %%java; remove the first"
            + " line, or the cell.");
  }

  private static Ran failed(Cell cell, String code, String problem, String fix) {
    var source = new Source(cell.source());
    int line = source.line(source.text().length() - source.text().stripLeading().length());
    Span head = source.lineSpan(line);
    Diagnostic error = Diagnostic.of(code, problem, head, "", fix);
    return new Ran.Failed(source, List.of(error), ErrorText.NAME);
  }

  /** How all cells stand now. */
  List<CellRun> cells() {
    var names = new LinkedHashSet<String>();
    for (Ran one : ran.values()) {
      if (one instanceof Ran.OnSheet onSheet) {
        names.addAll(onSheet.outcome().attempted());
      }
    }
    var cells = new ArrayList<CellRun>();
    ran.forEach((cell, one) -> cells.add(stands(cell, one, names)));
    return cells;
  }

  private CellRun stands(Cell cell, Ran one, Set<String> names) {
    List<Output> outputs = printed.of(cell);
    if (one instanceof Ran.Failed failed) {
      return CellRun.refused(cell, failed.source(), failed.errors(), outputs, failed.name());
    }
    CellOutcome outcome = ((Ran.OnSheet) one).outcome();
    if (!outcome.tookEffect()) {
      return CellRun.refused(cell, outcome.source(), outcome.errors(), outputs, ErrorText.NAME);
    }
    List<Step> steps = sheet.steps(id(cell));
    List<String> notices = outcome.notices().stream().map(Diagnostic::problem).toList();
    return new CellRun(
        cell,
        outcome.source(),
        true,
        errors(steps, names),
        steps,
        notices,
        outputs,
        ErrorText.NAME);
  }

  private static List<Diagnostic> errors(List<Step> steps, Set<String> names) {
    var errors = new ArrayList<Diagnostic>();
    for (Step step : steps) {
      if (step instanceof Step.Broken broken) {
        errors.add(broken.diagnostic());
      } else if (step instanceof Step.Waiting waiting) {
        // What waits for a definition that is in error follows from that error.
        waiting.undefined(names).ifPresent(errors::add);
      }
    }
    return errors;
  }

  @Override
  public void close() {
    java.close();
  }
}
