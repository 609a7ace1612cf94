package whorl.page;

import com.google.gson.JsonObject;
import whorl.report.ProgressReport;
import whorl.sheet.Progress;

/** Shows below a cell how far its recalculation has come, and is gone when that is done. */
final class ProgressBar implements Progress {
  private final Front front;
  private final String id;
  private boolean shown;

  ProgressBar(Front front, String id) {
    this.front = front;
    this.id = id;
  }

  @Override
  public void at(int done, int total) {
    ProgressReport report = ProgressReport.of(done, total);
    var data = new JsonObject();
    data.addProperty("text/html", report.html());
    data.addProperty("text/plain", report.text());
    if (shown) {
      front.update(Bundle.of(data), id);
    } else {
      front.display(Bundle.of(data), id);
      shown = true;
    }
  }

  /** Removes the bar; a cell of the sheet shows nothing else before its steps. */
  void end() {
    if (shown) {
      front.clear(/* wait= */ false);
    }
  }
}
