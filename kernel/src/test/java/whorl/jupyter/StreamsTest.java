package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class StreamsTest {
  @Test
  void manyShortLinesArriveWholeInFewMessages() throws Exception {
    int bytes = 10_000_000;
    try (var kernel = new Served();
        var client = kernel.client()) {
      List<Message> published = client.execute("lines " + bytes).published();
      var text = new StringBuilder();
      for (Message message : published) {
        if (message.type().equals("stream")) {
          text.append(message.content().get("text").getAsString());
        }
      }
      assertEquals(bytes, text.length());
      for (int line = 0; line < bytes; line += 10) {
        assertEquals(line, Integer.parseInt(text, line, line + 9, 10));
      }
      assertTrue(published.size() < 400, () -> published.size() + " messages");
    }
  }

  @Test
  void whatACellPrintsShowsWhileItRuns() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      client.send(Channel.SHELL, "execute_request", Client.request("print a\nforever", "{}"));
      Message message = client.receive(Channel.IOPUB);
      while (!message.type().equals("stream")) {
        message = client.receive(Channel.IOPUB);
      }
      assertEquals("a", message.content().get("text").getAsString());
      client.exchange(Channel.CONTROL, "interrupt_request", "{}");
    }
  }

  @Test
  void whatAThreadPrintsLaterBelongsToItsCell() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String cell = client.execute("straggle late").reply().parentId();
      client.execute("straggle never", "{\"silent\": true}");
      Message late = client.receive(Channel.IOPUB);
      while (!late.type().equals("stream")) {
        late = client.receive(Channel.IOPUB);
      }
      assertEquals("late", late.content().get("text").getAsString());
      assertEquals(cell, late.parentId());
      client.execute("sleep 200");
      assertEquals("[input 3, stdout x]", client.execute("print x").outputs().toString());
    }
  }
}
