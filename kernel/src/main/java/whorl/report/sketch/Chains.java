package whorl.report.sketch;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** Joins short strokes that continue each other, so that dashes run on and corners are mitred. */
final class Chains {
  /** Ends closer than this are one. */
  private static final double GRAIN = 0.04;

  /** A line goes on where it turns by less than this. */
  private static final double STRAIGHT_ON = Math.cos(Math.toRadians(40));

  private record Place(long x, long y) {
    static Place of(Vector2D at) {
      return new Place(Math.round(at.getX() / GRAIN), Math.round(at.getY() / GRAIN));
    }
  }

  private final List<Stroke> strokes;
  private final boolean[] used;
  private final Map<Place, List<Integer>> ends = new HashMap<>();

  private Chains(List<Stroke> strokes) {
    this.strokes = strokes;
    used = new boolean[strokes.size()];
    for (int i = 0; i < strokes.size(); i++) {
      List<Vector2D> points = strokes.get(i).points();
      ends.computeIfAbsent(Place.of(points.get(0)), at -> new ArrayList<>()).add(i);
      ends.computeIfAbsent(Place.of(points.get(points.size() - 1)), at -> new ArrayList<>()).add(i);
    }
  }

  /** Strokes of two points each, joined; in the order in which their first pieces came. */
  static List<Stroke> joined(List<Stroke> strokes) {
    Chains chains = new Chains(strokes);
    List<Stroke> joined = new ArrayList<>();
    for (int i = 0; i < strokes.size(); i++) {
      if (!chains.used[i]) {
        joined.add(chains.from(i));
      }
    }
    return joined;
  }

  private Stroke from(int first) {
    used[first] = true;
    Stroke stroke = strokes.get(first);
    Deque<Vector2D> line = new ArrayDeque<>(stroke.points());
    Vector2D before = stroke.points().get(0);
    Vector2D last = stroke.points().get(1);
    for (Vector2D next = next(stroke, before, last);
        !next.isNaN();
        next = next(stroke, before, last)) {
      line.addLast(next);
      before = last;
      last = next;
    }
    before = stroke.points().get(1);
    last = stroke.points().get(0);
    for (Vector2D next = next(stroke, before, last);
        !next.isNaN();
        next = next(stroke, before, last)) {
      line.addFirst(next);
      before = last;
      last = next;
    }
    return new Stroke(simplified(List.copyOf(line)), stroke.hidden(), stroke.contour());
  }

  /** Where the stroke goes on that ends at a place; not a number where it does not. */
  private Vector2D next(Stroke like, Vector2D before, Vector2D at) {
    Vector2D came = at.subtract(before);
    Vector2D best = Vector2D.NaN;
    int index = -1;
    double most = STRAIGHT_ON;
    for (int i : ends.getOrDefault(Place.of(at), List.of())) {
      Stroke other = strokes.get(i);
      if (used[i] || other.hidden() != like.hidden() || other.contour() != like.contour()) {
        continue;
      }
      boolean forth = Place.of(other.points().get(0)).equals(Place.of(at));
      Vector2D far = other.points().get(forth ? 1 : 0);
      Vector2D goes = far.subtract(at);
      double sizes = came.getNorm() * goes.getNorm();
      double cosine = sizes == 0 ? 1 : came.dotProduct(goes) / sizes;
      if (cosine > most) {
        most = cosine;
        best = far;
        index = i;
      }
    }
    if (index >= 0) {
      used[index] = true;
    }
    return best;
  }

  /** Leaves out points between which a line runs straight. */
  private static List<Vector2D> simplified(List<Vector2D> line) {
    List<Vector2D> kept = new ArrayList<>();
    for (int i = 0; i < line.size(); i++) {
      boolean end = i == 0 || i == line.size() - 1;
      if (end || bends(kept.get(kept.size() - 1), line.get(i), line.get(i + 1))) {
        kept.add(line.get(i));
      }
    }
    return kept;
  }

  private static boolean bends(Vector2D a, Vector2D b, Vector2D c) {
    Vector2D base = c.subtract(a);
    Vector2D arm = b.subtract(a);
    double area = Math.abs(base.getX() * arm.getY() - base.getY() * arm.getX());
    return area > 0.08 * base.getNorm();
  }
}
