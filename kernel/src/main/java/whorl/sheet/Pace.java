package whorl.sheet;

import java.util.function.LongSupplier;

/** Tells of progress no sooner and no more often than a reader wants to hear of it. */
final class Pace {
  private static final long SILENCE = 500_000_000;
  private static final long INTERVAL = 100_000_000;

  private final Progress listener;
  private final LongSupplier clock;
  private final int total;
  private long lastTold;

  /**
   * Starts to count.
   *
   * @param clock gives nanoseconds
   * @param total what there is to do
   */
  Pace(Progress listener, LongSupplier clock, int total) {
    this.listener = listener;
    this.clock = clock;
    this.total = total;
    this.lastTold = clock.getAsLong() + SILENCE - INTERVAL;
  }

  /** So much is done. */
  void done(int done) {
    long now = clock.getAsLong();
    if (now - lastTold >= INTERVAL) {
      lastTold = now;
      listener.at(done, total);
    }
  }
}
