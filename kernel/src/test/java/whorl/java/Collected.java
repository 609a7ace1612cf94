package whorl.java;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Collects what a cell prints and shows. */
final class Collected implements JavaOutput {
  private final StringBuilder out = new StringBuilder();
  private final StringBuilder err = new StringBuilder();
  private final List<JsonObject> displays = new ArrayList<>();
  private final List<JsonObject> updates = new ArrayList<>();
  private final List<JsonObject> results = new ArrayList<>();
  private final Deque<String> answers = new ArrayDeque<>();
  private int prints;

  /** Gives answers to the questions of the cell. */
  synchronized Collected answering(String... lines) {
    answers.addAll(List.of(lines));
    return this;
  }

  synchronized String out() {
    return out.toString();
  }

  synchronized String err() {
    return err.toString();
  }

  /** How often something was printed. */
  synchronized int prints() {
    return prints;
  }

  synchronized List<JsonObject> displays() {
    return List.copyOf(displays);
  }

  synchronized List<JsonObject> updates() {
    return List.copyOf(updates);
  }

  /** The value of the cell as plain text; empty if it has none. */
  synchronized String result() {
    return results.isEmpty() ? "" : results.get(0).get("text/plain").getAsString();
  }

  synchronized JsonObject resultData() {
    return results.get(0);
  }

  @Override
  public synchronized void print(Stream stream, String text) {
    (stream == Stream.OUT ? out : err).append(text);
    prints++;
    notifyAll();
  }

  /** Waits until the cell has printed something. */
  synchronized void awaitPrint() throws InterruptedException {
    while (prints == 0) {
      wait();
    }
  }

  @Override
  public synchronized void display(JsonObject data, JsonObject metadata, @Nullable String id) {
    displays.add(data);
  }

  @Override
  public synchronized void update(JsonObject data, JsonObject metadata, String id) {
    updates.add(data);
  }

  @Override
  public synchronized void result(JsonObject data, JsonObject metadata) {
    results.add(data);
  }

  @Override
  public synchronized void clear(boolean wait) {
    displays.clear();
  }

  @Override
  public String ask(String prompt, boolean secret) throws IOException {
    synchronized (this) {
      if (!answers.isEmpty()) {
        return answers.remove();
      }
    }
    print(Stream.OUT, "asking");
    try {
      Thread.sleep(Long.MAX_VALUE);
      return "";
    } catch (InterruptedException e) {
      throw new IOException("nobody answers", e);
    }
  }
}
