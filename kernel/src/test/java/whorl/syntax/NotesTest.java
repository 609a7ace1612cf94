package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.diagnostic.Source;

/** Whole calculation notes are read, and their canonical text says the same. */
class NotesTest {
  @ParameterizedTest
  @CsvSource({"boom_stabiliser, 45", "cable_spool, 47", "ferry_flywheel, 46", "trifilar, 45"})
  void wholeNotesAreRead(String note, int statements) throws IOException {
    Parsed parsed = parsed(Resources.text("notes/" + note + ".whorl"));
    assertEquals(List.of(), parsed.errors());
    assertEquals(statements, parsed.statements().size());
  }

  @ParameterizedTest
  @CsvSource({"boom_stabiliser", "cable_spool", "ferry_flywheel", "trifilar"})
  void canonicalTextOfANoteReadsAsTheSameNote(String note) throws IOException {
    Parsed written = parsed(Resources.text("notes/" + note + ".whorl"));
    String canonical = Printer.text(written);
    Parsed again = parsed(canonical);
    assertEquals(List.of(), again.errors());
    assertEquals(Unplaced.statements(written), Unplaced.statements(again));
    assertEquals(canonical, Printer.text(again));
    assertEquals(
        written.remarks().stream().map(Remark::text).toList(),
        again.remarks().stream().map(Remark::text).toList());
  }

  private static Parsed parsed(String text) {
    return Parser.parse(new Source(text), name -> false, CatalogueWords.STANDARD);
  }
}
