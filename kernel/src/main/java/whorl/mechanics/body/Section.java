package whorl.mechanics.body;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.mechanics.reference.InertiaTensor;

/**
 * The moments of a plane area.
 *
 * @param centroid in the coordinates of its outline, in m
 * @param perMass inertia tensor about the centroid of a thin plate of this outline, divided by its
 *     mass, in m²
 */
record Section(Vector2D centroid, InertiaTensor perMass) {
  static Section of(Contour outline) {
    double area = outline.area();
    double x = outline.integral((u, v) -> u * u / 2) / area;
    double y = outline.integral((u, v) -> u * v) / area;
    double xx = outline.integral((u, v) -> u * u * u / 3) / area - x * x;
    double yy = outline.integral((u, v) -> u * v * v) / area - y * y;
    double xy = outline.integral((u, v) -> u * u * v / 2) / area - x * y;
    return new Section(
        outline.reference().add(new Vector2D(x, y)), new InertiaTensor(yy, xx, xx + yy, -xy, 0, 0));
  }

  /** The origin of the outline's coordinates, as seen from the centroid. */
  Vector3D origin() {
    return new Vector3D(-centroid.getX(), -centroid.getY(), 0);
  }

  /** Corners as seen from the centroid. */
  List<Vector2D> centred(List<Vector2D> corners) {
    return corners.stream().map(corner -> corner.subtract(centroid)).toList();
  }
}
