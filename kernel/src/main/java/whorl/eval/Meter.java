package whorl.eval;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import whorl.eval.NumericFailure.Reason;

/**
 * Counts the operations of one evaluation, and now and then looks whether it is to end. Only calls
 * of functions are counted, each with the size of the body: without calls the work is bounded by
 * the length of the text, with them it may double with every function. What else happens on the way
 * that the author should know is noted here too.
 */
final class Meter {
  /** Operations between two looks: some tens of microseconds. */
  private static final int STRIDE = 1 << 14;

  private final Site formula;
  private final long allowed;
  private long done;
  private long nextLook;
  private final Set<Breach> breaches = new LinkedHashSet<>();

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

  /** Looks whether the evaluation is to end. */
  void look() {
    if (done > allowed) {
      throw formula.noValue(Reason.TOO_LONG, (double) done);
    }
    if (Thread.currentThread().isInterrupted()) {
      throw formula.noValue(Reason.INTERRUPTED, (double) done);
    }
    nextLook = Math.min(done + STRIDE, allowed + 1);
  }

  /** Notes that a law was used where it does not hold. */
  void breach(Breach breach) {
    breaches.add(breach);
  }

  /** The laws that were used where they do not hold, each once. */
  List<Breach> breaches() {
    return List.copyOf(breaches);
  }

  /** What to throw where functions nest too deep. */
  NoValue tooDeep(int levels) {
    return formula.noValue(Reason.TOO_DEEP, levels);
  }
}
