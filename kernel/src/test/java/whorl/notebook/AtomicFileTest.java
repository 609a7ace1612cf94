package whorl.notebook;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class AtomicFileTest {
  private static final byte[] FRESH = "fresh".getBytes(UTF_8);

  @TempDir Path folder;

  private String refusal(Path file) {
    var e = assertThrows(NoteFileException.class, () -> AtomicFile.replace(file, FRESH));
    return e.getMessage().replace(folder.toString(), "F");
  }

  private List<String> names() throws IOException {
    try (var files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).sorted().toList();
    }
  }

  @Test
  void aFileIsMadeOrReplacedAndNothingElseIsLeft() throws IOException {
    Path file = folder.resolve("a b.ipynb");
    AtomicFile.replace(file, FRESH);
    assertEquals("fresh", Files.readString(file));
    AtomicFile.replace(file, "again".getBytes(UTF_8));
    assertEquals("again", Files.readString(file));
    assertEquals(List.of("a b.ipynb"), names());
  }

  @Test
  void permissionsAreKept() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    for (String rights : List.of("rw-r-----", "rwxr-xr-x", "rw-rw-rw-")) {
      Files.setPosixFilePermissions(file, PosixFilePermissions.fromString(rights));
      AtomicFile.replace(file, FRESH);
      assertEquals(rights, PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
    }
  }

  @Test
  void aNewFileHasThePermissionsThatAnyNewFileHas() throws IOException {
    Path usual = Files.createFile(folder.resolve("usual"));
    Path file = folder.resolve("a");
    AtomicFile.replace(file, FRESH);
    assertEquals(Files.getPosixFilePermissions(usual), Files.getPosixFilePermissions(file));
  }

  @Test
  void linksAreFollowedAndStay() throws IOException {
    Path inner = Files.createDirectory(folder.resolve("inner"));
    Path file = Files.writeString(inner.resolve("file"), "old");
    Path link = Files.createSymbolicLink(folder.resolve("link"), Path.of("inner", "file"));
    Path second = Files.createSymbolicLink(inner.resolve("second"), Path.of("..", "link"));
    AtomicFile.replace(second, FRESH);
    assertEquals("fresh", Files.readString(file));
    assertTrue(Files.isSymbolicLink(link) && Files.isSymbolicLink(second));

    Path dangling = Files.createSymbolicLink(folder.resolve("dangling"), Path.of("made"));
    AtomicFile.replace(dangling, FRESH);
    assertEquals("fresh", Files.readString(folder.resolve("made")));
  }

  @Test
  void linksInACircleAreRefused() throws IOException {
    Files.createSymbolicLink(folder.resolve("a"), Path.of("b"));
    Path b = Files.createSymbolicLink(folder.resolve("b"), Path.of("a"));
    assertEquals("F/b cannot be written: its links go round in a circle", refusal(b));
  }

  @Test
  void whenWritingFailsTheOldContentStaysAndNothingIsLeft() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    for (Exception failure :
        List.of(new IOException("No space left on device"), new IllegalStateException("bug"))) {
      assertThrows(
          Exception.class,
          () ->
              AtomicFile.replace(
                  file,
                  out -> {
                    out.write(FRESH);
                    if (failure instanceof IOException e) {
                      throw e;
                    }
                    throw (RuntimeException) failure;
                  }));
      assertEquals("old", Files.readString(file));
      assertEquals(List.of("a"), names());
    }
  }

  @Test
  void aFullDiskIsCalledThat() {
    Path full = Path.of("/dev/full");
    assumeTrue(Files.exists(full), "only some systems offer a device that is always full");
    assertEquals("/dev/full cannot be written: the disk is full", refusal(full));
    assertTrue(Files.exists(full) && !Files.isRegularFile(full), "a device stays a device");
  }

  @Test
  void aFolderIsNotReplaced() throws IOException {
    Path file = Files.createDirectory(folder.resolve("a.ipynb"));
    assertEquals("F/a.ipynb is a folder; it is left as it was", refusal(file));
  }

  @Test
  void aMissingFolderIsNamed() {
    assertEquals(
        "F/no/a.ipynb cannot be written: there is no folder F/no",
        refusal(folder.resolve("no/a.ipynb")));
  }

  @Test
  void missingPermissionIsSaid() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    file.toFile().setWritable(false);
    assumeFalse(Files.isWritable(file), "an administrator may write everything");
    assertEquals("F/a cannot be written: there is no permission", refusal(file));
    assertEquals("old", Files.readString(file));
  }

  /** Replaces a file again and again by as many bytes of one letter, until it is killed. */
  static final class Replacer {
    static final int SIZE = 3_000_000;

    private Replacer() {}

    public static void main(String[] args) throws IOException {
      byte[] content = new byte[SIZE];
      for (byte letter = 'a'; ; letter = letter == 'z' ? (byte) 'a' : (byte) (letter + 1)) {
        Arrays.fill(content, letter);
        AtomicFile.replace(Path.of(args[0]), content);
      }
    }
  }

  @Test
  void aProgramThatIsKilledLeavesAWholeFile() throws Exception {
    Path file = folder.resolve("a");
    for (int round = 0; round < 3; round++) {
      Files.deleteIfExists(file);
      Process writer =
          new ProcessBuilder(
                  Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                  "-cp",
                  System.getProperty("java.class.path"),
                  Replacer.class.getName(),
                  file.toString())
              .inheritIO()
              .start();
      try {
        while (writer.isAlive() && !Files.exists(file)) {
          Thread.onSpinWait();
        }
        assertTrue(writer.isAlive(), "the writer ended by itself");
        writer.waitFor(20L + 17L * round, TimeUnit.MILLISECONDS);
      } finally {
        writer.destroyForcibly().waitFor();
      }
      byte[] content = Files.readAllBytes(file);
      byte[] whole = new byte[Replacer.SIZE];
      Arrays.fill(whole, content[0]);
      assertTrue(Arrays.equals(whole, content), "the file is not whole");
    }
  }
}
