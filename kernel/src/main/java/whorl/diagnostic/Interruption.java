package whorl.diagnostic;

/**
 * Ends long work on a text because its thread was interrupted. Who started the work catches it and
 * answers the interrupt; the thread's interrupt status is left as it is.
 */
public final class Interruption extends RuntimeException {
  private static final long serialVersionUID = 1;

  /** Ends the work at hand. */
  public Interruption() {
    super("interrupted", null, false, false);
  }

  /** Ends the work at hand if the thread was interrupted. */
  public static void poll() {
    if (Thread.currentThread().isInterrupted()) {
      throw new Interruption();
    }
  }
}
