package whorl.mechanics.motion;

/**
 * A condition on the time and the states, with a margin whose sign tells on which side of it a
 * state is: negative where the condition does not hold, positive where it does. Where the margin is
 * 0 the condition itself answers, so that {@code x > 1} and {@code x >= 1} differ there.
 */
public interface Condition {
  /** By how much the condition holds; negative where it does not. Continuous if at all possible. */
  double margin(double time, double[] state);

  /** Whether the condition holds. */
  boolean holds(double time, double[] state);

  /** The condition that a number is at least 0. */
  static Condition atLeastZero(StateFunction value) {
    return new Condition() {
      @Override
      public double margin(double time, double[] state) {
        return value.at(time, state);
      }

      @Override
      public boolean holds(double time, double[] state) {
        return value.at(time, state) >= 0;
      }
    };
  }
}
