package whorl.jupyter;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.locks.LockSupport;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.assist.Completion.Candidate;
import whorl.page.Bundle;
import whorl.page.CellAnswer;
import whorl.page.CellAnswer.Failed;
import whorl.page.CellRequest;
import whorl.page.ExpressionAnswer;
import whorl.page.Front;
import whorl.page.Front.Stream;
import whorl.page.Page;
import whorl.page.PlainLanguage;

/** A page whose cells say line by line what they do, as in {@code print hello}. */
final class ScriptPage implements Page {
  private final List<CellRequest> requests = Collections.synchronizedList(new ArrayList<>());
  private volatile boolean interrupted;
  private volatile Thread runner = Thread.currentThread();
  private volatile boolean running;
  private volatile boolean closed;

  List<CellRequest> requests() {
    return requests;
  }

  boolean isRunning() {
    return running;
  }

  boolean isClosed() {
    return closed;
  }

  @Override
  public PlainLanguage language() {
    return PlainLanguage.SHEET;
  }

  @Override
  public CellAnswer run(CellRequest request, Front front) {
    requests.add(request);
    interrupted = false;
    runner = Thread.currentThread();
    running = true;
    try {
      for (String line : request.code().lines().toList()) {
        String[] words = line.split(" ", 2);
        step(words[0], words.length == 1 ? "" : words[1], front);
      }
      return new CellAnswer.Done();
    } catch (IOException e) {
      String summary = String.valueOf(e.getMessage());
      return new Failed("ScriptError", summary, List.of("line 1", summary));
    } finally {
      running = false;
    }
  }

  private void step(String verb, String object, Front front) throws IOException {
    switch (verb) {
      case "print" -> front.print(Stream.OUT, object.replace("\\n", "\n"));
      case "warn" -> front.print(Stream.ERR, object);
      case "lines" -> printLines(Integer.parseInt(object), front);
      case "displays" -> {
        for (int i = 0; i < Integer.parseInt(object); i++) {
          front.display(bundle("display " + i + " ".repeat(10_000)), null);
        }
      }
      case "display" -> front.display(bundle(object), null);
      case "card" -> front.display(bundle(object), object);
      case "update" -> front.update(bundle("new " + object), object);
      case "result" -> front.result(bundle(object));
      case "clear" -> front.clear(object.equals("later"));
      case "ask" -> front.print(Stream.OUT, "<" + front.ask(object, false) + ">");
      case "askSecretly" -> front.print(Stream.OUT, "<" + front.ask(object, true) + ">");
      case "straggle" -> new Thread(() -> straggle(object, front)).start();
      case "sleep" -> LockSupport.parkNanos(Long.parseLong(object) * 1_000_000);
      case "forever" -> waitForInterrupt();
      case "fail" -> throw new IOException(object);
      case "overflow" -> overflow(0);
      case "exhaust" -> throw new OutOfMemoryError(object);
      case "break" -> throw new IllegalStateException(object);
      default -> {}
    }
  }

  private static void printLines(int bytes, Front front) {
    for (int printed = 0; printed < bytes; printed += 10) {
      front.print(Stream.OUT, String.format("%09d\n", printed));
    }
  }

  private static void straggle(String text, Front front) {
    LockSupport.parkNanos(100_000_000);
    front.print(Stream.OUT, text);
  }

  /** Heeds an interrupt as the sheet does, and as a cell in Java does. */
  private void waitForInterrupt() throws IOException {
    while (!interrupted) {
      Thread.onSpinWait();
    }
    throw new IOException("interrupted");
  }

  private static int overflow(int depth) {
    return depth < 0 ? 0 : overflow(depth + 1) + 1;
  }

  private static Bundle bundle(String text) {
    var data = new JsonObject();
    data.addProperty("text/plain", text);
    return Bundle.of(data);
  }

  @Override
  public ExpressionAnswer evaluate(String expression) {
    return switch (expression) {
      case "wrong" -> new ExpressionAnswer.Failed("ScriptError", "no such name", List.of("wrong"));
      case "break" -> throw new IllegalStateException(expression);
      default -> new ExpressionAnswer.Value(bundle("value of " + expression));
    };
  }

  /** Offers what stands before the cursor, twice. */
  @Override
  public Completion complete(String code, int cursor) {
    String before = code.substring(0, cursor);
    return before.isBlank()
        ? Completion.none(cursor)
        : new Completion(
            before.lastIndexOf(' ') + 1,
            cursor,
            List.of(new Candidate(before, "variable", "1 m"), new Candidate("b", "unit", "")));
  }

  @Override
  public Optional<Bundle> inspect(String code, int cursor, int detail) {
    String before = code.substring(0, cursor);
    return before.isBlank() ? Optional.empty() : Optional.of(bundle(before + "/" + detail));
  }

  @Override
  public Completeness completeness(String code) {
    return switch (code) {
      case "complete" -> new Completeness.Complete();
      case "incomplete" -> new Completeness.Incomplete("  ");
      case "invalid" -> new Completeness.Invalid();
      default -> new Completeness.Unknown();
    };
  }

  @Override
  public void interrupt() {
    interrupted = true;
    if (running) {
      runner.interrupt();
    }
  }

  @Override
  public void close() {
    closed = true;
  }
}
