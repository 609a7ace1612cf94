package whorl.eval;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.fail;

import org.junit.jupiter.api.Test;

/** What the benchmark compares must come to the same. */
class FlywheelFormulasTest {
  @Test
  void theProgramGivesTheNumbersOfTheLoopWrittenByHand() throws InterruptedException {
    double[][] columns = FlywheelFormulas.columns();
    double[][] byHand = new double[FlywheelFormulas.RESULTS][FlywheelFormulas.ROWS];
    double[][] results = new double[FlywheelFormulas.RESULTS][FlywheelFormulas.ROWS];

    FlywheelFormulas.byHand(columns, FlywheelFormulas.FRAME[6], 0, FlywheelFormulas.ROWS, byHand);
    FlywheelFormulas.program()
        .runOnAllProcessors(
            FlywheelFormulas.FRAME,
            columns,
            0,
            FlywheelFormulas.ROWS,
            results,
            (row, formula, failure) -> fail("row " + row + ": " + failure));

    assertArrayEquals(byHand, results);
  }
}
