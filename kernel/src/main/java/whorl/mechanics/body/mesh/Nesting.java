package whorl.mechanics.body.mesh;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import whorl.mechanics.Refusal;

/**
 * Which shells of a surface lie within which, and the check that they face the right way: outwards
 * where they bound a body, inwards where they bound a cavity in it.
 */
final class Nesting {
  /** A shell with the box around it. */
  private record Boxed(Surface shell, Bounds bounds) {}

  private final List<Boxed> shells;

  Nesting(Surface[] shells) {
    this.shells =
        Arrays.stream(shells)
            .map(shell -> new Boxed(shell, shell.bounds()))
            .sorted(Comparator.comparingDouble((Boxed boxed) -> boxed.bounds.leastX()))
            .toList();
  }

  /**
   * Refuses a shell that faces inwards though it bounds a body, and one that faces outwards though
   * it lies in the material of another.
   */
  void demandOutward() {
    // Boxes are met in the order of their least x; those that ended before cannot enclose any more.
    List<Boxed> near = new ArrayList<>();
    for (Boxed boxed : shells) {
      near.removeIf(other -> other.bounds.mostX() < boxed.bounds.leastX());
      demandOutward(boxed, near);
      near.add(boxed);
    }
  }

  private static void demandOutward(Boxed boxed, List<Boxed> near) {
    long depth =
        near.stream()
            .filter(other -> other.bounds.contains(boxed.bounds))
            .filter(other -> surrounds(other.shell, boxed.shell))
            .count();
    boolean outward = Moments.of(boxed.shell).volume() > 0;
    if (depth % 2 == 0 && !outward) {
      throw insideOut("A shell of the mesh, around " + boxed.bounds.middle() + " of the file,");
    }
    if (depth % 2 == 1 && outward) {
      throw new Refusal(
          "mesh",
          "A shell of the mesh, around "
              + boxed.bounds.middle()
              + " of the file, lies within another and faces outwards as well, so its inside would"
              + " count twice.",
          "If it bounds a cavity, reverse its triangles. If it bounds another part, make that a"
              + " body of its own.");
    }
  }

  /** Refuses what faces inwards. */
  static Refusal insideOut(String what) {
    return new Refusal(
        "mesh",
        what + " is inside out: its triangles face inwards, so it encloses a negative volume.",
        "Reverse the order of the corners of its triangles where the surface was made.");
  }

  /** Whether a shell, of either orientation, goes round a vertex of another. */
  private static boolean surrounds(Surface shell, Surface inner) {
    double[] point = inner.coordinates();
    int at = 3 * inner.corners()[0];
    double angle = 0;
    double[] p = shell.coordinates();
    int[] corners = shell.corners();
    double[] v = new double[9];
    for (int t = 0; t < corners.length; t += 3) {
      for (int corner = 0; corner < 3; corner++) {
        for (int k = 0; k < 3; k++) {
          v[3 * corner + k] = p[3 * corners[t + corner] + k] - point[at + k];
        }
      }
      angle += solidAngle(v);
    }
    return Math.abs(angle) > 2 * Math.PI;
  }

  /** The solid angle of a triangle seen from the origin, by the formula of van Oosterom. */
  private static double solidAngle(double[] v) {
    double a = Math.sqrt(v[0] * v[0] + v[1] * v[1] + v[2] * v[2]);
    double b = Math.sqrt(v[3] * v[3] + v[4] * v[4] + v[5] * v[5]);
    double c = Math.sqrt(v[6] * v[6] + v[7] * v[7] + v[8] * v[8]);
    double triple =
        v[0] * (v[4] * v[8] - v[5] * v[7])
            + v[1] * (v[5] * v[6] - v[3] * v[8])
            + v[2] * (v[3] * v[7] - v[4] * v[6]);
    double ab = v[0] * v[3] + v[1] * v[4] + v[2] * v[5];
    double bc = v[3] * v[6] + v[4] * v[7] + v[5] * v[8];
    double ca = v[6] * v[0] + v[7] * v[1] + v[8] * v[2];
    return 2 * Math.atan2(triple, a * b * c + ab * c + bc * a + ca * b);
  }
}
