package whorl.install;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import whorl.notebook.NoteFileException;

/** A jar that starts nothing stands for the program: no archive comes of its rehearsal. */
class InstallationTest {
  @TempDir Path folder;
  private Path library = Path.of("");
  private Path kernels = Path.of("");
  private Program program = new Program(Path.of(""), List.of());

  @BeforeEach
  void makeProgram() throws IOException {
    kernels = folder.resolve("not there yet").resolve("kernels");
    Path jar = folder.resolve("whorl.jar");
    var manifest = new Manifest();
    manifest.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
    manifest.getMainAttributes().put(Attributes.Name.CLASS_PATH, "lib/a.jar");
    new JarOutputStream(Files.newOutputStream(jar), manifest).close();
    library = folder.resolve("lib").resolve("a.jar");
    Files.createDirectory(folder.resolve("lib"));
    Files.writeString(library, "a library");
    program = Program.of(jar);
  }

  private void install() throws NoteFileException {
    new Installation(kernels, "whorl", JavaCommand.running(List.of("-Xmx99m"))).install(program);
  }

  private JsonObject spec(String name) throws IOException {
    return JsonParser.parseString(Files.readString(kernels.resolve(name).resolve("kernel.json")))
        .getAsJsonObject();
  }

  private List<String> command(String name) throws IOException {
    return spec(name).getAsJsonArray("argv").asList().stream()
        .map(JsonElement::getAsString)
        .toList();
  }

  private static Path jar(List<String> command) {
    return Path.of(command.get(command.indexOf("-jar") + 1));
  }

  private static List<Path> content(Path folder) throws IOException {
    try (Stream<Path> found = Files.walk(folder)) {
      return found.sorted().toList();
    }
  }

  @Test
  void jupyterIsToldHowToStartBothKernels() throws IOException {
    install();
    List<String> sheet = command("whorl");
    assertTrue(Path.of(sheet.get(0)).isAbsolute(), sheet::toString);
    assertTrue(sheet.containsAll(List.of("-XX:+UseSerialGC", "-Xmx99m")), sheet::toString);
    assertTrue(sheet.stream().noneMatch(word -> word.startsWith("#")), sheet::toString);
    assertEquals(
        List.of("kernel", "{connection_file}"), sheet.subList(sheet.size() - 2, sheet.size()));
    List<String> java = command("whorl-java");
    assertEquals(
        List.of("kernel", "--java", "{connection_file}"),
        java.subList(java.size() - 3, java.size()));
    assertEquals("java", spec("whorl-java").get("language").getAsString());
    assertEquals("message", spec("whorl").get("interrupt_mode").getAsString());
  }

  @Test
  void eachKernelHasItsOwnCopyOfTheProgram() throws IOException {
    install();
    Files.delete(library);
    Files.delete(program.jar());
    for (String name : List.of("whorl", "whorl-java")) {
      Path jar = jar(command(name));
      assertTrue(jar.startsWith(kernels.resolve(name)), jar::toString);
      assertTrue(Files.exists(jar));
      assertEquals("a library", Files.readString(jar.resolveSibling("lib").resolve("a.jar")));
    }
  }

  @Test
  void aProgramIsKeptForAsLongAsAKernelMayRunFromIt() throws IOException {
    install();
    Path first = jar(command("whorl"));
    install();
    assertTrue(Files.exists(first));
    install();
    assertFalse(Files.exists(first.getParent()));
  }

  @Test
  void aFailedInstallationLeavesWhatWasThere() throws IOException {
    install();
    List<Path> before = content(kernels);
    String json = Files.readString(kernels.resolve("whorl").resolve("kernel.json"));
    Files.delete(library);
    NoteFileException failure = assertThrows(NoteFileException.class, this::install);
    assertTrue(
        failure.getMessage().startsWith(kernels + " cannot be written: "), failure::getMessage);
    assertEquals(before, content(kernels));
    assertEquals(json, Files.readString(kernels.resolve("whorl").resolve("kernel.json")));
  }

  @Test
  void aFailedFirstInstallationLeavesNoKernel() throws IOException {
    Files.delete(library);
    assertThrows(NoteFileException.class, this::install);
    assertEquals(List.of(kernels), content(kernels));
  }

  @Test
  void aFileInPlaceOfAFolderIsNamedAndLeftAsItIs() throws IOException {
    Path file = folder.resolve("not there yet");
    Files.writeString(file, "mine");
    NoteFileException failure = assertThrows(NoteFileException.class, this::install);
    assertEquals(
        file + " is not a folder, so that no kernel can be put into " + kernels,
        failure.getMessage());
    assertEquals("mine", Files.readString(file));
  }
}
