package whorl.notebook;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import whorl.report.CellReport;
import whorl.report.ErrorText;
import whorl.report.NoteRecord;

/** Sets what a cell came to as outputs of a notebook. */
final class CellOutputs {
  private CellOutputs() {}

  static Execution of(CellRun run, int count) {
    return new Execution(OptionalInt.of(count), outputs(run));
  }

  private static List<Output> outputs(CellRun run) {
    if (!run.tookEffect()) {
      ErrorText error = ErrorText.of(run.errors(), run.source());
      return List.of(new Output.Failure(ErrorText.NAME, error.summary(), error.lines()));
    }
    CellReport report = report(run);
    if (report.text().isEmpty()) {
      return List.of();
    }
    Map<String, JsonElement> data =
        Map.of(
            "text/html",
            new JsonPrimitive(report.html()),
            "text/plain",
            new JsonPrimitive(report.text()),
            NoteRecord.MEDIA_TYPE,
            NoteRun.record(run));
    return List.of(new Output.Display(data, new JsonObject()));
  }

  /** The steps of a cell for people. */
  static CellReport report(CellRun run) {
    return CellReport.of(run.source(), run.steps(), run.notices());
  }
}
