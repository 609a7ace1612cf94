package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;

/** The examples of the user's page of the language are read, or refused, as the page says. */
class LanguagePageTest {
  private static final Path PAGE = Path.of("docs/language.md");

  static Stream<String> examples() throws IOException {
    return blocks("whorl");
  }

  static Stream<String> wrongLines() throws IOException {
    return blocks("whorl-refused").flatMap(String::lines);
  }

  private static Stream<String> blocks(String language) throws IOException {
    var fence = Pattern.compile("(?ms)^```" + language + "\n(.*?)^```$");
    return fence.matcher(Files.readString(PAGE)).results().map(found -> found.group(1));
  }

  @ParameterizedTest
  @MethodSource("examples")
  void anExampleIsRead(String example) {
    assertEquals(List.of(), parsed(example).errors());
  }

  @ParameterizedTest
  @MethodSource("wrongLines")
  void aLineShownAsWrongIsRefused(String line) {
    assertFalse(parsed(line).errors().isEmpty());
  }

  @Test
  void theMessageOnThePageIsTheOneThatIsShown() throws IOException {
    Source source = new Source("a = 1/2 in");
    String message = DiagnosticText.render(parsed(source.text()).errors().get(0), source);
    assertTrue(Files.readString(PAGE).contains(message), message);
  }

  private static Parsed parsed(String text) {
    return Parser.parse(new Source(text), name -> false, CatalogueWords.STANDARD);
  }
}
