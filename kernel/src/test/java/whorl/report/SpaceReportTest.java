package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;

/** Things in space, and what quantities are about, as the page and the record show them. */
class SpaceReportTest {
  private static final boolean REWRITE = Boolean.getBoolean("whorl.rewriteGolden");

  private static final String NOTE =
      """
      n [rpm] = 600                # strobe
      A = point(0, 0, 0)
      C = point(0, 60 mm, 180 mm)
      deck = frame(origin = A, turned = 30 deg, about = (1, 0, 0), turning = (0, 0.2, 0) rad/s)
      P = point(0, 1 m, 0, frame = deck)
      axle = axis(through = A, along = (0, 1, 3))
      wheel = placed(solid_cylinder(diameter = 320 mm, length = 30 mm, mass = 19 kg), at = C)
      I_a = inertia(wheel, about = axle)
      L_a = I_a * n
      J = inertia(wheel, about = A)
      J_d = wheel.inertia @ deck
      W = weight(wheel)
      M = moment(W, about = A)
      H = angular_momentum(wheel, spin = (0, 0, n), about = wheel.centre) @ deck
      hoop = ring(diameter = 320 mm, thickness = 40 mm, mass = 2 kg)
      m_h = hoop.mass
      x = M.x
      """;

  private static CellReport report() {
    CellOutcome outcome = new Sheet().run(new CellId("space"), "cell [1]", NOTE);
    assertEquals(List.of(), outcome.errors());
    return CellReport.of(outcome);
  }

  @Test
  void textIsAsReviewed() throws IOException {
    assertGolden("space.txt", report().text() + "\n");
  }

  @Test
  void pageIsAsReviewed() throws IOException {
    assertGolden("space.html", report().html().replace("><", ">\n<") + "\n");
  }

  @Test
  void recordIsWhatToolsExpect() throws IOException {
    assertGolden("space.json", NoteRecord.text(report().record()));
  }

  @Test
  void noLineOfTextIsWiderThanThePage() {
    for (String line : report().text().lines().toList()) {
      assertTrue(TextWidth.of(line) <= 108, line);
    }
  }

  private static void assertGolden(String name, String actual) throws IOException {
    Path file = Path.of("src/test/resources/whorl/report", name);
    if (REWRITE) {
      Files.writeString(file, actual);
    }
    assertEquals(Files.readString(file, StandardCharsets.UTF_8), actual);
  }
}
