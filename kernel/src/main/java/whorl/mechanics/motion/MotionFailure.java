package whorl.mechanics.motion;

import org.jspecify.annotations.Nullable;

/** A run that could not be carried to an end. */
public final class MotionFailure extends RuntimeException {
  private static final long serialVersionUID = 1;

  /** What stood in its way. */
  public enum Reason {
    /** The rates have no value: the cause says why, if they were refused; else one is no number. */
    NO_RATE,
    /** A rate grows without bound, so that no step is short enough. */
    RUNAWAY,
    /** The rates jump to and fro: either side of a jump drives the motion back to the other. */
    TO_AND_FRO,
    /** The run took more steps than are allowed. */
    TOO_MANY_STEPS
  }

  private final Reason reason;
  private final double time;
  private final transient double[] state;
  private final int index;

  MotionFailure(
      Reason reason, double time, double[] state, int index, @Nullable RuntimeException cause) {
    super(reason + " at t = " + time + " s", cause);
    this.reason = reason;
    this.time = time;
    this.state = state.clone();
    this.index = index;
  }

  /** What stood in its way. */
  public Reason reason() {
    return reason;
  }

  /** The time up to which the run came, in s. */
  public double time() {
    return time;
  }

  /** The states at that time. */
  public double[] state() {
    return state.clone();
  }

  /** Which state's rate is at fault, or −1 where it is not one alone. */
  public int index() {
    return index;
  }
}
