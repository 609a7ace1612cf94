package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * A parallel projection from a direction, with the z axis of the world upright.
 *
 * @param right along the drawing to the right
 * @param up along the drawing upwards
 * @param eye towards the onlooker
 */
record View(Vector3D right, Vector3D up, Vector3D eye) {
  private static final double ELEVATION = Math.toRadians(24);

  /** Azimuths of the onlooker in degrees, the usual one first; none lies in a plane of symmetry. */
  private static final double[] AZIMUTHS = {-57, -38, -76, -21, -109, -128};

  /** A line that is seen more obliquely than this is too short to be read. */
  private static final double END_ON = Math.toRadians(24);

  static View from(double azimuth, double elevation) {
    Vector3D eye = new Vector3D(azimuth, elevation);
    Vector3D right = new Vector3D(-Math.sin(azimuth), Math.cos(azimuth), 0);
    return new View(right, eye.crossProduct(right), eye);
  }

  /**
   * The usual view, or the first in which no direction is seen end on; the best of all failing
   * that.
   */
  static View showing(List<Vector3D> directions) {
    View best = from(Math.toRadians(AZIMUTHS[0]), ELEVATION);
    double most = -1;
    for (double azimuth : AZIMUTHS) {
      View view = from(Math.toRadians(azimuth), ELEVATION);
      double least = directions.stream().mapToDouble(view::obliqueness).min().orElse(Math.PI);
      if (least >= END_ON) {
        return view;
      }
      if (least > most) {
        most = least;
        best = view;
      }
    }
    return best;
  }

  private double obliqueness(Vector3D direction) {
    return Math.atan2(eye.crossProduct(direction).getNorm(), Math.abs(eye.dotProduct(direction)));
  }

  /** Parts to the right, downwards and towards the onlooker. */
  Vector3D seen(Vector3D v) {
    return new Vector3D(v.dotProduct(right), -v.dotProduct(up), v.dotProduct(eye));
  }
}
