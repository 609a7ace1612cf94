package whorl.check;

/** A routine came to no number. */
public final class RoutineFailure extends Exception {
  private static final long serialVersionUID = 1;

  private final boolean interrupted;

  private RoutineFailure(String message, boolean interrupted) {
    super(message, null, false, false);
    this.interrupted = interrupted;
  }

  /**
   * It has no value for its arguments.
   *
   * @param message why, in words for the user
   */
  public RoutineFailure(String message) {
    this(message, false);
  }

  /** It was interrupted. */
  public static RoutineFailure ofInterrupt() {
    return new RoutineFailure("interrupted", true);
  }

  /** Whether it was interrupted, so that what called it ends too. */
  public boolean interrupted() {
    return interrupted;
  }
}
