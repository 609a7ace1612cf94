package whorl.eval;

/**
 * Ends an evaluation from within. Carries no stack trace, so that a column with many failing rows
 * stays cheap. Never leaves this package.
 */
final class NoValue extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient NumericFailure failure;

  NoValue(NumericFailure failure) {
    super(failure.reason().name(), null, false, false);
    this.failure = failure;
  }

  NumericFailure failure() {
    return failure;
  }
}
