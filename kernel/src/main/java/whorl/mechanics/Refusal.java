package whorl.mechanics;

/**
 * An argument that mechanics cannot take: what is wrong, why, and what to do, in the words of an
 * engineer. Numbers in the text are in coherent SI units.
 */
public final class Refusal extends IllegalArgumentException {
  private static final long serialVersionUID = 1;

  private final String subject;
  private final String reason;
  private final String fix;

  /**
   * Refuses an argument.
   *
   * @param subject the argument at fault in one or a few words, such as {@code bore}
   * @param reason a sentence that says what is wrong and why
   * @param fix a sentence that says what to do; may be empty
   */
  public Refusal(String subject, String reason, String fix) {
    super(fix.isEmpty() ? reason : reason + " " + fix);
    this.subject = subject;
    this.reason = reason;
    this.fix = fix;
  }

  /** The argument at fault. */
  public String subject() {
    return subject;
  }

  /** What is wrong, and why. */
  public String reason() {
    return reason;
  }

  /** What to do; may be empty. */
  public String fix() {
    return fix;
  }
}
