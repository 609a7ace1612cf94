package whorl.page;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class LivePageTest {
  private final LivePage page = new LivePage(PlainLanguage.SHEET);
  private final ShownPage shown = new ShownPage(page);

  @AfterEach
  void close() {
    page.close();
  }

  private void runsWithoutError(String cell, String code) {
    CellAnswer answer = shown.run(cell, code);
    if (answer instanceof CellAnswer.Failed failed) {
      throw new AssertionError(String.join("\n", failed.lines()));
    }
  }

  private String error(String cell, String code) {
    return String.join(
        "\n", assertInstanceOf(CellAnswer.Failed.class, shown.run(cell, code)).lines());
  }

  private static void holds(String text, String... parts) {
    assertAll(
        List.of(parts).stream()
            .map(part -> () -> assertTrue(text.contains(part), part + "\nis not in\n" + text)));
  }

  @Test
  void changedInputShowsTwoCellsBelowAndInTheCellThatChangedIt() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("b", "I = 41.72 kg·m²");
    runsWithoutError("c", "E [MJ] = 1/2*I*n^2\ncheck E <= 10 MJ");
    holds(shown.text("c"), "8.235 MJ", "holds");

    runsWithoutError("a", "n [rpm] = 7000");

    holds(shown.text("c"), "11.21 MJ", "FAILS", "Recalculated in [4].");
    holds(
        shown.text("a"),
        "7000 rpm",
        "now E ≈ 11.21 MJ, was 8.235 MJ",
        "FAILS now: check E ≤ 10 MJ");
  }

  @Test
  void whatLooksAsBeforeIsNotShownAnew() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("b", "k = 2");
    runsWithoutError("c", "d = 2*k");
    Bundle before = shown.outputs("c").get(0).bundle();
    runsWithoutError("a", "n [rpm] = 7000");
    assertEquals(before, shown.outputs("c").get(0).bundle());
    assertFalse(shown.text("c").contains("Recalculated"));
  }

  @Test
  void deletedCellWithdrawsItsNamesAndTheNextCellSaysSo() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("b", "t = 2 s");
    runsWithoutError("c", "turns = n*t");
    shown.delete("a");
    runsWithoutError("b", "t = 2 s");
    holds(shown.text("c"), "waits for n");
    holds(shown.text("b"), "Withdrawn with a deleted cell: n.", "without result now: turns");
  }

  @Test
  void cellInErrorLeavesThePageAsItWasAndSaysWhatStands() {
    runsWithoutError("a", "m [kg] = 4\nD [mm] = 300");
    runsWithoutError("b", "I [kg·m²] = 1/8*m*D^2");
    String before = shown.text("b");
    holds(
        error("a", "m [kg] = 5\nD [mm] = 300 kg"),
        "This cell was not taken over: m and D stand as before.");
    assertEquals(before, shown.text("b"));
    assertEquals(List.of(), shown.outputs("a"));
  }

  @Test
  void changeElsewhereThatBreaksACellShowsACardThere() {
    runsWithoutError("a", "k = 4");
    runsWithoutError("b", "x = 1/k");
    runsWithoutError("a", "k = 0");
    holds(shown.text("b"), "k");
    holds(shown.text("a"), "without result now: x");
    runsWithoutError("a", "k = 5");
    holds(shown.text("b"), "0.2");
  }

  @Test
  void cellsFromBeforeAReloadAreNamed() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("b", "f [Hz] = n/(2*pi)");
    shown.reload();
    runsWithoutError("a", "n [rpm] = 3000");
    holds(
        shown.text("a"),
        "Shown before the page was loaded anew, so run again to be up to date: [2].");
    runsWithoutError("b", "f [Hz] = n/(2*pi)");
    runsWithoutError("a", "n [rpm] = 1500");
    assertFalse(shown.text("a").contains("loaded anew"), shown.text("a"));
  }

  @Test
  void sheetAndJavaCellsChangeTheirRoles() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("a", "%%java\nint twice = 2 * 3;");
    runsWithoutError("b", "w = n");
    holds(shown.text("b"), "waits for n");
    runsWithoutError("a", "%%sheet\nn [rpm] = 600");
    holds(shown.text("b"), "600 rpm");
  }

  @Test
  void functionPublishedFromJavaIsPartOfTheSheet() {
    runsWithoutError("a", "v = drag(3 m/s)");
    holds(shown.text("a"), "waits for drag");
    runsWithoutError("b", "%%java\nsheet.function(\"drag(v [m/s]) [N]\", v -> 2 * v * v);");
    holds(shown.text("a"), "18 N");
    runsWithoutError("b", "%%java\nsheet.function(\"drag(v [m/s]) [N]\", v -> 3 * v * v);");
    holds(shown.text("a"), "27 N");
    holds(shown.text("b"), "now v = 27 N, was 18 N");
    holds(error("c", "x = drag(3 kg)"), "drag");
    shown.delete("b");
    runsWithoutError("d", "k = 1");
    holds(shown.text("a"), "waits for drag");
  }

  @Test
  void cellInJavaThatReadSomethingElseSinceIsNamed() {
    runsWithoutError("a", "n [rpm] = 6000");
    runsWithoutError("b", "%%java\nSystem.out.println(sheet.value(\"n\", \"rpm\"));");
    holds(shown.text("b"), "6000.0");
    runsWithoutError("a", "n [rpm] = 7000");
    holds(shown.text("a"), "Changed since Java used it, so run again: cell [2] read n.");
    runsWithoutError("c", "k = 3");
    assertFalse(shown.text("c").contains("Java"), shown.text("c"));
    runsWithoutError("b", "%%java\nSystem.out.println(sheet.value(\"n\", \"rpm\"));");
    holds(shown.text("b"), "7000.0");
  }

  @Test
  void consoleRedefinesPlainly() {
    shown.type("n [rpm] = 6000");
    shown.type("E = 1/2*41.72 kg·m²*n^2");
    String text = shown.type("n [rpm] = 7000").get(0).text();
    holds(text, "7000 rpm", "now E ≈");
    shown.type("%%java\nsheet.function(\"twice(x) [1]\", x -> 2 * x);");
    shown.type("y = twice(3)");
    String again =
        shown.type("%%java\nsheet.function(\"twice(x) [1]\", x -> 2.5 * x);").get(0).text();
    holds(again, "now y = 7.5, was 6");
  }

  @Test
  void commandsListShowAndWithdraw() {
    runsWithoutError("a", "n [rpm] = 6000  # plate\nE [MJ] = 1/2*41.72 kg·m²*n^2");
    runsWithoutError("b", "%definitions");
    holds(shown.text("b"), "n", "6000 rpm", "[1]", "E");
    runsWithoutError("c", "%withdraw n");
    holds(shown.text("c"), "without result now: E");
    holds(shown.text("a"), "waits for n");
    holds(error("c", "%withdraw n"), "No cell defines n.");
    holds(error("c", "%nonsense"), "There is no command %nonsense");
  }

  @Test
  void expressionsOfAClientLeaveNothingBehind() {
    runsWithoutError("a", "n [rpm] = 6000");
    ExpressionAnswer answer = page.evaluate("2*n");
    holds(
        assertInstanceOf(ExpressionAnswer.Value.class, answer)
            .bundle()
            .data()
            .get("text/plain")
            .getAsString(),
        "1257 rad/s");
    assertInstanceOf(ExpressionAnswer.Failed.class, page.evaluate("2*unknown"));
    assertInstanceOf(ExpressionAnswer.Failed.class, page.evaluate("n = 3"));
    assertInstanceOf(ExpressionAnswer.Failed.class, page.evaluate("2*"));
  }

  @Test
  void outputsOfTwoPagesAreNotTakenForEachOther() {
    try (var other = new LivePage(PlainLanguage.SHEET)) {
      assertNotEquals(
          shown.type("k = 1").get(0).id(), new ShownPage(other).type("k = 1").get(0).id());
    }
  }
}
