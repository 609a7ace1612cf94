package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.diagnostic.Source;

/** Every line of the table is read as the table says. */
class LinesTest {
  private static final UnitWords UNITS = CatalogueWords.STANDARD;

  /** A row of the table; names stands for the names of the sheet at that point. */
  record Row(String kind, String source, String expected, String span, Set<String> names) {
    @Override
    public String toString() {
      return kind + " " + source + (names.isEmpty() ? "" : " with " + names);
    }
  }

  static Stream<Row> rows() throws IOException {
    return Resources.lines("lines.tsv").stream()
        .filter(line -> !line.startsWith("# ") && !line.startsWith("kind\t"))
        .map(line -> line.split("\t", -1))
        .map(
            cells ->
                new Row(
                    cells[0],
                    Resources.unescaped(cells[1]),
                    Resources.unescaped(cells[2]),
                    cells[3],
                    names(cells[4])));
  }

  private static Set<String> names(String note) {
    if (!note.startsWith("names=")) {
      return Set.of();
    }
    return Set.of(note.substring("names=".length()).replaceFirst(";.*", "").split(","));
  }

  @ParameterizedTest
  @MethodSource("rows")
  void isReadAsTheTableSays(Row row) {
    Parsed parsed = Parser.parse(new Source(row.source()), row.names()::contains, UNITS);
    var errors =
        parsed.errors().stream().map(error -> error.code() + " " + error.span()).limit(1).toList();
    if (row.kind().equals("error")) {
      assertEquals(List.of(row.expected() + " " + row.span()), errors);
    } else {
      assertEquals(List.of(), errors);
      assertEquals(row.expected(), Printer.text(parsed));
    }
  }
}
