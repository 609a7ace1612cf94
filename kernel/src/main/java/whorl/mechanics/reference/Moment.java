package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A moment of force, with the point that it is taken about.
 *
 * @param value along the axes of the world, in N·m
 * @param about the point
 */
public record Moment(Vector3D value, Point about) {
  /** Refuses what is no number. */
  public Moment {
    Given.finite("moment", value);
  }

  /**
   * The moment that the rate of an angular momentum shows: {@code M = dL/dt}. That holds about a
   * point at rest and about the centre of mass. About another point, moving with velocity v, the
   * momentum p of the body adds {@code v × p}.
   *
   * @param rate of the angular momentum about the point, in N·m
   * @param about the point
   * @param centre the centre of mass
   * @throws Refusal where the point is neither at rest nor the centre of mass
   */
  public static Moment fromRate(Vector3D rate, Point about, Point centre) {
    if (about.isFixed() || about.coincidesWith(centre)) {
      return new Moment(rate, about);
    }
    throw new Refusal(
        "point",
        "The point moves with "
            + Given.text(about.velocity().getNorm(), "m/s")
            + " and is not the centre of mass, so the moment about it is not the rate of the angular"
            + " momentum about it.",
        "Take both about the centre of mass or about a point at rest, and move the moment"
            + " afterwards.");
  }

  /**
   * The moment of the same forces about another point, {@code M_B = M_A + (A − B) × F}.
   *
   * @param to the other point B
   * @param force sum F of the forces, in N; zero for a pure couple
   */
  public Moment moved(Point to, Vector3D force) {
    Given.finite("force", force);
    return new Moment(value.add(about.minus(to).crossProduct(force)), to);
  }

  /**
   * The sum of two moments about one point.
   *
   * @throws Refusal where they are about different points
   */
  public Moment plus(Moment other) {
    demandSame("moment", "force", about, other.about);
    return new Moment(value.add(other.value), about);
  }

  /** The torque about an axis, in N·m: the part along it. */
  double along(Axis axis) {
    return axis.along().dotProduct(value);
  }

  /**
   * The torque about an axis, in N·m: the part along it.
   *
   * @throws Refusal where the axis does not pass through the point that the moment is about
   */
  public double about(Axis axis) {
    demandThrough("moment", "force", axis, about);
    return along(axis);
  }

  static void demandSame(String what, String with, Point first, Point second) {
    if (!first.coincidesWith(second)) {
      throw new Refusal(
          what,
          "The two are about different points, "
              + Given.text(first.position(), "m")
              + " and "
              + Given.text(second.position(), "m")
              + ".",
          "Move one of them to the point of the other; that takes the " + with + ".");
    }
  }

  static void demandThrough(String what, String with, Axis axis, Point about) {
    if (!axis.passesThrough(about)) {
      throw new Refusal(
          "axis",
          "The axis misses the point that the "
              + what
              + " is about by "
              + Given.text(axis.distance(about), "m")
              + ".",
          "Move the " + what + " to a point of the axis first; that takes the " + with + ".");
    }
  }
}
