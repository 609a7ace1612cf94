package whorl.eval;

/** What an evaluation came to: a value, or the first part of the formula that has none. */
public sealed interface Outcome {
  /** A value; its numbers are finite. */
  record Done(Value value) implements Outcome {}

  /** No value. */
  record Failed(NumericFailure failure) implements Outcome {}
}
