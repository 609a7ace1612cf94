package whorl.mechanics.motion;

import java.util.Arrays;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;

/**
 * The method of Dormand and Prince of order 8, whose errors are judged by the largest size that
 * each state has had so far. So no scale has to be asked for, a state may start from 0, and one
 * that swings through 0 takes no needless steps there. The parts of a vector or a quaternion are
 * judged by the largest of them.
 *
 * <p>Source: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd
 * ed., section II.5 (from memory); as worked out by Apache Commons Math.
 */
final class Stepper extends DormandPrince853Integrator {
  /** Error of a step allowed, as a part of the largest size of the state. */
  private static final double TOLERANCE = 1e-12;

  /** Shortest step near time 0, as a part of the limit. */
  private static final double SHORTEST = 1e-18;

  private final double[] largest;
  private final int[] groupEnds;
  private final double limit;

  /**
   * A stepper.
   *
   * @param groups how many states, one behind the other, are parts of one thing each
   * @param limit time up to which it will be asked to go, in s
   */
  Stepper(double[] start, int[] groups, double limit) {
    super(0, Double.POSITIVE_INFINITY, new double[start.length], new double[start.length]);
    this.largest = new double[start.length];
    this.groupEnds = groups.clone();
    Arrays.parallelPrefix(groupEnds, Integer::sum);
    this.limit = limit;
    reached(start);
  }

  /** Takes note of a state that the motion came to. */
  void reached(double[] state) {
    for (int i = 0; i < largest.length; i++) {
      largest[i] = Math.max(largest[i], Math.abs(state[i]));
    }
  }

  /** Bounds the steps, and says how long the first one is to be. */
  void bound(double longest, double first) {
    double[] none = new double[largest.length];
    setStepSizeControl(0, longest, none, none);
    setInitialStepSize(Math.min(first, longest));
  }

  /** Whether one state's rate is larger against its size than another's. */
  boolean isSteeper(double[] rates, int one, int other) {
    return Math.abs(rates[one]) * largest[other] > Math.abs(rates[other]) * largest[one];
  }

  @Override
  protected double estimateError(double[][] rates, double[] before, double[] after, double step) {
    int first = 0;
    for (int end : groupEnds) {
      double size = 0;
      for (int i = first; i < end; i++) {
        double here = Math.max(Math.abs(after[i]), Math.abs(step * rates[0][i]));
        size = Math.max(size, Math.max(largest[i], here));
      }
      // The least number keeps a state that is 0 throughout from being judged by 0.
      Arrays.fill(vecAbsoluteTolerance, first, end, Math.max(TOLERANCE * size, Double.MIN_NORMAL));
      first = end;
    }
    double error = super.estimateError(rates, before, after, step);
    if (error < 1) {
      return error;
    }
    if (step <= shortest(stepStart)) {
      throw new TooShort();
    }
    return Double.isNaN(error) ? Double.MAX_VALUE : error;
  }

  /** The shortest step at a time that still is one. */
  double shortest(double time) {
    return Math.max(8 * Math.ulp(time), SHORTEST * limit);
  }

  /** No step is short enough: the rates jump here, or grow without bound. */
  static final class TooShort extends RuntimeException {
    private static final long serialVersionUID = 1;

    TooShort() {
      super("no step is short enough", null, false, false);
    }
  }
}
