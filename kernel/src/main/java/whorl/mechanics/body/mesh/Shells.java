package whorl.mechanics.body.mesh;

import java.util.Arrays;

/** The connected parts of a surface, found by joining the corners of its triangles. */
final class Shells {
  private final Surface surface;

  /** For each vertex another of its shell, in the end the first one. */
  private final int[] parent;

  private Shells(Surface surface) {
    this.surface = surface;
    parent = new int[surface.vertices()];
    for (int v = 0; v < parent.length; v++) {
      parent[v] = v;
    }
    int[] corners = surface.corners();
    for (int t = 0; t < corners.length; t += 3) {
      join(corners[t], corners[t + 1]);
      join(corners[t], corners[t + 2]);
    }
  }

  private int root(int vertex) {
    int v = vertex;
    while (parent[v] != v) {
      parent[v] = parent[parent[v]];
      v = parent[v];
    }
    return v;
  }

  private void join(int a, int b) {
    int first = root(a);
    int second = root(b);
    if (first != second) {
      parent[Math.max(first, second)] = Math.min(first, second);
    }
  }

  /** One surface for each shell; they share the coordinates. */
  static Surface[] of(Surface surface) {
    return new Shells(surface).split();
  }

  private Surface[] split() {
    int[] corners = surface.corners();
    // A vertex that no triangle uses is no shell, so only roots of triangles are numbered, from
    // one.
    int[] number = new int[parent.length];
    int[] sizes = new int[4];
    int count = 0;
    for (int t = 0; t < corners.length; t += 3) {
      int root = root(corners[t]);
      if (number[root] == 0) {
        number[root] = ++count;
        if (count == sizes.length) {
          sizes = Arrays.copyOf(sizes, 2 * count);
        }
      }
      sizes[number[root]] += 3;
    }
    if (count == 1) {
      return new Surface[] {surface};
    }
    int[][] parts = new int[count][];
    for (int i = 0; i < count; i++) {
      parts[i] = new int[sizes[i + 1]];
    }
    int[] next = new int[count];
    for (int t = 0; t < corners.length; t += 3) {
      int shell = number[root(corners[t])] - 1;
      System.arraycopy(corners, t, parts[shell], next[shell], 3);
      next[shell] += 3;
    }
    Surface[] shells = new Surface[count];
    for (int i = 0; i < count; i++) {
      shells[i] = new Surface(surface.coordinates(), surface.vertices(), parts[i]);
    }
    return shells;
  }
}
