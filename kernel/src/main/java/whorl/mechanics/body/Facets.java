package whorl.mechanics.body;

import java.util.Arrays;
import java.util.List;
import java.util.function.UnaryOperator;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/**
 * A surface of triangles, whose corners run anticlockwise as seen from outside. Curved surfaces are
 * faceted finely enough for a drawing; mass properties are never taken from them.
 */
public final class Facets {
  private static final int ROUND = 72;

  private static final double RAY_X = 0.3782931;
  private static final double RAY_Y = 0.5217443;
  private static final double RAY_Z = 0.7646547;

  private final double[] coordinates;
  private final int[] corners;

  /**
   * Takes over its arguments, which are not to be changed afterwards.
   *
   * @param coordinates x, y and z of each vertex, in m
   * @param corners three vertices of each triangle
   */
  public Facets(double[] coordinates, int[] corners) {
    this.coordinates = coordinates;
    this.corners = corners;
  }

  /** The number of vertices. */
  public int vertices() {
    return coordinates.length / 3;
  }

  /** A vertex. */
  public Vector3D vertex(int index) {
    return new Vector3D(
        coordinates[3 * index], coordinates[3 * index + 1], coordinates[3 * index + 2]);
  }

  /** The number of triangles. */
  public int triangles() {
    return corners.length / 3;
  }

  /** The vertex at a corner of a triangle. */
  public int corner(int triangle, int corner) {
    return corners[3 * triangle + corner];
  }

  /**
   * Whether this closed surface goes round a point: a ray from it leaves the surface once more
   * often than it enters. The ray has a direction in which no edge of a shape is likely to run.
   */
  boolean surrounds(Vector3D point) {
    int leaving = 0;
    for (int t = 0; t < corners.length; t += 3) {
      leaving += crossing(3 * corners[t], 3 * corners[t + 1], 3 * corners[t + 2], point);
    }
    return leaving > 0;
  }

  /** One where the ray leaves through a triangle, minus one where it enters, else zero. */
  private int crossing(int a, int b, int c, Vector3D point) {
    double x = coordinates[a] - point.getX();
    double y = coordinates[a + 1] - point.getY();
    double z = coordinates[a + 2] - point.getZ();
    double bx = coordinates[b] - coordinates[a];
    double by = coordinates[b + 1] - coordinates[a + 1];
    double bz = coordinates[b + 2] - coordinates[a + 2];
    double cx = coordinates[c] - coordinates[a];
    double cy = coordinates[c + 1] - coordinates[a + 1];
    double cz = coordinates[c + 2] - coordinates[a + 2];
    double nx = by * cz - bz * cy;
    double ny = bz * cx - bx * cz;
    double nz = bx * cy - by * cx;
    double through = nx * RAY_X + ny * RAY_Y + nz * RAY_Z;
    if (through == 0 || (nx * x + ny * y + nz * z) / through <= 0) {
      return 0;
    }
    // Shares of the two sides at which the line of the ray meets the plane of the triangle.
    double qx = y * RAY_Z - z * RAY_Y;
    double qy = z * RAY_X - x * RAY_Z;
    double qz = x * RAY_Y - y * RAY_X;
    double u = (cx * qx + cy * qy + cz * qz) / through;
    double v = -(bx * qx + by * qy + bz * qz) / through;
    return u >= 0 && v >= 0 && u + v < 1 ? (through > 0 ? 1 : -1) : 0;
  }

  /**
   * The surface with each vertex moved inwards, by at least a distance from each of its triangles.
   */
  Facets inset(double distance) {
    Vector3D[] normals = new Vector3D[triangles()];
    Vector3D[] sums = new Vector3D[vertices()];
    Arrays.fill(sums, Vector3D.ZERO);
    for (int t = 0; t < normals.length; t++) {
      Vector3D a = vertex(corner(t, 0));
      Vector3D normal =
          vertex(corner(t, 1)).subtract(a).crossProduct(vertex(corner(t, 2)).subtract(a));
      double size = normal.getNorm();
      normals[t] = size == 0 ? Vector3D.ZERO : normal.scalarMultiply(1 / size);
      for (int k = 0; k < 3; k++) {
        sums[corner(t, k)] = sums[corner(t, k)].add(normals[t]);
      }
    }
    double[] least = new double[sums.length];
    Arrays.fill(least, Double.MAX_VALUE);
    for (int t = 0; t < normals.length; t++) {
      for (int k = 0; k < 3 && normals[t].getNormSq() > 0; k++) {
        int vertex = corner(t, k);
        least[vertex] = Math.min(least[vertex], normals[t].dotProduct(sums[vertex]));
      }
    }
    double[] moved = coordinates.clone();
    for (int v = 0; v < sums.length; v++) {
      // At a saddle no direction leads inwards from all triangles; the mean one is as good as any.
      double size = sums[v].getNorm();
      double scale = Math.max(least[v], 0.2 * size);
      if (size > 0) {
        put(moved, v, vertex(v).subtract(distance / scale, sums[v]));
      }
    }
    return new Facets(moved, corners);
  }

  /** The surface whose vertices are elsewhere. */
  Facets mapped(UnaryOperator<Vector3D> map, boolean mirroring) {
    double[] moved = new double[coordinates.length];
    for (int i = 0; i < vertices(); i++) {
      put(moved, i, map.apply(vertex(i)));
    }
    return new Facets(moved, mirroring ? reversed() : corners);
  }

  private int[] reversed() {
    int[] turned = corners.clone();
    for (int i = 0; i < turned.length; i += 3) {
      turned[i + 1] = corners[i + 2];
      turned[i + 2] = corners[i + 1];
    }
    return turned;
  }

  private static void put(double[] coordinates, int vertex, Vector3D at) {
    coordinates[3 * vertex] = at.getX();
    coordinates[3 * vertex + 1] = at.getY();
    coordinates[3 * vertex + 2] = at.getZ();
  }

  /**
   * The surface that a line in the half-plane of radius and z sweeps round the z axis.
   *
   * @param profile its corners; material is to the left of the line as one goes along it
   * @param closed whether the line returns to its first corner
   */
  static Facets revolved(List<Vector2D> profile, boolean closed) {
    int rings = profile.size();
    double[] coordinates = new double[3 * rings * ROUND];
    for (int ring = 0; ring < rings; ring++) {
      double radius = profile.get(ring).getX();
      for (int k = 0; k < ROUND; k++) {
        double angle = 2 * Math.PI * k / ROUND;
        put(
            coordinates,
            ring * ROUND + k,
            new Vector3D(
                radius * Math.cos(angle), radius * Math.sin(angle), profile.get(ring).getY()));
      }
    }
    Triangles triangles = new Triangles();
    // All that lies on the axis is one vertex, the first of its ring.
    for (int ring = 0; ring < (closed ? rings : rings - 1); ring++) {
      int next = (ring + 1) % rings;
      boolean fromAxis = profile.get(ring).getX() == 0;
      boolean toAxis = profile.get(next).getX() == 0;
      for (int k = 0; k < ROUND; k++) {
        int onward = (k + 1) % ROUND;
        int a = fromAxis ? ring * ROUND : ring * ROUND + k;
        int b = fromAxis ? ring * ROUND : ring * ROUND + onward;
        int c = toAxis ? next * ROUND : next * ROUND + onward;
        int d = toAxis ? next * ROUND : next * ROUND + k;
        if (!fromAxis) {
          triangles.add(a, b, c);
        }
        if (!toAxis) {
          triangles.add(a, c, d);
        }
      }
    }
    return new Facets(coordinates, triangles.corners());
  }

  /** The surface of a prism over an anticlockwise polygon, from one z to another. */
  static Facets prism(List<Vector2D> polygon, double from, double to) {
    int n = polygon.size();
    double[] coordinates = new double[6 * n];
    Triangles triangles = new Triangles();
    for (int i = 0; i < n; i++) {
      Vector2D corner = polygon.get(i);
      put(coordinates, i, new Vector3D(corner.getX(), corner.getY(), from));
      put(coordinates, n + i, new Vector3D(corner.getX(), corner.getY(), to));
      int next = (i + 1) % n;
      triangles.add(i, next, n + next);
      triangles.add(i, n + next, n + i);
    }
    int[] cap = Ears.triangles(polygon);
    for (int i = 0; i < cap.length; i += 3) {
      triangles.add(cap[i], cap[i + 2], cap[i + 1]);
      triangles.add(n + cap[i], n + cap[i + 1], n + cap[i + 2]);
    }
    return new Facets(coordinates, triangles.corners());
  }

  /** The flat surface of an anticlockwise polygon in the plane z = 0, seen from above. */
  static Facets flat(List<Vector2D> polygon) {
    double[] coordinates = new double[3 * polygon.size()];
    for (int i = 0; i < polygon.size(); i++) {
      put(coordinates, i, new Vector3D(polygon.get(i).getX(), polygon.get(i).getY(), 0));
    }
    return new Facets(coordinates, Ears.triangles(polygon));
  }

  /** A list of corners that grows. */
  private static final class Triangles {
    private int[] corners = new int[256];
    private int size;

    void add(int a, int b, int c) {
      if (size + 3 > corners.length) {
        corners = Arrays.copyOf(corners, 2 * corners.length);
      }
      corners[size++] = a;
      corners[size++] = b;
      corners[size++] = c;
    }

    int[] corners() {
      return Arrays.copyOf(corners, size);
    }
  }
}
