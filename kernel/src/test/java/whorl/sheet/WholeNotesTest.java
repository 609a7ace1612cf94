package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import whorl.diagnostic.Span;

/** Whole calculation notes against results that were computed apart from the language. */
class WholeNotesTest {
  private static final String FOLDER = "whole-notes";

  @TestFactory
  Stream<DynamicTest> notesGiveTheResultsComputedApartFromThem() throws IOException {
    List<CaseTable.Case> notes = new CaseTable(FOLDER + "/results.txt").cases();
    assertTrue(notes.size() >= 4);
    return notes.stream()
        .map(note -> DynamicTest.dynamicTest(note.title(), () -> assertResults(note)));
  }

  private static void assertResults(CaseTable.Case note) throws IOException {
    Path file = Path.of("src/test/resources/whorl/sheet", FOLDER, note.title() + ".whorl");
    WorkedSheet sheet = WorkedSheet.of(Files.readString(file));
    sheet.assertWhole();
    sheet.assertGives(note.section("gives"));
    assertEquals(
        note.section("fails").lines().toList(),
        sheet.outcome().steps().stream()
            .filter(WholeNotesTest::fails)
            .map(step -> text(step.statement().span(), sheet))
            .toList());
  }

  private static boolean fails(Step step) {
    return (step instanceof Step.Checked checked && !checked.verdict().holds())
        || (step instanceof Step.Assumed assumed && !assumed.verdict().holds())
        || (step instanceof Step.Reproduced reproduced && !reproduced.holds());
  }

  private static String text(Span span, WorkedSheet sheet) {
    return sheet.outcome().source().slice(span);
  }
}
