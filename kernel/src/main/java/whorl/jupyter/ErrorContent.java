package whorl.jupyter;

import com.google.gson.JsonObject;
import java.util.List;

/** Errors as messages have them. */
final class ErrorContent {
  private ErrorContent() {}

  static JsonObject of(String name, String summary, List<String> lines) {
    var content = new JsonObject();
    content.addProperty("ename", name);
    content.addProperty("evalue", summary);
    content.add("traceback", Json.array(lines));
    return content;
  }
}
