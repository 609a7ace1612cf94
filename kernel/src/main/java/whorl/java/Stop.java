package whorl.java;

/** What was called on a cell thread was interrupted. */
final class Stop extends Exception {
  private static final long serialVersionUID = 1;

  /** What became of the code. */
  enum Ending {
    /** It ended. */
    ENDED,
    /** It has not come to a place yet where it could end: its thread was left behind. */
    UNREACHED,
    /** It was told to end and went on: its thread was left behind. */
    IGNORED
  }

  private final Ending ending;

  Stop(Ending ending) {
    super("interrupted", null, false, false);
    this.ending = ending;
  }

  Ending ending() {
    return ending;
  }
}
