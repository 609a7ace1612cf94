package whorl.notebook;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.ArrayList;
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
    var outputs = new ArrayList<Output>(run.printed());
    if (!run.tookEffect()) {
      ErrorText error = ErrorText.of(run.errors(), run.source());
      outputs.add(new Output.Failure(run.errorName(), error.summary(), error.lines()));
      return outputs;
    }
    CellReport report = report(run);
    if (!report.text().isEmpty()) {
      Map<String, JsonElement> data =
          Map.of(
              "text/html",
              new JsonPrimitive(report.html()),
              "text/plain",
              new JsonPrimitive(report.text()),
              NoteRecord.MEDIA_TYPE,
              NoteRun.record(run));
      outputs.add(new Output.Display(data, new JsonObject()));
    }
    return outputs;
  }

  /** What a terminal shows of a cell: what it printed, then its steps. */
  static String text(CellRun run) {
    var parts = new ArrayList<String>();
    run.printed().forEach(output -> parts.add(output.text().stripTrailing()));
    parts.add(report(run).text());
    parts.removeIf(String::isEmpty);
    return String.join("\n", parts);
  }

  /** The steps of a cell for people. */
  private static CellReport report(CellRun run) {
    return CellReport.of(run.source(), run.steps(), run.notices());
  }
}
