package whorl.assist;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.sheet.Sheet;

/** Whatever stands in a cell and wherever the cursor is, an answer comes. */
class RandomTextTest {
  private static final int TEXTS = 600;

  private static final List<String> PIECES =
      List.of(
          "E",
          "m",
          "ω_max",
          "v_rim",
          "(",
          ")",
          "[",
          "]",
          ",",
          " ",
          "  ",
          "\n",
          "\n    ",
          "=",
          "+",
          "-",
          "*",
          "/",
          "^",
          "²",
          "⁻¹",
          "×",
          "·",
          "|",
          ".",
          "'",
          "@",
          "\\",
          "\\ome",
          "\"",
          "#",
          "%",
          "%%",
          "°",
          "°C",
          "′",
          "12",
          "3.5",
          "1e",
          "1_",
          "0.",
          "kg",
          "N·m",
          "kN*",
          "m/s",
          "check ",
          "assume ",
          "within ",
          "nominal ",
          "if ",
          " then ",
          " else ",
          " and ",
          " or ",
          "cases a: ",
          "data d: ",
          "motion r",
          "<=",
          "<",
          "≤",
          "±",
          "with ",
          "sqrt(",
          "atan2(",
          "unit(",
          "𝜔",
          "é",
          "e\u0301",
          "\uD835",
          "\u202E",
          "А",
          "，",
          "\t",
          "\r\n",
          ":",
          "energy",
          "x [m]",
          "f(x [m]) = ");

  private static final Sheet SHEET = Samples.sheet();
  private static final Assistant ASSISTANT = new Assistant(SHEET);

  static Stream<String> texts() {
    var random = new SplittableRandom(20260);
    List<String> lines = Samples.text("sheet.txt").lines().toList();
    return IntStream.range(0, TEXTS)
        .mapToObj(i -> i % 2 == 0 ? pieces(random) : spoiled(lines, random));
  }

  private static String pieces(SplittableRandom random) {
    var text = new StringBuilder();
    for (int i = random.nextInt(1, 24); i > 0; i--) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
    }
    return text.toString();
  }

  /** Lines of a note with pieces cut out and put in. */
  private static String spoiled(List<String> lines, SplittableRandom random) {
    var text = new StringBuilder();
    for (int i = random.nextInt(1, 5); i > 0; i--) {
      text.append(lines.get(random.nextInt(lines.size()))).append('\n');
    }
    for (int i = random.nextInt(1, 6); i > 0; i--) {
      int place = random.nextInt(text.length() + 1);
      text.delete(place, Math.min(text.length(), place + random.nextInt(6)));
      text.insert(place, PIECES.get(random.nextInt(PIECES.size())));
    }
    return text.toString();
  }

  @ParameterizedTest
  @MethodSource("texts")
  void anyTextIsAnswered(String text) {
    var random = new SplittableRandom(text.hashCode());
    for (int i = 0; i < 4; i++) {
      int cursor = random.nextInt(text.length() + 1);
      Completion completion = ASSISTANT.complete(text, cursor);
      assertTrue(0 <= completion.start() && completion.start() <= completion.end(), text);
      assertTrue(completion.end() <= cursor, text);
      ASSISTANT
          .inspect(text, cursor, i % 2)
          .ifPresent(card -> assertTrue(card.html().startsWith("<div") && !card.text().isBlank()));
    }
    Assistant.completeness(text);
  }

  @Test
  void placesOutsideTheTextAreTakenForItsEnds() {
    assertEquals(0, ASSISTANT.complete("E", -3).end());
    assertEquals(1, ASSISTANT.complete("E", 99).end());
  }

  @Test
  void asksLeaveTheSheetAsItWas() {
    long evaluations = SHEET.evaluations();
    List<?> cells = SHEET.cells();
    texts().limit(50).forEach(text -> ASSISTANT.complete(text, text.length()));
    assertEquals(evaluations, SHEET.evaluations());
    assertEquals(cells, SHEET.cells());
  }
}
