package whorl.mechanics.gyro;

import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A symmetric body on a point of its axis that stays in place, under its own weight: a top, a wheel
 * on a ball joint.
 *
 * <p>Throughout, the lean θ is the angle of the axis, from the pivot to the centre of mass, from
 * straight up; the spin ω₃ is the part of the body's angular velocity along that axis, which does
 * not change while nothing turns the body about it. It is not the speed relative to the precessing
 * frame; see {@link #spinOfRelative}.
 *
 * <p>Valid for a rigid body, a pivot without friction, and a uniform field of weight.
 *
 * <p>Source: the first integrals of Lagrange's top, as in H. Goldstein, Classical Mechanics,
 * section 5.7 (from memory; held by tests against a full motion).
 *
 * @param axial C, moment of inertia about the axis, in kg·m²; positive
 * @param atPivot A, moment of inertia about an axis across it through the pivot, in kg·m²; positive
 * @param weightMoment m g l, weight times the distance from the pivot to the centre of mass, in
 *     N·m; positive
 */
public record SymmetricTop(double axial, double atPivot, double weightMoment) {
  /** Refuses what is not positive. */
  public SymmetricTop {
    Given.positive("axial moment of inertia", axial, "kg·m²");
    Given.positive("moment of inertia at the pivot", atPivot, "kg·m²");
    Given.positive("moment of the weight", weightMoment, "N·m");
  }

  /**
   * The two rates of steady precession about the vertical, in rad/s; positive in the sense of a
   * positive spin seen from above.
   *
   * @param slow the one that a top shows when it is set down with care
   * @param fast the one near {@code C ω₃/(A cos θ)}; infinite where the axis is level
   */
  public record SteadyPrecession(double slow, double fast) {}

  /**
   * Steady precession, exact: the roots of {@code A cos θ Ω² − C ω₃ Ω + m g l = 0}.
   *
   * @param spin ω₃, in rad/s
   * @param lean θ, in rad, from 0 to π
   * @throws Refusal where the spin is less than {@link #leastSpin}
   */
  public SteadyPrecession steadyPrecession(double spin, double lean) {
    double momentum = axial * Given.finite("spin", spin, "rad/s");
    double square = momentum * momentum - 4 * atPivot * weightMoment * cosine(lean);
    if (square < 0 || (momentum == 0 && Math.cos(lean) >= 0)) {
      throw new Refusal(
          "spin",
          "At "
              + Given.text(spin, "rad/s")
              + " the top does not precess steadily with a lean of "
              + Given.text(Math.toDegrees(lean), "deg")
              + "; that takes at least "
              + Given.text(leastSpin(lean), "rad/s")
              + ".",
          "Spin it faster, or follow it with a motion.");
    }
    return roots(atPivot * cosine(lean), momentum, square);
  }

  /** The roots of {@code a Ω² − b Ω + m g l = 0}, without the cancellation of the usual formula. */
  private SteadyPrecession roots(double a, double b, double square) {
    double sum = b + Math.copySign(Math.sqrt(square), b);
    double slow = 2 * weightMoment / sum;
    double level = 1e-15 * atPivot;
    double fast =
        Math.abs(a) <= level
            ? Math.copySign(Double.POSITIVE_INFINITY, b * Math.signum(a))
            : sum / (2 * a);
    return new SteadyPrecession(slow, fast);
  }

  /**
   * Steady precession where the spin is given relative to the precessing frame, as a motor or a
   * strobe on the gimbal shows it: the roots of {@code (A − C) cos θ Ω² − C ψ' Ω + m g l = 0}.
   *
   * @param relativeSpin ψ', in rad/s
   * @param lean θ, in rad, from 0 to π
   * @throws Refusal where there is none
   */
  public SteadyPrecession steadyPrecessionOfRelative(double relativeSpin, double lean) {
    double momentum = axial * Given.finite("spin", relativeSpin, "rad/s");
    double a = (atPivot - axial) * cosine(lean);
    double square = momentum * momentum - 4 * a * weightMoment;
    if (square < 0 || (momentum == 0 && a >= 0)) {
      throw new Refusal(
          "spin",
          "At "
              + Given.text(relativeSpin, "rad/s")
              + " relative to the precessing frame the top does not precess steadily with a lean of "
              + Given.text(Math.toDegrees(lean), "deg")
              + ".",
          "Spin it faster, or follow it with a motion.");
    }
    return roots(a, momentum, square);
  }

  /**
   * The spin ω₃ with a spin ψ' relative to the precessing frame, {@code ψ' + Ω cos θ}, in rad/s.
   */
  public static double spinOfRelative(double relativeSpin, double precession, double lean) {
    return relativeSpin + precession * Math.cos(lean);
  }

  /**
   * Slow precession of a fast top, approximate: {@code Ω ≈ m g l/(C ω₃)}. Its error is about {@code
   * −ε cos θ} of the exact rate, with {@link #slowness ε}; use it for ε up to 0.1.
   *
   * @throws Refusal where the spin is zero
   */
  public double fastTopPrecession(double spin) {
    if (Given.finite("spin", spin, "rad/s") == 0) {
      throw new Refusal("spin", "A top without spin does not precess.", "");
    }
    return weightMoment / (axial * spin);
  }

  /**
   * How far a top is from being fast: {@code ε = A m g l/(C ω₃)²}, a pure number. The formulas for
   * fast tops are good to about ε.
   */
  public double slowness(double spin) {
    double momentum = axial * spin;
    return atPivot * weightMoment / (momentum * momentum);
  }

  /**
   * The error of {@link #fastTopPrecession} as a part of the exact slow precession, with its sign.
   *
   * @throws Refusal where there is no steady precession
   */
  public double fastTopError(double spin, double lean) {
    return fastTopPrecession(spin) / steadyPrecession(spin, lean).slow() - 1;
  }

  /**
   * The least spin with which a top precesses steadily: {@code ω₃ = 2 √(A m g l cos θ)/C}, in
   * rad/s; 0 with the axis level or below.
   */
  public double leastSpin(double lean) {
    return 2 * Math.sqrt(atPivot * weightMoment * Math.max(0, cosine(lean))) / axial;
  }

  /** The spin above which a top stands upright: {@code ω₃ = 2 √(A m g l)/C}, in rad/s. */
  public double uprightSpin() {
    return leastSpin(0);
  }

  /**
   * The angular frequency of a small nutation about steady precession, in rad/s: {@code Λ² = Ω² − 2
   * m g l cos θ/A + (m g l/(A Ω))²}. For a fast top it nears {@code C ω₃/A}.
   *
   * @param precession Ω, one of the rates of steady precession, in rad/s; not 0
   * @param lean θ, in rad
   */
  public double nutationRate(double precession, double lean) {
    double pull = weightMoment / atPivot;
    double other = pull / precession;
    return Math.sqrt(precession * precession - 2 * pull * cosine(lean) + other * other);
  }

  /** The nutation of the top released with its axis at rest at a lean; θ in rad, ω₃ in rad/s. */
  public Nutation nutation(double spin, double lean) {
    return nutation(spin, lean, 0, 0);
  }

  /**
   * The nutation of the top in general.
   *
   * @param spin ω₃, in rad/s
   * @param lean θ at some time, in rad, from 0 to π
   * @param leanRate θ' at that time, in rad/s
   * @param precession φ' at that time, in rad/s
   */
  public Nutation nutation(double spin, double lean, double leanRate, double precession) {
    double cosine = cosine(lean);
    double sine = Math.sin(lean);
    double across = precession * sine;
    double momentum = axial * Given.finite("spin", spin, "rad/s");
    return Nutation.of(
        this,
        momentum,
        atPivot * precession * sine * sine + momentum * cosine,
        atPivot * (leanRate * leanRate + across * across) / 2,
        cosine);
  }

  private static double cosine(double lean) {
    if (!(lean >= 0 && lean <= Math.PI)) {
      throw new Refusal(
          "lean",
          "The lean is the angle of the axis from straight up, so it lies between 0 and 180 deg, but"
              + " is "
              + Given.text(Math.toDegrees(lean), "deg")
              + ".",
          "");
    }
    return Math.cos(lean);
  }
}
