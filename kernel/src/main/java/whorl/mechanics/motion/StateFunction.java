package whorl.mechanics.motion;

/** A number that follows from the time and the states. */
@FunctionalInterface
public interface StateFunction {
  /**
   * The number.
   *
   * @param time t, in s
   * @param state the states; must be left as they are
   */
  double at(double time, double[] state);

  /** The state at a place of the list of states. */
  static StateFunction ofState(int index) {
    return (time, state) -> state[index];
  }
}
