package whorl.jupyter;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import whorl.page.Bundle;
import whorl.page.CellAnswer;
import whorl.page.CellRequest;
import whorl.page.ExpressionAnswer;
import whorl.page.Page;

/** Runs cells. */
final class Execution implements Handler {
  /** What a request says about how its cell is to run. */
  private record Order(
      String code,
      boolean silent,
      boolean remembered,
      boolean stopsOthers,
      boolean mayAsk,
      JsonObject expressions) {
    static Order of(Content content) throws BadContentException {
      boolean silent = content.flag("silent", false);
      return new Order(
          content.text("code"),
          silent,
          !silent && content.flag("store_history", true),
          content.flag("stop_on_error", true),
          content.flag("allow_stdin", false),
          content.object("user_expressions"));
    }
  }

  /**
   * Notebooks send the cells of a run of all cells one by one, whether or not one has failed
   * already, with gaps of up to so many milliseconds.
   */
  private static final long GAP_IN_RUN = 200;

  private final Supplier<Page> page;
  private final Inbox inbox;
  private final History history;
  private final Outbox outbox;
  private final Questions questions;
  private final Log log;

  private volatile boolean interrupted;

  /** The number of the last cell that was remembered. */
  private int count;

  Execution(
      Supplier<Page> page,
      Inbox inbox,
      History history,
      Outbox outbox,
      Questions questions,
      Log log) {
    this.page = page;
    this.inbox = inbox;
    this.history = history;
    this.outbox = outbox;
    this.questions = questions;
    this.log = log;
  }

  @Override
  public void handle(Request request) throws BadContentException {
    if (request.aborted()) {
      request.reply("aborted", new JsonObject(), new JsonObject());
      return;
    }
    var order = Order.of(request.content());
    var metadata = new JsonObject();
    metadata.addProperty("started", Session.now());
    if (order.remembered()) {
      count++;
      history.add(count, order.code());
    }
    if (!order.silent()) {
      var input = new JsonObject();
      input.addProperty("code", order.code());
      input.addProperty("execution_count", count);
      request.publish("execute_input", input);
    }
    CellAnswer answer = run(request.message(), order);
    if (answer instanceof CellAnswer.Failed failed) {
      fail(request, order, failed, metadata);
    } else {
      succeed(request, order, metadata);
    }
  }

  /** Is told that the cell that runs, if one does, is about to be interrupted; from any thread. */
  void expectInterrupt() {
    interrupted = true;
  }

  private CellAnswer run(Message message, Order order) {
    interrupted = false;
    var front = new CellFront(message, count, order.silent(), order.mayAsk(), outbox, questions);
    try {
      return page.get()
          .run(
              new CellRequest(
                  cell(message),
                  deleted(message),
                  message.session(),
                  count,
                  order.code(),
                  order.mayAsk()),
              front);
    } catch (Throwable e) {
      String summary = failure("while it ran this cell", e);
      return new CellAnswer.Failed(e.getClass().getSimpleName(), summary, List.of(summary));
    } finally {
      front.end();
      Thread.interrupted();
    }
  }

  private void succeed(Request request, Order order, JsonObject metadata) {
    var values = new JsonObject();
    for (String name : order.expressions().keySet()) {
      values.add(name, value(order.expressions().get(name)));
    }
    var content = new JsonObject();
    content.addProperty("execution_count", count);
    content.add("user_expressions", values);
    content.add("payload", new JsonArray());
    request.reply("ok", content, metadata);
  }

  private void fail(Request request, Order order, CellAnswer.Failed failed, JsonObject metadata) {
    JsonObject error = ErrorContent.of(failed.name(), failed.summary(), failed.lines());
    if (!order.silent()) {
      request.publish("error", error);
    }
    // Before the answer, for what is sent after it was read is to run.
    if (order.stopsOthers()) {
      Message message = request.message();
      boolean inRun = cell(message).isPresent() && !interrupted;
      inbox.abort(message.route().get(0), inRun ? GAP_IN_RUN : 0);
    }
    error.addProperty("execution_count", count);
    request.reply("error", error, metadata);
  }

  /** What an expression comes to; one that fails does not make the cell fail. */
  private JsonObject value(JsonElement expression) {
    if (!(expression instanceof JsonPrimitive text) || !text.isString()) {
      return error("BadRequest", "an expression must be a text, but is " + expression, List.of());
    }
    try {
      return value(page.get().evaluate(text.getAsString()));
    } catch (Throwable e) {
      String summary = failure("while it worked out an expression", e);
      return error(e.getClass().getSimpleName(), summary, List.of(summary));
    }
  }

  private static JsonObject value(ExpressionAnswer answer) {
    if (answer instanceof ExpressionAnswer.Failed failed) {
      return error(failed.name(), failed.summary(), failed.lines());
    }
    Bundle bundle = ((ExpressionAnswer.Value) answer).bundle();
    var value = new JsonObject();
    value.addProperty("status", "ok");
    value.add("data", bundle.data());
    value.add("metadata", bundle.metadata());
    return value;
  }

  private static JsonObject error(String name, String summary, List<String> lines) {
    JsonObject error = ErrorContent.of(name, summary, lines);
    error.addProperty("status", "error");
    return error;
  }

  private String failure(String when, Throwable e) {
    log.line("a failure " + when, e);
    return "Whorl failed " + when + ": " + e;
  }

  // ---- What some clients say about a cell; others say nothing, and that is no mistake.

  private static Optional<String> cell(Message message) {
    return text(message.metadata().get("cellId"));
  }

  private static List<String> deleted(Message message) {
    var cells = new ArrayList<String>();
    if (message.metadata().get("deletedCells") instanceof JsonArray ids) {
      ids.forEach(id -> text(id).ifPresent(cells::add));
    }
    return cells;
  }

  private static Optional<String> text(@Nullable JsonElement value) {
    return value instanceof JsonPrimitive text && text.isString()
        ? Optional.of(text.getAsString())
        : Optional.empty();
  }
}
