package whorl.sheet;

import static java.util.stream.Collectors.joining;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import whorl.diagnostic.DiagnosticText;

/** One text run as the only cell of a new sheet. */
record WorkedSheet(Sheet sheet, CellOutcome outcome) {
  static WorkedSheet of(String text) {
    var sheet = new Sheet();
    return new WorkedSheet(sheet, sheet.run(new CellId("a"), "cell [1]", text));
  }

  /** The messages as a reader sees them; empty if there are none. */
  String messages() {
    return outcome.errors().stream()
        .map(error -> DiagnosticText.render(error, outcome.source()))
        .collect(joining("\n\n"))
        .strip();
  }

  /** Fails unless the text was taken without a mistake and every line of it was worked out. */
  void assertWhole() {
    assertEquals("", messages());
    assertEquals(
        List.of(), outcome.steps().stream().filter(Step.Waiting.class::isInstance).toList());
  }

  /** Fails unless every expected value comes out. */
  void assertGives(String expected) {
    List<ExpectedValue> values = ExpectedValue.read(expected);
    assertTrue(!values.isEmpty(), "nothing is expected");
    values.forEach(value -> value.assertIn(sheet));
  }
}
