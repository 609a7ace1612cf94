package whorl.jupyter;

import com.google.gson.JsonObject;
import java.util.List;

/** A request that is being served, and the way back to whoever sent it. */
final class Request {
  private static final String REQUEST = "_request";

  private final Channel channel;
  private final Message message;
  private final boolean aborted;
  private final Session session;
  private final Outbox outbox;
  private boolean answered;

  Request(Channel channel, Message message, boolean aborted, Session session, Outbox outbox) {
    this.channel = channel;
    this.message = message;
    this.aborted = aborted;
    this.session = session;
    this.outbox = outbox;
  }

  Message message() {
    return message;
  }

  Content content() {
    return new Content(message.content());
  }

  /** Whether it is not to run, for a cell before it failed. */
  boolean aborted() {
    return aborted;
  }

  /** Answers that all went well. */
  void succeed(JsonObject content) {
    reply("ok", content, new JsonObject());
  }

  /** Answers that it failed, unless it is answered already. */
  void fail(String name, String summary) {
    if (!answered) {
      reply("error", ErrorContent.of(name, summary, List.of(summary)), new JsonObject());
    }
  }

  /** Answers; a message that is no request has no answer. */
  void reply(String status, JsonObject content, JsonObject metadata) {
    answered = true;
    if (!message.type().endsWith(REQUEST)) {
      return;
    }
    if (!content.has("status")) {
      content.addProperty("status", status);
    }
    JsonObject header = session.header(message.type().replace(REQUEST, "_reply"));
    outbox.send(
        channel,
        new Message(message.route(), header, message.header(), metadata, content, List.of()));
  }

  /** Tells all front ends. */
  void publish(String type, JsonObject content) {
    outbox.publish(type, message.header(), content);
  }

  /** Tells all front ends whether the kernel is busy with this request. */
  void publishState(String state) {
    var content = new JsonObject();
    content.addProperty("execution_state", state);
    publish("status", content);
  }
}
