package whorl.mechanics.gyro;

import whorl.mechanics.Given;

/**
 * A turning body whose moment of inertia changes with no moment from outside, in the two cases that
 * must not be mixed up.
 *
 * <ul>
 *   <li>The <em>same matter</em> moves in or out, as when arms are drawn in, or matter comes to it
 *       that did not turn: the angular momentum is kept, {@code I₁ ω₁ = I₂ ω₂}. The energy is not:
 *       who draws the arms in does work, and what is dropped on is brought up to speed by slipping.
 *   <li>Matter <em>leaves with the speed it has</em>, as cable from a spool: it takes its momentum
 *       and its energy along, and the speed of what stays does not change.
 * </ul>
 *
 * <p>Source: the angular momentum of the same matter, any textbook of dynamics (common practice).
 *
 * @param before I₁, in kg·m²; positive
 * @param after I₂, in kg·m²; positive
 * @param speed ω₁, in rad/s
 */
public record ChangingInertia(double before, double after, double speed) {
  /** Refuses moments of inertia that are not positive. */
  public ChangingInertia {
    Given.positive("moment of inertia before", before, "kg·m²");
    Given.positive("moment of inertia after", after, "kg·m²");
    Given.finite("angular velocity", speed, "rad/s");
  }

  /** The speed where no matter leaves, {@code ω₂ = ω₁ I₁/I₂}, in rad/s. */
  public double speedOfSameMatter() {
    return speed * before / after;
  }

  /**
   * The kinetic energy gained where no matter leaves, {@code ½ L² (1/I₂ − 1/I₁)}, in J: the work
   * done to draw it in; negative where energy is lost or taken out.
   */
  public double workOnSameMatter() {
    double momentum = before * speed;
    return momentum * momentum * (1 / after - 1 / before) / 2;
  }

  /** The angular momentum that matter takes along which leaves, {@code (I₁ − I₂) ω₁}, in N·m·s. */
  public double momentumTakenAlong() {
    return (before - after) * speed;
  }

  /** The kinetic energy that it takes along, {@code ½ (I₁ − I₂) ω₁²}, in J. */
  public double energyTakenAlong() {
    return (before - after) * speed * speed / 2;
  }
}
