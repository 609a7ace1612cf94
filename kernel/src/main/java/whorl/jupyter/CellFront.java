package whorl.jupyter;

import com.google.gson.JsonObject;
import java.io.IOException;
import org.jspecify.annotations.Nullable;
import whorl.page.Bundle;
import whorl.page.Front;

/**
 * What the cell of one request shows. A thread of the cell that outlives it may go on to show, but
 * not to ask.
 */
final class CellFront implements Front {
  private final Message cell;
  private final int count;
  private final boolean silent;
  private final boolean mayAsk;
  private final Outbox outbox;
  private final Questions questions;
  private volatile boolean ended;

  CellFront(
      Message cell, int count, boolean silent, boolean mayAsk, Outbox outbox, Questions questions) {
    this.cell = cell;
    this.count = count;
    this.silent = silent;
    this.mayAsk = mayAsk;
    this.outbox = outbox;
    this.questions = questions;
  }

  /** The cell is done; a question that still waits is not. */
  void end() {
    ended = true;
    questions.cancel();
  }

  @Override
  public void print(Stream stream, String text) {
    if (!silent && !text.isEmpty()) {
      outbox.print(cell.header(), stream, text);
      outbox.awaitRoom();
    }
  }

  @Override
  public void display(Bundle bundle, @Nullable String id) {
    show("display_data", content(bundle, id));
  }

  @Override
  public void update(Bundle bundle, String id) {
    show("update_display_data", content(bundle, id));
  }

  @Override
  public void result(Bundle bundle) {
    JsonObject content = content(bundle, null);
    content.addProperty("execution_count", count);
    show("execute_result", content);
  }

  @Override
  public void clear(boolean wait) {
    var content = new JsonObject();
    content.addProperty("wait", wait);
    show("clear_output", content);
  }

  @Override
  public String ask(String prompt, boolean secret) throws IOException {
    if (!mayAsk) {
      throw new IOException("this front end cannot ask the user");
    }
    if (ended) {
      throw new IOException("the cell has ended, so that nobody answers its questions");
    }
    return questions.ask(cell, prompt, secret);
  }

  private void show(String type, JsonObject content) {
    if (!silent) {
      outbox.publish(type, cell.header(), content);
      outbox.awaitRoom();
    }
  }

  private static JsonObject content(Bundle bundle, @Nullable String id) {
    var content = new JsonObject();
    content.add("data", bundle.data());
    content.add("metadata", bundle.metadata());
    var fleeting = new JsonObject();
    if (id != null) {
      fleeting.addProperty("display_id", id);
    }
    content.add("transient", fleeting);
    return content;
  }
}
