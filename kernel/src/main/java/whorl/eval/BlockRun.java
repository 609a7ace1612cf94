package whorl.eval;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import whorl.eval.NumericFailure.Reason;

/** A block program at work on one thread. */
final class BlockRun {
  /**
   * Rows of a block. With 512 a register takes 4 KiB and a usual set of formulas stays in the
   * first-level cache, while the loops are long enough to be worth starting.
   */
  static final int ROWS = 512;

  private final BlockPlan plan;
  private final List<RowFormula> formulas;
  private final boolean allInBlocks;
  private final int[] slots;
  private final double[] frame;
  private final double[][] columns;
  private final double[][] results;
  private final double[][] registers;

  /** Adds up to 0 in rows where all results are finite, and to NaN elsewhere. */
  private final double[] suspicion = new double[ROWS];

  private int firstRow;
  private int rows;

  BlockRun(
      BlockPlan plan,
      List<RowFormula> formulas,
      BitSet varyingSlots,
      double[] frame,
      double[][] columns,
      double[][] results) {
    this.plan = plan;
    this.formulas = formulas;
    this.allInBlocks = formulas.stream().allMatch(RowFormula::inBlocks);
    this.slots = varyingSlots.stream().toArray();
    this.frame = frame.clone();
    this.columns = columns;
    this.results = results;
    this.registers = new double[plan.registers()][ROWS];
    plan.fixed().broadcast(frame, registers);
  }

  /** Works out rows, block by block. */
  void rows(int from, int to, FailedRows failures) throws InterruptedException {
    for (firstRow = from; firstRow < to; firstRow += rows) {
      if (Thread.interrupted()) {
        throw new InterruptedException();
      }
      rows = Math.min(ROWS, to - firstRow);
      Arrays.fill(suspicion, 0);
      for (BlockStep step : plan.steps()) {
        step.run(this);
      }
      for (int i = 0; i < rows; i++) {
        if (suspicion[i] != 0 || !allInBlocks) {
          finish(firstRow + i, failures);
        }
      }
    }
  }

  void load(int column, int register) {
    System.arraycopy(columns[column], firstRow, registers[register], 0, rows);
  }

  void compute(RowOperation operation, int target, int a, int b, int c) {
    operation.run(rows, registers[target], registers[a], registers[b], registers[c]);
  }

  void store(int register, int column) {
    double[] values = registers[register];
    System.arraycopy(values, 0, results[column], firstRow, rows);
    suspect(rows, suspicion, values);
  }

  private static void suspect(int rows, double[] suspicion, double[] values) {
    for (int i = 0; i < rows; i++) {
      suspicion[i] += values[i] * 0;
    }
  }

  private void finish(int row, FailedRows failures) throws InterruptedException {
    for (int i = 0; i < slots.length; i++) {
      frame[slots[i]] = columns[i][row];
    }
    for (int i = 0; i < formulas.size(); i++) {
      RowFormula formula = formulas.get(i);
      if (formula.isOpen(results, row)
          && formula.evaluate(frame, results, row) instanceof Outcome.Failed failed) {
        if (failed.failure().reason() == Reason.INTERRUPTED) {
          throw new InterruptedException();
        }
        failures.failed(row, i, failed.failure());
      }
    }
  }
}
