package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The check tables of formulas: textbook formulas pass as written, slips are refused. */
class FormulasTest {

  @ParameterizedTest(name = "{1} [{2}] {3}: {4}")
  @CsvFileSource(resources = {"formulas.csv", "more-formulas.csv"})
  void formulaIsJudgedAsTheTableSays(
      String topic, String formula, String inputs, String kind, String verdict, String note) {
    Judgement judgement = FormulaKinds.judge(formula, inputs == null ? "" : inputs, kind);
    assertEquals(
        verdict,
        judgement instanceof Judgement.Accepted ? "accept" : "refuse",
        () -> topic + ", " + formula + (note == null ? "" : " (" + note + ")") + ": " + judgement);
  }
}
