package whorl.jupyter;

import com.google.gson.JsonObject;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.UUID;
import java.util.concurrent.atomic.AtomicLong;

/** One end of a conversation: makes headers that nobody else makes. For any thread. */
final class Session {
  static final String PROTOCOL = "5.5";

  private final String id = UUID.randomUUID().toString();
  private final String user;
  private final AtomicLong messages = new AtomicLong();

  Session(String user) {
    this.user = user;
  }

  /** The time as clients can read it, some of which know microseconds at most. */
  static String now() {
    return Instant.now().truncatedTo(ChronoUnit.MICROS).toString();
  }

  JsonObject header(String type) {
    var header = new JsonObject();
    header.addProperty("msg_id", id + "_" + messages.incrementAndGet());
    header.addProperty("session", id);
    header.addProperty("username", user);
    header.addProperty("date", now());
    header.addProperty("msg_type", type);
    header.addProperty("version", PROTOCOL);
    return header;
  }
}
