package whorl.jupyter;

import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * A message, in either direction.
 *
 * @param route whom it comes from or goes to, or on IOPub its topic
 * @param header what sort of message it is, and its id
 * @param parent header of the message that led to this one, or empty
 * @param metadata what the content can do without
 * @param content what it says
 * @param buffers binary attachments
 */
record Message(
    List<byte[]> route,
    JsonObject header,
    JsonObject parent,
    JsonObject metadata,
    JsonObject content,
    List<byte[]> buffers) {
  Message {
    route = List.copyOf(route);
    buffers = List.copyOf(buffers);
  }

  /** A message to all front ends. Its sort is its topic, though nobody is known to sort by it. */
  static Message published(JsonObject header, JsonObject parent, JsonObject content) {
    byte[] topic = text(header, "msg_type").getBytes(StandardCharsets.UTF_8);
    return new Message(List.of(topic), header, parent, new JsonObject(), content, List.of());
  }

  String type() {
    return text(header, "msg_type");
  }

  String id() {
    return text(header, "msg_id");
  }

  String session() {
    return text(header, "session");
  }

  /** The id of the message that led to this one, or empty. */
  String parentId() {
    return text(parent, "msg_id");
  }

  private static String text(JsonObject object, String name) {
    return object.get(name) instanceof JsonPrimitive value && value.isString()
        ? value.getAsString()
        : "";
  }
}
