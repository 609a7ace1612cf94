package whorl.mechanics.body.mesh;

import java.io.BufferedReader;
import java.io.IOException;
import java.util.StringTokenizer;
import whorl.mechanics.Refusal;

/** A mesh written as lines of words, with the place of what is wrong in it. */
abstract class TextMesh {
  private int line;

  /** Reads all lines. */
  Surface read(BufferedReader reader) throws IOException {
    String text = reader.readLine();
    while (text != null) {
      line++;
      StringTokenizer words = new StringTokenizer(text);
      if (words.hasMoreTokens()) {
        take(words.nextToken(), words);
      }
      text = reader.readLine();
    }
    return end();
  }

  /** Takes a line with its first word. */
  abstract void take(String first, StringTokenizer rest);

  /** What all lines came to. */
  abstract Surface end();

  /** The next word as a number. */
  double number(StringTokenizer words) {
    if (!words.hasMoreTokens()) {
      throw wrong("has too few numbers");
    }
    String word = words.nextToken();
    try {
      return Double.parseDouble(word);
    } catch (NumberFormatException notANumber) {
      throw wrong("has “" + word + "” where a number belongs");
    }
  }

  /** What to say of the line. */
  Refusal wrong(String what) {
    return new Refusal(
        "mesh", "Line " + line + " of the mesh file " + what + ".", "Write the file again.");
  }
}
