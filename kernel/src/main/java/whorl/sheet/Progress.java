package whorl.sheet;

/** Told how far a long recalculation has come. */
@FunctionalInterface
public interface Progress {
  /** Tells nobody. */
  Progress UNWATCHED = (done, total) -> {};

  /**
   * So much is done; called on the thread that runs the cell, some ten times a second at most and
   * not in the first half second.
   *
   * @param done statements worked out
   * @param total statements to be worked out
   */
  void at(int done, int total);
}
