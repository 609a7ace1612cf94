package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * The box around points, along the axes in which they are given.
 *
 * @param least smallest coordinates
 * @param most largest coordinates
 */
record Extent(Vector3D least, Vector3D most) {
  /** The box around some points; that of the origin where there are none. */
  static Extent of(List<Vector3D> points) {
    if (points.isEmpty()) {
      return new Extent(Vector3D.ZERO, Vector3D.ZERO);
    }
    Vector3D least = points.get(0);
    Vector3D most = points.get(0);
    for (Vector3D p : points) {
      least =
          new Vector3D(
              Math.min(least.getX(), p.getX()),
              Math.min(least.getY(), p.getY()),
              Math.min(least.getZ(), p.getZ()));
      most =
          new Vector3D(
              Math.max(most.getX(), p.getX()),
              Math.max(most.getY(), p.getY()),
              Math.max(most.getZ(), p.getZ()));
    }
    return new Extent(least, most);
  }

  Vector3D middle() {
    return new Vector3D(0.5, least, 0.5, most);
  }

  double halfDiagonal() {
    return most.distance(least) / 2;
  }
}
