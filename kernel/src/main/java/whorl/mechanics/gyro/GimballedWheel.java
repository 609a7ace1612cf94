package whorl.mechanics.gyro;

import whorl.mechanics.Given;

/**
 * A spinning wheel in two gimbals at right angles, which a steady moment about the one begins to
 * act on at rest. The other one then turns steadily, with a small nod of both.
 *
 * <p>Small angles: {@code I₁ α" + h β' = M} and {@code I₂ β" − h α' = 0}, with α about the axis of
 * the moment and β about the other. Valid while the axis of the wheel stays within some 10 deg of a
 * right angle to the axis of the moment, for gimbals without friction.
 *
 * <p>Source: linearised equations of a gyroscope (common practice), held by a test against a full
 * motion.
 *
 * @param momentum h, angular momentum of the wheel about its axis, in N·m·s; positive
 * @param aboutMoment I₁, moment of inertia of wheel and gimbals about the axis of the moment, in
 *     kg·m²; positive
 * @param aboutOther I₂, moment of inertia of wheel and inner gimbal about the other axis, in kg·m²;
 *     positive
 */
public record GimballedWheel(double momentum, double aboutMoment, double aboutOther) {
  /** Refuses what is not positive. */
  public GimballedWheel {
    Given.positive("angular momentum", momentum, "N·m·s");
    Given.positive("moment of inertia", aboutMoment, "kg·m²");
    Given.positive("moment of inertia", aboutOther, "kg·m²");
  }

  /** The steady rate at which the other axis turns, {@code β' = M/h}, in rad/s. */
  public double precession(double moment) {
    return Given.finite("moment", moment, "N·m") / momentum;
  }

  /** The angular frequency of the nod, {@code h/√(I₁ I₂)}, in rad/s. */
  public double nutationRate() {
    return momentum / Math.sqrt(aboutMoment * aboutOther);
  }

  /**
   * How far the axis of the moment gives way, {@code α = (M I₂/h²)(1 − cos Λt)}, in rad: it nods,
   * and does not run away.
   */
  public double yielding(double moment, double time) {
    double sine = Math.sin(nutationRate() * time / 2);
    return 2 * moment * aboutOther / (momentum * momentum) * sine * sine;
  }

  /** How far the other axis has turned, {@code β = (M/h)(t − sin(Λt)/Λ)}, in rad. */
  public double turned(double moment, double time) {
    double rate = nutationRate();
    return precession(moment) * (time - Math.sin(rate * time) / rate);
  }
}
