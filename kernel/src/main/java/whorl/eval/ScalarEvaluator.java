package whorl.eval;

import whorl.check.Operation;

/**
 * Works out one formula for one set of numbers at a time.
 *
 * <p>What the author means is what counts: a result is finite, or the innermost part that has no
 * value is named with the number at fault. Infinity and NaN never stand for a number on the way; a
 * number too small for a double is zero. The branch of a choice that is not taken, and a condition
 * behind one that decides, are not worked out. Arguments of functions always are.
 *
 * <p>An evaluation ends, with a failure that names the whole formula, where the thread is
 * interrupted, where functions that call functions come to more work than allowed, and where they
 * nest deeper than the stack allows. The interrupt status is left as it is.
 *
 * <p>The things in space that a formula reads are given when it is made ready, the numbers each
 * time.
 *
 * <p>Immutable: one evaluator may serve several threads at once.
 */
public final class ScalarEvaluator {
  /** Operations allowed in one evaluation: about a second of work. */
  public static final long MOST_OPERATIONS = 200_000_000;

  private final Site formula;
  private final Procedure[] procedures;
  private final Object[] things;

  private ScalarEvaluator(Site formula, Procedure[] procedures, Object[] things) {
    this.formula = formula;
    this.procedures = procedures;
    this.things = things;
  }

  /**
   * Makes a checked tree ready to be worked out.
   *
   * @param things the things in space that it reads, by slot
   */
  public static ScalarEvaluator of(Operation tree, Object... things) {
    return new ScalarEvaluator(
        new Site(tree.span(), ""), new CodeWriter().write(tree), things.clone());
  }

  /**
   * Works out the formula.
   *
   * @param frame the numbers it reads, by slot
   * @throws IllegalArgumentException if a number in the frame is infinite or NaN
   */
  public Outcome evaluate(double[] frame) {
    return evaluate(frame, MOST_OPERATIONS);
  }

  /** The same with a bound on the work, in operations. */
  Outcome evaluate(double[] frame, long mostOperations) {
    for (int slot = 0; slot < frame.length; slot++) {
      if (!Double.isFinite(frame[slot])) {
        throw new IllegalArgumentException(
            "frame must hold finite numbers, but slot " + slot + " holds " + frame[slot]);
      }
    }
    Meter meter = new Meter(formula, mostOperations);
    try {
      Activation activation = Activation.of(procedures, frame, things, meter);
      Value value = procedures[0].code().valueIn(activation);
      return new Outcome.Done(value, meter.breaches());
    } catch (NoValue noValue) {
      return new Outcome.Failed(noValue.failure());
    }
  }
}
