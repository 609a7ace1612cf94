package whorl.mechanics.body.mesh;

import java.util.Arrays;
import whorl.mechanics.Refusal;

/**
 * The check that a surface is closed and consistently oriented: every edge belongs to two
 * triangles, which run along it in opposite senses. Edges are sorted into buckets by their lower
 * vertex, so that time and memory grow with the number of triangles only.
 */
final class Edges {
  private final Surface surface;

  /** Where the edges of a lower vertex begin in {@link #upper}. */
  private final int[] begin;

  /** Twice the upper vertex, plus one where the triangle runs down to the lower vertex. */
  private final int[] upper;

  private int open;
  private int twisted;
  private int crowded;
  private int lower;
  private int higher;

  private Edges(Surface surface) {
    this.surface = surface;
    int[] corners = surface.corners();
    begin = new int[surface.vertices() + 1];
    for (int t = 0; t < corners.length; t += 3) {
      begin[Math.min(corners[t], corners[t + 1]) + 1]++;
      begin[Math.min(corners[t + 1], corners[t + 2]) + 1]++;
      begin[Math.min(corners[t + 2], corners[t]) + 1]++;
    }
    for (int v = 0; v < surface.vertices(); v++) {
      begin[v + 1] += begin[v];
    }
    upper = new int[corners.length];
    int[] next = Arrays.copyOf(begin, surface.vertices());
    for (int t = 0; t < corners.length; t += 3) {
      put(next, corners[t], corners[t + 1]);
      put(next, corners[t + 1], corners[t + 2]);
      put(next, corners[t + 2], corners[t]);
    }
  }

  private void put(int[] next, int from, int to) {
    if (from < to) {
      upper[next[from]++] = 2 * to;
    } else {
      upper[next[to]++] = 2 * from + 1;
    }
  }

  /**
   * Refuses a surface that is not closed or not consistently oriented.
   *
   * @throws Refusal that counts the edges at fault and names one
   */
  static void demandClosed(Surface surface) {
    Edges edges = new Edges(surface);
    for (int v = 0; v < surface.vertices(); v++) {
      edges.judge(v);
    }
    edges.report();
  }

  private void judge(int vertex) {
    int from = begin[vertex];
    int to = begin[vertex + 1];
    Arrays.sort(upper, from, to);
    for (int i = from; i < to; ) {
      int end = upper[i] >> 1;
      int down = 0;
      int first = i;
      for (; i < to && upper[i] >> 1 == end; i++) {
        down += upper[i] & 1;
      }
      int count = i - first;
      if (count != 2 || down != 1) {
        fault(vertex, end, count);
      }
    }
  }

  private void fault(int vertex, int end, int count) {
    if (open + twisted + crowded == 0) {
      lower = vertex;
      higher = end;
    }
    if (count == 1) {
      open++;
    } else if (count == 2) {
      twisted++;
    } else {
      crowded++;
    }
  }

  private void report() {
    String first = " One runs from " + text(lower) + " to " + text(higher) + " of the file.";
    if (open > 0) {
      throw new Refusal(
          "mesh",
          "The mesh is open, so it encloses no volume: "
              + count(open)
              + (open == 1 ? " belongs" : " belong")
              + " to one triangle only."
              + first,
          "Close the surface where it was made. If it looks closed there, corners that should be"
              + " one point differ in their last digits: merge them, or write more digits.");
    }
    if (twisted > 0) {
      throw new Refusal(
          "mesh",
          "The mesh is not consistently oriented: along "
              + count(twisted)
              + " the two triangles face opposite sides."
              + first,
          "Orient all triangles outwards where the surface was made.");
    }
    if (crowded > 0) {
      throw new Refusal(
          "mesh",
          "More than two triangles meet at "
              + count(crowded)
              + ", so the mesh touches itself or holds triangles twice."
              + first,
          "Remove what stands twice, or make a body of each part.");
    }
  }

  private static String count(int edges) {
    return edges == 1 ? "1 edge" : edges + " edges";
  }

  private String text(int vertex) {
    double[] at = surface.coordinates();
    return "(" + at[3 * vertex] + ", " + at[3 * vertex + 1] + ", " + at[3 * vertex + 2] + ")";
  }
}
