package whorl.cli;

import com.google.gson.JsonObject;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.page.Bundle;
import whorl.page.CellAnswer;
import whorl.page.CellRequest;
import whorl.page.ExpressionAnswer;
import whorl.page.Front;
import whorl.page.Page;
import whorl.page.PlainLanguage;
import whorl.report.CellReport;
import whorl.report.ErrorText;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Sheet;

/** A page of cells in the sheet language, each shown as it was when it ran. */
final class SheetPage implements Page {
  private final Sheet sheet = new Sheet();

  @Override
  public PlainLanguage language() {
    return PlainLanguage.SHEET;
  }

  @Override
  public CellAnswer run(CellRequest request, Front front) {
    var cell = new CellId(request.cell().orElseGet(() -> UUID.randomUUID().toString()));
    CellOutcome outcome = sheet.run(cell, "cell [" + request.count() + "]", request.code());
    if (!outcome.tookEffect()) {
      ErrorText error = ErrorText.of(outcome.errors(), outcome.source());
      return new CellAnswer.Failed(ErrorText.NAME, error.summary(), error.lines());
    }
    CellReport report = CellReport.of(outcome.source(), sheet.steps(cell), List.of(), List.of());
    if (!report.text().isEmpty()) {
      var data = new JsonObject();
      data.addProperty("text/html", report.html());
      data.addProperty("text/plain", report.text());
      front.display(Bundle.of(data), cell.id());
    }
    return new CellAnswer.Done();
  }

  @Override
  public ExpressionAnswer evaluate(String expression) {
    return new ExpressionAnswer.Failed("Error", "Expressions are not worked out yet.", List.of());
  }

  @Override
  public Completion complete(String code, int cursor) {
    return Completion.none(cursor);
  }

  @Override
  public Optional<Bundle> inspect(String code, int cursor, int detail) {
    return Optional.empty();
  }

  @Override
  public Completeness completeness(String code) {
    return new Completeness.Unknown();
  }

  @Override
  public void interrupt() {}

  @Override
  public void close() {}
}
