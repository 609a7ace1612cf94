package whorl.mechanics.reference;

import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A moment of inertia, with the axis that it is taken about.
 *
 * @param value in kg·m²; not negative
 * @param about the axis
 */
public record AxialInertia(double value, Axis about) {
  /** Refuses what is negative or no number. */
  public AxialInertia {
    Given.notNegative("moment of inertia", value, "kg·m²");
  }

  /**
   * The moment of inertia of the same body about a parallel axis, {@code I_b = I_a + m (b² − a²)}
   * with a and b the distances of the centre of mass from the axes. Neither axis has to pass
   * through the centre.
   *
   * @param to the parallel axis
   * @param mass m, in kg
   * @param centre the centre of mass
   * @throws Refusal where the axes are not parallel, or where no body of that mass and centre has
   *     the inertia
   */
  public AxialInertia moved(Axis to, double mass, Point centre) {
    Given.positive("mass", mass, "kg");
    if (!about.isParallelTo(to)) {
      throw new Refusal(
          "axis",
          "The axes are not parallel, and one moment of inertia does not tell that about an axis of"
              + " another direction.",
          "Start from the inertia tensor of the body.");
    }
    double from = about.distance(centre);
    double own = value - mass * from * from;
    if (own < -Point.SAME * value) {
      throw new Refusal(
          "moment of inertia",
          "A mass of "
              + Given.text(mass, "kg")
              + " with its centre "
              + Given.text(from, "m")
              + " from the axis has an inertia of at least "
              + Given.text(mass * from * from, "kg·m²")
              + " about it, more than the "
              + Given.text(value, "kg·m²")
              + " given.",
          "Check the mass, the centre and which axis the inertia is about.");
    }
    double distance = to.distance(centre);
    return new AxialInertia(Math.max(own, 0) + mass * distance * distance, to);
  }

  /**
   * The sum of two moments of inertia about one axis.
   *
   * @throws Refusal where they are about different axes
   */
  public AxialInertia plus(AxialInertia other) {
    if (!about.coincidesWith(other.about)) {
      throw new Refusal(
          "moment of inertia",
          "The two are about different axes.",
          "Move one of them to the axis of the other; that takes mass and centre.");
    }
    return new AxialInertia(value + other.value, about);
  }
}
