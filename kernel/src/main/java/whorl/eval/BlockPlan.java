package whorl.eval;

import java.util.List;

/**
 * What to do for each block of rows.
 *
 * @param fixed worked out before the first block
 * @param steps done for each block, in order
 * @param registers number of registers, each as long as a block
 */
record BlockPlan(FixedPart fixed, List<BlockStep> steps, int registers) {
  /** Copies the steps. */
  BlockPlan {
    steps = List.copyOf(steps);
  }
}
