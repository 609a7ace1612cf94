package whorl.java;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringWriter;
import java.net.URI;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.ToolProvider;

/** Libraries made for a test. */
final class TestJar {
  private TestJar() {}

  /** Compiles a class into a folder. */
  static Path classes(Path folder, String className, String source) throws IOException {
    Files.createDirectories(folder);
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    var messages = new StringWriter();
    var file =
        new SimpleJavaFileObject(
            URI.create("string:///" + className.replace('.', '/') + ".java"),
            JavaFileObject.Kind.SOURCE) {
          @Override
          public CharSequence getCharContent(boolean ignoreEncodingErrors) {
            return source;
          }
        };
    var options =
        List.of(
            "-d", folder.toString(), "-cp", System.getProperty("java.class.path"), "-proc:none");
    assertTrue(
        compiler.getTask(messages, null, null, options, null, List.of(file)).call(),
        messages::toString);
    return folder;
  }

  /** A jar with one class. */
  static Path of(Path jar, String className, String source) throws IOException {
    return of(jar, className, source, Map.of());
  }

  /**
   * A jar with one class.
   *
   * @param resources texts by path
   */
  static Path of(Path jar, String className, String source, Map<String, String> resources)
      throws IOException {
    Path folder = Files.createTempDirectory(jar.getParent(), "classes");
    classes(folder, className, source);
    try (FileSystem zip =
            FileSystems.newFileSystem(URI.create("jar:" + jar.toUri()), Map.of("create", "true"));
        Stream<Path> files = Files.walk(folder)) {
      for (Path file : files.filter(Files::isRegularFile).toList()) {
        Path target = zip.getPath(folder.relativize(file).toString());
        if (target.getParent() != null) {
          Files.createDirectories(target.getParent());
        }
        Files.copy(file, target);
      }
      for (var resource : resources.entrySet()) {
        Path target = zip.getPath(resource.getKey());
        Files.createDirectories(target.getParent());
        Files.writeString(target, resource.getValue());
      }
    }
    return jar;
  }
}
