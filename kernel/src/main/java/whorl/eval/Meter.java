package whorl.eval;

import whorl.eval.NumericFailure.Reason;

/**
 * Counts the operations of one evaluation, and now and then looks whether it is to end. Only calls
 * of functions are counted, each with the size of the body: without calls the work is bounded by
 * the length of the text, with them it may double with every function.
 */
final class Meter {
  /** Operations between two looks: some tens of microseconds. */
  private static final int STRIDE = 1 << 14;

  private final Site formula;
  private final long allowed;
  private long done;
  private long nextLook;

  Meter(Site formula, long allowed) {
    this.formula = formula;
    this.allowed = allowed;
  }

  /** Counts operations that are about to be worked out. */
  void count(int operations) {
    done += operations;
    if (done >= nextLook) {
      look();
    }
  }

  private void look() {
    if (done > allowed) {
      throw formula.noValue(Reason.TOO_LONG, (double) done);
    }
    if (Thread.currentThread().isInterrupted()) {
      throw formula.noValue(Reason.INTERRUPTED, (double) done);
    }
    nextLook = Math.min(done + STRIDE, allowed + 1);
  }

  /** What to throw where functions nest too deep. */
  NoValue tooDeep(int levels) {
    return formula.noValue(Reason.TOO_DEEP, levels);
  }
}
