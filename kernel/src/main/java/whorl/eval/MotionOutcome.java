package whorl.eval;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** What following a motion came to. */
public sealed interface MotionOutcome {
  /**
   * It was followed to its end.
   *
   * @param breaches laws that were used where they do not hold
   */
  record Ran(Run run, List<Breach> breaches) implements MotionOutcome {
    /** Copies the list. */
    public Ran {
      breaches = List.copyOf(breaches);
    }
  }

  /** What stood in the way. */
  enum Obstacle {
    /** Something has no value: a start, the limit, a rate. */
    NO_VALUE,
    /** A rate grows without bound. */
    RUNAWAY,
    /** A rate jumps to and fro about a condition. */
    TO_AND_FRO,
    /** It takes too many steps. */
    TOO_MANY_STEPS,
    /** The time limit is not above zero. */
    LIMIT
  }

  /**
   * It could not be.
   *
   * @param time up to which it was followed, in s
   * @param states the columns that are states, at that time
   * @param state position of the state at fault among them, or −1 where it is not one alone
   * @param failure the part of a formula that has no value; null where none is at fault
   */
  record Failed(
      Obstacle obstacle,
      double time,
      List<Value> states,
      int state,
      @Nullable NumericFailure failure)
      implements MotionOutcome {
    /** Copies the list. */
    public Failed {
      states = List.copyOf(states);
    }
  }
}
