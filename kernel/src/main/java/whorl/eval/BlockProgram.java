package whorl.eval;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import whorl.check.Operation;

/**
 * Several formulas over one frame, made ready to be worked out for many rows. Some slots of the
 * frame vary: each has a column with a number for every row. The others are fixed.
 *
 * <p>The formulas are worked out a block of rows at a time, operation by operation, in registers
 * that fit into the cache; what formulas have in common is worked out once, what does not vary once
 * a run. Functions are written out in place of their calls. A formula that would be too large when
 * written out, that calls a routine or uses a law, is worked out row by row instead.
 *
 * <p>Every number is the same, to the last bit, as {@link ScalarEvaluator} gives for that row, and
 * so is every failure: a row in which a result comes out infinite or NaN is worked out again by
 * itself to learn why.
 *
 * <p>Each formula has its columns of results in the order of the formulas: one for a number, three
 * (x, y, z) for a vector, one for a truth value (1 for true, 0 for false). Where a formula has no
 * value its columns hold NaN.
 *
 * <p>Immutable: one program may serve several threads at once.
 */
public final class BlockProgram {
  private final BlockPlan plan;
  private final List<RowFormula> formulas;
  private final int frameSize;
  private final BitSet varyingSlots;

  private BlockProgram(
      BlockPlan plan, List<RowFormula> formulas, int frameSize, BitSet varyingSlots) {
    this.plan = plan;
    this.formulas = List.copyOf(formulas);
    this.frameSize = frameSize;
    this.varyingSlots = varyingSlots;
  }

  /**
   * Makes formulas ready that read no things in space.
   *
   * @param formulas checked trees that read one frame
   * @param frameSize number of slots of the frame
   * @param varyingSlots the slots that have a column
   */
  public static BlockProgram compile(
      List<? extends Operation> formulas, int frameSize, BitSet varyingSlots) {
    return compile(formulas, frameSize, List.of(), varyingSlots);
  }

  /**
   * Makes formulas ready.
   *
   * @param formulas checked trees that read one frame
   * @param frameSize number of slots of the frame
   * @param things what the frame's slots for things hold, the same for all rows
   * @param varyingSlots the slots that have a column
   */
  public static BlockProgram compile(
      List<? extends Operation> formulas, int frameSize, List<?> things, BitSet varyingSlots) {
    if (varyingSlots.length() > frameSize) {
      throw new IllegalArgumentException(
          "varyingSlots must be below frameSize " + frameSize + ", but are " + varyingSlots);
    }
    BitSet varying = (BitSet) varyingSlots.clone();
    RowGraph graph = new RowGraph(varying);
    RowGraphWriter writer = new RowGraphWriter(graph, frameSize);
    List<BlockPlanner.Result> results = new ArrayList<>();
    List<RowFormula> rowFormulas = new ArrayList<>();
    int column = 0;
    for (Operation formula : formulas) {
      boolean inBlocks = true;
      try {
        int next = column;
        for (int node : writer.write(formula)) {
          results.add(new BlockPlanner.Result(node, next++));
        }
      } catch (RowGraphWriter.RowByRow rowByRow) {
        inBlocks = false;
      }
      RowFormula rowFormula = RowFormula.of(formula, things, column, inBlocks);
      rowFormulas.add(rowFormula);
      column += rowFormula.columns();
    }
    BlockPlan plan = BlockPlanner.plan(graph, varying, results);
    return new BlockProgram(plan, rowFormulas, frameSize, varying);
  }

  /** Number of columns of results of all formulas together. */
  public int resultColumns() {
    return formulas.stream().mapToInt(RowFormula::columns).sum();
  }

  /** The first column of results of a formula, by its number from 0. */
  public int firstColumn(int formula) {
    return formulas.get(formula).firstColumn();
  }

  /**
   * Works out rows on the calling thread.
   *
   * @param frame the fixed numbers by slot; those in varying slots are not read
   * @param columns a column for each varying slot, in the order of the slots; every number finite
   * @param from first row
   * @param to row behind the last
   * @param results the columns of results; only the given rows are written
   * @param failures told of the rows without value
   * @throws InterruptedException if the thread is interrupted; rows done so far are written
   * @throws IllegalArgumentException if the frame or the columns do not fit, or if a number that is
   *     not finite is found in them
   */
  public void run(
      double[] frame, double[][] columns, int from, int to, double[][] results, FailedRows failures)
      throws InterruptedException {
    start(frame, columns, results).rows(from, to, failures);
  }

  /**
   * Works out rows on as many threads as the machine has processors, where there is enough to do.
   * Parameters and results are those of {@link #run}; failures are told by the calling thread, at
   * the end if there are several threads.
   *
   * @throws InterruptedException if the calling thread is interrupted
   */
  public void runOnAllProcessors(
      double[] frame, double[][] columns, int from, int to, double[][] results, FailedRows failures)
      throws InterruptedException {
    int processors = Runtime.getRuntime().availableProcessors();
    if (processors > 1 && SharedRun.isWorthwhile(plan.steps().size(), to - from)) {
      new SharedRun(() -> start(frame, columns, results), from, to).run(processors, failures);
    } else {
      run(frame, columns, from, to, results, failures);
    }
  }

  private BlockRun start(double[] frame, double[][] columns, double[][] results) {
    require("frame", "slots", frameSize, frame.length);
    require(
        "columns",
        "columns, one for each varying slot,",
        varyingSlots.cardinality(),
        columns.length);
    require("results", "columns", resultColumns(), results.length);
    return new BlockRun(plan, formulas, varyingSlots, frame, columns, results);
  }

  private static void require(String name, String what, int wanted, int found) {
    if (found != wanted) {
      throw new IllegalArgumentException(
          name + " must have " + wanted + " " + what + " but has " + found);
    }
  }
}
