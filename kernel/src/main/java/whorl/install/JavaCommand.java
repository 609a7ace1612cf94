package whorl.install;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/**
 * How a JVM is started.
 *
 * @param java the program to start, an absolute path
 * @param options for the JVM
 */
public record JavaCommand(Path java, List<String> options) {
  /** A guard against a rehearsal that hangs; one takes a few seconds. */
  private static final int MOST_SECONDS = 120;

  /** Copies the list. */
  public JavaCommand {
    options = List.copyOf(options);
  }

  /** The JVM that runs now, with the usual options and more behind them. */
  public static JavaCommand running(List<String> more) {
    Path folder = Path.of(System.getProperty("java.home"), "bin");
    Path windows = folder.resolve("java.exe");
    return new JavaCommand(
        Files.exists(windows) ? windows : folder.resolve("java"),
        Stream.concat(usualOptions().stream(), more.stream()).toList());
  }

  private static List<String> usualOptions() {
    var stream =
        Objects.requireNonNull(JavaCommand.class.getResourceAsStream("jvm.options"), "no options");
    try (var lines = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
      return lines.lines().filter(line -> !line.startsWith("#")).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The words that start a program with an archive of its classes. */
  List<String> start(Path jar, Path archive, List<String> arguments) {
    return command("-XX:SharedArchiveFile=" + archive, jar, arguments);
  }

  /**
   * Writes an archive of the classes that a run of the program loads, which shortens later starts.
   * Best effort: where none can be made, the program starts without.
   */
  void archive(Path jar, Path archive, List<String> arguments) throws IOException {
    Process run =
        new ProcessBuilder(command("-XX:ArchiveClassesAtExit=" + archive, jar, arguments))
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    try {
      run.getOutputStream().close();
      if (!run.waitFor(MOST_SECONDS, TimeUnit.SECONDS)) {
        Files.deleteIfExists(archive);
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } finally {
      run.destroyForcibly();
    }
  }

  private List<String> command(String archiveOption, Path jar, List<String> arguments) {
    var words = new ArrayList<String>();
    words.add(java.toString());
    words.addAll(options);
    words.add(archiveOption);
    words.add("-jar");
    words.add(jar.toString());
    words.addAll(arguments);
    return words;
  }
}
