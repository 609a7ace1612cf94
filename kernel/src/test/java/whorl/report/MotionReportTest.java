package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;

/** How a motion stands on the page. */
class MotionReportTest {
  private static final String NOTE =
      """
      n [rpm] = 60                       # before
      I_b(x [m]) [kg·m²] = 1.2 kg·m² + 8 kg * x^2
      motion turn                        # a turntable with arms
          x [m] starts 0.7
          ω [rpm] starts n
          x' = -0.2 m/s                  # arms drawn in
          (I_b(x)*ω)' = -0.5 N·m
          stop when x <= 0.3 m
          within 5 s
      E_k = 1/2 * I_b(turn.x) * turn.ω^2
      turn.ω [rpm]
      """;

  private static CellReport report() {
    CellOutcome outcome = new Sheet().run(new CellId("a"), "cell [1]", NOTE);
    return CellReport.of(outcome);
  }

  private static void assertGolden(String name, String actual) throws IOException {
    Path file = Path.of("src/test/resources/whorl/report", name);
    if (Boolean.getBoolean("whorl.rewrite")) {
      Files.writeString(file, actual + "\n");
    }
    assertEquals(Files.readString(file), actual + "\n");
  }

  @Test
  void theRunStandsUnderItsEquationsAsATable() throws IOException {
    assertGolden("motion.txt", report().text());
  }

  @Test
  void theRecordHoldsEveryCourse() throws IOException {
    assertGolden("motion.json", NoteRecord.text(report().record()).strip());
  }

  @Test
  void thePageHoldsTheTableToo() {
    String html = report().html();
    assertTrue(html.contains("arms drawn in"));
    assertTrue(html.contains("the same matter throughout"));
    assertEquals(13, html.split("<tr", -1).length - 1 - 6, html);
  }
}
