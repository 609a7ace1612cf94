package whorl.page;

/**
 * Holds a page back from showing more than a server between kernel and front end lets pass: servers
 * drop what exceeds about a megabyte in a second over some seconds.
 */
final class Pace {
  private static final double MOST_AT_ONCE = 2.0e6;
  private static final double PER_SECOND = 0.8e6;

  private double allowance = MOST_AT_ONCE;
  private long last = System.nanoTime();

  /**
   * Waits until so much can be shown. An interrupt ends the wait and stays set.
   *
   * @param characters length of the output
   */
  void await(int characters) {
    long now = System.nanoTime();
    allowance = Math.min(MOST_AT_ONCE, allowance + (now - last) * 1e-9 * PER_SECOND) - characters;
    last = now;
    if (allowance < 0) {
      try {
        Thread.sleep((long) (-allowance / PER_SECOND * 1000));
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
      }
    }
  }
}
