package whorl.jupyter;

import com.google.gson.JsonObject;
import java.util.Map;

/**
 * Lasting conversations with parts of a front end. This kernel has no use for any yet, and says so
 * at once, so that nobody waits for it.
 */
final class Comms {
  private Comms() {}

  static Map<String, Handler> handlers() {
    return Map.of(
        "comm_info_request",
        Comms::list,
        "comm_open",
        Comms::close,
        "comm_msg",
        message -> {},
        "comm_close",
        message -> {});
  }

  private static void list(Request request) {
    var content = new JsonObject();
    content.add("comms", new JsonObject());
    request.succeed(content);
  }

  private static void close(Request request) throws BadContentException {
    var content = new JsonObject();
    content.addProperty("comm_id", request.content().text("comm_id"));
    content.add("data", new JsonObject());
    request.publish("comm_close", content);
  }
}
