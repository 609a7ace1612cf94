package whorl.syntax;

import whorl.diagnostic.Diagnostic;

/** Leaves a statement at its first mistake; the parser goes on at the next statement line. */
final class Refusal extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final transient Diagnostic diagnostic;

  Refusal(Diagnostic diagnostic) {
    super(diagnostic.problem(), null, false, false);
    this.diagnostic = diagnostic;
  }

  Diagnostic diagnostic() {
    return diagnostic;
  }
}
