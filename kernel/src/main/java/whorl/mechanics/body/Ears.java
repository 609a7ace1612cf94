package whorl.mechanics.body;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** A simple polygon cut into triangles by taking off one corner (an ear) after the other. */
final class Ears {
  private Ears() {}

  /** The corners of the triangles, each anticlockwise, of an anticlockwise polygon. */
  static int[] triangles(List<Vector2D> polygon) {
    List<Integer> left = new ArrayList<>();
    for (int i = 0; i < polygon.size(); i++) {
      left.add(i);
    }
    int[] corners = new int[3 * (polygon.size() - 2)];
    int size = 0;
    while (left.size() >= 3) {
      int ear = ear(polygon, left);
      int n = left.size();
      corners[size++] = left.get((ear + n - 1) % n);
      corners[size++] = left.get(ear);
      corners[size++] = left.get((ear + 1) % n);
      left.remove(ear);
    }
    return corners;
  }

  private static int ear(List<Vector2D> polygon, List<Integer> left) {
    int n = left.size();
    for (int i = 0; i < n; i++) {
      Vector2D a = polygon.get(left.get((i + n - 1) % n));
      Vector2D b = polygon.get(left.get(i));
      Vector2D c = polygon.get(left.get((i + 1) % n));
      if (area(a, b, c) > 0 && noneInside(polygon, left, a, b, c)) {
        return i;
      }
    }
    // Only corners on one straight line are left; which of them goes first makes no difference.
    return 0;
  }

  private static boolean noneInside(
      List<Vector2D> polygon, List<Integer> left, Vector2D a, Vector2D b, Vector2D c) {
    for (int index : left) {
      Vector2D p = polygon.get(index);
      boolean corner = p.equals(a) || p.equals(b) || p.equals(c);
      if (!corner && area(a, b, p) >= 0 && area(b, c, p) >= 0 && area(c, a, p) >= 0) {
        return false;
      }
    }
    return true;
  }

  private static double area(Vector2D a, Vector2D b, Vector2D c) {
    return (b.getX() - a.getX()) * (c.getY() - a.getY())
        - (b.getY() - a.getY()) * (c.getX() - a.getX());
  }
}
