package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.body.Facets;

/** The lines in which surfaces pass through each other, such as where a shaft leaves a disc. */
final class Crossings {
  /** More pairs of triangles than this are not looked through: the drawing does without. */
  private static final long MOST_PAIRS = 40_000_000;

  private Crossings() {}

  /** The crossings of two surfaces that are given as seen. */
  static List<Edge> of(Facets first, Facets second) {
    List<Edge> edges = new ArrayList<>();
    if ((long) first.triangles() * second.triangles() > MOST_PAIRS) {
      return edges;
    }
    Triangle[] others = triangles(second);
    for (Triangle triangle : triangles(first)) {
      for (Triangle other : others) {
        if (triangle.near(other)) {
          cross(triangle, other, edges);
        }
      }
    }
    return edges;
  }

  private static Triangle[] triangles(Facets facets) {
    Triangle[] triangles = new Triangle[facets.triangles()];
    for (int t = 0; t < triangles.length; t++) {
      triangles[t] =
          Triangle.of(
              facets.vertex(facets.corner(t, 0)),
              facets.vertex(facets.corner(t, 1)),
              facets.vertex(facets.corner(t, 2)));
    }
    return triangles;
  }

  private record Triangle(
      Vector3D a, Vector3D b, Vector3D c, Vector3D normal, Vector3D least, Vector3D most) {
    static Triangle of(Vector3D a, Vector3D b, Vector3D c) {
      return new Triangle(
          a,
          b,
          c,
          b.subtract(a).crossProduct(c.subtract(a)),
          new Vector3D(
              Math.min(a.getX(), Math.min(b.getX(), c.getX())),
              Math.min(a.getY(), Math.min(b.getY(), c.getY())),
              Math.min(a.getZ(), Math.min(b.getZ(), c.getZ()))),
          new Vector3D(
              Math.max(a.getX(), Math.max(b.getX(), c.getX())),
              Math.max(a.getY(), Math.max(b.getY(), c.getY())),
              Math.max(a.getZ(), Math.max(b.getZ(), c.getZ()))));
    }

    boolean near(Triangle other) {
      return least.getX() <= other.most.getX()
          && other.least.getX() <= most.getX()
          && least.getY() <= other.most.getY()
          && other.least.getY() <= most.getY()
          && least.getZ() <= other.most.getZ()
          && other.least.getZ() <= most.getZ();
    }

    double height(Vector3D p) {
      return normal.dotProduct(p.subtract(a));
    }

    /**
     * Where the plane of another triangle cuts this one: two places along a line; none beside it.
     */
    double[] stretch(Triangle plane, Vector3D base, Vector3D along) {
      double[] ends = new double[2];
      int found = 0;
      Vector3D[] corners = {a, b, c};
      for (int i = 0; i < 3 && found < 2; i++) {
        Vector3D p = corners[i];
        Vector3D q = corners[(i + 1) % 3];
        double hp = plane.height(p);
        double hq = plane.height(q);
        if (hp > 0 != hq > 0) {
          Vector3D at = p.add(hp / (hp - hq), q.subtract(p));
          ends[found++] = at.subtract(base).dotProduct(along);
        }
      }
      return found == 2 ? ends : new double[0];
    }
  }

  private static void cross(Triangle first, Triangle second, List<Edge> edges) {
    Vector3D along = first.normal.crossProduct(second.normal);
    double size = along.getNorm();
    if (size <= 1e-6 * first.normal.getNorm() * second.normal.getNorm()) {
      return;
    }
    Vector3D unit = along.scalarMultiply(1 / size);
    double[] one = first.stretch(second, first.a, unit);
    double[] two = second.stretch(first, first.a, unit);
    if (one.length == 0 || two.length == 0) {
      return;
    }
    double from = Math.max(Math.min(one[0], one[1]), Math.min(two[0], two[1]));
    double to = Math.min(Math.max(one[0], one[1]), Math.max(two[0], two[1]));
    if (to > from) {
      Vector3D base = onBoth(first, second);
      double shift = base.subtract(first.a).dotProduct(unit);
      edges.add(
          new Edge(base.add(from - shift, unit), base.add(to - shift, unit), Vector3D.ZERO, false));
    }
  }

  /** A point in the planes of both triangles. */
  private static Vector3D onBoth(Triangle first, Triangle second) {
    double h = first.normal.dotProduct(first.a);
    double k = second.normal.dotProduct(second.a);
    Vector3D cross = first.normal.crossProduct(second.normal);
    return second
        .normal
        .crossProduct(cross)
        .scalarMultiply(h)
        .add(cross.crossProduct(first.normal).scalarMultiply(k))
        .scalarMultiply(1 / cross.getNormSq());
  }
}
