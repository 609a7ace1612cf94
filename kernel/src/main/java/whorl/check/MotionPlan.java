package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A checked motion: what is integrated, and what is worked out at an instant, all over one frame.
 * Its first slots hold the states and locals, those behind them what is read from the sheet.
 *
 * @param states what is integrated
 * @param computed what follows from the states at an instant, in an order in which it can be worked
 *     out
 * @param stop ends the run; null where only time does
 * @param limit longest time to follow it
 * @param jumps conditions at whose turning a rate may jump
 * @param columns its courses, in the order in which they are shown
 * @param rigid the rigid body that it follows; null where there is none
 */
public record MotionPlan(
    List<State> states,
    List<Computed> computed,
    Operation.@Nullable Truth stop,
    Operation.Real limit,
    List<Operation.Truth> jumps,
    List<Column> columns,
    @Nullable RigidPlan rigid) {
  /** Copies the lists. */
  public MotionPlan {
    states = List.copyOf(states);
    computed = List.copyOf(computed);
    jumps = List.copyOf(jumps);
    columns = List.copyOf(columns);
  }

  /** What an equation says of an inertia that changes with a state. */
  public enum Balance {
    /** There is none. */
    NONE,
    /** {@code I * ω' = T}: matter leaves, or comes, with the speed it has. */
    MATTER_LEAVES,
    /** {@code (I*ω)' = T}: the same matter throughout. */
    SAME_MATTER
  }

  /**
   * A state.
   *
   * @param type number or vector
   * @param integrated first slot of what is integrated: the state itself, or for {@code (I*ω)' = T}
   *     the product, from which the state is worked out
   * @param start value of the state at the start
   * @param rate the right side of its equation
   * @param weight what the rate, or the state in the product, is multiplied by; null for 1
   * @param ofProduct whether the product is integrated
   */
  public record State(
      String name,
      Type type,
      int slot,
      int integrated,
      Operation start,
      Operation rate,
      Operation.@Nullable Real weight,
      boolean ofProduct,
      Balance balance) {}

  /** A value that is worked out into a slot at every instant. */
  public record Computed(int slot, Operation value) {}

  /**
   * A course.
   *
   * @param kind the kind of quantity in words, or empty
   * @param slot first slot of its value
   * @param isState whether it is a state; else a local
   */
  public record Column(
      String name, Meaning.Quantity quantity, String kind, int slot, boolean isState) {}
}
