package whorl.mechanics.motion;

/**
 * How well something that should not change was kept during a run.
 *
 * @param name what it is: "energy"
 * @param start its value at the start
 * @param change the largest change from there during the run, in size
 * @param scale the size that the change is judged by
 */
public record Kept(String name, double start, double change, double scale) {
  /** The largest change over the scale; 0 where there is nothing to keep. */
  public double relative() {
    return scale == 0 ? 0 : change / scale;
  }
}
