package whorl.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonParser;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MainTest {
  @TempDir Path folder;

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();
  private Path sheet = Path.of("");

  @BeforeEach
  void writeSheet() throws IOException {
    sheet = Files.writeString(folder.resolve("s.whorl"), "m [kg] = 4\nF [N] = m * g_n\n");
  }

  private int run(String... args) {
    return Main.run(new PrintWriter(out, true), new PrintWriter(err, true), args);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "''             | a command is missing: run, recheck",
        "walk           | there is no such command; there are: run, recheck",
        "--walk         | Unknown option: '--walk'",
        "run            | Missing required parameter: 'NOTE'",
        "run a b        | Unmatched argument at index 2: 'b'",
        "run a --set    | Missing required parameter for option '--set'",
        "recheck a --out b | Unknown options: '--out', 'b'",
      })
  void aWrongCommandIsExplainedAndIsStatus3(String command, String problem) {
    assertEquals(3, run(command.isEmpty() ? new String[0] : command.split(" ", -1)));
    assertTrue(err.toString().startsWith("whorl: " + problem), err::toString);
    assertTrue(err.toString().contains("--help"), err::toString);
    assertEquals("", out.toString());
  }

  @Test
  void helpIsPrintedWhenAskedFor() {
    assertEquals(0, run("--help"));
    assertEquals(0, run("run", "--help"));
    assertTrue(out.toString().contains("Exit status:"), out::toString);
    assertTrue(out.toString().contains("--set='NAME=VALUE UNIT'"), out::toString);
    assertEquals("", err.toString());
  }

  @Test
  void aNoteThatHoldsIsStatus0() {
    assertEquals(0, run("run", sheet.toString()), err::toString);
    assertTrue(out.toString().contains("39.2"), out::toString);
    assertEquals(sheet + ": 2 results\n", err.toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "check m <= 5 kg          | 0",
        "check m <= 3 kg          | 1",
        "assume m <= 3 kg         | 1",
        "q [s] = m                | 2",
        "q = x                    | 2",
        "q = x;check m <= 3 kg    | 2",
      })
  void theStatusTellsHowANoteStands(String line, int status) throws IOException {
    Files.writeString(sheet, "m [kg] = 4\n" + line.replace(';', '\n'));
    assertEquals(status, run("run", sheet.toString()), err::toString);
  }

  @Test
  void aFileThatCannotBeReadIsStatus3() {
    assertEquals(3, run("run", folder.resolve("no.whorl").toString()));
    assertEquals("whorl: there is no file " + folder.resolve("no.whorl") + "\n", err.toString());
  }

  @Test
  void theRecordIsPrintedInPlaceOfTheStepsWhenAskedFor() {
    assertEquals(0, run("run", sheet.toString(), "--json", "-"));
    var record = JsonParser.parseString(out.toString()).getAsJsonObject();
    assertEquals("[m, F]", record.getAsJsonObject("definitions").keySet().toString());
  }

  @Test
  void resultsOfTheNoteAreWrittenWhereTheyAreWanted() throws IOException {
    Path note = folder.resolve("o.ipynb");
    Path record = folder.resolve("r.json");
    assertEquals(
        0,
        run("run", sheet.toString(), "--out", note.toString(), "--json", record.toString()),
        err::toString);
    assertTrue(Files.readString(record).contains("\"F\""));
    assertEquals(0, run("recheck", note.toString()), out::toString);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "m=5 kg        | 0 | ''",
        "m = 5         | 0 | ''",
        "m=5 s         | 2 | cell 1, line 1",
        "F=5 N         | 3 | --set: F cannot be set, for cell 1 derives it; only an input can be set",
        "x=5           | 3 | --set: there is no input x to set",
        "m             | 3 | --set: An input is set as name=value",
      })
  void inputsAreSetWhereTheyAreDefined(String setting, int status, String message) {
    assertEquals(status, run("run", sheet.toString(), "--set", setting), err::toString);
    assertTrue(err.toString().contains(message), err::toString);
    assertEquals(status == 0, out.toString().contains("49.03"), out::toString);
  }

  @Test
  void anInputIsSetOnce() {
    assertEquals(3, run("run", sheet.toString(), "--set", "m=5 kg", "--set", "m=6 kg"));
    assertTrue(err.toString().contains("--set: m is set twice"), err::toString);
  }

  @Test
  void anExecutedNoteIsANotebookByItsName() {
    assertEquals(3, run("run", sheet.toString(), "--out", folder.resolve("o.txt").toString()));
    assertTrue(err.toString().contains("must end in .ipynb"), err::toString);
  }

  @Test
  void aRehearsalRunsANoteAndAKernel() {
    assertEquals(0, run("rehearse"), err::toString);
    assertEquals("", out.toString() + err);
  }
}
