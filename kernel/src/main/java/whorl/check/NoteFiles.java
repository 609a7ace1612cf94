package whorl.check;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import whorl.syntax.Expr;

/**
 * The files that a sheet may read: those below the folder of its note, and no others, so that a
 * note from elsewhere cannot look round.
 *
 * @param folder of the note
 */
record NoteFiles(Path folder) {
  /**
   * The file of a name, which need not be there; links that lead out of the folder do not count.
   */
  Path named(Expr.Text name) {
    Path relative;
    try {
      relative = Path.of(name.value().replace('\\', '/')).normalize();
    } catch (InvalidPathException impossible) {
      throw CheckMessages.noFileName(name);
    }
    boolean inside =
        !name.value().isBlank() && !relative.isAbsolute() && !relative.startsWith("..");
    Path file = folder.toAbsolutePath().normalize().resolve(relative);
    if (!inside || leadsOut(file)) {
      throw CheckMessages.fileOutside(name);
    }
    return file;
  }

  private boolean leadsOut(Path file) {
    if (!Files.exists(file)) {
      return false;
    }
    try {
      return !file.toRealPath().startsWith(folder.toRealPath());
    } catch (IOException unreadable) {
      return true;
    }
  }
}
