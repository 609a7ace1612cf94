package whorl.units;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The data files of this package: cells separated by commas, nothing quoted, remarks behind {@code
 * #} at the start of a line, then a line with the names of the columns.
 */
final class CommaSeparated {

  private CommaSeparated() {}

  /** The cells of each line below the names of the columns. */
  static List<List<String>> lines(String file, int columns) {
    List<List<String>> lines = new ArrayList<>();
    try (var reader =
        new BufferedReader(new InputStreamReader(stream(file), StandardCharsets.UTF_8))) {
      boolean named = false;
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (!line.isEmpty() && line.charAt(0) != '#') {
          if (named) {
            lines.add(cells(file, line, columns));
          }
          named = true;
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException("the data file " + file + " cannot be read", e);
    }
    return lines;
  }

  private static InputStream stream(String file) {
    @Nullable InputStream stream = CommaSeparated.class.getResourceAsStream(file);
    if (stream == null) {
      throw new IllegalStateException("the data file " + file + " is missing from the program");
    }
    return stream;
  }

  private static List<String> cells(String file, String line, int columns) {
    List<String> cells = split(line, ',');
    if (cells.size() != columns) {
      throw new IllegalStateException(
          "%s: a line has %d cells in place of %d: %s"
              .formatted(file, cells.size(), columns, line));
    }
    return cells;
  }

  /** The words of a cell, which are separated by blanks. */
  static List<String> words(String cell) {
    return cell.isEmpty() ? List.of() : split(cell, ' ');
  }

  /** The units of a cell, which are separated by blanks. */
  static List<UnitText> units(String cell) {
    List<UnitText> units = new ArrayList<>();
    for (String word : words(cell)) {
      units.add(UnitReader.read(word));
    }
    return units;
  }

  private static List<String> split(String text, char separator) {
    List<String> parts = new ArrayList<>();
    int start = 0;
    for (int end = text.indexOf(separator); end >= 0; end = text.indexOf(separator, start)) {
      parts.add(text.substring(start, end));
      start = end + 1;
    }
    parts.add(text.substring(start));
    return parts;
  }
}
