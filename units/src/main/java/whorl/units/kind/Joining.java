package whorl.units.kind;

/** The ways in which two quantities must be alike. */
public enum Joining {
  /** {@code a + b}. */
  ADD,
  /** {@code a - b}. */
  SUBTRACT,
  /** {@code a <= b}, the least and the greatest of both, the sides of an angle, either branch. */
  COMPARE
}
