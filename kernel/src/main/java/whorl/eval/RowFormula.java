package whorl.eval;

import java.util.List;
import whorl.check.Operation;

/**
 * A formula of a block program as it is worked out for one row.
 *
 * @param evaluator works out the row
 * @param firstColumn its first column of results
 * @param columns number of its columns
 * @param inBlocks whether the block program works it out too, so that only failing rows are left
 */
record RowFormula(ScalarEvaluator evaluator, int firstColumn, int columns, boolean inBlocks) {
  static RowFormula of(Operation formula, List<?> things, int firstColumn, boolean inBlocks) {
    if (formula instanceof Operation.Thing) {
      throw new IllegalArgumentException("formulas must give numbers, but one gives a thing");
    }
    int columns = formula instanceof Operation.Vector ? 3 : 1;
    return new RowFormula(
        ScalarEvaluator.of(formula, things.toArray()), firstColumn, columns, inBlocks);
  }

  /** Whether the row has still to be worked out by itself. */
  boolean isOpen(double[][] results, int row) {
    boolean open = !inBlocks;
    for (int column = firstColumn; column < firstColumn + columns; column++) {
      open |= !Double.isFinite(results[column][row]);
    }
    return open;
  }

  /** Works out one row and writes the result. */
  Outcome evaluate(double[] frame, double[][] results, int row) {
    Outcome outcome = evaluator.evaluate(frame);
    if (outcome instanceof Outcome.Done done) {
      write(done.value(), results, row);
    } else {
      for (int column = firstColumn; column < firstColumn + columns; column++) {
        results[column][row] = Double.NaN;
      }
    }
    return outcome;
  }

  private void write(Value value, double[][] results, int row) {
    if (value instanceof Value.Real real) {
      results[firstColumn][row] = real.value();
    } else if (value instanceof Value.Vector vector) {
      results[firstColumn][row] = vector.x();
      results[firstColumn + 1][row] = vector.y();
      results[firstColumn + 2][row] = vector.z();
    } else if (value instanceof Value.Truth truth) {
      results[firstColumn][row] = truth.holds() ? 1 : 0;
    }
  }
}
