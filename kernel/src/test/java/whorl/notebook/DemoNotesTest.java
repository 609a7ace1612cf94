package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The demo notes hold, and their files hold what they come to. */
class DemoNotesTest {
  static List<Path> notes() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("..", "notebooks-demo"))) {
      return files.filter(file -> file.toString().endsWith(".ipynb")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("notes")
  void everythingInADemoNoteHoldsAndIsStored(Path file) throws NoteFileException {
    NoteRun run = NoteRun.of(NoteFile.read(file), JavaCells.RUN, NoteFile.folder(file));
    Tally tally = Tally.of(run);
    assertFalse(tally.hasErrors() || tally.hasFailures(), tally::words);
    var recheck = new Recheck(run);
    assertEquals(List.of(), recheck.differences());
    assertTrue(recheck.compared() > 20, "most of a demo is compared");
  }
}
