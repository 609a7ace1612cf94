package whorl.install;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import java.util.UUID;
import java.util.stream.Stream;
import whorl.notebook.AtomicFile;

/**
 * The folder in which Jupyter finds one kernel. It holds the program too, in a folder of its own,
 * so that what happens elsewhere does not break the kernel.
 *
 * <p>{@code kernel.json} names the program's folder and is replaced in one step: until then the old
 * kernel is whole, from then on the new one. The program that was replaced is kept until the next
 * time, for kernels that still run from it.
 */
final class KernelFolder {
  private static final String PROGRAM = "program-";
  private static final List<String> LOGOS =
      List.of("logo-svg.svg", "logo-64x64.png", "logo-32x32.png");

  private final Kernelspec spec;
  private final JavaCommand java;
  private final Path folder;
  private final Path program;
  private final Path jar;
  private final Path archive;
  private boolean committed;

  KernelFolder(Path kernels, Kernelspec spec, JavaCommand java) {
    this.spec = spec;
    this.java = java;
    folder = kernels.resolve(spec.name());
    program = folder.resolve(PROGRAM + UUID.randomUUID().toString().substring(0, 8));
    jar = program.resolve("whorl.jar");
    archive = program.resolve("classes.jsa");
  }

  Path path() {
    return folder;
  }

  Kernelspec spec() {
    return spec;
  }

  /** Writes the program and its archive of classes, which the present kernel does not notice. */
  void prepare(Program original) throws IOException {
    Files.createDirectories(program);
    original.copyTo(jar);
    java.archive(jar, archive, List.of("rehearse"));
  }

  /** Lets Jupyter start what was prepared. */
  void commit() throws IOException {
    for (String logo : LOGOS) {
      AtomicFile.replace(folder.resolve(logo), resource(spec.logos() + "/" + logo));
    }
    Path json = folder.resolve("kernel.json");
    String before = Files.exists(json) ? Files.readString(json) : "";
    List<String> command = java.start(jar, archive, spec.arguments());
    AtomicFile.replace(json, spec.json(command).getBytes(StandardCharsets.UTF_8));
    committed = true;
    for (Path other : programs()) {
      if (!other.equals(program) && !before.contains(other.getFileName().toString())) {
        deleteIfPossible(other);
      }
    }
  }

  /** Removes what was prepared and is not used; a folder that was there before holds more. */
  void discardIfUnused() {
    if (!committed && Files.isDirectory(folder)) {
      deleteIfPossible(program);
      folder.toFile().delete();
    }
  }

  private List<Path> programs() throws IOException {
    try (DirectoryStream<Path> found = Files.newDirectoryStream(folder, PROGRAM + "*")) {
      var programs = new ArrayList<Path>();
      found.forEach(programs::add);
      return programs;
    }
  }

  /** Some systems keep files that are in use; the next installation tries again. */
  private static void deleteIfPossible(Path folder) {
    try (Stream<Path> content = Files.walk(folder)) {
      content.sorted(Comparator.reverseOrder()).forEach(path -> path.toFile().delete());
    } catch (IOException | UncheckedIOException gone) {
      // There is nothing left to remove, or no right to do so.
    }
  }

  private static byte[] resource(String name) throws IOException {
    try (var stream = KernelFolder.class.getResourceAsStream(name)) {
      return Objects.requireNonNull(stream, name).readAllBytes();
    }
  }
}
