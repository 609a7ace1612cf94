package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Texts that nobody would write: the sheet answers every one and keeps what it has. */
class RandomSheetsTest {
  private static final List<String> PIECES =
      List.of(
          "a",
          "b",
          "ω",
          "n_1",
          "x",
          "f",
          "g",
          "F",
          "v",
          " ",
          " ",
          "\n",
          "\n",
          " = ",
          " = ",
          " + ",
          " - ",
          "*",
          "/",
          " * ",
          " / ",
          "^",
          "²",
          "(",
          ")",
          "(",
          ")",
          "[",
          "]",
          ",",
          ", ",
          ".",
          "'",
          "@",
          "|",
          "±",
          " < ",
          " <= ",
          "≥",
          "check ",
          "assume ",
          "if ",
          " then ",
          " else ",
          " and ",
          " or ",
          " within ",
          "plot ",
          "motion ",
          "cases ",
          "data ",
          "solve ",
          "vary ",
          "1",
          "2.5",
          "6000",
          "1e300",
          "0",
          "3 m",
          "5 kg",
          "6000 rpm",
          "50 Hz",
          "2 N·m",
          "20 degC",
          "4 K",
          "7 J",
          "9 s",
          "1 %",
          "sqrt(",
          "sin(",
          "min(",
          "exp(",
          "unit(",
          "π",
          "g_n",
          "#",
          "\"t\"",
          "×",
          "·",
          "true",
          "\t",
          "Ω",
          "é",
          "𝜔",
          "\u0301",
          " a = 1\n",
          " b = a * 2 m\n");

  private static String text(long seed) {
    var random = new SplittableRandom(seed);
    int size = random.nextInt(1, 10_000);
    var text = new StringBuilder();
    while (text.length() < size) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
    }
    return text.toString();
  }

  static LongStream seeds() {
    return LongStream.range(0, 100);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void randomTextIsAnsweredAndLeavesTheSheetWhole(long seed) {
    var sheet = new Sheet();
    var first = new CellId("first");
    assertTrue(sheet.run(first, "cell [1]", "a = 1\nω [rpm] = 6000\nz = a + 1").tookEffect());
    String before = sheet.steps(first).toString();
    CellOutcome outcome =
        Assertions.assertTimeoutPreemptively(
            Duration.ofSeconds(60), () -> sheet.run(new CellId("second"), "cell [2]", text(seed)));
    assertTrue(outcome.errors().size() <= 10);
    if (!outcome.tookEffect()) {
      assertEquals(before, sheet.steps(first).toString());
      assertEquals(List.of(first), sheet.cells());
    }
  }

  /** Lines that are sound by themselves in any number and order, with the names that they use. */
  private static String soundCell(SplittableRandom random, int cell) {
    var lines = new ArrayList<String>();
    int count = random.nextInt(1, 6);
    for (int line = 0; line < count; line++) {
      String name = "q" + cell + "_" + line;
      // A cell uses names of cells before it only, so that no order closes a ring.
      String other = cell == 0 ? "3" : "q" + random.nextInt(cell) + "_" + random.nextInt(6);
      lines.add(
          switch (random.nextInt(5)) {
            case 0 -> name + " = " + random.nextInt(100);
            case 1 -> name + " = " + other + " * 2 + " + random.nextInt(10);
            case 2 -> name + " = if " + other + " > 50 then 1 else 2";
            case 3 -> "check " + other + " <= " + random.nextInt(100);
            default -> "assume " + other + " >= 0\n" + name + " = " + other + " - 1";
          });
    }
    return String.join("\n", lines);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void anyOrderAndAnyRepetitionOfCellsGivesTheSameSheet(long seed) {
    var random = new SplittableRandom(seed);
    var texts = new ArrayList<String>();
    int count = random.nextInt(2, 9);
    for (int cell = 0; cell < count; cell++) {
      texts.add(soundCell(random, cell));
    }
    var inOrder = new Sheet();
    for (int cell = 0; cell < count; cell++) {
      run(inOrder, cell, texts.get(cell));
    }
    var edited = new Sheet();
    for (int edit = 0; edit < 3 * count; edit++) {
      int cell = random.nextInt(count);
      run(edited, cell, random.nextBoolean() ? texts.get(cell) : soundCell(random, cell));
    }
    for (int cell = count - 1; cell >= 0; cell--) {
      run(edited, cell, texts.get(cell));
    }
    for (int cell = 0; cell < count; cell++) {
      var id = new CellId("c" + cell);
      assertEquals(inOrder.steps(id).toString(), edited.steps(id).toString());
    }
  }

  private static void run(Sheet sheet, int cell, String text) {
    CellOutcome outcome = sheet.run(new CellId("c" + cell), "cell [" + cell + "]", text);
    assertTrue(outcome.tookEffect(), () -> outcome.errors() + "\n" + text);
  }
}
