package whorl.check;

/**
 * The room that a formula needs for what it reads, or a value for itself.
 *
 * @param numbers slots for numbers
 * @param things slots for things in space
 */
public record FrameSize(int numbers, int things) {
  /** No room. */
  public static final FrameSize NONE = new FrameSize(0, 0);

  /** Room for both. */
  public FrameSize plus(FrameSize other) {
    return new FrameSize(numbers + other.numbers, things + other.things);
  }
}
