package whorl.check;

import java.util.Map;
import whorl.diagnostic.Diagnostic;
import whorl.units.kind.Readings;

/** Ends the check of a statement at its first mistake; it never leaves this room. */
final class CheckFailure extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final transient Wording wording;

  /** Words a message with the names of the sheet, which suggestions may use. */
  @FunctionalInterface
  interface Wording {
    /** The message, given the names that hold numbers or vectors. */
    Diagnostic among(Map<String, Readings> names);
  }

  CheckFailure(Diagnostic diagnostic) {
    this(names -> diagnostic);
  }

  CheckFailure(Wording wording) {
    super(null, null, false, false);
    this.wording = wording;
  }

  Diagnostic among(Map<String, Readings> names) {
    return wording.among(names);
  }
}
