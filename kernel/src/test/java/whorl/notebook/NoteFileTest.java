package whorl.notebook;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HexFormat;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NoteFileTest {
  @TempDir Path folder;

  private String refusal(Path file) {
    var e = assertThrows(NoteFileException.class, () -> NoteFile.read(file));
    return e.getMessage().replace(folder.toString(), "F");
  }

  @Test
  void aMissingFileIsNamed() {
    assertEquals("there is no file F/a b.ipynb", refusal(folder.resolve("a b.ipynb")));
  }

  @Test
  void aFolderIsNoNote() throws IOException {
    Path file = Files.createDirectory(folder.resolve("a.ipynb"));
    assertEquals("F/a.ipynb is a folder, not a note", refusal(file));
  }

  @Test
  void otherKindsOfFilesAreRefusedByName() throws IOException {
    Path file = Files.createFile(folder.resolve("a.txt"));
    assertEquals(
        "F/a.txt is neither a notebook (.ipynb) nor a sheet (.whorl) by its name", refusal(file));
  }

  @Test
  void aFileWithoutPermissionIsRefused() throws IOException {
    Path file = Files.createFile(folder.resolve("a.whorl"));
    file.toFile().setReadable(false);
    assumeFalse(Files.isReadable(file), "an administrator may read everything");
    assertEquals("there is no permission to read F/a.whorl", refusal(file));
  }

  @Test
  void tooLargeAFileIsRefusedWithoutReadingOn() throws IOException {
    Path file = folder.resolve("a.ipynb");
    try (var out = new RandomAccessFile(file.toFile(), "rw")) {
      out.setLength(NoteFile.LARGEST + 1L);
    }
    assertEquals("F/a.ipynb is larger than 64 MB, the most that a note may have", refusal(file));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "e9             | line 1, column 1: the byte 0xE9",
        "61 0a 62 ff    | line 2, column 2: the byte 0xFF",
        "c3 a9 0d 0a e9 | line 2, column 1: the byte 0xE9",
        "f0 9d 9c 94 c0 | line 1, column 2: the byte 0xC0",
        "ed a0 80       | line 1, column 1: the byte 0xED",
        "ef bb bf 61 c3 | line 1, column 2: the byte 0xC3",
      })
  void textThatIsNotUtf8IsRefusedWithItsPlace(String hex, String place) throws IOException {
    byte[] bytes = HexFormat.ofDelimiter(" ").parseHex(hex);
    Path file = Files.write(folder.resolve("a.whorl"), bytes);
    assertEquals("F/a.whorl is not in UTF-8: " + place + " does not belong there", refusal(file));
  }

  @Test
  void theFaultOfABrokenNotebookHasItsPlace() throws IOException {
    Path file = Files.writeString(folder.resolve("a.ipynb"), "\uFEFF{\r\n \"é𝜔\": tru}");
    assertEquals(
        "F/a.ipynb is not a notebook, for it is not JSON: line 2, column 8: a value must stand here",
        refusal(file));
  }

  @Test
  void aSheetIsReadAsOneCellWithoutItsByteOrderMark() throws IOException {
    Path file = folder.resolve("A.WHORL");
    Files.write(file, "\uFEFFω [rpm] = 60\r\n".getBytes(UTF_8));
    assertEquals("ω [rpm] = 60\r\n", NoteFile.read(file).cells().get(0).source());
  }
}
