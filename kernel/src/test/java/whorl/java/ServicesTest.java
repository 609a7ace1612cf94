package whorl.java;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.assist.Completion.Candidate;

class ServicesTest {
  private static final JavaCells JAVA = new JavaCells();

  @BeforeAll
  static void declare() {
    JAVA.run(
        """
        int twice(int n) {
          return 2 * n;
        }
        double counted = 3;
        class Disc {
          static final int MOST_HOLES = 4;
          double mass;
          void spin(double w) {}
        }
        Disc disc = new Disc();
        """);
  }

  @AfterAll
  static void close() {
    JAVA.close();
  }

  /** Completes where {@code |} stands. */
  private static Completion complete(String marked) {
    int cursor = marked.indexOf('|');
    return JAVA.side().complete(marked.replace("|", ""), cursor);
  }

  @ParameterizedTest
  @CsvSource({
    "count|, counted, variable, double",
    "%%java\\nint a = 1;\\ntwi|, twice(, method, int twice(int)",
    "disc.ma|, mass, field, ''",
    "disc.sp|(3), spin(, method, ''",
    "Disc.MO|, MOST_HOLES, field, ''",
    "new Dis|, Disc(), class, ''",
    "int q = 2; Strin| + 1, String, class, ''",
    "retu|, return, keyword, ''",
    "for (int i = 0; i < coun|, counted, variable, double",
    "%ja|, %jars, magic, ''",
    "int b = 2;\\n%|, %classpath, magic, ''",
    "sheet.va|, value(, method, ''",
    "displ|, display(, method, ''",
    "Math.ma|, max(, method, ''",
  })
  void theCursorIsCompleted(String marked, String text, String type, String detail) {
    String code = marked.replace("\\n", "\n");
    Completion completion = complete(code);
    List<Candidate> found =
        completion.candidates().stream().filter(each -> each.text().equals(text)).toList();
    assertEquals(List.of(new Candidate(text, type, detail)), found, completion::toString);
    int cursor = code.indexOf('|');
    assertEquals(cursor, completion.end());
    assertTrue(text.startsWith(code.substring(completion.start(), cursor)), completion::toString);
  }

  @ParameterizedTest
  @ValueSource(strings = {"%jars nowhere|", "disc.zzz|", "disc.retu|"})
  void whereNothingFitsNothingIsOffered(String marked) {
    assertEquals(List.of(), complete(marked).candidates());
  }

  @Test
  void aMagicIsNoneWithinAStatement() {
    List<String> offered =
        complete("int a = 7\n  %ja|").candidates().stream().map(Candidate::text).toList();
    assertFalse(offered.contains("%jars"), offered::toString);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "coun|ted + 1; counted:double",
        "disc.spin|(3); void Disc.spin(double w)",
        "disc.spin(3 + |; void Disc.spin(double w)",
        "int a = 1\\ntwi|ce(a); int twice(int n)",
        "Str|ing; java.lang.String",
        "%%java\\nMath.ma|x(1, 2); int Math.max(int a, int b)",
        "sheet.val|ue; double whorl.java.JavaSheet.value(",
      })
  void aWordIsExplained(String marked, String signature) {
    String code = marked.replace("\\n", "\n");
    JsonObject card = JAVA.side().inspect(code.replace("|", ""), code.indexOf('|')).orElseThrow();
    String text = card.get("text/plain").getAsString();
    assertTrue(text.startsWith(signature), text);
    assertTrue(card.get("text/html").getAsString().startsWith("<div><code>"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"nothi|ng", "%ja|rs x", "|", "1 + |"})
  void whatIsUnknownIsNotExplained(String marked) {
    assertTrue(JAVA.side().inspect(marked.replace("|", ""), marked.indexOf('|')).isEmpty(), marked);
  }

  static Stream<Arguments> completeness() {
    return Stream.of(
        Arguments.of("", new Completeness.Complete()),
        Arguments.of("1 + 1", new Completeness.Complete()),
        Arguments.of("%jars x.jar\nint a = 1;\n%jars y.jar", new Completeness.Complete()),
        Arguments.of("int f() {", new Completeness.Incomplete("    ")),
        Arguments.of(
            "%jars x.jar\nint f() {\n  if (a) { // why", new Completeness.Incomplete("      ")),
        Arguments.of("int f() {\n    int a = 1;", new Completeness.Incomplete("    ")),
        Arguments.of("1 +", new Completeness.Incomplete("")),
        Arguments.of("/* open", new Completeness.Incomplete("")),
        Arguments.of("int = )", new Completeness.Invalid()),
        Arguments.of("%%html\n<p>", new Completeness.Incomplete("")),
        Arguments.of("%%html\n<p>\n", new Completeness.Complete()));
  }

  @ParameterizedTest
  @MethodSource("completeness")
  void aConsoleKnowsWhetherMoreMustFollow(String code, Completeness answer) {
    assertEquals(answer, JAVA.side().completeness(code));
  }
}
