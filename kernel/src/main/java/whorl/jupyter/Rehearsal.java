package whorl.jupyter;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.util.List;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import org.zeromq.ZMQ.Socket;

/**
 * Talks to a kernel as front ends do, so that all is loaded that a kernel needs for its usual work.
 */
public final class Rehearsal implements AutoCloseable {
  /** A guard against a kernel that does not answer, in milliseconds. */
  private static final int PATIENCE = 20_000;

  private final ZContext context = new ZContext(1);
  private final Session session = new Session("rehearsal");
  private final WireFormat format;
  private final Socket shell;

  /** Connects, also to a kernel that is still to start. */
  public Rehearsal(ConnectionFile connection) {
    format = new WireFormat(new Signatures(connection.key()));
    shell = context.createSocket(SocketType.DEALER);
    shell.setReceiveTimeOut(PATIENCE);
    shell.connect(connection.address(Channel.SHELL));
    // What is published is to be sent; nobody needs to read it.
    Socket published = context.createSocket(SocketType.SUB);
    published.subscribe("");
    published.connect(connection.address(Channel.IOPUB));
  }

  /** Runs cells, asks what front ends ask about them, and shuts the kernel down. */
  public void run(List<String> cells) throws IOException {
    request("kernel_info_request", new JsonObject());
    for (String cell : cells) {
      var code = new JsonObject();
      code.addProperty("code", cell);
      request("execute_request", code);
      request("is_complete_request", code);
      code.addProperty("cursor_pos", cell.length());
      request("complete_request", code);
      request("inspect_request", code);
    }
    request("shutdown_request", new JsonObject());
  }

  private void request(String type, JsonObject content) throws IOException {
    var none = new JsonObject();
    JsonObject header = session.header(type);
    List<byte[]> frames =
        format.write(new Message(List.of(), header, none, none, content, List.of()));
    for (int i = 0; i < frames.size(); i++) {
      shell.send(frames.get(i), i < frames.size() - 1 ? ZMQ.SNDMORE : 0);
    }
    do {
      if (shell.recv() == null) {
        throw new IOException("the kernel does not answer " + type);
      }
    } while (shell.hasReceiveMore());
  }

  @Override
  public void close() {
    context.close();
  }
}
