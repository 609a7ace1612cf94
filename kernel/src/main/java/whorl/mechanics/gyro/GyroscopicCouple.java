package whorl.mechanics.gyro;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Point;

/**
 * The couple that goes with turning the axis of a spinning body.
 *
 * <p>To turn with the angular velocity Ω, the angular momentum L needs the moment {@code M = Ω × L}
 * from the bearings, in addition to what carries the weight. The body answers with {@code −M = L ×
 * Ω} on the bearings: the <em>gyroscopic couple</em> that a frame, a hull or an airframe feels.
 *
 * <p>Valid for a steady Ω and an L that turns with it unchanged, as that of a balanced symmetric
 * body about its axis does. The part of L that the turning itself gives across the axis is left
 * out; it is small where the spin is fast against Ω.
 *
 * <p>Source: the rate of a vector that turns, any textbook of dynamics (common practice).
 *
 * @param angularMomentum L of the spinning body, along the axes of the world, in N·m·s
 * @param turning Ω, angular velocity of its axis, along the axes of the world, in rad/s
 */
public record GyroscopicCouple(Vector3D angularMomentum, Vector3D turning) {
  /** Refuses what is no number. */
  public GyroscopicCouple {
    Given.finite("angular momentum", angularMomentum);
    Given.finite("angular velocity", turning);
  }

  /** The moment that the bearings exert on the body, {@code Ω × L}, in N·m. */
  public Vector3D onBody() {
    return turning.crossProduct(angularMomentum);
  }

  /** The gyroscopic couple that the body exerts on its bearings, {@code L × Ω}, in N·m. */
  public Vector3D onBearings() {
    return onBody().negate();
  }

  /**
   * The forces that the couple makes the body exert on two bearings: equal and opposite, across the
   * line from one to the other, {@code F_B = d × (Ω × L)/d²} with {@code d = B − A} on bearing B
   * and its reverse on A. Those of the bearings on the body are the reverse. Weight and other loads
   * come on top.
   *
   * @param a bearing A
   * @param b bearing B
   * @throws Refusal where the bearings coincide, or where the couple has a part along their line,
   *     which bearings cannot carry
   */
  public Bearings bearings(Point a, Point b) {
    Vector3D span = b.minus(a);
    if (a.coincidesWith(b)) {
      throw new Refusal(
          "bearings", "Both bearings are at one point.", "Give the two places on the shaft.");
    }
    Vector3D moment = onBody();
    double along = moment.dotProduct(span) / span.getNorm();
    if (Math.abs(along) > 1e-9 * moment.getNorm()) {
      throw new Refusal(
          "bearings",
          "The couple has a part of "
              + Given.text(along, "N·m")
              + " along the line of the bearings, which only a drive or a brake can exert.",
          "Check that the spin is along the shaft.");
    }
    Vector3D onB = span.crossProduct(moment).scalarMultiply(1 / span.getNormSq());
    return new Bearings(new BoundForce(onB.negate(), a), new BoundForce(onB, b));
  }

  /**
   * What the body exerts on its bearings.
   *
   * @param onA on bearing A
   * @param onB on bearing B
   */
  public record Bearings(BoundForce onA, BoundForce onB) {}

  /**
   * The least turning of the axis that a moment on the body gives, {@code Ω = L × M/L²}: across
   * both, at the rate M/L where they are at right angles. What M has along L changes the spin
   * instead.
   *
   * <p>Valid for fast spin; what turning itself adds to L is left out.
   *
   * @param angularMomentum L, in N·m·s
   * @param moment M on the body about its pivot or centre of mass, in N·m
   * @throws Refusal where the body has no angular momentum
   */
  public static Vector3D turningUnder(Vector3D angularMomentum, Vector3D moment) {
    Given.direction("angular momentum", angularMomentum);
    return angularMomentum.crossProduct(moment).scalarMultiply(1 / angularMomentum.getNormSq());
  }

  /**
   * The rate at which a moment turns the angular momentum about a given axis, {@code Ω = M · n / |u
   * × L|} with u along the axis and n along {@code u × L}, in rad/s: a top's weight about the
   * vertical, the Sun's pull about the pole of the ecliptic.
   *
   * @param angularMomentum L, in N·m·s
   * @param moment M on the body, in N·m
   * @param about direction of the axis
   * @throws Refusal where the angular momentum is along the axis
   */
  public static double rateAbout(Vector3D angularMomentum, Vector3D moment, Vector3D about) {
    Vector3D across = Given.direction("axis", about).crossProduct(angularMomentum);
    if (across.getNorm() <= 1e-12 * angularMomentum.getNorm()) {
      throw new Refusal(
          "axis",
          "The angular momentum is along the axis, so turning about it changes nothing.",
          "Take the axis about which the spinning body's axis goes round.");
    }
    return moment.dotProduct(across) / across.getNormSq();
  }
}
