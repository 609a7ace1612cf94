package whorl.eval;

/**
 * One operation of a block program, on the same row of up to three registers.
 *
 * <p>The rule that every operation keeps: where an operand that is needed has no value in a row, or
 * the operation has none, the result is infinite or NaN in that row; otherwise it is finite. Most
 * operations hand an operand without value on by themselves, as {@code inf + 1} does. Those that
 * would swallow it, as {@code 1 / inf} does, say so, and {@link RowGraph} puts a guard behind them.
 */
sealed interface RowOperation permits RowArithmetic, RowFunction {
  /** Whether the result is infinite or NaN wherever this operand, counted from 0, is. */
  boolean handsOn(int operand);

  /** Whether it has a value for all finite operands. */
  boolean isTotal();

  /**
   * Works out the first rows of the target. The target may be one of the operands. An operand that
   * the operation does not have is not read.
   */
  void run(int rows, double[] target, double[] a, double[] b, double[] c);

  /** The result for one row. */
  default double value(double... operands) {
    double[] target = new double[1];
    double[][] rows = new double[3][1];
    for (int i = 0; i < operands.length; i++) {
      rows[i][0] = operands[i];
    }
    run(1, target, rows[0], rows[1], rows[2]);
    return target[0];
  }
}
