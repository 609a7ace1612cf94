package whorl.report.sketch;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** The heads of arrows. */
final class Heads {
  private static final double SLENDER = 0.36;

  private Heads() {}

  /** A triangle to be filled, with its point at the tip. */
  static List<Vector2D> filled(Vector2D tip, Vector2D along, double length) {
    Vector2D across = new Vector2D(-along.getY(), along.getX()).scalarMultiply(SLENDER * length);
    Vector2D back = tip.subtract(length, along);
    return List.of(
        tip, back.add(across), tip.subtract(0.78 * length, along), back.subtract(across));
  }

  /** Two strokes from the tip. */
  static List<Vector2D> open(Vector2D tip, Vector2D along, double length) {
    Vector2D across = new Vector2D(-along.getY(), along.getX()).scalarMultiply(SLENDER * length);
    Vector2D back = tip.subtract(length, along);
    return List.of(back.add(across), tip, back.subtract(across));
  }
}
