package whorl.java;

import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import org.dflib.jjava.jupyter.kernel.BaseKernel;
import org.dflib.jjava.jupyter.kernel.magic.LineMagic;
import org.dflib.jjava.jupyter.kernel.magic.MagicsRegistry;
import org.dflib.jjava.jupyter.kernel.util.PathsHandler;

/** The magics that cells in Java have from the start. */
final class Magics {
  private final JavaSession session;
  private final Set<Path> loading = new HashSet<>();

  Magics(JavaSession session) {
    this.session = session;
  }

  void register(MagicsRegistry registry) {
    register(registry, "jars", arguments -> session.add(files(arguments, Files::isRegularFile)));
    register(registry, "classpath", arguments -> session.add(files(arguments, Files::exists)));
    register(registry, "maven", this::maven);
    register(registry, "load", this::load);
  }

  /** What a magic does with its arguments. */
  private interface Work {
    void with(List<String> arguments) throws Exception;
  }

  private static void register(MagicsRegistry registry, String name, Work work) {
    LineMagic<Object, BaseKernel> magic =
        (kernel, arguments) -> {
          if (arguments.isEmpty()) {
            throw new MagicFailure("%" + name + " needs something behind it.");
          }
          work.with(arguments);
          return arguments;
        };
    registry.registerLineMagic(name, magic);
  }

  private static List<Path> files(List<String> globs, Predicate<Path> wanted) throws MagicFailure {
    var files = new ArrayList<Path>();
    for (String glob : globs) {
      List<Path> found = matching(glob).stream().filter(wanted).toList();
      if (found.isEmpty()) {
        throw new MagicFailure(
            "There is no file "
                + glob
                + " (looked for from "
                + Path.of("").toAbsolutePath()
                + ").");
      }
      files.addAll(found);
    }
    return files;
  }

  private static List<Path> matching(String glob) throws MagicFailure {
    try {
      return PathsHandler.splitAndResolveGlobs(glob);
    } catch (RuntimeException e) {
      // The library does not take a folder that is not there for one without files.
      if (e.getCause() instanceof NoSuchFileException) {
        return List.of();
      }
      throw new MagicFailure(glob + " cannot be looked for: " + e.getMessage(), e);
    }
  }

  private void maven(List<String> coordinates) throws Exception {
    try (var maven = new Maven()) {
      session.add(maven.jars(coordinates));
    }
  }

  private void load(List<String> names) throws Exception {
    for (String name : names) {
      Path file = Path.of(name).toAbsolutePath().normalize();
      if (!loading.add(file)) {
        throw new MagicFailure(name + " loads itself.");
      }
      try {
        for (JavaText text : LoadedFile.texts(Path.of(name))) {
          session.runWithin(text);
        }
      } finally {
        loading.remove(file);
      }
    }
  }
}
