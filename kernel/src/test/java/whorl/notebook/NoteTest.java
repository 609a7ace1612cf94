package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NoteTest {

  private static Note note(String... cells) throws NoteFileException {
    return Note.parse("n.ipynb", "{\"nbformat\": 4, \"cells\": [" + String.join(",", cells) + "]}");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "code     | m [kg] = 412         | SHEET",
        "code     | ''                   | SHEET",
        "code     | %%java               | JAVA",
        "code     | '  %%java -x'        | JAVA",
        "code     | %%javascript         | FOREIGN",
        "code     | %%html               | FOREIGN",
        "code     | 5 %                  | SHEET",
        "code     | # %%java             | SHEET",
        "markdown | %%java               | MARKDOWN",
        "raw      | m [kg] = 412         | OTHER",
        "slide    | m [kg] = 412         | OTHER",
      })
  void theKindOfACellFollowsFromItsTypeAndItsFirstWord(String type, String source, CellKind kind)
      throws NoteFileException {
    var cell = new JsonObject();
    cell.addProperty("cell_type", type);
    cell.addProperty("source", source);
    assertEquals(kind, note(cell.toString()).cells().get(0).kind());
  }

  @Test
  void cellsWithoutAnIdStaySo() throws NoteFileException {
    Note note = note("{\"cell_type\": \"code\", \"source\": \"\", \"id\": \"a\"}", "{}");
    assertEquals("a", note.cells().get(0).id().orElseThrow());
    assertEquals(Optional.empty(), note.cells().get(1).id());
  }

  @Test
  void idsGivenTwiceAreReported() throws NoteFileException {
    Note note = note("{\"id\": \"a\"}", "{\"id\": \"b\"}", "{\"id\": \"a\"}");
    assertEquals(
        List.of(
            "cells 1 and 3 have the same id a, so that in a live page one takes the place of the"
                + " other; opening and saving the note in JupyterLab mends it"),
        note.oddities());
  }

  @Test
  void storedResultsAreFoundByTheirType() throws NoteFileException {
    Note note =
        note(
            """
            {"cell_type": "code", "source": "", "outputs": [
              {"output_type": "stream", "name": "stdout", "text": "x"},
              {"output_type": "display_data", "data": {"text/plain": "1", "a/b+json": {"n": 1}}},
              {"output_type": "display_data", "data": {"a/b+json": [2]}}]}
            """);
    assertEquals(
        List.of(JsonParser.parseString("{\"n\": 1}"), JsonParser.parseString("[2]")),
        note.cells().get(0).stored("a/b+json"));
  }

  /** The layout is that of nbformat's writer: blanks, line breaks and the order of keys. */
  @Test
  void outputsLookAsJupyterWritesThem() throws NoteFileException {
    String before =
        """
        {
         "cells": [
          {
           "cell_type": "code",
           "execution_count": null,
           "id": "a1",
           "metadata": {},
           "outputs": [],
           "source": [
            "m = 1"
           ]
          }
         ],
         "metadata": {},
         "nbformat": 4,
         "nbformat_minor": 5
        }
        """;
    var numbers = new JsonArray();
    numbers.add(1.0);
    numbers.add(1.5);
    var steps = new JsonObject();
    steps.add("m", new JsonObject());
    steps.add("b", numbers);
    steps.addProperty("a", "x\ny");
    var shown =
        new Output.Display(
            Map.of(
                "text/plain", new JsonPrimitive("a\nb\u2028c"),
                "image/png", new JsonPrimitive("iVBO\n"),
                "text/html", new JsonPrimitive(""),
                "application/x-whorl-steps+json", steps),
            new JsonObject());
    var printed = new Output.Stream("stdout", "é <1>\r\nand more");
    String after =
        """
           "execution_count": 3,
           "id": "a1",
           "metadata": {},
           "outputs": [
            {
             "data": {
              "application/x-whorl-steps+json": {
               "a": "x\\ny",
               "b": [
                1,
                1.5
               ],
               "m": {}
              },
              "image/png": "iVBO\\n",
              "text/html": [],
              "text/plain": [
               "a\\n",
               "b\\u2028",
               "c"
              ]
             },
             "metadata": {},
             "output_type": "display_data"
            },
            {
             "name": "stdout",
             "output_type": "stream",
             "text": [
              "é <1>\\r\\n",
              "and more"
             ]
            }
           ],
           "source": [
        """;
    Note note = Note.parse("n.ipynb", before);
    String result =
        note.executed(Map.of(1, new Execution(OptionalInt.of(3), List.of(shown, printed))));
    int start = before.indexOf("   \"execution_count\"");
    assertEquals(after, result.substring(start, start + after.length()));
    assertEquals(before, Note.parse("n.ipynb", result).executed(Map.of(1, Execution.NONE)));
  }

  @Test
  void aCellThatLacksItsOutputsGetsThem() throws NoteFileException {
    Note note = note("{ \"cell_type\":\"code\", \"source\":\"1\" }");
    String result = note.executed(Map.of(1, Execution.NONE));
    assertEquals(
        "{\"nbformat\": 4, \"cells\": [{ \"cell_type\":\"code\", \"source\":\"1\","
            + " \"execution_count\":null, \"outputs\":[] }]}",
        result);
  }

  @Test
  void aSheetBecomesANoteWithOneCell() throws NoteFileException {
    String sheet = "# ω\r\nm [kg] = 412\n\"x\"";
    Note note = Note.ofSheet("s.whorl", sheet);
    assertEquals(1, note.cells().size());
    assertEquals(CellKind.SHEET, note.cells().get(0).kind());
    assertEquals(sheet, note.cells().get(0).source());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "{\"a\": 1} | n.ipynb is JSON, but not a notebook: it does not say its nbformat",
        "[1]        | n.ipynb is JSON, but not a notebook: it does not say its nbformat",
        "3          | n.ipynb is JSON, but not a notebook: it does not say its nbformat",
        "{\"nbformat\": 4} | n.ipynb is JSON, but not a notebook: it has no list of cells",
        "{\"nbformat\": 4, \"cells\": {}} | n.ipynb is JSON, but not a notebook: it has no list of cells",
        "{\"nbformat\": 3, \"worksheets\": []} | n.ipynb: this notebook is format 3; open it in JupyterLab and save it, which makes it format 4",
        "{\"nbformat\": 5, \"cells\": []} | n.ipynb: this notebook is format 5, which is newer than this program; it reads format 4",
        "{\"nbformat\": \"4\", \"cells\": []} | n.ipynb is JSON, but not a notebook: its nbformat is no number",
        "{\"nbformat\": 4, \"cells\": [1]} | n.ipynb: cell 1 is not an object",
        "{\"nbformat\": 4, \"cells\": [{}, {\"source\": 1}]} | n.ipynb: the source of cell 2 is neither a text nor a list of texts",
        "{\"nbformat\": 4, \"cells\": [{\"source\": [\"a\", 2]}]} | n.ipynb: the source of cell 1 is neither a text nor a list of texts",
        "{\"nbformat\": 4, \"cells\": [}     | n.ipynb is not a notebook, for it is not JSON: line 1, column 27: a value must stand here",
        "{\"nbformat\": 4, \"metadata\": {\"kernelspec\": {\"language\": \"python\"}}, \"cells\": []} | n.ipynb is a note in python, not in Whorl; to make it one, choose the kernel Whorl in JupyterLab and save it",
        "{\"nbformat\": 4, \"metadata\": {\"language_info\": {\"name\": \"R\"}}, \"cells\": []} | n.ipynb is a note in R, not in Whorl; to make it one, choose the kernel Whorl in JupyterLab and save it",
      })
  void whatIsNoNoteIsRefusedWithTheReason(String text, String message) {
    var e = assertThrows(NoteFileException.class, () -> Note.parse("n.ipynb", text));
    assertEquals(message, e.getMessage());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "{}",
        "{\"kernelspec\": {\"language\": \"whorl\"}}",
        "{\"kernelspec\": {\"language\": \"Whorl\"}, \"language_info\": {\"name\": \"python\"}}",
        "{\"kernelspec\": {\"name\": \"whorl\"}, \"language_info\": {\"name\": \"whorl\"}}",
        "{\"kernelspec\": [], \"language_info\": {\"name\": 7}}",
      })
  void aNoteInOurLanguageOrInNoneIsRead(String metadata) throws NoteFileException {
    String text = "{\"nbformat\": 4.0, \"metadata\": " + metadata + ", \"cells\": []}";
    assertEquals(List.of(), Note.parse("n.ipynb", text).cells());
  }
}
