package whorl.eval;

import java.util.Arrays;
import whorl.mechanics.motion.Extreme;
import whorl.mechanics.motion.MotionRun;

/** A quantity that has a value for every instant of a run. Immutable. */
public final class Course {
  private final MotionRun run;
  private final int width;
  private final Sampler sampler;

  /**
   * A course.
   *
   * @param width numbers that a value takes: 1, or 3 for a vector
   */
  Course(MotionRun run, int width, Sampler sampler) {
    this.run = run;
    this.width = width;
    this.sampler = sampler;
  }

  /** Gives the value at an instant. */
  @FunctionalInterface
  interface Sampler {
    /** Puts the value into some places of an array. */
    void at(double time, double[] state, double[] into, int slot);
  }

  /** The run that it belongs to. */
  public MotionRun run() {
    return run;
  }

  /** Numbers that a value takes: 1, or 3 for a vector. */
  public int width() {
    return width;
  }

  void sample(double time, double[] state, double[] into, int slot) {
    sampler.at(time, state, into, slot);
  }

  /** The largest value of a course of numbers, and when it is first reached. */
  public Extreme peak() {
    return run.peak(this::number);
  }

  /** The least value of a course of numbers, and when it is first reached. */
  public Extreme least() {
    return run.least(this::number);
  }

  private double number(double time, double[] state) {
    double[] value = new double[1];
    try {
      sample(time, state, value, 0);
    } catch (NoValue none) {
      return Double.NaN;
    }
    return value[0];
  }

  /**
   * The value at a time from 0 to the duration of the run, in coherent SI units; NaN where it has
   * none.
   */
  public double[] at(double time) {
    double[] value = new double[width];
    try {
      sample(time, run.state(time), value, 0);
    } catch (NoValue none) {
      Arrays.fill(value, Double.NaN);
    }
    return value;
  }
}
