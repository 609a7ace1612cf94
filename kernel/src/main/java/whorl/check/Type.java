package whorl.check;

import whorl.units.kind.Readings;

/** What is known of an expression before any number is worked out. */
public sealed interface Type {
  /** A number with what its kind may be. */
  record Real(Readings readings) implements Type {}

  /** A vector, whose parts all have these readings. */
  record Vector(Readings readings) implements Type {}

  /** A condition. */
  record Truth() implements Type {}

  /** Number of slots that a value of this type takes in a frame. */
  default int slots() {
    return this instanceof Vector ? 3 : 1;
  }
}
