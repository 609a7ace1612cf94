package whorl.jupyter;

import java.io.IOException;

/** A kernel cannot start, or cannot go on. The message is meant for the person who started it. */
public final class KernelException extends IOException {
  private final String message;

  KernelException(String message) {
    super(message);
    this.message = message;
  }

  KernelException(String message, Throwable cause) {
    super(message, cause);
    this.message = message;
  }

  /** What is wrong; always there. */
  @Override
  public String getMessage() {
    return message;
  }
}
