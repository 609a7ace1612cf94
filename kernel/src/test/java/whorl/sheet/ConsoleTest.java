package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import whorl.diagnostic.Diagnostic;
import whorl.eval.Value;

/** What is typed in a console, where nothing has a place that one could go back to. */
class ConsoleTest {
  private final Sheet sheet = new Sheet();
  private int count;

  private CellOutcome run(String cell, String text) {
    return sheet.run(new CellId(cell), "cell [" + cell + "]", text);
  }

  private CellOutcome type(String text) {
    count++;
    return sheet.runFromConsole(new CellId("typed " + count), "[" + count + "]", text);
  }

  private static CellOutcome good(CellOutcome outcome) {
    assertEquals(List.of(), problems(outcome.errors()));
    return outcome;
  }

  private static List<String> problems(List<Diagnostic> diagnostics) {
    return diagnostics.stream().map(Diagnostic::problem).toList();
  }

  private double si(String name) {
    return ((Value.Real) sheet.quantity(name).orElseThrow().value()).value();
  }

  @Test
  void aNameIsTakenOverWithANotice() {
    good(run("3", "n [rpm] = 6000\nm [kg] = 2\nω_2 [rad/s] = 2 * n"));
    good(run("4", "a = 1 * ω_2"));
    CellOutcome outcome = good(type("n [rpm] = 3000"));
    assertEquals(
        List.of("n replaces its definition in cell [3], 6000 rpm."), problems(outcome.notices()));
    assertEquals(200 * Math.PI, si("ω_2"), 1e-9);
    assertEquals(
        Set.of("ω_2", "a"),
        Set.copyOf(outcome.changes().stream().map(CellOutcome.Change::name).toList()));
    assertEquals(Set.of(new CellId("3"), new CellId("4")), outcome.refreshed());
    assertEquals(2, sheet.steps(new CellId("3")).size());
    assertEquals(2, si("m"));
  }

  @Test
  void aCellWhoseLastStatementIsTakenHoldsNothing() {
    good(run("3", "n = 1"));
    CellOutcome outcome = good(type("n = 2"));
    assertEquals(List.of(), sheet.steps(new CellId("3")));
    assertEquals(Set.of(new CellId("3")), outcome.refreshed());
    assertEquals(List.of(new CellId("typed 1")), sheet.cells());
  }

  @Test
  void aNameMayNotStandTwiceInOneText() {
    CellOutcome outcome = type("n = 1\nn = 2");
    assertEquals(List.of("n already has its definition: line 1, 1."), problems(outcome.errors()));
    assertEquals(List.of(), sheet.cells());
  }

  @Test
  void aTextInErrorTakesNothingOver() {
    good(run("3", "n [rpm] = 6000\nω_2 = 2 * n"));
    String before = sheet.steps(new CellId("3")).toString();
    assertEquals(1, type("n [rpm] = 3000\nx [kg] = 3 m").errors().size());
    assertEquals(1, type("n [kg] = 3 m").errors().size());
    assertEquals(1, type("n = ω_2 / 2").errors().size());
    assertEquals(before, sheet.steps(new CellId("3")).toString());
    assertEquals(200 * Math.PI, si("n"), 1e-9);
    assertEquals(List.of(new CellId("3")), sheet.cells());
  }

  @Test
  void theSameDefinitionTypedAgainChangesNothingAndSaysNothing() {
    good(type("n [rpm] = 6000\nE = 2 * n"));
    long before = sheet.evaluations();
    CellOutcome outcome = good(type("n [rpm] = 6000"));
    assertEquals(before, sheet.evaluations());
    assertEquals(List.of(), outcome.notices());
    assertEquals(List.of(), outcome.changes());
  }

  @Test
  void whatWasTypedYieldsToACellAndToAFunctionFromJava() {
    good(type("n = 1\nf(x) = x\nk = 5"));
    good(run("3", "a = n + f(2)"));
    CellOutcome outcome = good(run("4", "n = 10"));
    assertEquals(List.of("n replaces its definition in [1], 1."), problems(outcome.notices()));
    assertEquals(12, si("a"));
    good(
        sheet.publish(
            new CellId("java"),
            "cell [5]",
            List.of(new PublishedFunction("f(x) [1]", x -> 100 * x[0]))));
    assertEquals(210, si("a"));
    assertEquals(5, si("k"));
  }

  @Test
  void aCheckGoesOnBeingJudgedAndIsReportedWhenItTurns() {
    good(type("n = 1\ncheck n <= 5"));
    CellOutcome outcome = good(type("n = 7"));
    assertEquals(List.of(new CellOutcome.Turn("check n ≤ 5", false)), outcome.turned());
  }

  @Test
  void aCheckTypedAgainStandsOnce() {
    good(type("n = 1"));
    for (int i = 0; i < 20; i++) {
      CellOutcome outcome = good(type("check n <= 5  # time " + i + "\nassume n > 0"));
      assertEquals(2, outcome.steps().size());
    }
    assertEquals(1, good(type("n = 7")).turned().size());
    assertEquals(2, sheet.cells().size());
  }

  @Test
  void aShownValueThatWaitsIsShownWhenItCan() {
    good(type("2 * n"));
    CellOutcome outcome = good(type("n = 3"));
    CellId waiting = new CellId("typed 1");
    assertEquals(Set.of(waiting), outcome.refreshed());
    assertEquals(new Value.Real(6), ((Step.Shown) sheet.steps(waiting).get(0)).gives().value());
  }

  @Test
  void aShownValueIsShownOnce() {
    good(type("n = 1"));
    CellOutcome outcome = good(type("2 * n\nn"));
    assertEquals(2, outcome.steps().size());
    assertEquals(List.of(new CellId("typed 1")), sheet.cells());
    assertEquals(Set.of(new CellId("typed 1")), good(type("n = 2")).refreshed());
  }

  @Test
  void thousandsOfInputsLeaveNoMoreThanTheirNames() {
    for (int i = 0; i < 3000; i++) {
      good(type("a = " + i + "\nb = 2 * a + 0 * " + i + "\na + b\ncheck a < 3000"));
    }
    assertEquals(2999 * 2, si("b"));
    assertTrue(sheet.cells().size() <= 3, sheet.cells().toString());
    assertEquals(2, sheet.definitions().size());
  }

  @Test
  void aWordThatATakenStatementReadAsAUnitIsFreeAgain() {
    good(type("F = 2 kg*g"));
    assertEquals(1, run("1", "g = 9.8 m/s²").errors().size());
    good(type("F = 3 N"));
    good(run("1", "g = 9.8 m/s²"));
  }
}
