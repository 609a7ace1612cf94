package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** The axes of the world, small in a corner of the drawing. */
final class Triad {
  private static final double SIDE = 62;
  private static final double LENGTH = 27;

  private Triad() {}

  /** The corners of what is drawn, and just beside it. */
  static List<Labels.Box> corners(double left, double top, double right, double bottom) {
    return List.of(
        box(left, bottom - SIDE),
        box(right - SIDE, bottom - SIDE),
        box(left, top),
        box(right - SIDE, top),
        box(left - SIDE, bottom - SIDE));
  }

  private static Labels.Box box(double left, double top) {
    return new Labels.Box(left, top, left + SIDE, top + SIDE);
  }

  static void write(Svg svg, Stage stage, Labels.Box box) {
    String ink = "stroke=\"currentColor\" stroke-width=\"1\" opacity=\"0.7\"";
    Vector2D origin = new Vector2D(box.left() + 0.42 * SIDE, box.bottom() - 0.38 * SIDE);
    List<Vector3D> axes = List.of(Vector3D.PLUS_I, Vector3D.PLUS_J, Vector3D.PLUS_K);
    List<String> names = List.of("x", "y", "z");
    for (int i = 0; i < 3; i++) {
      Vector2D seen = stage.direction(axes.get(i)).scalarMultiply(LENGTH);
      Vector2D tip = origin.add(seen);
      svg.line(List.of(origin, tip), ink);
      svg.line(Heads.open(tip, seen.normalize(), 5), ink);
      Vector2D beyond = tip.add(8, seen.normalize());
      svg.label(
          new Vector2D(beyond.getX() - 3, beyond.getY() + 4),
          new Label(names.get(i), "", "", false),
          "currentColor");
    }
  }
}
