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
