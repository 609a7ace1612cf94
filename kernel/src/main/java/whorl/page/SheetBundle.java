package whorl.page;

import com.google.gson.JsonObject;
import whorl.report.CellReport;
import whorl.report.NoteRecord;

/** Puts steps into the forms in which a front end shows them. */
final class SheetBundle {
  private SheetBundle() {}

  static Bundle of(CellReport report) {
    var data = new JsonObject();
    data.addProperty("text/html", report.html());
    data.addProperty("text/plain", report.text());
    data.add(NoteRecord.MEDIA_TYPE, report.record());
    return Bundle.of(data);
  }
}
