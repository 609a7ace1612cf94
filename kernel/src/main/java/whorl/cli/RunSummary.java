package whorl.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.notebook.CellRun;
import whorl.notebook.Mark;
import whorl.notebook.Note;
import whorl.notebook.NoteRun;
import whorl.notebook.Tally;
import whorl.sheet.Lapse;
import whorl.sheet.Step;

/** Says on the error output what is wrong in a note and how it stands. */
final class RunSummary {
  private final PrintWriter err;
  private final Path file;

  RunSummary(PrintWriter err, Path file) {
    this.err = err;
    this.file = file;
  }

  /** Prints the summary and returns the exit status that follows from the note. */
  ExitStatus print(Note note, NoteRun run) {
    note.oddities().forEach(oddity -> err.println(file + ": " + oddity));
    run.cells().forEach(this::print);
    Tally tally = Tally.of(run);
    err.println(file + ": " + tally.words());
    if (tally.hasErrors()) {
      return ExitStatus.ERROR;
    }
    return tally.hasFailures() ? ExitStatus.FAILS : ExitStatus.HOLDS;
  }

  private void print(CellRun run) {
    String cell = file + ", cell " + run.cell().position() + ", line ";
    for (Diagnostic error : run.errors()) {
      int start = error.span().start();
      err.println(
          cell
              + run.source().line(start)
              + ", column "
              + run.source().column(start)
              + ": "
              + DiagnosticText.render(error, run.source())
              + "\n");
    }
    for (Step step : run.steps()) {
      for (Lapse lapse : step.standing().lapses()) {
        err.println(cell + step.place().line() + ": OUTSIDE VALIDITY: " + lapse.text());
      }
      if (Mark.of(step).isFailure()) {
        int line = step.place().line();
        err.println(cell + line + ": FAILS: " + run.source().lineText(line).strip());
      }
    }
  }
}
