package whorl.report;

import java.util.ArrayList;
import java.util.List;

/**
 * What there is to say of one thing, for people: a title, a sentence, and facts with a word in
 * front of each.
 *
 * @param title what it is about, as it would be written in a cell
 * @param lead what it is, in a few words; may be empty
 * @param facts in the order in which they matter
 */
public record InfoCard(String title, String lead, List<Fact> facts) {
  private static final int WIDTH = 84;
  private static final int GAP = 2;

  /**
   * A fact.
   *
   * @param word what it is about, as {@code gives}
   * @param lines what is said
   */
  public record Fact(String word, List<String> lines) {
    /** Copies the lines. */
    public Fact {
      lines = List.copyOf(lines);
    }

    /** A fact of one line. */
    public static Fact of(String word, String line) {
      return new Fact(word, List.of(line));
    }
  }

  /** Leaves out facts of which nothing is said. */
  public InfoCard {
    facts = facts.stream().filter(fact -> !fact.lines().isEmpty()).toList();
  }

  /** As HTML that needs no style sheet and no script. */
  public String html() {
    var parts = new ArrayList<Html>();
    parts.add(Html.styled("div", Look.INFO_TITLE, Html.text(title)));
    if (!lead.isEmpty()) {
      parts.add(Html.styled("div", Look.INFO_LEAD, Html.text(lead)));
    }
    if (!facts.isEmpty()) {
      List<Html> rows = facts.stream().map(InfoCard::row).toList();
      parts.add(Html.styled("table", Look.INFO_TABLE, Html.element("tbody", Html.all(rows))));
    }
    return Html.styled("div", Look.INFO, Html.all(parts)).toString();
  }

  private static Html row(Fact fact) {
    List<Html> lines =
        fact.lines().stream().map(line -> Html.styled("span", Look.LINE, Html.text(line))).toList();
    return Html.styled(
        "tr",
        Look.INFO_ROW,
        Html.styled(
            "th",
            Look.INFO_WORD,
            "scope",
            "row",
            Html.styled("span", Look.QUIET, Html.text(fact.word()))),
        Html.styled("td", Look.INFO_FACT, Html.all(lines)));
  }

  /** As text for a terminal. */
  public String text() {
    var lines = new ArrayList<String>();
    lines.addAll(TextWrap.wrap(printable(title), WIDTH));
    if (!lead.isEmpty()) {
      lines.addAll(TextWrap.wrap(lead, WIDTH));
    }
    if (!facts.isEmpty()) {
      lines.add("");
    }
    int column = facts.stream().mapToInt(fact -> TextWidth.of(fact.word())).max().orElse(0) + GAP;
    for (Fact fact : facts) {
      String word = fact.word();
      for (String line : fact.lines()) {
        for (String piece : TextWrap.wrap(printable(line), WIDTH - column)) {
          lines.add(TextWidth.padded(word, column) + piece);
          word = "";
        }
      }
    }
    return TextWrap.plain(String.join("\n", lines));
  }

  /** A text on one line, without what would steer a terminal. */
  private static String printable(String text) {
    return text.replaceAll("[\\s\\p{Cntrl}]+", " ");
  }
}
