package whorl.jupyter;

/** What a message says cannot be used. */
final class BadContentException extends Exception {
  BadContentException(String message) {
    super(message);
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
