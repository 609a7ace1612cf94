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
        Recalculated.sentence(outcome).stream().toList());
  }

  /**
   * Sets the steps of a cell as one table.
   *
   * @param source the text of the cell
   * @param steps its steps in order
   * @param notices sentences for the author that belong to no step, such as that a name hides a law
   * @param elsewhere sentences about what the cell changed elsewhere
   */
  public static CellReport of(
      Source source, List<Step> steps, List<String> notices, List<String> elsewhere) {
    List<Row> rows = steps.stream().map(StepRows::of).toList();
    var html = new ArrayList<Html>();
    var text = new ArrayList<String>();
    if (!rows.isEmpty()) {
      html.add(HtmlTable.of(rows, source));
      text.add(TextTable.of(rows, source));
    }
    var sentences = new ArrayList<String>();
    notices.forEach(notice -> sentences.add("Note: " + notice));
    sentences.addAll(elsewhere);
    for (String sentence : sentences) {
      html.add(Html.styled("div", Look.NOTE, Html.text(sentence)));
      text.addAll(TextWrap.wrap(sentence, TextTable.PAGE_WIDTH));
    }
    return new CellReport(
        Html.all(html).toString(), String.join("\n", text), NoteRecord.of(steps, List.of()));
  }
}
