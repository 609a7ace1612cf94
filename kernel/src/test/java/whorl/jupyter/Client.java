package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import org.zeromq.ZMQ.Socket;

/** A front end. */
final class Client implements AutoCloseable {
  /** Only to end a test that hangs, in milliseconds. */
  private static final int GUARD = 30_000;

  private final ZContext context = new ZContext(1);
  private final Session session = new Session("tester");
  private final WireFormat format;
  private final Map<Channel, Socket> sockets = new EnumMap<>(Channel.class);

  Client(ConnectionFile connection) throws BadMessageException {
    format = new WireFormat(new Signatures(connection.key()));
    byte[] identity =
        session.header("").get("session").getAsString().getBytes(StandardCharsets.UTF_8);
    for (Channel channel : Channel.values()) {
      Socket socket =
          context.createSocket(channel == Channel.IOPUB ? SocketType.SUB : SocketType.DEALER);
      socket.setIdentity(identity);
      socket.setHWM(0);
      socket.setReceiveTimeOut(GUARD);
      socket.connect(connection.address(channel));
      sockets.put(channel, socket);
    }
    socket(Channel.IOPUB).subscribe("");
    assertEquals("iopub_welcome", receive(Channel.IOPUB).type());
  }

  Socket socket(Channel channel) {
    return Objects.requireNonNull(sockets.get(channel));
  }

  WireFormat format() {
    return format;
  }

  /** Sends a message and returns its id. */
  String send(Channel channel, String type, String content) {
    return send(channel, type, content, "{}");
  }

  String send(Channel channel, String type, String content, String metadata) {
    var message =
        new Message(
            List.of(),
            session.header(type),
            new JsonObject(),
            object(metadata),
            object(content),
            List.of());
    sendFrames(channel, format.write(message));
    return message.id();
  }

  void sendFrames(Channel channel, List<byte[]> frames) {
    for (int i = 0; i < frames.size(); i++) {
      socket(channel).send(frames.get(i), i < frames.size() - 1 ? ZMQ.SNDMORE : 0);
    }
  }

  Message receive(Channel channel) throws BadMessageException {
    var frames = new ArrayList<byte[]>();
    byte[] frame = socket(channel).recv();
    assertTrue(frame != null, "nothing came on " + channel);
    frames.add(frame);
    while (socket(channel).hasReceiveMore()) {
      frames.add(socket(channel).recv());
    }
    return format.read(frames);
  }

  /** What was published for a request, up to idle; what others caused is left out. */
  List<Message> published(String request) throws BadMessageException {
    var published = new ArrayList<Message>();
    while (true) {
      Message message = receive(Channel.IOPUB);
      if (message.parentId().equals(request)) {
        published.add(message);
        if (message.type().equals("status")
            && message.content().get("execution_state").getAsString().equals("idle")) {
          return published;
        }
      }
    }
  }

  /** A request with all that it led to. */
  record Exchange(Message reply, List<Message> published) {
    String status() {
      return reply.content().get("status").getAsString();
    }

    /** What was published, in short, without busy and idle. */
    List<String> outputs() {
      return published.subList(1, published.size() - 1).stream().map(Exchange::brief).toList();
    }

    private static String brief(Message message) {
      JsonObject content = message.content();
      return switch (message.type()) {
        case "execute_input" -> "input " + content.get("execution_count");
        case "stream" ->
            content.get("name").getAsString() + " " + content.get("text").getAsString();
        case "error" -> "error " + content.get("evalue").getAsString();
        default ->
            content.has("data")
                ? message.type()
                    + " "
                    + content.getAsJsonObject("data").get("text/plain").getAsString()
                : message.type() + " " + content;
      };
    }
  }

  Exchange exchange(Channel channel, String type, String content) throws BadMessageException {
    return exchange(channel, type, content, "{}");
  }

  Exchange exchange(Channel channel, String type, String content, String metadata)
      throws BadMessageException {
    String id = send(channel, type, content, metadata);
    Message reply = receive(channel);
    assertEquals(id, reply.parentId());
    return new Exchange(reply, published(id));
  }

  Exchange execute(String code) throws BadMessageException {
    return execute(code, "{}");
  }

  /** Runs a cell, with more fields of the request. */
  Exchange execute(String code, String more) throws BadMessageException {
    return exchange(Channel.SHELL, "execute_request", request(code, more));
  }

  static String request(String code, String more) {
    JsonObject content = object(more);
    content.addProperty("code", code);
    return content.toString();
  }

  static JsonObject object(String json) {
    return JsonParser.parseString(json).getAsJsonObject();
  }

  @Override
  public void close() {
    context.close();
  }
}
