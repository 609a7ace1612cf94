package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class TextWrapTest {

  static Stream<Arguments> longLines() {
    return Stream.of(
        Arguments.of("short", 10, List.of("short")),
        Arguments.of("first term + second", 15, List.of("first term", "  + second")),
        // A sign inside parentheses waits until no other break is left.
        Arguments.of(
            "(a + b)\u200B·(c + d)\u200B·e", 12, List.of("(a + b)", "  \u200B·(c + d)\u200B·e")),
        Arguments.of(
            "≈\u00A036.40\u00A0N·m·s computed",
            15,
            List.of("≈\u00A036.40\u00A0N·m·s", "  computed")),
        Arguments.of("words that go on", 10, List.of("words that", "  go on")),
        Arguments.of("unbreakable", 5, List.of("unbre", "  aka", "  ble")));
  }

  @ParameterizedTest
  @MethodSource("longLines")
  void linesBreakBeforeSignsThenBeforeDotsThenAtBlanks(String text, int width, List<String> lines) {
    assertEquals(lines, TextWrap.wrap(text, width));
  }

  @ParameterizedTest
  @CsvSource({"abc, 3", "ω_max, 5", "'e\u0301', 1", "'x\u200Bx', 2", "幅, 2", "'', 0"})
  void widthCountsColumnsOfTheTerminal(String text, int columns) {
    assertEquals(columns, TextWidth.of(text));
  }

  @Test
  void nothingIsLostAndNothingIsTooWide() {
    var random = new SplittableRandom(12);
    String alphabet = "abω³ +−·(),\u200B\u00A0幅";
    for (int i = 0; i < 200; i++) {
      var text = new StringBuilder();
      for (int k = random.nextInt(60); k > 0; k--) {
        text.append(alphabet.charAt(random.nextInt(alphabet.length())));
      }
      List<String> lines = TextWrap.wrap(text.toString(), 12);

      assertEquals(text.toString().replace(" ", ""), String.join("", lines).replace(" ", ""));
      assertTrue(lines.stream().allMatch(line -> TextWidth.of(line) <= 12), lines.toString());
    }
  }
}
