package whorl.mechanics.motion;

/** The rates of a system of first order: what its states change by per second. */
@FunctionalInterface
public interface Rates {
  /**
   * Works out the rates.
   *
   * <p>A {@link NoRate} that it throws, or a rate that is no finite number, says that there are
   * none for this state. A step that was tried only may come to such a state, so a shorter one is
   * tried then; where no step is short enough, the run ends with a {@link MotionFailure}.
   *
   * @param time t, in s
   * @param state the states; must be left as they are
   * @param rates is filled with the rates of the states, in the same order
   */
  void at(double time, double[] state, double[] rates);
}
