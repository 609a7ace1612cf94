package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A line with a sense: the sense of the axis and the sense of positive turning make a right-handed
 * screw.
 *
 * @param through a point on the axis
 * @param along the direction; made a unit vector
 */
public record Axis(Point through, Vector3D along) {
  /** Refuses a direction of length zero. */
  public Axis {
    along = Given.direction("direction", along);
  }

  /**
   * The axis from one point to another.
   *
   * @throws Refusal where the points coincide
   */
  public static Axis through(Point from, Point to) {
    if (from.coincidesWith(to)) {
      throw new Refusal(
          "axis",
          "Both points of the axis are at " + Given.text(from.position(), "m") + ".",
          "Give two different points, or one point and a direction.");
    }
    return new Axis(from, to.minus(from));
  }

  /** The point of the axis nearest to another point. */
  public Point nearest(Point point) {
    double along = point.minus(through).dotProduct(this.along);
    return through.plus(this.along.scalarMultiply(along));
  }

  /** The distance of a point from the axis, in m. */
  public double distance(Point point) {
    return along.crossProduct(point.minus(through)).getNorm();
  }

  /** Whether the axis passes through a point, within rounding. */
  public boolean passesThrough(Point point) {
    double size = Math.max(point.position().getNorm(), through.position().getNorm());
    return distance(point) <= Point.SAME * size;
  }

  /** Whether another axis points the same way or the opposite way, within rounding. */
  public boolean isParallelTo(Axis other) {
    return along.crossProduct(other.along).getNorm() <= Point.SAME;
  }

  /** Whether another axis is the same line, of either sense, within rounding. */
  public boolean coincidesWith(Axis other) {
    return isParallelTo(other) && passesThrough(other.through);
  }
}
