package whorl.jupyter;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import com.google.gson.JsonPrimitive;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.Map;

/**
 * Where a front end wants to find the kernel.
 *
 * @param ip the one address to listen at
 * @param ports one for each channel
 * @param key with which messages are signed; empty if they are not
 */
public record ConnectionFile(String ip, Map<Channel, Integer> ports, String key) {
  private static final String LOOPBACK = "127.0.0.1";
  private static final String SIGNATURE = "hmac-sha256";
  private static final int HIGHEST_PORT = 0xFFFF;

  /** Copies the ports. */
  public ConnectionFile {
    ports = Map.copyOf(ports);
  }

  /** Reads the file that a front end wrote. */
  public static ConnectionFile read(Path file) throws KernelException {
    try {
      return of(Json.parse(Files.readAllBytes(file)));
    } catch (NoSuchFileException e) {
      throw new KernelException("there is no file " + file, e);
    } catch (IOException e) {
      throw new KernelException(file + " cannot be read: " + e.getMessage(), e);
    } catch (JsonParseException e) {
      throw new KernelException(file + " is not a connection file: it is not a JSON object", e);
    } catch (BadContentException e) {
      throw new KernelException(file + " is not a connection file: " + e.getMessage(), e);
    }
  }

  private static ConnectionFile of(JsonObject file) throws BadContentException {
    var content = new Content(file);
    String transport = content.text("transport", "tcp");
    if (!transport.equals("tcp")) {
      throw new BadContentException("its transport is " + transport + ", but Whorl knows tcp only");
    }
    String key = content.text("key");
    String scheme = content.text("signature_scheme", SIGNATURE);
    if (!key.isEmpty() && !scheme.equals(SIGNATURE)) {
      throw new BadContentException(
          "its signature_scheme is " + scheme + ", but Whorl knows " + SIGNATURE + " only");
    }
    var ports = new EnumMap<Channel, Integer>(Channel.class);
    for (Channel channel : Channel.values()) {
      ports.put(channel, port(file, channel));
    }
    return new ConnectionFile(content.text("ip", LOOPBACK), ports, key);
  }

  private static int port(JsonObject file, Channel channel) throws BadContentException {
    JsonElement port = file.get(channel.portName());
    if (port == null) {
      throw new BadContentException(channel.portName() + " is missing");
    }
    boolean sound =
        port instanceof JsonPrimitive number
            && number.isNumber()
            && number.getAsDouble() == number.getAsInt()
            && number.getAsInt() > 0
            && number.getAsInt() <= HIGHEST_PORT;
    if (!sound) {
      throw new BadContentException(
          channel.portName() + " must be a number from 1 to " + HIGHEST_PORT + ", but is " + port);
    }
    return port.getAsInt();
  }

  /** Where a channel listens, as the sockets want it. */
  String address(Channel channel) {
    String host = isVersion6() ? "[" + ip + "]" : ip;
    return "tcp://" + host + ":" + ports.get(channel);
  }

  /** Whether the address is of version 6 of the internet protocol. */
  boolean isVersion6() {
    return ip.indexOf(':') >= 0;
  }
}
