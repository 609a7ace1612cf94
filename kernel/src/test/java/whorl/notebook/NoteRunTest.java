package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.diagnostic.Diagnostic;

class NoteRunTest {

  private static List<String> problems(String... cells) throws NoteFileException {
    return Notes.run(Notes.of(cells)).cells().stream()
        .flatMap(
            cell ->
                cell.errors().stream()
                    .map(error -> cell.cell().position() + ": " + error.problem()))
        .toList();
  }

  @Test
  void aNameMayBeDefinedBelowItsUse() throws NoteFileException {
    assertEquals(List.of(), problems("F [N] = m * g_n", "m [kg] = 4"));
  }

  @Test
  void whatNoCellDefinesIsAnErrorAtTheEnd() throws NoteFileException {
    assertEquals(
        List.of(
            "1: This statement waits for m, which no cell defines.",
            "2: This statement waits for a and b, which no cell defines."),
        problems("F [N] = m * g_n", "c = a + b", "d = 2"));
  }

  @Test
  void whatFollowsFromAnErrorIsNotReportedAgain() throws NoteFileException {
    List<String> problems = problems("m [kg] = 4 s", "F [N] = m * g_n\nG [N] = 2 * F", "H = x");
    assertEquals(2, problems.size(), problems::toString);
    assertEquals("1", problems.get(0).substring(0, 1));
    assertEquals("3: This statement waits for x, which no cell defines.", problems.get(1));
  }

  @Test
  void aCellThatALaterOneBreaksIsInError() throws NoteFileException {
    List<String> problems = problems("t [s] = a", "a = 3 kg");
    assertEquals(1, problems.size(), problems::toString);
    assertEquals("1", problems.get(0).substring(0, 1));
  }

  @Test
  void cellsOfOtherLanguagesAreErrors() throws NoteFileException {
    assertEquals(List.of("1: This cell is written for another kernel."), problems("\n%%html\n<p>"));
  }

  @Test
  void cellsInJavaAreErrorsWhereTheyAreRefused() throws NoteFileException {
    NoteRun run = NoteRun.of(Notes.of("%%java\nint x;", "k = 1"), JavaCells.REFUSED, Path.of(""));
    assertEquals(
        List.of("Cells in Java are refused here."),
        run.cells().get(0).errors().stream().map(Diagnostic::problem).toList());
    assertEquals(List.of(), run.cells().get(1).errors());
  }

  @Test
  void cellsInJavaReadTheSheetAndGiveItFunctions() throws NoteFileException {
    NoteRun run =
        Notes.run(
            Notes.of(
                "v = drag(3 m/s)",
                "%%java\nsheet.function(\"drag(v [m/s]) [N]\", v -> 2 * v * v);\nint k = 6;",
                "n [rpm] = 600",
                "%%java\nSystem.out.println(sheet.value(\"n\", \"rpm\"));\nk * 7"));
    JsonObject drag = run.record().getAsJsonObject("definitions").getAsJsonObject("v");
    assertEquals(18, drag.get("si").getAsDouble());
    List<Output> printed = run.cells().get(3).printed();
    assertEquals(List.of("600.0\n", "42"), printed.stream().map(Output::text).toList());
    assertEquals("execute_result", printed.get(1).json(4).get("output_type").getAsString());
  }

  @Test
  void errorsInJavaStandAtTheLineOfTheCell() throws NoteFileException {
    CellRun run = Notes.run(Notes.of("%%java\nint a = 1;\nint b = a / 0;")).cells().get(0);
    Diagnostic error = run.errors().get(0);
    assertEquals(3, run.source().line(error.span().start()));
    assertEquals("ArithmeticException", run.errorName());
  }

  @Test
  void theErrorOfAForeignCellStandsAtItsFirstWords() throws NoteFileException {
    CellRun run = Notes.run(Notes.of("\n%%html\n<p>")).cells().get(0);
    Diagnostic error = run.errors().get(0);
    assertEquals("%%html", run.source().slice(error.span()));
  }

  @Test
  void theRecordOfANoteHoldsAllOfItsCells() throws NoteFileException {
    JsonObject record =
        Notes.run(Notes.of("m [kg] = 4", "# Prose", "check m <= 3 kg", "y [s] = m")).record();
    assertEquals("[m]", record.getAsJsonObject("definitions").keySet().toString());
    assertFalse(
        record.getAsJsonArray("checks").get(0).getAsJsonObject().get("holds").getAsBoolean());
    JsonObject error = record.getAsJsonArray("errors").get(0).getAsJsonObject();
    assertEquals(4, error.get("cell").getAsInt());
    assertEquals(1, error.get("line").getAsInt());
    assertEquals(9, error.get("column").getAsInt());
  }

  @Test
  void blankCellsGetNoNumber() throws NoteFileException {
    Note note = Notes.executed(Notes.of("m [kg] = 4", " \n", "# Prose", "# only a remark\n", "m"));
    List<String> counts =
        StreamSupport.stream(note.cells().spliterator(), false)
            .map(cell -> cell.json().member("execution_count").map(Json::written).orElse("-"))
            .toList();
    assertEquals(List.of("1", "null", "-", "-", "2"), counts);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a = 1                                     | 1 result",
        "a = 1;b = a;check a <= 2                  | 2 results; 1 check holds",
        "a = 1;check a <= 2;check a <= 0;check a>0 | 1 result; 2 checks hold, 1 FAILS",
        "a = 1;check a <= 0;check a < 0            | 1 result; 2 checks FAIL",
        "a = 1;assume a <= 0;assume a > 0          | 1 result; 1 assumption holds, 1 FAILS",
        "a = 1;check a = 1.1 within 1 %            | 1 result; 1 check FAILS",
        "a = 1;b = x                               | 1 result; 1 error",
      })
  void aRunIsSummedUp(String lines, String words) throws NoteFileException {
    Tally tally = Tally.of(Notes.run(Notes.of(lines.replace(';', '\n'))));
    assertEquals(words, tally.words());
    assertEquals(words.contains("FAIL"), tally.hasFailures());
    assertEquals(words.contains("error"), tally.hasErrors());
  }

  @Test
  void headingsArePrintedAndOtherProseIsNot() throws NoteFileException {
    Note note =
        Notes.of(
            "# One\n\nText #2\n\n```\n# code\n```\n   ## Two ##\n#tag\n#", "m [kg] = 4", "# Three");
    List<String> parts = PrintedNote.parts(note, Notes.run(note));
    assertEquals(4, parts.size(), parts::toString);
    assertEquals(List.of("# One", "## Two ##"), parts.subList(0, 2));
    assertEquals("# Three", parts.get(3));
  }
}
