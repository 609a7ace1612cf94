package whorl.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import whorl.notebook.AtomicFile;
import whorl.notebook.InputSettings;
import whorl.notebook.JavaCells;
import whorl.notebook.Note;
import whorl.notebook.NoteFile;
import whorl.notebook.NoteFileException;
import whorl.notebook.NoteRun;
import whorl.notebook.PrintedNote;
import whorl.report.NoteRecord;
import whorl.sheet.InputSetting;

/** {@code whorl run}: works out a note, prints its steps and says how it stands. */
@Command(
    name = "run",
    description = "Work out a note and print its steps.",
    mixinStandardHelpOptions = true,
    sortOptions = false)
final class RunCommand implements Callable<Integer> {
  private static final String STANDARD_OUTPUT = "-";

  @Spec private CommandSpec spec = CommandSpec.create();

  @Parameters(paramLabel = "NOTE", description = "a notebook (.ipynb) or a sheet (.whorl)")
  private Path file = Path.of("");

  @Option(
      names = "--set",
      paramLabel = "'NAME=VALUE UNIT'",
      description = "give an input another value for this run; may be given several times")
  private List<String> settings = new ArrayList<>();

  @Option(
      names = "--out",
      paramLabel = "FILE.ipynb",
      description =
          "write the note with its results, unless it has an error; inputs that were set are"
              + " changed there")
  private @Nullable Path out;

  @Option(
      names = "--json",
      paramLabel = "FILE",
      description = "write the results as JSON; - prints them instead of the steps")
  private @Nullable Path json;

  @Option(names = "--no-java", description = "refuse cells in Java")
  private boolean noJava;

  @Override
  public Integer call() throws NoteFileException {
    if (out != null && !out.toString().endsWith(".ipynb")) {
      throw new ParameterException(
          spec.commandLine(),
          "--out writes a notebook, so that its name must end in .ipynb: " + out);
    }
    Note note = set(NoteFile.read(file));
    NoteRun run =
        NoteRun.of(note, noJava ? JavaCells.REFUSED : JavaCells.RUN, NoteFile.folder(file));
    String record = NoteRecord.text(run.record());
    PrintWriter printer = spec.commandLine().getOut();
    if (json != null && json.toString().equals(STANDARD_OUTPUT)) {
      printer.print(record);
    } else {
      printer.println(String.join("\n\n", PrintedNote.parts(note, run)));
    }
    ExitStatus status = new RunSummary(spec.commandLine().getErr(), file).print(note, run);
    if (json != null && !json.toString().equals(STANDARD_OUTPUT)) {
      AtomicFile.replace(json, record.getBytes(StandardCharsets.UTF_8));
    }
    if (out != null) {
      write(out, note, run, status);
    }
    return status.code();
  }

  /** A note in error replaces no file: what stands there may be the last good one. */
  private void write(Path target, Note note, NoteRun run, ExitStatus status)
      throws NoteFileException {
    if (status == ExitStatus.ERROR) {
      spec.commandLine().getErr().println(target + " was not written, for the note has an error.");
    } else {
      AtomicFile.replace(target, note.executed(run.executions()).getBytes(StandardCharsets.UTF_8));
    }
  }

  private Note set(Note note) throws NoteFileException {
    try {
      return InputSettings.applied(note, settings.stream().map(InputSetting::read).toList());
    } catch (IllegalArgumentException e) {
      throw new ParameterException(spec.commandLine(), "--set: " + e.getMessage(), e);
    }
  }
}
