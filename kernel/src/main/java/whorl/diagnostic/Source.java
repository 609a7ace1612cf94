package whorl.diagnostic;

import java.util.List;

/**
 * A text that messages point into, with the lines it consists of. Offsets and columns count Unicode
 * code points; this class is the one place that converts them to the UTF-16 indices of a {@code
 * String}.
 */
public final class Source {
  private final String text;
  private final int[] codePoints;
  private final List<Line> lines;

  private record Line(int start, int end) {}

  /**
   * A text to point into.
   *
   * @param text the text, with lines ended by LF, CR LF or CR
   */
  public Source(String text) {
    this.text = text;
    this.codePoints = text.codePoints().toArray();
    this.lines = linesOf(codePoints);
  }

  private static List<Line> linesOf(int[] codePoints) {
    var lines = new java.util.ArrayList<Line>();
    int start = 0;
    for (int i = 0; i < codePoints.length; i++) {
      boolean crLf =
          codePoints[i] == '\r' && i + 1 < codePoints.length && codePoints[i + 1] == '\n';
      if (codePoints[i] == '\n' || codePoints[i] == '\r') {
        lines.add(new Line(start, i));
        i += crLf ? 1 : 0;
        start = i + 1;
      }
    }
    lines.add(new Line(start, codePoints.length));
    return List.copyOf(lines);
  }

  /** The whole text. */
  public String text() {
    return text;
  }

  /** Number of code points. */
  public int length() {
    return codePoints.length;
  }

  /** The text of a span, cut at the end of the text. */
  public String slice(Span span) {
    int start = Math.min(span.start(), codePoints.length);
    int end = Math.min(span.end(), codePoints.length);
    return new String(codePoints, start, end - start);
  }

  /** Line of an offset, counted from 1. */
  public int line(int offset) {
    int low = 0;
    int high = lines.size() - 1;
    while (low < high) {
      int middle = (low + high + 1) >>> 1;
      if (lines.get(middle).start() <= offset) {
        low = middle;
      } else {
        high = middle - 1;
      }
    }
    return low + 1;
  }

  /** Column of an offset within its line, counted from 1. */
  public int column(int offset) {
    return offset - lines.get(line(offset) - 1).start() + 1;
  }

  /**
   * The text of a line without its end.
   *
   * @param line from 1
   */
  public String lineText(int line) {
    Line found = lines.get(line - 1);
    return slice(new Span(found.start(), found.end()));
  }

  /** The span of a line without its end; {@code line} counts from 1. */
  public Span lineSpan(int line) {
    Line found = lines.get(line - 1);
    return new Span(found.start(), found.end());
  }
}
