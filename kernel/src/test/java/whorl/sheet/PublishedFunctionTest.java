package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.eval.Value;

/** Functions published from Java are functions of the sheet like any other. */
class PublishedFunctionTest {
  private static final CellId JAVA = new CellId("java");

  private final Sheet sheet = new Sheet();

  private CellOutcome run(String cell, String text) {
    return sheet.run(new CellId(cell), "cell [" + cell + "]", text);
  }

  private CellOutcome publish(String head, Routine routine) {
    return sheet.publish(JAVA, "cell [3]", List.of(new PublishedFunction(head, routine)));
  }

  private static CellOutcome good(CellOutcome outcome) {
    assertEquals(List.of(), outcome.errors().stream().map(Diagnostic::problem).toList());
    return outcome;
  }

  private static String message(CellOutcome outcome) {
    return DiagnosticText.render(outcome.errors().get(0), outcome.source());
  }

  private double si(String name) {
    return ((Value.Real) sheet.quantity(name).orElseThrow().value()).value();
  }

  private Step step(String cell, int index) {
    return sheet.steps(new CellId(cell)).get(index);
  }

  @Test
  void numbersEnterAndLeaveInTheUnitsOfTheHead() {
    good(publish("drag(v [km/h], A [cm²], c) [kN]", x -> x[2] * x[1] * x[0] * x[0]));
    good(run("1", "F [N] = drag(10 m/s, 0.02 m², 1/8)\nq = drag(36 km/h, 200 cm², c = 0.125)"));
    assertEquals(0.125 * 200 * 36 * 36 * 1000, si("F"));
    assertEquals(si("F"), si("q"));
    assertEquals("force", sheet.quantity("q").orElseThrow().kind());
    assertEquals("kN", sheet.quantity("q").orElseThrow().unit().symbol());
  }

  @Test
  void aReadingOfAThermometerEntersAndLeavesAsOne() {
    good(publish("warmer(T [degC]) [degC]", x -> x[0] + 10));
    good(run("1", "T_1 [degC] = warmer(20 degC)\nT_2 [K, temperature] = warmer(20 degC)"));
    assertEquals(303.15, si("T_1"), 1e-12);
    assertEquals(303.15, si("T_2"), 1e-12);
  }

  @Test
  void digitsThatWereWrittenArriveUnchanged() {
    good(publish("seen(l [mm], n [rpm], p) [1]", x -> x[0] == 0.3 && x[1] == 6000 ? x[2] : -1));
    good(run("1", "l [mm] = 0.3\na = seen(l, 6000 rpm, 5 %)"));
    assertEquals(0.05, si("a"));
  }

  @Test
  void aCallWithAWrongKindIsRefusedLikeAnyOther() {
    good(publish("lift(T [N·m]) [N]", x -> x[0]));
    String ofSheet =
        WorkedSheet.of("lift(T [N·m]) [N] = T / (1 m)\nW [J] = 3\nF = lift(W)").messages();
    CellOutcome outcome = run("1", "x = 1\nW [J] = 3\nF = lift(W)");
    assertEquals(ofSheet, message(outcome));
    String shown = message(run("1", "F [J] = lift(3 N·m)"));
    assertTrue(shown.startsWith("F is declared as an energy, but its right side is a force."));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          drag(v [m/s])                ; 13-13; The unit of the result is missing.
          drag(v [m/s]) [N] = v        ; 18-19; No formula follows the head of a function published from Java.
          drag [N]                     ; 0-4  ; A function published from Java has parentheses behind its name.
          drag (v [m/s]) [N]           ; 4-5  ; A blank stands between `drag` and the parenthesis.
          drag(,) [N]                  ; 5-6  ; Between the parentheses of a definition stand names, with their units in brackets.
          drag()                       ; 6-6  ; The unit of the result is missing.
          drag(v [m/s], v [m]) [N]     ; 14-15; The parameter `v` stands twice.
          drag(v [m/s] [N]             ; 13-14; Between the parentheses of a definition stand names, with their units in brackets.
          drag(v [m/s]) [Nn]           ; 15-17; `Nn` is no unit.
          drag(v [m/z]) [N]            ; 10-11; `z` is no unit.
          drag(v [m/s]) [N, torque]    ; 14-25; A torque is not measured in N.
          check(v [m/s]) [N]           ; 0-5  ; `check` is a word of the language and cannot be a name.
          pi(v [m/s]) [N]              ; 0-2  ; `pi` is a constant and keeps its value.
          drag(v [m/s]) [N] twice      ; 18-23; `twice` cannot follow here.
          ''                           ; 0-0  ; The head of a function published from Java is empty.
          # only a remark              ; 14-14; The head of a function published from Java is empty.
          3(x) [N]                     ; 0-1  ; In the place of `3` this is needed: the head of a function, such as `f(x [m], k) [N]`.
          drag(v “m/s”) [N]            ; 7-8  ; `“` (left double quotation mark) is not used here.
          """)
  void aHeadThatCannotBeReadIsRefusedWithItsPlace(String head, String span, String problem) {
    CellOutcome outcome = publish(head, x -> 1);
    Diagnostic error = outcome.errors().get(0);
    assertEquals(problem, error.problem());
    assertEquals(span, error.span().toString());
    assertEquals(1, outcome.errors().size());
    assertEquals(List.of(), sheet.cells());
  }

  @Test
  void allWrongHeadsAreReportedEachOnItsLineAndNothingTakesEffect() {
    CellOutcome outcome =
        sheet.publish(
            JAVA,
            "cell [3]",
            List.of(
                new PublishedFunction("f(x [m])", x -> 1),
                new PublishedFunction(" g(x [m],\n  y [s]) [m/s]  ", x -> 1),
                new PublishedFunction("h(x", x -> 1),
                new PublishedFunction("g(x) [1]", x -> 1)));
    assertEquals(
        List.of(1, 3, 4),
        outcome.errors().stream().map(e -> outcome.source().line(e.span().start())).toList());
    assertEquals(Set.of("g"), outcome.attempted());
  }

  @Test
  void aNameHasOneDefinitionAlsoFromJava() {
    good(run("1", "drag = 3"));
    CellOutcome refused = publish("drag(v [m/s]) [N]", x -> 1);
    assertEquals(
        "drag already has its definition: cell [1], 3.", refused.errors().get(0).problem());
    good(publish("push(v [m/s]) [N]", x -> 1));
    assertEquals(
        "push already has its definition: cell [3], a function from Java.",
        run("2", "push = 4").errors().get(0).problem());
    CellOutcome hiding = good(publish("min(v [m/s], x) [N]", x -> 1));
    assertEquals(List.of("hides"), hiding.notices().stream().map(Diagnostic::code).toList());
  }

  @Test
  void aNewRoutineRecalculatesItsUsersThoughTheHeadIsTheSame() {
    good(publish("gain(x) [1]", x -> 2 * x[0]));
    good(run("1", "a = gain(3)\nf(x) = gain(x) + 1"));
    good(run("2", "b = f(4)\nc = 5"));
    CellOutcome outcome = good(publish("gain(x) [1]", x -> 10 * x[0]));
    assertEquals(30, si("a"));
    assertEquals(41, si("b"));
    assertEquals(Set.of("a", "b"), Set.copyOf(names(outcome)));
    assertEquals(Set.of(new CellId("1"), new CellId("2")), outcome.refreshed());
  }

  private static List<String> names(CellOutcome outcome) {
    return outcome.changes().stream().map(CellOutcome.Change::name).toList();
  }

  @Test
  void theSameRoutineAndHeadRecalculateNothing() {
    Routine routine = x -> 2 * x[0];
    good(publish("gain(x) [1]", routine));
    good(run("1", "a = gain(3)"));
    long before = sheet.evaluations();
    good(publish("gain(x) [1]", routine));
    assertEquals(before, sheet.evaluations());
  }

  @Test
  void aWithdrawnFunctionLeavesItsUsersWaiting() {
    good(publish("gain(x) [1]", x -> 2 * x[0]));
    good(run("1", "a = gain(3)"));
    good(sheet.publish(JAVA, "cell [3]", List.of()));
    assertEquals(List.of("gain"), ((Step.Waiting) step("1", 0)).names());
    good(publish("gain(x) [1]", x -> 3 * x[0]));
    assertEquals(9, si("a"));
    sheet.withdraw(JAVA);
    assertTrue(sheet.quantity("a").isEmpty());
  }

  @Test
  void whatTheRoutineSaysIsPassedOnWithItsArguments() {
    good(
        publish(
            "drag(v [km/h], k) [N]",
            x -> {
              if (x[0] < 0) {
                throw new RoutineFailure("speed below zero");
              }
              if (x[0] == 0) {
                throw new IllegalStateException("at rest");
              }
              return x[1] == 0 ? Double.NaN : 1 / x[1] > 1e300 ? 1e308 * 10 : 1;
            }));
    assertEquals(
        """
        drag gives no number for v = −36 km/h, k = 2.

          1 | F = drag(-10 m/s, 2)
                  ^^^^^^^^^^^^^^^^

        Its Java code says: speed below zero
        Check what goes in, or treat the case by itself: if … then … else …""",
        message(run("1", "F = drag(-10 m/s, 2)")));
    assertEquals(
        "Its Java code says: java.lang.IllegalStateException: at rest",
        run("1", "F = drag(0 m/s, 2)").errors().get(0).reason());
    assertEquals(
        "Its Java code returns NaN, which is no number.",
        run("1", "F = drag(1 m/s, 0)").errors().get(0).reason());
    assertEquals(
        "Its Java code returns a number that is too large.",
        run("1", "F = drag(1 m/s, 1e-301)").errors().get(0).reason());
    assertEquals(
        "drag gives no number for v = −3.6 km/h, k = 0.",
        run("1", "f(x) = drag(-1 m/s, x)\nF = f(0)").errors().get(0).problem());
    assertFalse(sheet.quantity("F").isPresent());
  }

  @Test
  void aBranchThatIsNotTakenCallsNoRoutine() {
    var calls = new AtomicInteger();
    good(publish("gain(x) [1]", x -> calls.incrementAndGet()));
    good(run("1", "x = 3\na = if x > 5 then gain(x) else 0"));
    assertEquals(0, calls.get());
  }

  @Test
  void itsStepShowsTheHeadAndWhereItComesFrom() {
    good(publish("drag(v [m/s], A [m²]) [N]  # wind tunnel", x -> 1));
    Step.Published published = (Step.Published) step("java", 0);
    assertEquals("cell [3]", published.label());
    assertEquals("force", published.resultKind());
    assertEquals("wind tunnel", published.statement().remark());
  }

  @Test
  void aFunctionMayTakeNothing() {
    good(publish("peak() [kN]", x -> 3));
    good(run("1", "F [N] = 2 * peak()"));
    assertEquals(6000, si("F"));
    good(publish("peak() [kN]", x -> 4));
    assertEquals(8000, si("F"));
    assertEquals("peak() [kN]", sheet.card("peak").orElseThrow().definition().text());
    assertEquals(
        "peak gives no number.",
        publish("peak() [kN]", x -> Double.NaN).errors().isEmpty()
            ? ((Step.Broken) step("1", 0)).diagnostic().problem()
            : "");
    assertEquals(1, run("2", "g() = 3").errors().size());
  }
}
