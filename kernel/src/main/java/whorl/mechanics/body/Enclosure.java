package whorl.mechanics.body;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/** Whether one body lies within another, judged by points all over its faceted surface. */
final class Enclosure {
  /** About so many triangles of a surface are looked at. */
  private static final int TRIANGLES = 64;

  /** Distance between points, as a share of the size of the surface. */
  private static final double SPACING = 0.06;

  private Enclosure() {}

  /**
   * Refuses to take out of a body what reaches outside it, or what is out already: that would count
   * material that is not there. Bodies without closed surfaces are not judged.
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
    double[] extent = extent(skin);
    // Surfaces may touch: further in than the facets of a round surface cut off, less than a wall.
    double inward = Math.min(0.003 * extent[2], 0.3 * extent[0]);
    Facets within = skin.inset(inward);
    int every = Math.max(1, skin.triangles() / TRIANGLES);
    for (int t = 0; t < within.triangles(); t += every) {
      Vector3D a = within.vertex(within.corner(t, 0));
      Vector3D b = within.vertex(within.corner(t, 1));
      Vector3D c = within.vertex(within.corner(t, 2));
      for (Vector3D at : points(a, b, c, SPACING * extent[2])) {
        if (body.solids().stream().noneMatch(solid -> contains(solid, at))) {
          throw new Refusal(
              "removed body",
              "What is taken out reaches outside the body, or into what is taken out already, near "
                  + Given.text(at, "m")
                  + ": there is no material to take.",
              "Make it end where the material ends, or check where it is placed.");
        }
      }
    }
  }

  /** The sides of the box around a surface, shortest first. */
  private static double[] extent(Facets skin) {
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
    return extent;
  }

  /** Points all over a triangle: rows beside its longest side, no further apart than a distance. */
  private static List<Vector3D> points(Vector3D a, Vector3D b, Vector3D c, double apart) {
    double ab = a.distance(b);
    double bc = b.distance(c);
    double ca = c.distance(a);
    if (bc > ab && bc >= ca) {
      return points(b, c, a, apart);
    } else if (ca > ab) {
      return points(c, a, b, apart);
    } else if (ab == 0) {
      return List.of(a);
    }
    double height = b.subtract(a).crossProduct(c.subtract(a)).getNorm() / ab;
    int rows = 1 + (int) (height / apart);
    List<Vector3D> points = new ArrayList<>();
    for (int row = 0; row <= rows; row++) {
      double up = (double) row / rows;
      int columns = 1 + (int) ((1 - up) * ab / apart);
      for (int column = 0; column <= columns; column++) {
        double along = (double) column / columns;
        points.add(new Vector3D((1 - up) * (1 - along), a, (1 - up) * along, b, up, c));
      }
    }
    return points;
  }

  /** Whether a point is in the material of a solid. */
  static boolean contains(Outline.Solid solid, Vector3D point) {
    return solid.skin().surrounds(point)
        && solid.removed().stream().noneMatch(removed -> contains(removed, point));
  }
}
