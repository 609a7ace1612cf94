package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import whorl.diagnostic.Diagnostic;
import whorl.eval.Value;

/** What a sheet tells of its names, and how a name is withdrawn by hand. */
class FactsTest {
  private final Sheet sheet = new Sheet();

  private CellOutcome run(String cell, String text) {
    CellOutcome outcome = sheet.run(new CellId(cell), "cell [" + cell + "]", text);
    assertEquals(List.of(), outcome.errors());
    return outcome;
  }

  private NameCard card(String name) {
    return sheet.card(name).orElseThrow();
  }

  private void flywheel() {
    run("1", "m [kg] = 412  # shop scale\nD [mm] = 900\nn [rpm] = 6000");
    run("2", "I [kg·m²] = 1/2 * m * (D/2)^2\nL = sqrt(I^2) * n\nv(r [m]) [m/s] = r * n");
    run("3", "check L <= 20 kN·m·s\ncheck m <= 500 kg\nassume n <= 7000 rpm\nI [kg·m²]");
    sheet.publish(
        new CellId("4"),
        "cell [4]",
        List.of(new PublishedFunction("drag(v [m/s]) [N]", x -> x[0])));
  }

  @Test
  void definitionsAreListedByCellWithWhatTheyComeTo() {
    flywheel();
    assertEquals(
        List.of(
            "INPUT m [kg] = 412, mass, cell [1]",
            "INPUT D [mm] = 900, length, cell [1]",
            "INPUT n [rpm] = 6000, angular velocity, cell [1]",
            "DERIVED I [kg·m^2] = 1 / 2 * m * (D / 2)^2, moment of inertia, cell [2]",
            "DERIVED L = sqrt(I^2) * n, angular momentum, cell [2]",
            "FUNCTION v(r [m]) [m/s] = r * n, velocity, cell [2]",
            "PUBLISHED drag(v [m/s]) [N], force, cell [4]"),
        sheet.definitions().stream()
            .map(d -> d.sort() + " " + d.text() + ", " + d.kind() + ", " + d.label())
            .toList());
    Definition mass = sheet.definitions().get(0);
    assertEquals("shop scale", mass.remark());
    assertEquals("412", Objects.requireNonNull(mass.quantity()).written());
    assertNull(sheet.definitions().get(5).quantity());
  }

  @Test
  void aCardTellsWhatANameUsesAndWhatRestsOnIt() {
    flywheel();
    assertEquals(List.of("m", "D"), card("I").uses());
    assertEquals(List.of("I", "n"), card("L").uses());
    assertEquals(List.of("L"), card("I").usedBy());
    assertEquals(List.of("L", "v"), card("n").usedBy());
    assertEquals(
        List.of(
            new NameCard.Judged("check L ≤ 20 kN·m·s", Optional.of(false)),
            new NameCard.Judged("check m ≤ 500 kg", Optional.of(true))),
        card("m").checks());
    assertEquals(List.of("n"), card("v").uses());
    assertEquals(List.of(), card("drag").usedBy());
    assertEquals(Optional.empty(), sheet.card("x"));
    assertEquals(Optional.empty(), sheet.card("sqrt"));
  }

  @Test
  void aCardTellsHowANameStands() {
    run("1", "a [m] = 3\nω_1 [rad/s] = 2");
    run("2", "b [m] = 2 * a\nc = b + z\nd = c / 1");
    run("3", "assume a <= 2 m\ncheck c <= 3");
    assertEquals(List.of("a ≤ 2 m"), card("b").doubts());
    assertEquals(new Definition.State.Waiting(List.of("z")), card("c").definition().state());
    assertEquals(List.of("b", "z"), card("c").uses());
    assertEquals(new Definition.State.Waiting(List.of("c")), card("d").definition().state());
    assertEquals(List.of(new NameCard.Judged("check c ≤ 3", Optional.empty())), card("c").checks());
    run("1", "a [kg] = 3\nω_1 [rad/s] = 2");
    var broken = (Definition.State.Broken) card("b").definition().state();
    assertEquals(new Value.Real(6), Objects.requireNonNull(broken.last()).value());
    assertNull(card("b").definition().quantity());
    assertEquals("ω_1", card("omega_1").definition().name());
    assertEquals(new Definition.State.Sound(), card("omega_1").definition().state());
  }

  @Test
  void aNameIsWithdrawnByHandAndTheRestOfItsCellStays() {
    run("1", "ω [rpm] = 6000\nb = 2");
    run("2", "c = ω * b\ncheck c < 1 rpm\nk = b");
    CellOutcome outcome = sheet.withdraw("omega");
    assertEquals(
        List.of("ω is withdrawn from cell [1]; it was 6000 rpm."),
        outcome.notices().stream().map(Diagnostic::problem).toList());
    assertEquals(List.of("c", "check c < 1 rpm"), outcome.stopped());
    assertEquals(Set.of(new CellId("1"), new CellId("2")), outcome.refreshed());
    assertEquals(Optional.empty(), sheet.quantity("ω"));
    assertEquals(1, sheet.steps(new CellId("1")).size());
    assertTrue(sheet.quantity("k").isPresent());
    run("1", "ω [rpm] = 3000\nb = 2");
    assertTrue(sheet.quantity("c").isPresent());
  }

  @Test
  void aNameThatNoCellDefinesIsNotWithdrawn() {
    run("1", "mass = 3");
    CellOutcome outcome = sheet.withdraw("mas");
    assertEquals("No cell defines mas.", outcome.errors().get(0).problem());
    assertEquals("Names spelled alike: mass, max.", outcome.errors().get(0).fix());
    assertEquals(1, sheet.definitions().size());
  }

  @Test
  void aRefusedCellTellsWhichOfItsNamesStillStand() {
    run("1", "a = 1\nb = 2\ncheck a < b");
    CellOutcome outcome = sheet.run(new CellId("1"), "cell [1]", "a = 1 x\nd = 3");
    assertEquals(List.of("a", "b"), outcome.standing());
    assertEquals(Set.of("d"), outcome.attempted());
  }
}
