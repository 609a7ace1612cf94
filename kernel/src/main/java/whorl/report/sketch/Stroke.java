package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/**
 * A line of the drawing.
 *
 * @param points at least two
 * @param hidden whether something stands before it
 * @param contour whether it is drawn heavier
 */
record Stroke(List<Vector2D> points, boolean hidden, boolean contour) {
  /** Copies the points. */
  Stroke {
    points = List.copyOf(points);
  }
}
