package whorl.jupyter;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.io.InterruptedIOException;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.atomic.AtomicReference;
import org.jspecify.annotations.Nullable;

/** Questions of a cell to the user: one at a time, from any thread. */
final class Questions {
  private static final String INTERRUPTED = "the question was interrupted";

  /** A question that waits for its answer. */
  private record Question(Message message, CompletableFuture<String> answer) {}

  private final Session session;
  private final WireFormat format;
  private final Outbox outbox;
  private final Log log;
  private final AtomicReference<@Nullable Question> open = new AtomicReference<>();

  Questions(Session session, WireFormat format, Outbox outbox, Log log) {
    this.session = session;
    this.format = format;
    this.outbox = outbox;
    this.log = log;
  }

  /**
   * Asks whoever sent a cell, and waits.
   *
   * @param cell the request to run the cell
   */
  String ask(Message cell, String prompt, boolean secret) throws IOException {
    var content = new JsonObject();
    content.addProperty("prompt", prompt);
    content.addProperty("password", secret);
    JsonObject header = session.header("input_request");
    var message =
        new Message(cell.route(), header, cell.header(), new JsonObject(), content, List.of());
    var question = new Question(message, new CompletableFuture<>());
    if (!open.compareAndSet(null, question)) {
      throw new IOException("another question still waits for its answer");
    }
    try {
      outbox.send(Channel.STDIN, message);
      return question.answer().get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new InterruptedIOException(INTERRUPTED);
    } catch (CancellationException | ExecutionException e) {
      throw new IOException(INTERRUPTED, e);
    } finally {
      open.set(null);
    }
  }

  /** Ends the question that waits, if one does. */
  void cancel() {
    Question question = open.get();
    if (question != null) {
      question.answer().cancel(false);
    }
  }

  /** Takes an answer; one that nobody waits for any more is dropped. */
  void received(List<byte[]> frames) {
    Question question = open.get();
    try {
      Message reply = format.read(frames);
      if (question != null && isAnswer(reply, question.message())) {
        question.answer().complete(new Content(reply.content()).text("value"));
      }
    } catch (BadMessageException | BadContentException e) {
      log.line("an answer to a question was ignored: " + e.getMessage());
    }
  }

  /** Clients need not say which question they answer. */
  private static boolean isAnswer(Message reply, Message question) {
    boolean sameClient = Arrays.deepEquals(reply.route().toArray(), question.route().toArray());
    return reply.type().equals("input_reply")
        && sameClient
        && (reply.parentId().isEmpty() || reply.parentId().equals(question.id()));
  }
}
