package whorl.mechanics.body.mesh;

import java.util.Arrays;
import java.util.StringTokenizer;

/**
 * Wavefront OBJ: the corners of flat faces. A face of more than three corners is cut into triangles
 * that meet at its first corner; for a flat face the sums over them are right even where it is not
 * convex. Textures, normals, groups and materials are passed over.
 */
final class Obj extends TextMesh {
  private final Triangles triangles = new Triangles(1024);

  /** Vertices that were read, as numbered in the file from one, and which of ours they are. */
  private int[] read = new int[1024];

  private int count;

  @Override
  void take(String first, StringTokenizer rest) {
    if (first.equals("v")) {
      if (count == read.length) {
        read = Arrays.copyOf(read, 2 * count);
      }
      read[count++] = triangles.vertex(number(rest), number(rest), number(rest));
    } else if (first.equals("f")) {
      face(rest);
    }
  }

  private void face(StringTokenizer words) {
    if (words.countTokens() < 3) {
      throw wrong("has a face of fewer than three corners");
    }
    int apex = corner(words.nextToken());
    int last = corner(words.nextToken());
    while (words.hasMoreTokens()) {
      int next = corner(words.nextToken());
      triangles.add(apex, last, next);
      last = next;
    }
  }

  /** A corner {@code v}, {@code v/vt} or {@code v/vt/vn}; negative numbers count from the last. */
  private int corner(String word) {
    int slash = word.indexOf('/');
    String number = slash < 0 ? word : word.substring(0, slash);
    int index;
    try {
      index = Integer.parseInt(number);
    } catch (NumberFormatException notANumber) {
      throw wrong("has “" + word + "” where the number of a vertex belongs");
    }
    int at = index < 0 ? count + index : index - 1;
    if (at < 0 || at >= count) {
      throw wrong("names vertex " + index + ", but " + count + " stand above it");
    }
    return read[at];
  }

  @Override
  Surface end() {
    return triangles.surface();
  }
}
