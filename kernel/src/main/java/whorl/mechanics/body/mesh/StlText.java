package whorl.mechanics.body.mesh;

import java.util.Locale;
import java.util.StringTokenizer;

/**
 * STL as text: three lines of {@code vertex x y z} between {@code outer loop} and {@code endloop}.
 */
final class StlText extends TextMesh {
  private final Triangles triangles = new Triangles(1024);
  private final int[] loop = new int[3];
  private int corners = 3;
  private boolean ended;

  @Override
  void take(String first, StringTokenizer rest) {
    switch (first.toLowerCase(Locale.ROOT)) {
      case "outer" -> corners = 0;
      case "vertex" -> {
        if (corners == 3) {
          throw wrong("has a corner outside a loop of three");
        }
        loop[corners++] = triangles.vertex(number(rest), number(rest), number(rest));
      }
      case "endloop" -> {
        if (corners != 3) {
          throw wrong("ends a loop of " + corners + " corners instead of three");
        }
        triangles.add(loop[0], loop[1], loop[2]);
      }
      case "endsolid" -> ended = true;
      case "solid", "facet", "endfacet" -> ended = false;
      default -> throw wrong("begins with “" + first + "”, which is no word of STL");
    }
  }

  @Override
  Surface end() {
    if (!ended) {
      throw wrong("is the last, but does not end the solid: the file is cut off");
    }
    return triangles.surface();
  }
}
