package whorl.mechanics.motion;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A system of first order with a state to start from, ready to be followed: {@code Motion.of(rates,
 * start, limit).stopWhen(condition).run()}. Immutable.
 *
 * <p>It is followed by the method of Dormand and Prince of order 8 with steps that adapt, to one
 * part in 10<sup>12</sup> a step of the largest size that each state has had so far; between the
 * steps by its own polynomials. The condition to stop is found on those to the last digits of the
 * time, even where it holds for a part of a step only.
 */
public final class Motion {
  /** Steps that a run may take unless it is told otherwise. */
  public static final int USUAL_STEPS = 200_000;

  private final Rates rates;
  private final double[] start;
  private final int[] groups;
  private final double limit;
  private final @Nullable Condition stop;
  private final List<Condition> jumps;
  private final List<Conserved> conserved;
  private final int mostSteps;
  private final Runnable poll;

  private Motion(
      Rates rates,
      double[] start,
      int[] groups,
      double limit,
      @Nullable Condition stop,
      List<Condition> jumps,
      List<Conserved> conserved,
      int mostSteps,
      Runnable poll) {
    this.rates = rates;
    this.start = start.clone();
    this.groups = groups.clone();
    this.limit = limit;
    this.stop = stop;
    this.jumps = List.copyOf(jumps);
    this.conserved = List.copyOf(conserved);
    this.mostSteps = mostSteps;
    this.poll = poll;
  }

  /**
   * Something that should not change.
   *
   * @param name what it is: "energy"
   * @param value its value
   * @param scale the size that a change is judged by: the largest during the run
   */
  public record Conserved(String name, StateFunction value, StateFunction scale) {
    /** A quantity whose change is judged by its own size. */
    public Conserved(String name, StateFunction value) {
      this(name, value, (time, state) -> Math.abs(value.at(time, state)));
    }
  }

  /**
   * A motion that starts at time 0.
   *
   * @param start the states at time 0; at least one
   * @param limit longest time to follow it, in s; positive and finite
   */
  public static Motion of(Rates rates, double[] start, double limit) {
    if (start.length == 0) {
      throw new IllegalArgumentException("a motion needs a state");
    }
    for (double value : start) {
      if (!Double.isFinite(value)) {
        throw new IllegalArgumentException("a state must start finite, not at " + value);
      }
    }
    if (!(limit > 0 && limit < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(
          "the time limit must be positive and finite, but is " + limit + " s");
    }
    int[] groups = new int[start.length];
    Arrays.fill(groups, 1);
    return new Motion(
        rates, start, groups, limit, null, List.of(), List.of(), USUAL_STEPS, () -> {});
  }

  /**
   * The same, with states that are parts of one thing each, as those of a vector: their errors are
   * judged by the largest of them.
   *
   * @param sizes how many states, one behind the other, belong together; 1 for a number
   */
  public Motion inGroups(int... sizes) {
    if (Arrays.stream(sizes).sum() != start.length) {
      throw new IllegalArgumentException("the groups do not make up the states");
    }
    return new Motion(rates, start, sizes, limit, stop, jumps, conserved, mostSteps, poll);
  }

  /** The same, ended as soon as a condition holds. */
  public Motion stopWhen(Condition condition) {
    return new Motion(rates, start, groups, limit, condition, jumps, conserved, mostSteps, poll);
  }

  /** The same, with conditions at whose turning the rates may jump: no step reaches across. */
  public Motion jumpingAt(List<Condition> conditions) {
    return new Motion(rates, start, groups, limit, stop, conditions, conserved, mostSteps, poll);
  }

  /** The same, with one more quantity that should not change, watched. */
  public Motion keeping(Conserved quantity) {
    var more = new ArrayList<>(conserved);
    more.add(quantity);
    return new Motion(rates, start, groups, limit, stop, jumps, more, mostSteps, poll);
  }

  /** The same with another bound on the number of steps. */
  public Motion inSteps(int most) {
    return new Motion(rates, start, groups, limit, stop, jumps, conserved, most, poll);
  }

  /** The same, with an action before every step; what it throws ends the run. */
  public Motion polling(Runnable action) {
    return new Motion(rates, start, groups, limit, stop, jumps, conserved, mostSteps, action);
  }

  /**
   * Follows the motion to its end.
   *
   * @throws MotionFailure where that is not possible
   */
  public MotionRun run() {
    return new AdaptiveRun(this).run();
  }

  Rates rates() {
    return rates;
  }

  double[] start() {
    return start.clone();
  }

  int[] groups() {
    return groups.clone();
  }

  double limit() {
    return limit;
  }

  @Nullable Condition stop() {
    return stop;
  }

  List<Condition> jumps() {
    return jumps;
  }

  List<Conserved> conserved() {
    return conserved;
  }

  int mostSteps() {
    return mostSteps;
  }

  Runnable poll() {
    return poll;
  }
}
