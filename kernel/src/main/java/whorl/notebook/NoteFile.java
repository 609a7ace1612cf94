package whorl.notebook;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;

/** Reads a file as a note: a notebook, or a plain text that holds one sheet. */
public final class NoteFile {
  /** Larger files are refused. */
  public static final int LARGEST = 64 << 20;

  private NoteFile() {}

  /**
   * Reads a note.
   *
   * @param file a notebook ({@code .ipynb}) or a sheet ({@code .whorl}), in UTF-8
   */
  public static Note read(Path file) throws NoteFileException {
    String name = file.toString().toLowerCase(Locale.ROOT);
    if (name.endsWith(".ipynb")) {
      return Note.parse(file.toString(), text(file));
    }
    if (name.endsWith(".whorl")) {
      String sheet = text(file);
      return Note.ofSheet(file.toString(), sheet.startsWith("\uFEFF") ? sheet.substring(1) : sheet);
    }
    throw new NoteFileException(
        file + " is neither a notebook (.ipynb) nor a sheet (.whorl) by its name");
  }

  private static String text(Path file) throws NoteFileException {
    if (Files.isDirectory(file)) {
      throw new NoteFileException(file + " is a folder, not a note");
    }
    try (InputStream in = Files.newInputStream(file)) {
      byte[] bytes = in.readNBytes(LARGEST + 1);
      if (bytes.length > LARGEST) {
        throw new NoteFileException(
            file + " is larger than " + (LARGEST >> 20) + " MB, the most that a note may have");
      }
      return decoded(file, bytes);
    } catch (NoSuchFileException e) {
      throw new NoteFileException("there is no file " + file, e);
    } catch (AccessDeniedException e) {
      throw new NoteFileException("there is no permission to read " + file, e);
    } catch (NoteFileException e) {
      throw e;
    } catch (IOException e) {
      throw new NoteFileException(file + " cannot be read: " + e.getMessage(), e);
    }
  }

  /** Decodes without replacing anything, so that encoding gives the same bytes again. */
  private static String decoded(Path file, byte[] bytes)
      throws CharacterCodingException, NoteFileException {
    var in = ByteBuffer.wrap(bytes);
    var out = CharBuffer.allocate(bytes.length);
    CoderResult result = StandardCharsets.UTF_8.newDecoder().decode(in, out, true);
    String text = out.flip().toString();
    if (result.isError()) {
      throw new NoteFileException(
          String.format(
              "%s is not in UTF-8: %s: the byte 0x%02X does not belong there",
              file, TextPlace.of(text, text.length()), bytes[in.position()]));
    }
    return text;
  }

  /** The folder in which a note lies. */
  public static Path folder(Path file) {
    Path parent = file.toAbsolutePath().getParent();
    return parent == null ? file.toAbsolutePath() : parent;
  }
}
