package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.diagnostic.Diagnostic;

/** Texts of a size that no sheet has. The time limits only keep a hanging test from hanging all. */
class SheetLimitsTest {
  private static final Duration GUARD = Duration.ofMinutes(2);

  private final Sheet sheet = new Sheet();

  private CellOutcome run(String cell, String text) {
    return assertTimeoutPreemptively(
        GUARD, () -> sheet.run(new CellId(cell), "cell [" + cell + "]", text));
  }

  private static List<String> problems(CellOutcome outcome) {
    return outcome.errors().stream().map(Diagnostic::problem).toList();
  }

  @ParameterizedTest
  @ValueSource(strings = {"a = 1\n", "1 + ", "(", "\n", "é", "𝜔", "# ", "a"})
  void aTextOfTwentyMillionCharactersIsRefusedAsAWhole(String piece) {
    run("1", "a = 1");
    String text = piece.repeat(20_000_000 / piece.length());
    CellOutcome outcome = run("1", text);
    assertEquals(List.of("The text is longer than 1,000,000 characters."), problems(outcome));
    assertTrue(outcome.source().length() <= 2_000_001);
    assertEquals(List.of("a"), outcome.standing());
    assertEquals(problems(outcome), problems(sheet.runFromConsole(new CellId("2"), "[2]", text)));
  }

  @Test
  void aHeadOfTwentyMillionCharactersIsRefused() {
    var head = new PublishedFunction("f(x".repeat(7_000_000), x -> 1);
    assertEquals(
        List.of("The text is longer than 1,000,000 characters."),
        problems(sheet.publish(new CellId("3"), "cell [3]", List.of(head))));
  }

  @Test
  void tooManyStatementsAreRefusedAtTheFirstTooMany() {
    String text =
        IntStream.range(0, 100_000).mapToObj(i -> "a" + i + "=1").collect(Collectors.joining("\n"));
    CellOutcome outcome = run("1", text);
    assertEquals(List.of("The text has more than 10,000 statements."), problems(outcome));
    assertEquals(10_001, outcome.source().line(outcome.errors().get(0).span().start()));
    assertEquals(List.of(), sheet.cells());
  }

  @Test
  void asManyStatementsAsAreAllowedAreWorkedOutAndChanged() {
    String chain =
        IntStream.range(1, 10_000)
            .mapToObj(i -> "a" + i + " = a" + (i - 1) + " + 1")
            .collect(Collectors.joining("\n"));
    assertEquals(List.of(), problems(run("1", "a0 = 1\n" + chain)));
    assertEquals(List.of(), problems(run("1", "a0 = 2\n" + chain)));
    assertEquals("10001", si("a9999"));
    assertEquals(List.of(), problems(run("2", "b = a9999")));
    assertEquals(10_001, sheet.evaluations() - 10_000);
  }

  private String si(String name) {
    var value = (whorl.eval.Value.Real) sheet.quantity(name).orElseThrow().value();
    return Long.toString((long) value.value());
  }

  @Test
  void manyUndefinedNamesAreLookedUpOnlyInPart() {
    String defined =
        IntStream.range(0, 3000)
            .mapToObj(i -> "alpha_" + i + " = 1")
            .collect(Collectors.joining("\n"));
    String waiting =
        IntStream.range(0, 3000)
            .mapToObj(i -> "b" + i + " = alpha_x" + i)
            .collect(Collectors.joining("\n"));
    run("1", defined);
    List<Step> steps = run("2", waiting).steps();
    assertEquals(
        10, steps.stream().filter(step -> !((Step.Waiting) step).near().get(0).isEmpty()).count());
  }

  @Test
  void manyFailingAssumptionsOnOneNameAreJudgedTogether() {
    String text =
        IntStream.range(1, 2000)
            .mapToObj(i -> "assume a > " + i + "\nb" + i + " = a")
            .collect(Collectors.joining("\n"));
    CellOutcome outcome = run("1", "a = 1\n" + text);
    assertEquals(List.of(), problems(outcome));
    assertEquals(10, outcome.steps().get(2).doubts().size());
    assertEquals("a > 1", outcome.steps().get(2).doubts().get(0));
    assertEquals("a > 10", outcome.steps().get(1).doubts().get(0));
  }
}
