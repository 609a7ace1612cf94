package whorl.eval;

import java.util.List;

/** What an evaluation came to: a value, or the first part of the formula that has none. */
public sealed interface Outcome {
  /**
   * A value; its numbers are finite.
   *
   * @param breaches laws that were used where they do not hold
   */
  record Done(Value value, List<Breach> breaches) implements Outcome {
    /** Copies the list. */
    public Done {
      breaches = List.copyOf(breaches);
    }

    /** A value with nothing against it. */
    public Done(Value value) {
      this(value, List.of());
    }
  }

  /** No value. */
  record Failed(NumericFailure failure) implements Outcome {}
}
