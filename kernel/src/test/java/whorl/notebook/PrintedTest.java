package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonObject;
import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.java.JavaOutput;

/** What is kept is what a page would show in the end. */
class PrintedTest {
  private static final JsonObject NO_METADATA = new JsonObject();

  private final Printed printed = new Printed();
  private final Cell first;
  private final Cell second;

  PrintedTest() throws NoteFileException {
    Note note = Notes.of("%%java\n1", "%%java\n2");
    first = note.cells().get(0);
    second = note.cells().get(1);
  }

  private static JsonObject text(String text) {
    var data = new JsonObject();
    data.addProperty("text/plain", text);
    return data;
  }

  private List<String> texts(Cell cell) {
    return printed.of(cell).stream().map(Output::text).toList();
  }

  @Test
  void whatIsPrintedInPiecesIsOneTextForEachStream() {
    JavaOutput out = printed.in(first);
    out.print(JavaOutput.Stream.OUT, "a");
    printed.in(second).print(JavaOutput.Stream.OUT, "x");
    out.print(JavaOutput.Stream.OUT, "b");
    out.print(JavaOutput.Stream.ERR, "c");
    out.print(JavaOutput.Stream.OUT, "d");
    assertEquals(List.of("ab", "c", "d"), texts(first));
    assertEquals(List.of("x"), texts(second));
  }

  @Test
  void aDisplayIsShownAnewWhereItStands() {
    printed.in(first).display(text("old"), NO_METADATA, "id");
    printed.in(first).display(text("other"), NO_METADATA, null);
    printed.in(second).update(text("new"), NO_METADATA, "id");
    assertEquals(List.of("new", "other"), texts(first));
    assertEquals(List.of(), texts(second));
  }

  @Test
  void aCellIsClearedAtOnceOrWithItsNextOutput() {
    JavaOutput out = printed.in(first);
    out.print(JavaOutput.Stream.OUT, "a");
    out.clear(/* wait= */ true);
    assertEquals(List.of("a"), texts(first));
    out.print(JavaOutput.Stream.OUT, "b");
    assertEquals(List.of("b"), texts(first));
    out.clear(/* wait= */ false);
    assertEquals(List.of(), texts(first));
  }
}
