package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collector;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;

/**
 * The words of every message about a text that cannot be read. The table holds for each wrong line,
 * behind {@code >}, the code and the span, the words under the caret if any, and then problem,
 * reason and fix. It is rewritten from the lines it holds with {@code -Dwhorl.rewrite=messages},
 * run from the folder of the module, and read in review.
 */
class MessagesTest {
  private static final String TABLE = "messages.txt";
  private static final Path FILE = Path.of("src/test/resources/whorl/syntax", TABLE);

  @Test
  void everyMistakeIsExplainedInTheWordsOfTheTable() throws IOException {
    String table = Resources.text(TABLE);
    String now = table.lines().takeWhile(line -> line.startsWith("#")).collect(lines());
    now += wrongLines(table).stream().map(MessagesTest::entry).collect(Collectors.joining("\n"));
    if (System.getProperty("whorl.rewrite", "").equals("messages")) {
      Files.writeString(FILE, now);
    }
    assertEquals(table, now);
  }

  @Test
  void everyCodeOfTheTableOfLinesHasItsWords() throws IOException {
    Set<String> wanted =
        LinesTest.rows()
            .filter(row -> row.kind().equals("error"))
            .map(LinesTest.Row::expected)
            .collect(Collectors.toCollection(TreeSet::new));
    Set<String> found = new TreeSet<>();
    for (String line : wrongLines(Resources.text(TABLE))) {
      found.add(message(line).code());
    }
    wanted.removeAll(found);
    assertEquals(Set.of(), wanted);
  }

  private static Collector<CharSequence, ?, String> lines() {
    return Collectors.joining("\n", "", "\n\n");
  }

  private static List<String> wrongLines(String table) {
    return table.lines().filter(line -> line.startsWith("> ")).map(l -> l.substring(2)).toList();
  }

  private static String entry(String line) {
    Diagnostic message = message(line);
    var parts = new ArrayList<String>();
    parts.add("> " + line);
    parts.add(message.code() + " " + message.span());
    message.further().forEach(label -> parts.add(label.span() + " " + label.text()));
    for (String part : List.of(message.problem(), message.reason(), message.fix())) {
      if (!part.isEmpty()) {
        parts.add(part);
      }
    }
    return String.join("\n", parts) + "\n";
  }

  /** The first message about a line; {@code g} and {@code K} are names of the sheet. */
  private static Diagnostic message(String line) {
    Source source = new Source(Resources.unescaped(line));
    Parsed parsed = Parser.parse(source, Set.of("g", "K")::contains, CatalogueWords.STANDARD);
    assertEquals(false, parsed.errors().isEmpty(), line);
    return parsed.errors().get(0);
  }
}
