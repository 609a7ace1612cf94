package whorl.mechanics.body.mesh;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.InertiaTensor;

/**
 * Volume, centre and inertia of what a closed surface encloses: the exact sums over the signed
 * tetrahedra that its triangles make with a reference point (divergence theorem).
 *
 * @param volume in cubes of the unit of the coordinates; negative inside out
 * @param centre of the volume, in the coordinates of the surface
 * @param perMass inertia tensor about the centre divided by the mass, in squares of the unit
 */
record Moments(double volume, Vector3D centre, InertiaTensor perMass) {
  /** Sums of so many triangles are added plainly; sums of blocks with compensation. */
  private static final int BLOCK = 256;

  /** Less than this share of the cube of the size is rounding. */
  private static final double NOTHING = 1e-13;

  /**
   * The moments, about the middle of the surface as reference point. A surface far from the origin
   * of its coordinates loses nothing: differences of coordinates come first.
   *
   * @throws Refusal where nothing is enclosed
   */
  static Moments of(Surface surface) {
    Bounds bounds = surface.bounds();
    double x0 = bounds.middleX();
    double y0 = bounds.middleY();
    double z0 = bounds.middleZ();
    CompensatedSums sums = new CompensatedSums(10);
    double[] block = new double[10];
    int triangles = surface.triangles();
    for (int from = 0; from < triangles; from += BLOCK) {
      addBlock(surface, from, Math.min(triangles, from + BLOCK), x0, y0, z0, block);
      sums.add(block);
    }
    double volume = sums.value(0) / 6;
    double size = bounds.size();
    if (!(Math.abs(volume) > NOTHING * size * size * size)) {
      throw new Refusal(
          "mesh",
          "The mesh encloses no volume: its triangles lie on each other.",
          "For a plate without thickness give the outline and the mass.");
    }
    double x = sums.value(1) / 24 / volume;
    double y = sums.value(2) / 24 / volume;
    double z = sums.value(3) / 24 / volume;
    double scale = 1 / (120 * volume);
    double xx = sums.value(4) * scale - x * x;
    double yy = sums.value(5) * scale - y * y;
    double zz = sums.value(6) * scale - z * z;
    return new Moments(
        volume,
        new Vector3D(x0 + x, y0 + y, z0 + z),
        InertiaTensor.fromProducts(
            yy + zz,
            zz + xx,
            xx + yy,
            sums.value(7) * scale - x * y,
            sums.value(8) * scale - y * z,
            sums.value(9) * scale - z * x));
  }

  private static void addBlock(
      Surface surface, int from, int to, double x0, double y0, double z0, double[] sums) {
    double[] at = surface.coordinates();
    int[] corners = surface.corners();
    double v = 0;
    double x = 0;
    double y = 0;
    double z = 0;
    double xx = 0;
    double yy = 0;
    double zz = 0;
    double xy = 0;
    double yz = 0;
    double zx = 0;
    for (int t = 3 * from; t < 3 * to; t += 3) {
      int a = 3 * corners[t];
      int b = 3 * corners[t + 1];
      int c = 3 * corners[t + 2];
      double ax = at[a] - x0;
      double ay = at[a + 1] - y0;
      double az = at[a + 2] - z0;
      double bx = at[b] - x0;
      double by = at[b + 1] - y0;
      double bz = at[b + 2] - z0;
      double cx = at[c] - x0;
      double cy = at[c + 1] - y0;
      double cz = at[c + 2] - z0;
      // Six times the volume of the tetrahedron with the reference point.
      double six = ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx);
      double sx = ax + bx + cx;
      double sy = ay + by + cy;
      double sz = az + bz + cz;
      v += six;
      x += six * sx;
      y += six * sy;
      z += six * sz;
      xx += six * (sx * sx + ax * ax + bx * bx + cx * cx);
      yy += six * (sy * sy + ay * ay + by * by + cy * cy);
      zz += six * (sz * sz + az * az + bz * bz + cz * cz);
      xy += six * (sx * sy + ax * ay + bx * by + cx * cy);
      yz += six * (sy * sz + ay * az + by * bz + cy * cz);
      zx += six * (sz * sx + az * ax + bz * bx + cz * cx);
    }
    sums[0] = v;
    sums[1] = x;
    sums[2] = y;
    sums[3] = z;
    sums[4] = xx;
    sums[5] = yy;
    sums[6] = zz;
    sums[7] = xy;
    sums[8] = yz;
    sums[9] = zx;
  }
}
