package whorl.notebook;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

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

  /** A file or a folder that the system did not let us write. */
  public static NoteFileException unwritten(Path file, IOException e) {
    return new NoteFileException(file + " cannot be written: " + reason(e, file), e);
  }

  /** What is wrong; always there. */
  @Override
  public String getMessage() {
    return message;
  }

  private static String reason(IOException e, Path file) {
    if (e instanceof NoSuchFileException) {
      return "there is no folder " + file.toAbsolutePath().getParent();
    }
    if (e instanceof AccessDeniedException) {
      return "there is no permission";
    }
    String said = e instanceof FileSystemException f ? f.getReason() : e.getMessage();
    if (said == null) {
      return e.getClass().getSimpleName();
    }
    return said.contains("No space left") || said.contains("quota") ? "the disk is full" : said;
  }
}
