package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import whorl.check.Checker;
import whorl.check.Meaning;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.check.Scope;
import whorl.check.Type;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.diagnostic.Source;
import whorl.eval.Value;
import whorl.syntax.CatalogueWords;
import whorl.syntax.Parser;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.kind.Readings;

/** An interrupted run changes nothing and says so; the next one works. */
class InterruptTest {
  private static final CellId JAVA = new CellId("java");

  private final Sheet sheet = new Sheet();
  private final AtomicBoolean interrupting = new AtomicBoolean();

  @AfterEach
  void noInterruptIsLeft() {
    assertFalse(Thread.interrupted());
  }

  private CellOutcome run(String cell, String text) {
    return sheet.run(new CellId(cell), "cell [" + cell + "]", text);
  }

  private static void good(CellOutcome outcome) {
    assertEquals(List.of(), outcome.errors().stream().map(Diagnostic::problem).toList());
    assertFalse(outcome.interrupted());
  }

  private void publish(Routine routine) {
    good(sheet.publish(JAVA, "cell [9]", List.of(new PublishedFunction("f(x) [1]", routine))));
  }

  private static void assertInterrupted(String problem, CellOutcome outcome) {
    assertTrue(outcome.interrupted());
    assertFalse(outcome.tookEffect());
    assertEquals(List.of(problem), outcome.errors().stream().map(Diagnostic::problem).toList());
    assertEquals(List.of(), outcome.changes());
  }

  private double si(String name) {
    return ((Value.Real) sheet.quantity(name).orElseThrow().value()).value();
  }

  @Test
  void aRunOnAnInterruptedThreadDoesNothing() {
    good(run("1", "a = 1"));
    Thread.currentThread().interrupt();
    assertInterrupted("The cell was interrupted.", run("1", "a = 2"));
    assertEquals(1, si("a"));
    good(run("1", "a = 2"));
    assertEquals(2, si("a"));
  }

  @Test
  void aRoutineThatIsInterruptedInTheCellInterruptsTheRun() {
    publish(
        x -> {
          if (interrupting.get()) {
            throw RoutineFailure.ofInterrupt();
          }
          return x[0];
        });
    good(run("1", "a = f(1)\nb = a + 1"));
    interrupting.set(true);
    CellOutcome outcome = run("1", "c = 3\na = f(2)\nb = a + 1");
    assertInterrupted("Interrupted while a was worked out.", outcome);
    assertEquals(List.of("a", "b"), outcome.standing());
    assertEquals(2, si("b"));
    assertTrue(sheet.quantity("c").isEmpty());
    interrupting.set(false);
    good(run("1", "c = 3\na = f(2)\nb = a + 1"));
    assertEquals(3, si("b"));
  }

  @Test
  void aDependentElsewhereThatIsInterruptedIsNotBroken() {
    publish(
        x -> {
          if (interrupting.get()) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("woken");
          }
          return x[0];
        });
    good(run("1", "n = 1"));
    good(run("2", "m = 2 * n"));
    good(run("3", "E = f(m)\ncheck E < 10"));
    String before = sheet.steps(new CellId("3")).toString();
    interrupting.set(true);
    CellOutcome outcome = run("1", "n = 5");
    assertInterrupted("Interrupted while E in cell [3] was worked out anew.", outcome);
    assertEquals(before, sheet.steps(new CellId("3")).toString());
    assertEquals(1, si("n"));
    assertEquals(2, si("m"));
    interrupting.set(false);
    good(run("1", "n = 5"));
    assertEquals(10, si("E"));
  }

  @Test
  void aMotionIsInterruptedBetweenItsSteps() {
    publish(
        x -> {
          if (x[0] > 5) {
            Thread.currentThread().interrupt();
          }
          return 1;
        });
    CellOutcome outcome =
        run(
            "1",
            """
            motion drift
                x starts 0
                x' = f(x) * 1 s^-1
                within 10 s
            """);
    assertInterrupted("Interrupted while drift was worked out.", outcome);
  }

  @Test
  void theInterruptOfACheckShowsItsText() {
    publish(x -> x[0]);
    good(run("1", "n = 1\ncheck f(n) < 10"));
    CellOutcome outcome =
        sheet.publish(
            JAVA,
            "cell [9]",
            List.of(
                new PublishedFunction(
                    "f(x) [1]",
                    x -> {
                      throw RoutineFailure.ofInterrupt();
                    })));
    assertInterrupted(
        "Interrupted while `check f(n) < 10` in cell [1] was worked out anew.", outcome);
    assertTrue(((Step.Checked) sheet.steps(new CellId("1")).get(1)).verdict().holds());
  }

  @Test
  void publishingWithdrawingAndTypingAreInterruptedToo() {
    good(run("1", "n = 1\nm = 2 * n"));
    Thread.currentThread().interrupt();
    assertTrue(
        sheet
            .publish(JAVA, "cell [9]", List.of(new PublishedFunction("f(x) [1]", x -> 1)))
            .interrupted());
    Thread.currentThread().interrupt();
    assertTrue(sheet.withdraw(new CellId("1")).interrupted());
    Thread.currentThread().interrupt();
    assertTrue(sheet.withdraw("n").interrupted());
    Thread.currentThread().interrupt();
    assertTrue(sheet.runFromConsole(new CellId("2"), "[2]", "n = 7").interrupted());
    assertEquals(2, si("m"));
    assertEquals(List.of(new CellId("1")), sheet.cells());
  }

  @Test
  void aLongCallChainIsInterrupted() {
    var text = new StringBuilder("f0(x) = x\n");
    for (int i = 1; i <= 40; i++) {
      text.append("f%d(x) = f%d(x) + f%d(x)\n".formatted(i, i - 1, i - 1));
    }
    good(run("1", text.toString()));
    Thread here = Thread.currentThread();
    publish(
        x -> {
          here.interrupt();
          return x[0];
        });
    assertInterrupted("Interrupted while y was worked out.", run("2", "y = f(1) + f20(1)"));
  }

  @Test
  void theReadingOfALongLineEndsWhereItIsInterrupted() {
    var source = new Source("x = 2 kg*g + 1 + 1 + 1");
    assertThrows(
        Interruption.class,
        () ->
            Parser.parse(
                source,
                name -> {
                  Thread.currentThread().interrupt();
                  return false;
                },
                CatalogueWords.STANDARD));
    assertTrue(Thread.interrupted());
  }

  @Test
  void theCheckOfALongLineEndsWhereItIsInterrupted() {
    Statement line =
        Parser.parse(new Source("x = a + 1 + 1"), name -> false, CatalogueWords.STANDARD)
            .statements()
            .get(0);
    Scope scope =
        new Scope() {
          @Override
          public Path folder() {
            return Path.of("");
          }

          @Override
          public Optional<Meaning> meaning(String name) {
            Thread.currentThread().interrupt();
            return Optional.of(
                new Meaning.Quantity(new Type.Real(Readings.NUMBER), Unit.ONE, false));
          }

          @Override
          public List<String> names() {
            return List.of();
          }
        };
    assertThrows(Interruption.class, () -> new Checker(scope).check(line));
    assertTrue(Thread.interrupted());
  }

  @Test
  void progressIsToldOfALongRecalculationOnly() {
    long[] now = new long[1];
    var slow = new Sheet(() -> now[0]);
    var told = new ArrayList<String>();
    slow.onProgress((done, total) -> told.add(done + " of " + total));
    slow.publish(
        JAVA,
        "cell [9]",
        List.of(
            new PublishedFunction(
                "f(x) [1]",
                x -> {
                  now[0] += 40_000_000;
                  return x[0];
                })));
    var text = new StringBuilder();
    for (int i = 0; i < 20; i++) {
      text.append("a").append(i).append(" = f(").append(i).append(")\n");
    }
    good(slow.run(new CellId("1"), "cell [1]", text.toString()));
    assertEquals(List.of("13 of 20", "16 of 20", "19 of 20"), told);
    good(slow.run(new CellId("2"), "cell [2]", "b = f(1)"));
    assertEquals(3, told.size());
  }
}
