package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.mechanics.body.Facets;

/** Cuts lines in space into what is seen of them, what is hidden, and what is no line at all. */
final class Tracing {
  /** Length of the pieces that are judged as one. */
  private static final double PIECE = 2.5;

  /** How far from a contour its visibility is judged: beyond what facets cut off. */
  private static final double ASIDE = 0.7;

  /** How far around a line material is looked for. */
  private static final double NEAR = 0.6;

  private enum Fate {
    SEEN,
    HIDDEN,
    NONE
  }

  private final Skins skins;

  Tracing(Skins skins) {
    this.skins = skins;
  }

  /** The lines on the surfaces of bodies. */
  List<Stroke> surfaces() {
    List<Stroke> strokes = new ArrayList<>();
    List<Facets> all = skins.all();
    for (int i = 0; i < all.size(); i++) {
      boolean sheet = skins.isSheet(i);
      Features.of(all.get(i)).forEach(edge -> trace(edge, sheet, strokes));
      for (int j = i + 1; j < all.size(); j++) {
        boolean either = sheet || skins.isSheet(j);
        Crossings.of(all.get(i), all.get(j)).forEach(edge -> trace(edge, either, strokes));
      }
    }
    return Chains.joined(strokes);
  }

  private void trace(Edge edge, boolean sheet, List<Stroke> strokes) {
    Vector3D test = edge.outward().scalarMultiply(ASIDE);
    boolean judge = skins.overlap() && !sheet;
    cut(
        edge.from(),
        edge.to(),
        at -> {
          if (judge && !onSurface(at)) {
            return Fate.NONE;
          }
          return fate(at.add(test));
        },
        edge.contour(),
        strokes);
  }

  /** A free line, such as an axis or the shaft of an arrow. */
  List<Stroke> free(Vector3D from, Vector3D to) {
    List<Stroke> strokes = new ArrayList<>();
    cut(from, to, this::fate, false, strokes);
    return strokes;
  }

  /** Whether something stands before a point. */
  boolean hides(Vector3D seen) {
    return skins.hides(seen.getX(), seen.getY(), seen.getZ());
  }

  private Fate fate(Vector3D at) {
    return hides(at) ? Fate.HIDDEN : Fate.SEEN;
  }

  /** Whether there is material on one side of a point and none on another. */
  private boolean onSurface(Vector3D at) {
    boolean some = false;
    boolean none = false;
    for (int corner = 0; corner < 8; corner++) {
      // Unequal steps, so that none of the eight points lies in a plane with the surface.
      double x = at.getX() + ((corner & 1) == 0 ? NEAR : -0.9 * NEAR);
      double y = at.getY() + ((corner & 2) == 0 ? 0.83 * NEAR : -NEAR);
      double depth = at.getZ() + ((corner & 4) == 0 ? 0.94 * NEAR : -0.87 * NEAR);
      if (skins.contains(x, y, depth)) {
        some = true;
      } else {
        none = true;
      }
      if (some && none) {
        return true;
      }
    }
    return false;
  }

  private interface Judge {
    Fate of(Vector3D at);
  }

  private static void cut(
      Vector3D from, Vector3D to, Judge judge, boolean contour, List<Stroke> strokes) {
    Vector3D whole = to.subtract(from);
    int pieces = 1 + (int) (Math.hypot(whole.getX(), whole.getY()) / PIECE);
    Fate fate = Fate.NONE;
    int since = 0;
    for (int i = 0; i <= pieces; i++) {
      Fate next = i < pieces ? judge.of(from.add((i + 0.5) / pieces, whole)) : Fate.NONE;
      if (next != fate) {
        if (fate != Fate.NONE) {
          Vector3D start = from.add((double) since / pieces, whole);
          Vector3D end = from.add((double) i / pieces, whole);
          strokes.add(new Stroke(List.of(flat(start), flat(end)), fate == Fate.HIDDEN, contour));
        }
        fate = next;
        since = i;
      }
    }
  }

  private static Vector2D flat(Vector3D v) {
    return new Vector2D(v.getX(), v.getY());
  }
}
