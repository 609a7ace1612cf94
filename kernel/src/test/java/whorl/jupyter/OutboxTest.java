package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.io.PrintWriter;
import java.io.Writer;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import whorl.page.Front.Stream;

class OutboxTest {
  private final WireFormat format = new WireFormat(new Signatures("k"));
  private final List<Message> sent = Collections.synchronizedList(new ArrayList<>());
  private final Outbox outbox =
      new Outbox(
          new Session("kernel"),
          format,
          this::carry,
          new Log(new PrintWriter(Writer.nullWriter())));
  private final Thread thread = new Thread(outbox);
  private final JsonObject cell = new JsonObject();

  private void carry(Channel channel, List<byte[]> frames) {
    try {
      sent.add(format.read(frames));
    } catch (BadMessageException e) {
      throw new IllegalStateException(e);
    }
  }

  @BeforeEach
  void nameCell() {
    cell.addProperty("msg_id", "cell");
  }

  @AfterEach
  void end() throws InterruptedException {
    outbox.end();
    thread.join();
  }

  private void print(String text) {
    outbox.print(cell, Stream.OUT, text);
  }

  private List<String> texts() {
    return List.copyOf(sent).stream()
        .map(message -> message.content().get("text").getAsString())
        .toList();
  }

  private void awaitTexts(int number) {
    while (sent.size() < number) {
      Thread.onSpinWait();
    }
  }

  @Test
  void textIsSentSoonThoughNothingFollows() {
    thread.start();
    print("a");
    print("b");
    awaitTexts(1);
    print("c");
    awaitTexts(2);
    assertEquals(List.of("ab", "c"), texts());
  }

  @Test
  void aCharacterIsNotDividedThoughItsHalvesArePrintedOneByOne() {
    thread.start();
    print("x\uD835");
    awaitTexts(1);
    print("\uDF14y");
    awaitTexts(2);
    assertEquals(List.of("x", "𝜔y"), texts());
  }

  @Test
  void aLongTextIsNotDividedWithinACharacter() throws InterruptedException {
    print("x" + "𝜔".repeat(200_000));
    print("𝜔".repeat(100_000));
    thread.start();
    outbox.end();
    thread.join();
    assertEquals("x" + "𝜔".repeat(300_000), String.join("", texts()));
  }

  @Test
  void halfACharacterIsSentBeforeWhatFollowsItsCell() throws InterruptedException {
    print("\uD835");
    outbox.publish("status", cell, new JsonObject());
    thread.start();
    outbox.end();
    thread.join();
    assertEquals(
        List.of("stream", "status"), List.copyOf(sent).stream().map(Message::type).toList());
  }

  @Test
  void textsOfTwoStreamsOrTwoCellsAreKeptApart() throws InterruptedException {
    var other = new JsonObject();
    print("a");
    outbox.print(cell, Stream.ERR, "b");
    outbox.print(cell, Stream.ERR, "c");
    outbox.print(other, Stream.ERR, "d");
    thread.start();
    outbox.end();
    thread.join();
    assertEquals(List.of("a", "bc", "d"), texts());
    assertEquals(
        List.of("stdout", "stderr", "stderr"),
        sent.stream().map(message -> message.content().get("name").getAsString()).toList());
    assertEquals(
        List.of("cell", "cell", ""), List.copyOf(sent).stream().map(Message::parentId).toList());
  }

  @Test
  void whoPrintsTooMuchWaitsUntilSomeIsSent() throws InterruptedException {
    var printer =
        new Thread(
            () -> {
              for (int i = 0; i < 200; i++) {
                print("x".repeat(1 << 16));
                outbox.awaitRoom();
              }
            });
    printer.start();
    while (printer.getState() != Thread.State.TIMED_WAITING) {
      Thread.onSpinWait();
    }
    thread.start();
    printer.join();
    outbox.end();
    thread.join();
    assertEquals(200 << 16, texts().stream().mapToInt(String::length).sum());
  }

  @Test
  void whoIsInterruptedDoesNotWait() throws InterruptedException {
    var printer =
        new Thread(
            () -> {
              while (!Thread.currentThread().isInterrupted()) {
                print("x".repeat(1 << 16));
                outbox.awaitRoom();
              }
            });
    printer.start();
    while (printer.getState() != Thread.State.TIMED_WAITING) {
      Thread.onSpinWait();
    }
    printer.interrupt();
    printer.join();
    assertTrue(sent.isEmpty());
    thread.start();
  }
}
