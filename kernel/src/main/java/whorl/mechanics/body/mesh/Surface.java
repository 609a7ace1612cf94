package whorl.mechanics.body.mesh;

/**
 * Triangles with common vertices, in the coordinates of their file. Arrays are shared, not copied.
 */
final class Surface {
  private final double[] coordinates;
  private final int vertices;
  private final int[] corners;

  /**
   * Takes over its arguments.
   *
   * @param coordinates x, y and z of each vertex, perhaps with room behind them
   * @param vertices number of vertices
   * @param corners three vertices of each triangle
   */
  Surface(double[] coordinates, int vertices, int[] corners) {
    this.coordinates = coordinates;
    this.vertices = vertices;
    this.corners = corners;
  }

  double[] coordinates() {
    return coordinates;
  }

  int vertices() {
    return vertices;
  }

  int[] corners() {
    return corners;
  }

  int triangles() {
    return corners.length / 3;
  }

  /** The box around the triangles. */
  Bounds bounds() {
    double leastX = Double.POSITIVE_INFINITY;
    double leastY = Double.POSITIVE_INFINITY;
    double leastZ = Double.POSITIVE_INFINITY;
    double mostX = Double.NEGATIVE_INFINITY;
    double mostY = Double.NEGATIVE_INFINITY;
    double mostZ = Double.NEGATIVE_INFINITY;
    for (int corner : corners) {
      double x = coordinates[3 * corner];
      double y = coordinates[3 * corner + 1];
      double z = coordinates[3 * corner + 2];
      leastX = Math.min(leastX, x);
      leastY = Math.min(leastY, y);
      leastZ = Math.min(leastZ, z);
      mostX = Math.max(mostX, x);
      mostY = Math.max(mostY, y);
      mostZ = Math.max(mostZ, z);
    }
    return new Bounds(leastX, leastY, leastZ, mostX, mostY, mostZ);
  }
}
