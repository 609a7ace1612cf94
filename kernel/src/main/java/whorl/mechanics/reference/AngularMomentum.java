package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * An angular momentum, with the point that it is taken about: {@code L = ∫ r × v dm}, with r from
 * the point and v as seen from the world, whether or not the point moves.
 *
 * @param value along the axes of the world, in N·m·s
 * @param about the point
 */
public record AngularMomentum(Vector3D value, Point about) {
  /** Refuses what is no number. */
  public AngularMomentum {
    Given.finite("angular momentum", value);
  }

  /**
   * The angular momentum of the same matter about another point, {@code L_B = L_A + (A − B) × p}.
   *
   * @param to the other point B
   * @param momentum p, mass times velocity of the centre of mass, in N·s
   */
  public AngularMomentum moved(Point to, Vector3D momentum) {
    Given.finite("momentum", momentum);
    return new AngularMomentum(value.add(about.minus(to).crossProduct(momentum)), to);
  }

  /**
   * The sum of two angular momenta about one point.
   *
   * @throws Refusal where they are about different points
   */
  public AngularMomentum plus(AngularMomentum other) {
    Moment.demandSame("angular momentum", "momentum", about, other.about);
    return new AngularMomentum(value.add(other.value), about);
  }

  /**
   * The part along an axis, in N·m·s.
   *
   * @throws Refusal where the axis does not pass through the point that this is about
   */
  public double about(Axis axis) {
    Moment.demandThrough("angular momentum", "momentum", axis, about);
    return axis.along().dotProduct(value);
  }
}
