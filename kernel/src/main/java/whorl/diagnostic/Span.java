package whorl.diagnostic;

/**
 * A stretch of a text, as offsets in Unicode code points: {@code start} inclusive, {@code end}
 * exclusive.
 *
 * @param start offset of the first code point, from 0
 * @param end offset behind the last code point, at least {@code start}
 */
public record Span(int start, int end) {
  /** Checks the order of the two offsets. */
  public Span {
    if (start < 0 || end < start) {
      throw new IllegalArgumentException(
          "span must run forward from 0, but is " + start + "-" + end);
    }
  }

  /** The smallest span that holds both. */
  public Span to(Span other) {
    return new Span(Math.min(start, other.start), Math.max(end, other.end));
  }

  /** The empty span behind this one. */
  public Span behind() {
    return new Span(end, end);
  }

  /** What lies between this one and one that begins further on. */
  public Span gapTo(Span next) {
    return new Span(/* start= */ end, /* end= */ next.start);
  }

  /** Number of code points. */
  public int length() {
    return end - start;
  }

  @Override
  public String toString() {
    return start + "-" + end;
  }
}
