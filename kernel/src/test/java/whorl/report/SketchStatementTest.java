package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.report.sketch.Drawn;
import whorl.report.sketch.Sense;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;
import whorl.sheet.Step;

class SketchStatementTest {
  private static final String WHEEL =
      """
      A = point(1 m, 0, 0)
      C = point(1 m, 0, 180 mm)
      wheel = placed(solid_cylinder(diameter = 320 mm, length = 30 mm, mass = 19 kg), at = C, along = (0, 1, 0))
      axle = axis(through = C, along = (0, 1, 0))
      W = force((0, 0, -186 N), at = point(1 m, 0.2 m, 0))
      M_A = moment(W, about = A)
      ω_w [rpm] = (0, 600, 0)
      v_w = (0, 0, 2 m/s)
      ship = frame(origin = A, turned = 5 deg, about = (1, 0, 0))
      """;

  private static CellOutcome run(String text) {
    CellOutcome outcome = new Sheet().run(new CellId("a"), "cell [1]", text);
    assertEquals(List.of(), outcome.errors());
    return outcome;
  }

  private static List<Drawn> drawn(String names) {
    CellOutcome outcome = run(WHEEL + "sketch " + names + "\n");
    Step.Sketched step = (Step.Sketched) outcome.steps().get(outcome.steps().size() - 1);
    return Depictions.of(step.things());
  }

  @Test
  void aSketchIsDrawnListedAndRecorded() {
    CellReport report =
        CellReport.of(run(WHEEL + "sketch wheel, A, axle, M_A  # which way it goes\n"));
    assertTrue(report.html().contains("<svg"), report.html());
    assertTrue(report.html().contains("which way it goes"));
    assertTrue(report.text().contains("wheel body"), report.text());
    assertTrue(report.text().contains("37.2 N·m torque"), report.text());
    assertFalse(report.text().contains("svg"));
    JsonObject sketch = report.record().getAsJsonArray("sketches").get(0).getAsJsonObject();
    assertEquals("sketch wheel, A, axle, M_A", sketch.get("text").getAsString());
    assertEquals(4, sketch.getAsJsonArray("things").size());
    assertTrue(sketch.get("svg").getAsString().startsWith("<svg"));
  }

  @Test
  void aMomentIsDrawnFromThePointThatItIsAbout() {
    Drawn.Arrow arrow = (Drawn.Arrow) drawn("M_A").get(0);
    assertEquals(1, arrow.at().orElseThrow().position().getX());
    assertEquals(Sense.MOMENT, arrow.sense());
    assertEquals(-37.2, arrow.value().getX(), 1e-12);
  }

  @Test
  void vectorsAreToldByTheirKinds() {
    List<Drawn> things = drawn("ω_w, v_w, W");
    assertEquals(Sense.TURNING, ((Drawn.Arrow) things.get(0)).sense());
    assertEquals("600 rpm", ((Drawn.Arrow) things.get(0)).size().replace('\u00A0', ' '));
    assertTrue(((Drawn.Arrow) things.get(0)).at().isEmpty());
    assertEquals(Sense.POLAR, ((Drawn.Arrow) things.get(1)).sense());
    Drawn.Arrow force = (Drawn.Arrow) things.get(2);
    assertEquals(Sense.FORCE, force.sense());
    assertEquals(0.2, force.at().orElseThrow().position().getY());
  }

  @Test
  void everySortOfThingIsDrawn() {
    List<Drawn> things = drawn("wheel, A, axle, ship, wheel.frame");
    assertEquals(
        List.of("Body", "Spot", "Line", "Axes", "Axes"),
        things.stream().map(thing -> thing.getClass().getSimpleName()).toList());
    assertEquals("wheel.frame", things.get(4).name());
  }

  @Test
  void aSketchWaitsForNamesAndFollowsTheirChanges() {
    Sheet sheet = new Sheet();
    CellId late = new CellId("late");
    CellOutcome waiting = sheet.run(new CellId("early"), "cell [1]", "sketch P");
    assertTrue(waiting.steps().get(0) instanceof Step.Waiting);
    CellOutcome outcome = sheet.run(late, "cell [2]", "P = point(0, 0, 1 m)");
    assertTrue(outcome.refreshed().contains(new CellId("early")), outcome.toString());
  }
}
