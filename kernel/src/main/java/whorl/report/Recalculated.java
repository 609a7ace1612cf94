package whorl.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import whorl.eval.Value;
import whorl.sheet.CellOutcome;
import whorl.sheet.Quantity;

/**
 * What running a cell did elsewhere on the sheet: first what turned, as it may call for action,
 * then what stopped, then the definitions that came to something else.
 *
 * @param turned checks and assumptions that now stand otherwise, as written, with whether they hold
 * @param stopped what came to something before and now waits or is broken
 * @param changes definitions whose values look different now
 */
public record Recalculated(
    Map<String, Boolean> turned, Set<String> stopped, List<CellOutcome.Change> changes) {
  /** Nothing. */
  public static final Recalculated NOTHING = new Recalculated(Map.of(), Set.of(), List.of());

  private static final int FEW = 4;

  /** Copies the collections. */
  public Recalculated {
    turned = Collections.unmodifiableMap(new LinkedHashMap<>(turned));
    stopped = Collections.unmodifiableSet(new LinkedHashSet<>(stopped));
    changes = List.copyOf(changes);
  }

  /** What several outcomes of one run did together. */
  public static Recalculated of(List<CellOutcome> outcomes) {
    var turned = new LinkedHashMap<String, Boolean>();
    var stopped = new TreeSet<String>();
    var changed = new LinkedHashMap<String, CellOutcome.Change>();
    for (CellOutcome outcome : outcomes) {
      outcome.turned().forEach(turn -> turned.put(turn.text(), turn.holds()));
      stopped.addAll(outcome.stopped());
      for (CellOutcome.Change change : outcome.changes()) {
        changed.merge(
            change.name(),
            change,
            (first, last) -> new CellOutcome.Change(first.name(), first.before(), last.now()));
        stopped.remove(change.name());
      }
    }
    List<CellOutcome.Change> changes =
        changed.values().stream()
            .filter(change -> !shown(change.now()).equals(shown(change.before())))
            .toList();
    return new Recalculated(turned, stopped, changes);
  }

  private static String shown(Quantity quantity) {
    return Amounts.of(quantity).signed();
  }

  /** For a page; many changes are folded away behind their names. */
  Html html() {
    var lines = new ArrayList<Html>();
    turned.forEach(
        (text, holds) ->
            lines.add(
                note(
                    Html.styled(
                        "span", Look.state(holds ? Tone.GOOD : Tone.BAD), Html.text(word(holds))),
                    Html.text(" " + text))));
    if (!stopped.isEmpty()) {
      lines.add(note(Html.text(stoppedText())));
    }
    if (!changes.isEmpty()) {
      lines.add(changes.size() <= FEW ? table() : folded());
    }
    return Html.all(lines);
  }

  private static Html note(Html... content) {
    return Html.styled("div", Look.NOTE, content);
  }

  private Html folded() {
    var names = new ArrayList<Html>();
    names.add(Html.text(changes.size() + " results elsewhere changed: "));
    for (int i = 0; i < changes.size(); i++) {
      names.add(Html.text(i == 0 ? "" : ", "));
      names.add(symbol(changes.get(i)));
    }
    return Html.styled("details", Look.NOTE, Html.element("summary", Html.all(names)), table());
  }

  private Html table() {
    var rows = new ArrayList<Html>();
    for (CellOutcome.Change change : changes) {
      rows.add(
          Html.styled(
              "tr",
              Look.PLAIN_ROW,
              Html.styled("td", Look.SNUG, symbol(change)),
              Html.styled("td", Look.SNUG, value(shown(change.now()))),
              Html.styled(
                  "td",
                  Look.SNUG,
                  Html.styled("span", Look.QUIET, Html.text("was ")),
                  value(Amounts.of(change.before()).text()))));
    }
    return Html.styled("table", Look.SNUG_TABLE, Html.element("tbody", Html.all(rows)));
  }

  private static Html symbol(CellOutcome.Change change) {
    boolean vector = change.now().value() instanceof Value.Vector;
    return FormulaHtml.of(FormulaLayout.symbol(change.name(), vector));
  }

  private static Html value(String text) {
    return Html.styled("span", Look.VALUE, FormulaHtml.value(text));
  }

  /** For a terminal, line by line. */
  List<String> text() {
    var lines = new ArrayList<String>();
    turned.forEach((text, holds) -> lines.add(word(holds) + " " + text));
    if (!stopped.isEmpty()) {
      lines.add(stoppedText());
    }
    for (CellOutcome.Change change : changes) {
      lines.add(
          "now "
              + change.name()
              + " "
              + shown(change.now())
              + ", was "
              + Amounts.of(change.before()).text());
    }
    return lines.stream().map(TextWrap::plain).toList();
  }

  private static String word(boolean holds) {
    return holds ? "holds now:" : "FAILS now:";
  }

  private String stoppedText() {
    return "without result now: " + String.join(", ", stopped);
  }
}
