package whorl.laws;

import java.util.List;

/**
 * A worked example, which is run as a test.
 *
 * @param lines of the sheet that it builds on, in order
 * @param expression with the law in it
 * @param value what it comes to, with its unit
 * @param within how far the two may lie apart, as in a check
 * @param source where the value comes from
 */
public record Example(
    List<String> lines, String expression, String value, String within, String source) {
  /** Copies the lines. */
  public Example {
    lines = List.copyOf(lines);
  }
}
