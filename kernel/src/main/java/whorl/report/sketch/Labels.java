package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/**
 * Places for labels: near what they name, off each other, off lines where that can be had. Labels
 * are placed in the order given, each at the best of some dozen places.
 */
final class Labels {
  static final double HEIGHT = 17;

  private static final double[] DISTANCES = {9, 16, 26, 40, 58};
  private static final int DIRECTIONS = 16;

  /** A box of the drawing. */
  record Box(double left, double top, double right, double bottom) {
    boolean overlaps(Box other) {
      return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
    }

    /** With some air around. */
    Box grown() {
      return new Box(left - 3, top - 1, right + 3, bottom + 1);
    }

    /** How much of a line is within, roughly. */
    double covers(Vector2D from, Vector2D to) {
      int steps = 1 + (int) (from.distance(to) / 3);
      int within = 0;
      for (int i = 0; i <= steps; i++) {
        double share = (double) i / steps;
        double x = from.getX() + share * (to.getX() - from.getX());
        double y = from.getY() + share * (to.getY() - from.getY());
        if (x > left && x < right && y > top && y < bottom) {
          within++;
        }
      }
      return within * from.distance(to) / (steps + 1);
    }

    Vector2D nearest(Vector2D to) {
      return new Vector2D(
          Math.max(left, Math.min(right, to.getX())), Math.max(top, Math.min(bottom, to.getY())));
    }
  }

  private final List<Box> taken = new ArrayList<>();
  private final List<Stroke> lines = new ArrayList<>();

  /** Keeps labels off these lines. */
  void avoid(List<Stroke> strokes) {
    lines.addAll(strokes);
  }

  /** Keeps labels off a box. */
  void avoid(Box box) {
    taken.add(box);
  }

  /**
   * The best box of a width for the label of something at a place.
   *
   * @param away where the label had better be, seen from the place; may be zero
   */
  Box place(Vector2D at, Vector2D away, double width) {
    Box best = box(at, 0, DISTANCES[0], width);
    double least = Double.POSITIVE_INFINITY;
    double favoured = Math.atan2(away.getY(), away.getX());
    for (int ring = 0; ring < DISTANCES.length; ring++) {
      for (int k = 0; k < DIRECTIONS; k++) {
        double turn = 2 * Math.PI * k / DIRECTIONS;
        Box box = box(at, favoured + turn, DISTANCES[ring], width);
        double aside = away.getNormSq() == 0 ? 0 : 1 - Math.cos(turn);
        double cost = 5 * ring + 4 * aside + cost(box);
        if (cost < least) {
          least = cost;
          best = box;
        }
      }
    }
    taken.add(best);
    return best;
  }

  /** The box with least in it; it is taken then. */
  Box emptiest(List<Box> boxes) {
    Box best = boxes.get(0);
    for (Box box : boxes) {
      if (cost(box) < cost(best)) {
        best = box;
      }
    }
    taken.add(best);
    return best;
  }

  private static Box box(Vector2D at, double angle, double distance, double width) {
    double x = at.getX() + distance * Math.cos(angle);
    double y = at.getY() + distance * Math.sin(angle);
    // The side of the box that faces the place touches the circle there.
    double left = x - width / 2 * (1 - Math.cos(angle));
    double top = y - HEIGHT / 2 * (1 - Math.sin(angle));
    return new Box(left, top, left + width, top + HEIGHT);
  }

  private double cost(Box box) {
    double cost = 0;
    for (Box other : taken) {
      if (box.grown().overlaps(other)) {
        cost += 400;
      }
    }
    for (Stroke line : lines) {
      for (int i = 1; i < line.points().size(); i++) {
        double covered = box.grown().covers(line.points().get(i - 1), line.points().get(i));
        cost += covered * (line.hidden() ? 0.4 : 1.2);
      }
    }
    return cost;
  }
}
