package whorl.assist;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.assist.Completion.Candidate;
import whorl.check.ConstantAtHand;
import whorl.check.Vocabulary;
import whorl.laws.Laws;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;
import whorl.sheet.Step;
import whorl.syntax.Words;

/**
 * What is said of names, units and words. The table is rewritten from the lines it holds with
 * {@code -Dwhorl.rewrite=cards}, run from the folder of the module, and read in review.
 */
class CardTest {
  private static final String TABLE = "cards.txt";
  private static final Path FILE = Path.of("src/test/resources/whorl/assist", TABLE);
  private static final List<String> NOT_WORKED_OUT =
      List.of(
          "cases s: a\n    calm 1",
          "data d: a, b\n    1, 2",
          "solve n between 1 and 2 so that n = 1",
          "vary n from 1 to 2 by 1: n",
          "plot n against n from 1 to 2",
          "spread n",
          "review");

  private static final Assistant ASSISTANT =
      new Assistant(
          Samples.sheet(), List.of(new Candidate("%results", "magic", "shows all steps")));

  @Test
  void everyCardSaysWhatTheTableSays() throws IOException {
    String table = Samples.text(TABLE);
    String now = table.lines().takeWhile(line -> line.startsWith("#")).collect(lines()) + "\n";
    now +=
        table
            .lines()
            .filter(line -> line.startsWith("> "))
            .map(CardTest::entry)
            .collect(Collectors.joining("\n"));
    if (System.getProperty("whorl.rewrite", "").equals("cards")) {
      Files.writeString(FILE, now);
    }
    assertEquals(table, now);
  }

  private static java.util.stream.Collector<CharSequence, ?, String> lines() {
    return Collectors.joining("\n", "", "\n");
  }

  private static String entry(String line) {
    int detail = line.charAt(2) - '0';
    String text = line.substring(4).replace("⏎", "\n");
    int cursor = text.indexOf('‸');
    String card =
        ASSISTANT.inspect(text.replace("‸", ""), cursor, detail).map(Card::text).orElse("-");
    return line + "\n" + card + "\n";
  }

  @Test
  void aNameSaysHowItStands() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell [1]", "m [kg] = 3\nF [N] = m * a");
    assertEquals(List.of("waits for   a"), linesWith("waits", card(sheet, "F")));
    assertEquals(List.of(), linesWith("value", card(sheet, "F")));
  }

  @Test
  void aBrokenNameKeepsItsLastValue() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell [1]", "m [kg] = 3");
    sheet.run(new CellId("2"), "cell [2]", "w [N] = m * 2 m/s^2");
    sheet.run(new CellId("1"), "cell [1]", "m [m] = 3");
    String card = card(sheet, "w");
    assertTrue(card.contains("last value  6 N"), card);
    assertTrue(card.contains("broken      w is declared"), card);
  }

  @Test
  void failuresStandInTheCardOfWhatTheyRestOn() {
    var sheet = new Sheet();
    sheet.run(
        new CellId("1"), "cell [1]", "m [kg] = 3\nassume m < 2 kg\nk = 2 * m\ncheck k < 1 kg");
    String card = card(sheet, "k");
    assertTrue(card.contains("checks      FAILS: check k < 1 kg"), card);
    assertTrue(card.contains("rests on    m < 2 kg, an assumption that fails"), card);
  }

  @Test
  void longListsAreCutUnlessAllIsAskedFor() {
    var sheet = new Sheet();
    String users =
        Stream.iterate(1, i -> i + 1)
            .limit(9)
            .map(i -> "u_" + i + " = " + i + " * m")
            .collect(Collectors.joining("\n"));
    sheet.run(new CellId("1"), "cell [1]", "m [kg] = 3\n" + users);
    var assistant = new Assistant(sheet);
    String usual = assistant.inspect("m", 1, 0).orElseThrow().text();
    assertTrue(usual.contains("u_1, u_2, u_3, u_4, u_5, u_6, and 3 more"), usual);
    String all = assistant.inspect("m", 1, 1).orElseThrow().text();
    assertTrue(all.contains("u_9 = 9 * m"), all);
  }

  private static String card(Sheet sheet, String name) {
    return new Assistant(sheet).inspect(name, name.length(), 0).orElseThrow().text();
  }

  private static List<String> linesWith(String word, String text) {
    return text.lines().filter(line -> line.contains(word)).toList();
  }

  @Test
  void whatUsersWroteIsEscapedAndCannotSteerATerminal() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell <b>", "m [kg] = 3 # <script>alert(1)</script> \u001B[31mred");
    Card card = new Assistant(sheet).inspect("m", 1, 0).orElseThrow();
    assertTrue(card.html().contains("&lt;script&gt;"), card.html());
    assertFalse(card.html().contains("<script"), card.html());
    assertTrue(card.html().contains("cell &lt;b&gt;"), card.html());
    assertFalse(card.text().contains("\u001B"), card.text());
    assertFalse(card.html().contains("\u001B"), card.html());
  }

  static Stream<String> examples() {
    return Stream.concat(
        Keyword.all().stream().map(Keyword::example),
        FunctionFacts.all().stream().map(FunctionFacts::example));
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyExampleRunsByItself(String example) {
    CellOutcome outcome = new Sheet().run(new CellId("1"), "cell [1]", example);
    assertEquals(List.of(), outcome.errors());
    assertFalse(outcome.steps().isEmpty());
    assertFalse(outcome.steps().stream().anyMatch(Step.Waiting.class::isInstance));
  }

  @Test
  void everyKeywordStandsInItsExample() {
    for (Keyword keyword : Keyword.all()) {
      assertTrue(keyword.example().matches("(?s).*\\b" + keyword.word() + "\\b.*"), keyword.word());
    }
  }

  @Test
  void everythingAtHandHasACard() {
    for (String name : Vocabulary.atHand()) {
      assertTrue(ASSISTANT.inspect(name, name.length(), 0).isPresent(), name);
    }
    assertEquals(
        new TreeSet<>(Vocabulary.atHand()),
        Stream.of(
                FunctionFacts.all().stream().map(FunctionFacts::name),
                ConstantAtHand.all().stream().map(ConstantAtHand::symbol),
                Laws.names().stream())
            .flatMap(names -> names)
            .collect(Collectors.toCollection(TreeSet::new)));
  }

  /** A word that comes to be worked out must be explained. */
  @Test
  void everyStatementWordIsExplainedOrNotWorkedOutYet() {
    Set<String> open = new TreeSet<>(Words.STATEMENTS);
    Keyword.all().forEach(keyword -> open.remove(keyword.word()));
    for (String line : NOT_WORKED_OUT) {
      CellOutcome outcome = new Sheet().run(new CellId("1"), "cell [1]", line);
      if (outcome.errors().stream().anyMatch(error -> error.code().equals("not-available"))) {
        open.remove(line.replaceFirst(" .*", "").lines().findFirst().orElseThrow());
      }
    }
    assertEquals(Set.of(), open);
  }
}
