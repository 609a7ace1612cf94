package whorl.mechanics.gyro;

import whorl.mechanics.Given;

/**
 * A turning body that is slowed by weights on cords, which unwind from its rim and are let go along
 * the tangent.
 *
 * <p>Angular momentum and energy of body and weights are kept while they unwind: with {@code c =
 * I/m + a²}, a cord unwound to the length l leaves {@code ω = ω₀ (c − l²)/(c + l²)}. Valid for
 * cords without mass, wound on evenly on opposite sides.
 *
 * <p>Source: momentum and energy integrals; J. V. Fedor, NASA TN D-708, 1961 (from memory).
 *
 * <p>Caution: the weights leave fast. Nobody may be where they or a torn cord can fly.
 *
 * @param inertia I of the body without the weights, in kg·m²; positive
 * @param mass m of all weights together, in kg; positive
 * @param radius a from the axis to the cords, in m; positive
 * @param speed ω₀ at the start, in rad/s
 */
public record YoYoDespin(double inertia, double mass, double radius, double speed) {
  /** Refuses what is not positive. */
  public YoYoDespin {
    Given.positive("moment of inertia", inertia, "kg·m²");
    Given.positive("mass", mass, "kg");
    Given.positive("radius", radius, "m");
    Given.finite("angular velocity", speed, "rad/s");
  }

  private double squareOfFullLength() {
    return inertia / mass + radius * radius;
  }

  /** The angular velocity with cords unwound to a length in m, in rad/s. */
  public double speedAt(double length) {
    double square = Given.notNegative("length", length, "m") * length;
    return speed * (squareOfFullLength() - square) / (squareOfFullLength() + square);
  }

  /** The length that brings the body to rest, {@code √(I/m + a²)}, in m; whatever the speed. */
  public double lengthToRest() {
    return Math.sqrt(squareOfFullLength());
  }

  /** The time in which the cords unwind to a length in m, {@code l/(a ω₀)}, in s. */
  public double timeTo(double length) {
    return Given.notNegative("length", length, "m")
        / (radius * Given.positive("angular velocity", Math.abs(speed), "rad/s"));
  }
}
