package whorl.eval;

/** Receives the rows that have no value. */
@FunctionalInterface
public interface FailedRows {
  /**
   * Takes one failure. Rows come in rising order, and within a row the formulas in their order.
   *
   * @param row in the columns
   * @param formula number of the formula, from 0
   * @param failure why it has no value
   */
  void failed(int row, int formula, NumericFailure failure);
}
