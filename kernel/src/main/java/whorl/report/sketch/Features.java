package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.body.Facets;

/**
 * The lines that show a faceted surface: its sharp edges, and the contours where its smooth parts
 * turn away from the onlooker. Contours follow normals averaged over a smooth part, so that they do
 * not zigzag along facets.
 */
final class Features {
  /** Facets at a smaller angle belong to one smooth part. */
  private static final double SMOOTH = Math.cos(Math.toRadians(15));

  /** Contours are looked for where a normal is within some 17° of the plane of the drawing. */
  private static final double NEARLY_ASIDE = 0.3;

  /** More sharp edges than this are no drawing any more; contours alone are drawn then. */
  private static final int MOST_SHARP = 12_000;

  private static final Vector3D EYE = Vector3D.PLUS_K;

  private final Facets facets;
  private final Vector3D[] normals;

  /** Where the corners at a vertex begin in {@link #around}. */
  private final int[] begin;

  /** Corners, three times the triangle plus which, by vertex. */
  private final int[] around;

  private final List<Edge> edges = new ArrayList<>();

  private Features(Facets facets) {
    this.facets = facets;
    int triangles = facets.triangles();
    normals = new Vector3D[triangles];
    begin = new int[facets.vertices() + 1];
    for (int t = 0; t < triangles; t++) {
      Vector3D a = at(t, 0);
      normals[t] = at(t, 1).subtract(a).crossProduct(at(t, 2).subtract(a));
      for (int corner = 0; corner < 3; corner++) {
        begin[facets.corner(t, corner) + 1]++;
      }
    }
    for (int v = 0; v < facets.vertices(); v++) {
      begin[v + 1] += begin[v];
    }
    around = new int[3 * triangles];
    int[] next = begin.clone();
    for (int t = 0; t < triangles; t++) {
      for (int corner = 0; corner < 3; corner++) {
        around[next[facets.corner(t, corner)]++] = 3 * t + corner;
      }
    }
  }

  private Vector3D at(int triangle, int corner) {
    return facets.vertex(facets.corner(triangle, corner));
  }

  /** The lines of a surface that is given as seen. */
  static List<Edge> of(Facets seen) {
    Features features = new Features(seen);
    for (int t = 0; t < seen.triangles(); t++) {
      features.sharpEdges(t);
    }
    if (features.edges.size() > MOST_SHARP) {
      features.edges.removeIf(edge -> !edge.contour());
    }
    for (int t = 0; t < seen.triangles(); t++) {
      features.contour(t);
    }
    return features.edges;
  }

  private void sharpEdges(int t) {
    for (int corner = 0; corner < 3; corner++) {
      int from = facets.corner(t, corner);
      int to = facets.corner(t, (corner + 1) % 3);
      int other = neighbour(t, from, to);
      // Each edge once: from the triangle of lower number, or the only one.
      if (other < 0 || (other > t && !smooth(t, other))) {
        boolean turns = other >= 0 && facing(t) != facing(other);
        edges.add(new Edge(facets.vertex(from), facets.vertex(to), Vector3D.ZERO, turns));
      }
    }
  }

  private boolean facing(int t) {
    return normals[t].getZ() > 0;
  }

  private boolean smooth(int t, int other) {
    double sizes = normals[t].getNorm() * normals[other].getNorm();
    return sizes == 0 || normals[t].dotProduct(normals[other]) >= SMOOTH * sizes;
  }

  /** The triangle on the other side of an edge; negative where there is none. */
  private int neighbour(int t, int from, int to) {
    for (int i = begin[from]; i < begin[from + 1]; i++) {
      int other = around[i] / 3;
      if (other != t) {
        for (int corner = 0; corner < 3; corner++) {
          if (facets.corner(other, corner) == to) {
            return other;
          }
        }
      }
    }
    return -1;
  }

  private void contour(int t) {
    double size = normals[t].getNorm();
    if (size == 0 || Math.abs(normals[t].getZ()) > NEARLY_ASIDE * size) {
      return;
    }
    List<Vector3D> ends = new ArrayList<>();
    Vector3D outward = Vector3D.ZERO;
    for (int corner = 0; corner < 3; corner++) {
      int next = (corner + 1) % 3;
      if (isPole(t, corner)) {
        ends.add(at(t, corner));
      } else if (!isPole(t, next)) {
        Vector3D here = normal(t, corner);
        Vector3D there = normal(t, next);
        double g = here.dotProduct(EYE);
        double h = there.dotProduct(EYE);
        if (g > 0 != h > 0) {
          double share = g / (g - h);
          ends.add(new Vector3D(1 - share, at(t, corner), share, at(t, next)));
          outward = outward.add(new Vector3D(1 - share, here, share, there));
        }
      }
    }
    if (ends.size() == 2 && outward.getNormSq() > 0) {
      edges.add(new Edge(ends.get(0), ends.get(1), outward.normalize(), true));
    }
  }

  /**
   * Whether a smooth part comes to a point at a corner, as a cone does at its apex: then no normal
   * can be told there, and a contour runs into the point.
   */
  private boolean isPole(int t, int corner) {
    int vertex = facets.corner(t, corner);
    boolean all = true;
    for (int i = begin[vertex]; i < begin[vertex + 1]; i++) {
      all &= smooth(t, around[i] / 3);
    }
    if (all) {
      return false;
    }
    // Round the vertex from triangle to triangle, as far as they are smooth with their neighbours.
    int[] legs = {facets.corner(t, (corner + 1) % 3), facets.corner(t, (corner + 2) % 3)};
    for (int leg : legs) {
      int last = t;
      int edge = leg;
      for (int i = begin[vertex]; i < begin[vertex + 1]; i++) {
        int next = neighbour(last, vertex, edge);
        if (next < 0 || next == t || !smooth(last, next)) {
          break;
        }
        if (!smooth(t, next)) {
          return true;
        }
        edge = third(next, vertex, edge);
        last = next;
      }
    }
    return false;
  }

  private int third(int t, int first, int second) {
    for (int corner = 0; corner < 3; corner++) {
      int vertex = facets.corner(t, corner);
      if (vertex != first && vertex != second) {
        return vertex;
      }
    }
    return second;
  }

  /** The normal at a corner, averaged over the smooth part that its triangle belongs to. */
  private Vector3D normal(int t, int corner) {
    int vertex = facets.corner(t, corner);
    Vector3D sum = Vector3D.ZERO;
    for (int i = begin[vertex]; i < begin[vertex + 1]; i++) {
      int other = around[i] / 3;
      if (smooth(t, other)) {
        sum = sum.add(normals[other]);
      }
    }
    double size = sum.getNorm();
    return size == 0 ? sum : sum.scalarMultiply(1 / size);
  }
}
