package whorl.notebook;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFileAttributes;
import java.util.UUID;

/**
 * Replaces a file whole or not at all: whoever reads it, and whenever the program ends, finds the
 * old content or the new.
 *
 * <p>The content goes into a new file beside the old one, to the disk, and then takes the old one's
 * name in one step. A link is followed, and what it points to is replaced. Permissions are kept,
 * the owner where the system lets us. A device or a pipe is written to, for it cannot be replaced.
 */
public final class AtomicFile {
  /** More links in a row are taken for a circle. */
  private static final int MOST_LINKS = 40;

  /** Something that writes the content of a file. */
  @FunctionalInterface
  public interface Content {
    /** Writes it; whatever it throws leaves the file as it was. */
    void writeTo(OutputStream out) throws IOException;
  }

  private AtomicFile() {}

  /** Replaces the content of a file, or makes the file. */
  public static void replace(Path file, byte[] content) throws NoteFileException {
    replace(file, out -> out.write(content));
  }

  /** Replaces the content of a file, or makes the file. */
  public static void replace(Path file, Content content) throws NoteFileException {
    try {
      Path target = linked(file.toAbsolutePath());
      if (Files.isDirectory(target)) {
        throw new NoteFileException(file + " is a folder; it is left as it was");
      }
      if (Files.exists(target) && !Files.isWritable(target)) {
        throw new AccessDeniedException(file.toString());
      }
      if (Files.exists(target) && !Files.isRegularFile(target)) {
        try (OutputStream out = Files.newOutputStream(target)) {
          content.writeTo(out);
        }
      } else {
        replaceRegular(target, content);
      }
    } catch (NoteFileException e) {
      throw e;
    } catch (IOException e) {
      throw NoteFileException.unwritten(file, e);
    }
  }

  private static void replaceRegular(Path target, Content content) throws IOException {
    Path folder = target.resolveSibling("");
    Path fresh = target.resolveSibling(".whorl-" + UUID.randomUUID() + ".tmp");
    try {
      try (var channel =
              FileChannel.open(fresh, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
          var out = Channels.newOutputStream(channel)) {
        if (Files.exists(target)) {
          keepRights(target, fresh);
        }
        content.writeTo(out);
        channel.force(true);
      }
      Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE);
    } finally {
      Files.deleteIfExists(fresh);
    }
    toDisk(folder);
  }

  private static Path linked(Path file) throws IOException {
    Path target = file;
    for (int links = 0; Files.isSymbolicLink(target); links++) {
      if (links == MOST_LINKS) {
        throw new FileSystemException(file.toString(), null, "its links go round in a circle");
      }
      target = target.resolveSibling(Files.readSymbolicLink(target));
    }
    return target;
  }

  private static void keepRights(Path from, Path to) throws IOException {
    var old = Files.getFileAttributeView(from, PosixFileAttributeView.class);
    var fresh = Files.getFileAttributeView(to, PosixFileAttributeView.class);
    if (old == null || fresh == null) {
      return;
    }
    PosixFileAttributes rights = old.readAttributes();
    try {
      if (!rights.group().equals(fresh.readAttributes().group())) {
        fresh.setGroup(rights.group());
      }
      if (!rights.owner().equals(fresh.readAttributes().owner())) {
        fresh.setOwner(rights.owner());
      }
    } catch (IOException notAllowed) {
      // Only the administrator may give a file away; the new one then belongs to who runs this.
    }
    // Behind the change of owner, which clears some permissions.
    fresh.setPermissions(rights.permissions());
  }

  /** Sees to it that the new name outlives a power cut; not every system can open a folder. */
  private static void toDisk(Path folder) {
    try (var channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (IOException notOffered) {
      // The file is replaced all the same.
    }
  }
}
