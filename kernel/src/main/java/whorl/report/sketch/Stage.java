package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/**
 * Where things of the world stand in the drawing.
 *
 * @param view the direction of view
 * @param zoom units of the drawing per metre
 * @param origin the origin of the world, seen: to the right, downwards, depth
 */
record Stage(View view, double zoom, Vector3D origin) {
  /** A stage on which points fill a box, with its upper left corner at the origin. */
  static Stage fitting(View view, List<Vector3D> points, double width, double height) {
    Extent seen = Extent.of(points.stream().map(view::seen).toList());
    Vector3D size = seen.most().subtract(seen.least());
    double zoom = Math.min(width / positive(size.getX()), height / positive(size.getY()));
    if (size.getX() == 0 && size.getY() == 0) {
      zoom = 1;
    }
    return new Stage(view, zoom, seen.least().scalarMultiply(-zoom));
  }

  private static double positive(double size) {
    return size > 0 ? size : Double.MIN_NORMAL;
  }

  /** A point of the world, seen: to the right, downwards, and depth towards the onlooker. */
  Vector3D seen(Vector3D v) {
    return view.seen(v).scalarMultiply(zoom).add(origin);
  }

  /** A direction of the world as it lies in the drawing. */
  Vector2D direction(Vector3D v) {
    Vector3D seen = view.seen(v);
    return new Vector2D(seen.getX(), seen.getY());
  }

  static Vector2D flat(Vector3D seen) {
    return new Vector2D(seen.getX(), seen.getY());
  }
}
