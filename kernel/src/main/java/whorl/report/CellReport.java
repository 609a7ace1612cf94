package whorl.report;

import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.sheet.CellOutcome;
import whorl.sheet.Step;

/**
 * The steps of a cell for people, as HTML and as text, and for tools.
 *
 * @param html a fragment that needs no style sheet and no script
 * @param text the same for a terminal
 * @param record the same at full precision, of {@link NoteRecord#MEDIA_TYPE}
 */
public record CellReport(String html, String text, JsonObject record) {

  /** Sets what running a cell came to, with what it changed elsewhere on the sheet. */
  public static CellReport of(CellOutcome outcome) {
    return of(
        outcome.source(),
        outcome.steps(),
        outcome.notices().stream().map(Diagnostic::problem).toList(),
        Recalculated.of(List.of(outcome)),
        List.of());
  }

  /** Sets steps that changed nothing elsewhere. */
  public static CellReport of(Source source, List<Step> steps, List<String> notices) {
    return of(source, steps, notices, Recalculated.NOTHING, List.of());
  }

  /**
   * Sets the steps of a cell as one table.
   *
   * @param source the text of the cell
   * @param steps its steps in order
   * @param notices sentences for the author that belong to no step, such as that a name hides a law
   * @param elsewhere what the cell changed elsewhere
   * @param more sentences about what happened besides
   */
  public static CellReport of(
      Source source,
      List<Step> steps,
      List<String> notices,
      Recalculated elsewhere,
      List<String> more) {
    List<Row> rows = StepRows.of(steps);
    var html = new ArrayList<Html>();
    var text = new ArrayList<String>();
    if (!rows.isEmpty()) {
      html.add(HtmlTable.of(rows, source));
      text.add(TextTable.of(rows, source));
    }
    for (String notice : notices) {
      add("Note: " + notice, html, text);
    }
    html.add(elsewhere.html());
    text.addAll(elsewhere.text());
    for (String sentence : more) {
      add(sentence, html, text);
    }
    return new CellReport(
        Html.all(html).toString(), String.join("\n", text), NoteRecord.of(steps, List.of()));
  }

  private static void add(String sentence, List<Html> html, List<String> text) {
    html.add(Html.styled("div", Look.NOTE, Html.text(sentence)));
    text.addAll(TextWrap.wrap(sentence, TextTable.PAGE_WIDTH));
  }

  /** The same with a line on top that says whose steps they are. */
  public CellReport headed(String heading) {
    Html line = Html.styled("div", Look.HEADING, Html.text(heading));
    return new CellReport(line + html, TextWrap.plain(heading) + "\n" + text, record);
  }
}
