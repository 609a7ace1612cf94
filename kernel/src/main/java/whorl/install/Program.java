package whorl.install;

import java.io.IOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import whorl.notebook.NoteFileException;

/**
 * The program as files: its jar, and the libraries that the jar names beside itself.
 *
 * @param jar the jar that starts it
 * @param libraries paths from the jar's folder
 */
public record Program(Path jar, List<Path> libraries) {
  /** Copies the list. */
  public Program {
    libraries = List.copyOf(libraries);
  }

  /** The program that runs now. */
  public static Program running() throws IOException {
    try {
      Path place =
          Path.of(Program.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      if (Files.isDirectory(place)) {
        throw new NoteFileException(
            "only a built program can be installed; this one runs from the classes in " + place);
      }
      return of(place);
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  /** The program that a jar starts. */
  static Program of(Path jar) throws IOException {
    var libraries = new ArrayList<Path>();
    try (var file = new JarFile(jar.toFile())) {
      String named = file.getManifest().getMainAttributes().getValue(Attributes.Name.CLASS_PATH);
      for (String library : named == null ? new String[0] : named.split(" ", -1)) {
        libraries.add(Path.of(library));
      }
    }
    return new Program(jar, libraries);
  }

  /** Copies all of it to where a jar is to stand. */
  void copyTo(Path target) throws IOException {
    copy(jar, target);
    for (Path library : libraries) {
      copy(jar.resolveSibling(library), target.resolveSibling(library));
    }
  }

  private static void copy(Path from, Path to) throws IOException {
    Files.createDirectories(to.resolveSibling(""));
    Files.copy(from, to, StandardCopyOption.REPLACE_EXISTING);
  }
}
