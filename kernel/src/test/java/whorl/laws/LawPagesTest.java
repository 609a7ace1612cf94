package whorl.laws;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * The pages about laws in the documentation are those of the catalogue. To write them anew after a
 * change: {@code mvn ... -Dtest=LawPagesTest -Dwhorl.rewrite=true}.
 */
class LawPagesTest {
  private static final Path FOLDER = Path.of("docs/laws");

  @Test
  void thePagesAreThoseOfTheCatalogue() throws IOException {
    Map<String, String> pages = LawPages.all();
    if (Boolean.getBoolean("whorl.rewrite")) {
      Files.createDirectories(FOLDER);
      for (Map.Entry<String, String> page : pages.entrySet()) {
        Files.writeString(FOLDER.resolve(page.getKey()), page.getValue());
      }
    }
    assertEquals(new TreeMap<>(pages), committed());
  }

  private static Map<String, String> committed() throws IOException {
    var committed = new TreeMap<String, String>();
    try (Stream<Path> files = Files.list(FOLDER)) {
      Set<Path> pages = files.collect(Collectors.toSet());
      for (Path page : pages) {
        committed.put(page.getFileName().toString(), Files.readString(page));
      }
    }
    return committed;
  }
}
