package whorl.assist;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Objects;
import java.util.stream.Stream;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;

/** The sheet and the tables of these tests. */
final class Samples {
  private Samples() {}

  /** A sheet with the lines of sheet.txt in its cell [2]. */
  static Sheet sheet() {
    var sheet = new Sheet();
    CellOutcome outcome = sheet.run(new CellId("c2"), "cell [2]", text("sheet.txt"));
    if (!outcome.errors().isEmpty()) {
      throw new IllegalStateException(outcome.errors().toString());
    }
    return sheet;
  }

  /** The lines of a table without remarks. */
  static Stream<String> lines(String file) {
    // A remark begins with a sign and a blank; the lines of the sheet with a remark have a cursor.
    return text(file)
        .lines()
        .filter(line -> line.contains(" => ") && (!line.startsWith("# ") || line.contains("‸ =>")));
  }

  static String text(String file) {
    try (InputStream stream = Samples.class.getResourceAsStream(file)) {
      byte[] bytes = Objects.requireNonNull(stream, file).readAllBytes();
      return new String(bytes, StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
