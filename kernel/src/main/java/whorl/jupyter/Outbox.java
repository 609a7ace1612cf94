package whorl.jupyter;

import com.google.gson.JsonObject;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import java.util.concurrent.locks.LockSupport;
import org.jspecify.annotations.Nullable;
import whorl.page.Front.Stream;

/**
 * All that the kernel sends passes through here, in the order in which it was handed in. Printed
 * text is held back for a moment, so that many short lines make few messages.
 *
 * <p>Threads of cells hand in messages too, and these may be interrupted or stopped at any point.
 * So there is no lock here, and no socket is touched but by a thread that no cell knows.
 */
final class Outbox implements Runnable {
  /** Takes messages to the sockets. */
  interface Carrier {
    void carry(Channel channel, List<byte[]> frames);
  }

  /** Printed text is held back no longer than this. */
  private static final long LONGEST_WAIT = TimeUnit.MILLISECONDS.toNanos(50);

  /** So many characters are sent at once. */
  private static final int ENOUGH = 1 << 16;

  /** A cell that printed so many characters, or showed so many messages, waits until some left. */
  private static final int MOST_PRINTED = 64 * ENOUGH;

  private static final int MOST_MESSAGES = 1_000;

  private static final long WAIT_FOR_ROOM = TimeUnit.MILLISECONDS.toNanos(1);

  /** What is handed in. */
  private sealed interface Parcel {
    record Frames(Channel channel, List<byte[]> frames) implements Parcel {}

    record Printed(JsonObject parent, Stream stream, String text) implements Parcel {}

    record End() implements Parcel {}
  }

  private final Session session;
  private final WireFormat format;
  private final Carrier carrier;
  private final Log log;
  private final Queue<Parcel> parcels = new ConcurrentLinkedQueue<>();
  private final AtomicLong messages = new AtomicLong();
  private final AtomicLong printed = new AtomicLong();
  private volatile @Nullable Thread thread;

  /** Whether text is held back, so that the thread will soon look without being woken. */
  private volatile boolean holdsBack;

  private final StringBuilder held = new StringBuilder();
  private JsonObject heldParent = new JsonObject();
  private Stream heldStream = Stream.OUT;
  private long deadline;

  Outbox(Session session, WireFormat format, Carrier carrier, Log log) {
    this.session = session;
    this.format = format;
    this.carrier = carrier;
    this.log = log;
  }

  // ---- What any thread may call.

  /** Sends a message; what it says must not change afterwards. */
  void send(Channel channel, Message message) {
    parcels.add(new Parcel.Frames(channel, format.write(message)));
    messages.incrementAndGet();
    LockSupport.unpark(thread);
  }

  /** Sends to all front ends. */
  void publish(String type, JsonObject parent, JsonObject content) {
    send(Channel.IOPUB, Message.published(session.header(type), parent, content));
  }

  /** Sends text to all front ends, soon. */
  void print(JsonObject parent, Stream stream, String text) {
    parcels.add(new Parcel.Printed(parent, stream, text));
    long waiting = printed.addAndGet(text.length());
    if (!holdsBack || waiting >= ENOUGH) {
      LockSupport.unpark(thread);
    }
  }

  /** Lets a cell that shows more than can be sent wait; one that is interrupted does not wait. */
  void awaitRoom() {
    while ((printed.get() > MOST_PRINTED || messages.get() > MOST_MESSAGES)
        && !Thread.currentThread().isInterrupted()) {
      LockSupport.parkNanos(this, WAIT_FOR_ROOM);
    }
  }

  /** Ends the thread when all that was handed in so far is sent. */
  void end() {
    parcels.add(new Parcel.End());
    LockSupport.unpark(thread);
  }

  // ---- What the outbox's own thread does.

  @Override
  public void run() {
    thread = Thread.currentThread();
    while (true) {
      Parcel parcel = parcels.poll();
      if (parcel instanceof Parcel.Printed text) {
        hold(text);
      } else if (parcel instanceof Parcel.Frames message) {
        sendHeld(held.length());
        carrier.carry(message.channel(), message.frames());
        messages.decrementAndGet();
      } else if (parcel instanceof Parcel.End) {
        sendHeld(held.length());
        return;
      } else {
        rest();
      }
    }
  }

  private void hold(Parcel.Printed text) {
    printed.addAndGet(-text.text().length());
    if (!text.parent().equals(heldParent) || text.stream() != heldStream) {
      sendHeld(held.length());
      heldParent = text.parent();
      heldStream = text.stream();
    }
    if (!holdsBack) {
      deadline = System.nanoTime() + LONGEST_WAIT;
      holdsBack = true;
    }
    held.append(text.text());
    if (held.length() >= ENOUGH) {
      sendHeld(wholeCharacters());
    }
  }

  private void rest() {
    long left = deadline - System.nanoTime();
    if (!holdsBack) {
      LockSupport.park(this);
    } else if (left > 0) {
      LockSupport.parkNanos(this, left);
    } else {
      sendHeld(wholeCharacters());
    }
  }

  /** All that is held, save the first half of a character whose second half is still to come. */
  private int wholeCharacters() {
    int length = held.length();
    boolean half = length > 0 && Character.isHighSurrogate(held.charAt(length - 1));
    return half ? length - 1 : length;
  }

  private void sendHeld(int length) {
    holdsBack = false;
    if (length == 0) {
      return;
    }
    String text = held.substring(0, length);
    held.delete(0, length);
    var content = new JsonObject();
    content.addProperty("name", heldStream == Stream.OUT ? "stdout" : "stderr");
    content.addProperty("text", text);
    List<byte[]> frames;
    try {
      frames = format.write(Message.published(session.header("stream"), heldParent, content));
    } catch (OutOfMemoryError e) {
      log.line("no memory to send " + length + " printed characters; they are lost", e);
      return;
    }
    carrier.carry(Channel.IOPUB, frames);
  }
}
