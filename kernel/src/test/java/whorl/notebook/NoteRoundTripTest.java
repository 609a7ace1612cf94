package whorl.notebook;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.stream.LongStream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A note keeps every byte that is not an output of ours. */
class NoteRoundTripTest {
  private static final Output SHOWN =
      new Output.Display(
          Map.of(
              "text/plain",
              new JsonPrimitive("E = 2.86 kWh\nω \uD800"),
              "application/x-whorl-steps+json",
              JsonParser.parseString("{\"b\": [1.5, {}], \"a\": []}")),
          new JsonObject());
  private static final Output FAILED =
      new Output.Failure("Error", "x is not defined", List.of("x is not defined", "", "  1 | x"));

  static LongStream seeds() {
    return LongStream.range(0, 150);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aNoteThatIsNotRunKeepsEveryByte(long seed, @TempDir Path folder) throws IOException {
    var made = new GeneratedNotebook(seed);
    Path file = folder.resolve("note.ipynb");
    byte[] bytes = made.text().getBytes(UTF_8);
    Files.write(file, bytes);
    Note note = NoteFile.read(file);
    assertArrayEquals(bytes, note.text().getBytes(UTF_8));
    assertEquals(note.text(), note.executed(Map.of()));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void sourcesAreReadHoweverTheyAreWritten(long seed) throws NoteFileException {
    var made = new GeneratedNotebook(seed);
    Note note = Note.parse("note.ipynb", made.text());
    assertEquals(made.sources, note.cells().stream().map(Cell::source).toList());
    assertEquals(
        made.codeCells,
        note.cells().stream().filter(cell -> cell.kind().isCode()).map(Cell::position).toList());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void runningACellChangesItsOutputsAndNothingElse(long seed) throws NoteFileException {
    var made = new GeneratedNotebook(seed);
    Note note = Note.parse("note.ipynb", made.text());
    var executions = new HashMap<Integer, Execution>();
    for (int cell : made.codeCells) {
      if (cell % 2 == 1) {
        executions.put(cell, new Execution(OptionalInt.of(70 + cell), List.of(SHOWN, FAILED)));
      }
    }
    String result = note.executed(executions);

    String rest = result;
    for (var piece : made.pieces()) {
      boolean replaced = executions.containsKey(piece.cell());
      String expected = piece.text();
      if (replaced && piece.role() == GeneratedNotebook.Role.COUNT) {
        expected = String.valueOf(70 + piece.cell());
      } else if (replaced && piece.role() == GeneratedNotebook.Role.OUTPUTS) {
        expected = firstValue(rest);
        assertEquals(outputs(SHOWN, FAILED), JsonParser.parseString(expected));
      }
      assertEquals(expected, rest.substring(0, Math.min(expected.length(), rest.length())));
      rest = rest.substring(expected.length());
    }
    assertEquals("", rest);

    assertEquals(result, Note.parse("note.ipynb", result).executed(executions), "twice is once");
    assertEquals(result, new String(result.getBytes(UTF_8), UTF_8), "fits UTF-8");
  }

  private static JsonElement outputs(Output... outputs) {
    var array = new JsonArray();
    for (Output output : outputs) {
      array.add(output.json(1));
    }
    return array;
  }

  /** The array that a text begins with, found by its brackets; no bracket stands in our texts. */
  private static String firstValue(String text) {
    int depth = 0;
    int end = 0;
    do {
      char c = text.charAt(end++);
      depth += c == '[' ? 1 : c == ']' ? -1 : 0;
    } while (depth > 0);
    return text.substring(0, end);
  }
}
