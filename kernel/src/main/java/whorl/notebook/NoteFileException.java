package whorl.notebook;

import java.io.IOException;

/**
 * A file cannot be read as a note, or cannot be written. The message names the file and is meant
 * for the person who gave it.
 */
public final class NoteFileException extends IOException {
  private final String message;

  /** A failure whose message says it all. */
  public NoteFileException(String message) {
    super(message);
    this.message = message;
  }

  /** A failure with what the system said about it. */
  public NoteFileException(String message, Throwable cause) {
    super(message, cause);
    this.message = message;
  }

  /** What is wrong; always there. */
  @Override
  public String getMessage() {
    return message;
  }
}
