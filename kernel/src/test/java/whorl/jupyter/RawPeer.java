package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Objects;

/** Whoever connects to a port of the kernel, byte by byte. */
final class RawPeer implements AutoCloseable {
  private static final int GREETING = 64;

  private final Socket socket;
  private final InputStream in;

  RawPeer(ConnectionFile connection, Channel channel) throws IOException {
    int port = Objects.requireNonNull(connection.ports().get(channel));
    socket = new Socket(InetAddress.getLoopbackAddress(), port);
    socket.setSoTimeout(30_000);
    in = new BufferedInputStream(socket.getInputStream());
  }

  /** What a socket of a sort begins with on a new connection, up to its first message. */
  static byte[] greeting(String sort) {
    byte[] ready = bytes("\4\0\5READY\13Socket-Type\0\0\0\0" + sort);
    ready[1] = (byte) (ready.length - 2);
    ready[ready.length - sort.length() - 1] = (byte) sort.length();
    byte[] all = Arrays.copyOf(bytes("\377\0\0\0\0\0\0\0\1\177\3\0NULL"), GREETING + ready.length);
    System.arraycopy(ready, 0, all, GREETING, ready.length);
    return all;
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.ISO_8859_1);
  }

  void send(byte[] part) throws IOException {
    socket.getOutputStream().write(part);
    socket.getOutputStream().flush();
  }

  /** Subscribes to what the kernel publishes on the topics that begin so. */
  void subscribe(String topic) throws IOException {
    send(greeting("SUB"));
    assertTrue(hears("XPUB"));
    byte[] wish = bytes("\0\0\1" + topic);
    wish[1] = (byte) (topic.length() + 1);
    send(wish);
    assertTrue(hears("iopub_welcome"));
  }

  /** Reads until a text comes; false if the connection ends before. */
  boolean hears(String text) throws IOException {
    byte[] wanted = bytes(text);
    int found = 0;
    for (int next = in.read(); next >= 0; next = in.read()) {
      // No text that is waited for begins anew within itself.
      found = next == wanted[found] ? found + 1 : next == wanted[0] ? 1 : 0;
      if (found == wanted.length) {
        return true;
      }
    }
    return false;
  }

  @Override
  public void close() throws IOException {
    socket.close();
  }
}
