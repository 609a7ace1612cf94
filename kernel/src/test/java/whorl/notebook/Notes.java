package whorl.notebook;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.stream.Collectors;

/** Makes notes for tests. */
final class Notes {
  private Notes() {}

  /** A note of code cells; a text that begins with {@code #} and a blank is a Markdown cell. */
  static Note of(String... cells) throws NoteFileException {
    return Note.parse(
        "n.ipynb",
        Arrays.stream(cells)
            .map(Notes::cell)
            .collect(Collectors.joining(",", "{\"nbformat\": 4, \"cells\": [", "]}")));
  }

  private static String cell(String source) {
    var cell = new JsonObject();
    cell.addProperty("cell_type", source.startsWith("# ") ? "markdown" : "code");
    cell.addProperty("source", source);
    return cell.toString();
  }

  /** The same note with the results of a run stored in it. */
  static Note executed(Note note) throws NoteFileException {
    return Note.parse("n.ipynb", note.executed(run(note).executions()));
  }

  static NoteRun run(Note note) {
    return NoteRun.of(note, JavaCells.RUN, Path.of(""));
  }
}
