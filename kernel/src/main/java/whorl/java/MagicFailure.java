package whorl.java;

/** A magic cannot do what was asked; its message says why, for the user. */
final class MagicFailure extends Exception {
  private static final long serialVersionUID = 1;

  MagicFailure(String message) {
    super(message);
  }

  MagicFailure(String message, Throwable cause) {
    super(message, cause);
  }
}
