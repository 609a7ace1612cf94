package whorl.jupyter;

/** What came over the wire is no message, or not from somebody who knows the key. */
final class BadMessageException extends Exception {
  BadMessageException(String message) {
    super(message);
  }

  BadMessageException(String message, Throwable cause) {
    super(message, cause);
  }
}
