package whorl.jupyter;

import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Messages as frames: route, delimiter, signature, four objects in JSON, buffers. For any thread.
 */
final class WireFormat {
  private static final byte[] DELIMITER = "<IDS|MSG>".getBytes(StandardCharsets.US_ASCII);
  private static final int SIGNED = 4;

  private final Signatures signatures;

  WireFormat(Signatures signatures) {
    this.signatures = signatures;
  }

  Message read(List<byte[]> frames) throws BadMessageException {
    int delimiter = 0;
    while (delimiter < frames.size() && !Arrays.equals(frames.get(delimiter), DELIMITER)) {
      delimiter++;
    }
    int start = delimiter + 2;
    int end = start + SIGNED;
    if (frames.size() < end) {
      throw new BadMessageException("parts of it are missing");
    }
    List<byte[]> signed = frames.subList(start, end);
    if (!signatures.isRight(frames.get(delimiter + 1), signed)) {
      throw new BadMessageException("its signature is wrong");
    }
    var message =
        new Message(
            frames.subList(0, delimiter),
            object("header", signed.get(0)),
            object("parent header", signed.get(1)),
            object("metadata", signed.get(2)),
            object("content", signed.get(3)),
            frames.subList(end, frames.size()));
    if (message.type().isEmpty() || message.id().isEmpty()) {
      throw new BadMessageException("its header has no msg_type or no msg_id");
    }
    return message;
  }

  private static JsonObject object(String part, byte[] bytes) throws BadMessageException {
    try {
      return Json.parse(bytes);
    } catch (JsonParseException e) {
      throw new BadMessageException("its " + part + " is not a JSON object", e);
    }
  }

  List<byte[]> write(Message message) {
    List<byte[]> signed =
        List.of(
            Json.bytes(message.header()),
            Json.bytes(message.parent()),
            Json.bytes(message.metadata()),
            Json.bytes(message.content()));
    var frames = new ArrayList<>(message.route());
    frames.add(DELIMITER);
    frames.add(signatures.of(signed));
    frames.addAll(signed);
    frames.addAll(message.buffers());
    return frames;
  }
}
