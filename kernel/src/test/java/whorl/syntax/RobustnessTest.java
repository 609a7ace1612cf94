package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;

/** No text makes the parser fail, hang or overflow the stack. */
class RobustnessTest {
  private static final List<String> PIECES =
      List.of(
          "+",
          "-",
          "*",
          "/",
          "×",
          "·",
          "^",
          "±",
          "+-",
          "<",
          "<=",
          "≥",
          "=",
          "==",
          "!=",
          "(",
          ")",
          "[",
          "]",
          "|",
          "||",
          ",",
          ":",
          ".",
          "'",
          "@",
          "\"",
          "#",
          "_",
          "!",
          ";",
          "\\",
          " ",
          "  ",
          "\t",
          "\n",
          "\n",
          "\n    ",
          "\r\n",
          "\r",
          "\u00a0",
          "1",
          "2.5",
          "1e9",
          "1e999",
          "1_0",
          "5 m",
          "5 kg*g",
          "9.81 m/s^2",
          "3 W/(m²·K)",
          "30°",
          "%",
          "‰",
          "′",
          "Δ°C",
          "°C",
          "²",
          "⁻¹",
          "⁻",
          "½",
          "√",
          "a",
          "ω",
          "omega_max",
          "Α",
          "а",
          "５",
          "x₁",
          "e",
          "in",
          "in 10 steps",
          "m",
          "g",
          "if ",
          "then ",
          "else ",
          "and ",
          "or ",
          "not ",
          "true ",
          "over ",
          "with ",
          "checks",
          "check ",
          "check nominal ",
          "assume ",
          "cases s: a [m], b\n",
          "data d: t, x\n",
          "data d from \"d.csv\": t",
          "motion r\n",
          "x starts 0",
          "x' = ",
          "stop when ",
          "within ",
          "body b about ",
          "load ",
          "spin ",
          "turned ",
          "about ",
          "starts ",
          "solve n between ",
          "so that ",
          "for least ",
          "vary n from 0 to 1 by 1: ",
          "plot ",
          "against ",
          "sketch ",
          "spread ",
          "review",
          "x = ",
          "x [m] = ",
          "f(x [m]) [N] = ",
          "f(a, b = 2)",
          "(k = 2)",
          "q\u0307",
          "\u0301",
          "\u0301\u0316\u0315",
          "\u202e",
          "\u200b",
          "\ud83d\ude00",
          "\ud800",
          "\udc00",
          "\ud835\udf14",
          "\u0000",
          "中",
          "\ufeff",
          "\u2028",
          "\u3000");

  static LongStream seeds() {
    return LongStream.range(0, 300);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void anyTextIsReadOrRefusedWithPlacesInsideIt(long seed) {
    var random = new SplittableRandom(seed);
    int length = 1 << random.nextInt(1, 14);
    var text = new StringBuilder();
    while (text.length() < length) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
    }
    Source source = new Source(text.toString());
    Parsed parsed = Parser.parse(source, name -> name.equals("g"), CatalogueWords.STANDARD);
    assertTrue(parsed.errors().size() <= Parser.MOST_ERRORS);
    for (Diagnostic error : parsed.errors()) {
      assertTrue(error.span().end() <= source.length(), error::toString);
      assertTrue(error.problem().endsWith("."), error::toString);
      assertTrue(!DiagnosticText.render(error, source).isEmpty());
    }
    Printer.text(parsed);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void whatIsReadPrintsAsTextThatReadsTheSame(long seed) {
    var random = new SplittableRandom(seed);
    for (int i = 0; i < 300; i++) {
      var line = new StringBuilder();
      for (int pieces = random.nextInt(1, 9); pieces > 0; pieces--) {
        line.append(PIECES.get(random.nextInt(PIECES.size())));
      }
      Parsed parsed = parsed(line.toString());
      if (parsed.errors().isEmpty()) {
        String printed = Printer.text(parsed);
        Parsed again = parsed(printed);
        assertEquals(List.of(), again.errors(), printed);
        assertEquals(Unplaced.statements(parsed), Unplaced.statements(again), printed);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "(",
        "-",
        "2^",
        "if a then b else ",
        "|",
        "f(",
        "a.",
        "v @ ",
        "[",
        "a[",
        "(1,2,",
        "+",
        "x = (",
        "(\n",
        "f(\n",
        "if ",
        "2^-",
        "a and (",
        "\"",
        "motion m\n ",
        "5 m/(",
        "5 m^("
      })
  void deepNestingIsRefused(String opening) {
    for (String start : List.of("x = ", "")) {
      Parsed parsed = parsed(start + opening.repeat(10_000) + "a");
      assertEquals(List.of(), parsed.statements());
      assertTrue(!parsed.errors().isEmpty());
    }
  }

  static Stream<String> closedNests() {
    int deep = 10_000;
    return Stream.of(
        "(".repeat(deep) + "a" + ")".repeat(deep),
        "f(".repeat(deep) + ")".repeat(deep),
        "-".repeat(deep) + "a",
        "2^".repeat(deep) + "2",
        "a" + ".b".repeat(deep),
        "v" + " @ s".repeat(deep),
        "v @ s" + ".b".repeat(deep),
        "if a then ".repeat(deep) + "b" + " else c".repeat(deep),
        "if a then b else ".repeat(deep) + "c");
  }

  @ParameterizedTest
  @MethodSource("closedNests")
  void deepNestingIsRefusedEvenWhereItIsClosed(String nest) {
    assertEquals("depth", parsed("x = " + nest).errors().get(0).code());
  }

  @Test
  void aLongChainIsOneNode() {
    String chain = "x = 1" + "+1".repeat(400_000);
    var definition = (Statement.Definition) parsed(chain).statements().get(0);
    assertEquals(400_001, ((Expr.Sum) definition.value()).terms().size());
  }

  static Stream<String> longTexts() {
    int many = 900_000;
    return Stream.of(
        "x = 1" + "/1".repeat(many / 2),
        "x = 5 m" + "*m".repeat(many / 2),
        "x = f(" + "a,".repeat(many / 2) + "a)",
        "x = (" + "\n".repeat(many) + "1)",
        "(".repeat(many),
        "(\n".repeat(many / 2),
        "[".repeat(many),
        "x = (\ny = (".repeat(many / 12),
        "a\n".repeat(many / 2),
        "#\n".repeat(many / 2),
        "motion r\n" + "  #\n".repeat(many / 5) + "  x starts 0",
        "a" + "\u0301".repeat(many),
        "\u0301\u0316".repeat(many / 2),
        "1".repeat(many),
        "x".repeat(many),
        "x = 5 m^" + "1".repeat(many),
        "x = a" + "²".repeat(many),
        "\"".repeat(many),
        " ".repeat(many),
        "a[".repeat(many / 2),
        "x = 1 +\n".repeat(many / 8),
        "cases s: a\n" + " c 1\n".repeat(many / 5),
        "f(a) [m\n".repeat(many / 8),
        "5 m/(m·".repeat(many / 7));
  }

  @ParameterizedTest
  @MethodSource("longTexts")
  void longTextsTakeNoLongerThanTheirLengthAsks(String text) {
    // Quadratic time would be hours here; the limit only tells a hang from slow machines.
    assertTimeoutPreemptively(Duration.ofSeconds(60), () -> Printer.text(parsed(text)));
  }

  @Test
  void aTextOverTheLimitIsRefusedAsAWhole() {
    Parsed parsed = parsed("1" + "+1".repeat(5_000_000));
    assertEquals(List.of(), parsed.statements());
    assertEquals(List.of("size"), parsed.errors().stream().map(Diagnostic::code).toList());
  }

  @Test
  void atMostTenMistakesAreReportedOnePerStatement() {
    Parsed parsed = parsed("x = 2 * * ; ; 3\n".repeat(30));
    assertEquals(Parser.MOST_ERRORS, parsed.errors().size());
    assertEquals(2, parsed("x = ;;;\ny = 1\nz = (((\n").errors().size());
  }

  private static Parsed parsed(String text) {
    return Parser.parse(new Source(text), name -> false, CatalogueWords.STANDARD);
  }
}
