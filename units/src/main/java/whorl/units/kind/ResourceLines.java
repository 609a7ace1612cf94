package whorl.units.kind;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** The lines of a data file of this package, without remarks and empty lines. */
final class ResourceLines {
  private ResourceLines() {}

  static List<String> of(String file) {
    @Nullable InputStream stream = ResourceLines.class.getResourceAsStream(file);
    if (stream == null) {
      throw new IllegalStateException("the data file " + file + " is missing from the program");
    }
    try (var reader = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
      return reader
          .lines()
          .map(ResourceLines::withoutRemark)
          .filter(line -> !line.isEmpty())
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException("the data file " + file + " cannot be read", e);
    }
  }

  /** A remark begins at the start of a line or behind a blank; a rule may have a # inside. */
  private static String withoutRemark(String line) {
    int start = line.startsWith("#") ? 0 : line.indexOf(" # ");
    return (start < 0 ? line : line.substring(0, start)).strip();
  }
}
