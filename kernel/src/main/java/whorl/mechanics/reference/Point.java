package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;

/**
 * A point in space, with the velocity that it has there: a point fixed in a turning frame moves.
 *
 * @param position from the origin of the world, in m
 * @param velocity as seen from the world, in m/s
 */
public record Point(Vector3D position, Vector3D velocity) {
  /** The origin of the world. */
  public static final Point ORIGIN = fixed(Vector3D.ZERO);

  /** Two lengths are taken as equal that differ by less than this share of the larger. */
  static final double SAME = 1e-9;

  /** Refuses what is no number. */
  public Point {
    Given.finite("position", position);
    Given.finite("velocity", velocity);
  }

  /** A point at rest. */
  public static Point fixed(Vector3D position) {
    return new Point(position, Vector3D.ZERO);
  }

  /** A point at rest, its coordinates in m. */
  public static Point fixed(double x, double y, double z) {
    return fixed(new Vector3D(x, y, z));
  }

  /** Whether the point is at rest in the world. */
  public boolean isFixed() {
    return velocity.getNormSq() == 0;
  }

  /** The point displaced by a vector in m, with the same velocity. */
  public Point plus(Vector3D displacement) {
    return new Point(position.add(displacement), velocity);
  }

  /** The vector to this point from another, in m. */
  public Vector3D minus(Point other) {
    return position.subtract(other.position);
  }

  /**
   * Whether the point is where another is now, within rounding: closer than 10⁻⁹ of their distance
   * from the origin.
   */
  public boolean coincidesWith(Point other) {
    double size = Math.max(position.getNorm(), other.position.getNorm());
    return minus(other).getNorm() <= SAME * size;
  }
}
