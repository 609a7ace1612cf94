package whorl.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import whorl.notebook.JavaCells;
import whorl.notebook.Note;
import whorl.notebook.NoteFile;
import whorl.notebook.NoteFileException;
import whorl.notebook.NoteRun;
import whorl.notebook.Recheck;

/** {@code whorl recheck}: works out a note and compares it with the results in its file. */
@Command(
    name = "recheck",
    description = {
      "Work out a note again and compare it with the results stored in its file.",
      "Numbers agree if they differ by no more than a billionth. Cells in Java are refused unless"
          + " --java is given; what they print is not compared."
    },
    mixinStandardHelpOptions = true)
final class RecheckCommand implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  @Parameters(paramLabel = "NOTE", description = "a notebook (.ipynb)")
  private Path file = Path.of("");

  @Option(names = "--java", description = "run cells in Java")
  private boolean java;

  @Override
  public Integer call() throws NoteFileException {
    Note note = NoteFile.read(file);
    NoteRun run = NoteRun.of(note, java ? JavaCells.RUN : JavaCells.REFUSED, NoteFile.folder(file));
    var recheck = new Recheck(run);
    var out = spec.commandLine().getOut();
    recheck.differences().forEach(out::println);
    out.println(
        recheck.differences().isEmpty()
            ? "All agrees with the file: " + recheck.compared() + " results and verdicts."
            : recheck.differences().size() + " differences.");
    ExitStatus status = new RunSummary(spec.commandLine().getErr(), file).print(note, run);
    return status == ExitStatus.HOLDS && !recheck.differences().isEmpty()
        ? ExitStatus.FAILS.code()
        : status.code();
  }
}
