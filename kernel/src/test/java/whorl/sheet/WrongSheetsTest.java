package whorl.sheet;

import static java.util.stream.Collectors.joining;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** The table of mistakes and the exact words that answer them. */
class WrongSheetsTest {
  private static final Path TABLE = Path.of("src/test/resources/whorl/sheet/wrong-sheets.txt");
  private static final String CASE_BREAK = "\n====\n";
  private static final String MESSAGE_BREAK = "\n----\n";

  private record WrongSheet(String text, String message) {}

  private static List<WrongSheet> table() throws IOException {
    List<String> parts = List.of(Files.readString(TABLE).strip().split(CASE_BREAK, -1));
    var table = new ArrayList<WrongSheet>();
    for (String part : parts.subList(1, parts.size())) {
      String[] halves = (part + "\n").split(MESSAGE_BREAK, 2);
      table.add(new WrongSheet(halves[0], halves[1].strip()));
    }
    return table;
  }

  @TestFactory
  Stream<DynamicTest> everyMistakeIsAnsweredInTheseWords() throws IOException {
    if (Boolean.getBoolean("whorl.rewrite")) {
      rewrite();
    }
    List<WrongSheet> table = table();
    assertTrue(table.size() >= 60);
    return table.stream()
        .map(
            wrong ->
                DynamicTest.dynamicTest(
                    wrong.text(),
                    () -> assertEquals(wrong.message(), WorkedSheet.of(wrong.text()).messages())));
  }

  @TestFactory
  Stream<DynamicTest> aRefusedSheetHoldsNothing() throws IOException {
    return table().stream()
        .map(
            wrong ->
                DynamicTest.dynamicTest(
                    wrong.text(),
                    () -> {
                      var sheet = new Sheet();
                      sheet.run(new CellId("a"), "cell [1]", wrong.text());
                      assertEquals(List.of(), sheet.cells());
                    }));
  }

  private static void rewrite() throws IOException {
    String head = Files.readString(TABLE).strip().split(CASE_BREAK, -1)[0];
    String body =
        table().stream()
            .map(wrong -> wrong.text() + MESSAGE_BREAK + WorkedSheet.of(wrong.text()).messages())
            .collect(joining(CASE_BREAK));
    Files.writeString(TABLE, head + CASE_BREAK + body + "\n");
  }
}
