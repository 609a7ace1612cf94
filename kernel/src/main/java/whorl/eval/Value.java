package whorl.eval;

import whorl.laws.ThingSort;

/** A result in coherent SI units. */
public sealed interface Value {
  /** A number. */
  record Real(double value) implements Value {}

  /** A vector by its parts in the world frame. */
  record Vector(double x, double y, double z) implements Value {}

  /** Whether a condition holds. */
  record Truth(boolean holds) implements Value {}

  /** A thing in space, of the class that its sort asks for. */
  record Thing(ThingSort sort, Object content) implements Value {}
}
