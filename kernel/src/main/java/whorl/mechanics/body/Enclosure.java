package whorl.mechanics.body;

import java.util.Arrays;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/** Whether one body lies within another, judged by their faceted surfaces. */
final class Enclosure {
  private static final int SAMPLES = 64;
  private static final double OFF_THE_EDGE = 0.02;

  private Enclosure() {}

  /**
   * Refuses to take out of a body what reaches outside it: that would count material that is not
   * there. Bodies without closed surfaces are not judged.
   */
  static void demandWithin(Outline body, Outline removed) {
    if (body.solids().isEmpty()) {
      return;
    }
    for (Outline.Solid solid : removed.solids()) {
      demandWithin(body, solid.skin());
    }
  }

  private static void demandWithin(Outline body, Facets skin) {
    double inward = inward(skin);
    int every = Math.max(1, skin.triangles() / SAMPLES);
    for (int t = 0; t < skin.triangles(); t += every) {
      Vector3D a = skin.vertex(skin.corner(t, 0));
      Vector3D b = skin.vertex(skin.corner(t, 1));
      Vector3D c = skin.vertex(skin.corner(t, 2));
      Vector3D normal = b.subtract(a).crossProduct(c.subtract(a));
      if (normal.getNormSq() == 0) {
        continue;
      }
      Vector3D middle = a.add(b).add(c).scalarMultiply(1 / 3.0);
      Vector3D step = normal.normalize().scalarMultiply(-inward);
      for (Vector3D corner : new Vector3D[] {a, b, c}) {
        Vector3D inside = corner.add(OFF_THE_EDGE, middle.subtract(corner)).add(step);
        if (body.solids().stream().noneMatch(solid -> contains(solid, inside))) {
          throw new Refusal(
              "removed body",
              "What is taken out reaches outside the body near "
                  + Given.text(corner, "m")
                  + ", where there is no material to take.",
              "Make it end where the body ends, or check where it is placed.");
        }
      }
    }
  }

  /**
   * How far the corners of a surface are moved inside before they are judged, since surfaces may
   * touch: further than the facets of a round surface cut off, less than a wall is thick.
   */
  private static double inward(Facets skin) {
    double[] least = {Double.MAX_VALUE, Double.MAX_VALUE, Double.MAX_VALUE};
    double[] most = {-Double.MAX_VALUE, -Double.MAX_VALUE, -Double.MAX_VALUE};
    for (int i = 0; i < skin.vertices(); i++) {
      double[] at = skin.vertex(i).toArray();
      for (int k = 0; k < 3; k++) {
        least[k] = Math.min(least[k], at[k]);
        most[k] = Math.max(most[k], at[k]);
      }
    }
    double[] extent = {most[0] - least[0], most[1] - least[1], most[2] - least[2]};
    Arrays.sort(extent);
    return Math.min(0.003 * extent[2], 0.3 * extent[0]);
  }

  /** Whether a point is in the material of a solid. */
  static boolean contains(Outline.Solid solid, Vector3D point) {
    return surrounds(solid.skin(), point)
        && solid.removed().stream().noneMatch(removed -> contains(removed, point));
  }

  /**
   * Whether a closed surface goes round a point: the solid angle under which it is seen from there
   * is that of the whole sphere. Unlike counting how often a ray meets the surface, this has no
   * rays that run along an edge.
   */
  private static boolean surrounds(Facets skin, Vector3D point) {
    double angle = 0;
    for (int t = 0; t < skin.triangles(); t++) {
      Vector3D a = skin.vertex(skin.corner(t, 0)).subtract(point);
      Vector3D b = skin.vertex(skin.corner(t, 1)).subtract(point);
      Vector3D c = skin.vertex(skin.corner(t, 2)).subtract(point);
      double la = a.getNorm();
      double lb = b.getNorm();
      double lc = c.getNorm();
      double triple = a.dotProduct(b.crossProduct(c));
      double below =
          la * lb * lc + a.dotProduct(b) * lc + b.dotProduct(c) * la + c.dotProduct(a) * lb;
      angle += 2 * Math.atan2(triple, below);
    }
    return angle > 2 * Math.PI;
  }
}
