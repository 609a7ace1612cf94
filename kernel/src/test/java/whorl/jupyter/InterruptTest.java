package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class InterruptTest {
  @Test
  void aCellIsInterruptedAHundredTimesAndTheNextOneRuns() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (int i = 0; i < 100; i++) {
        String cell =
            client.send(Channel.SHELL, "execute_request", Client.request("forever", "{}"));
        kernel.awaitCell();
        assertEquals("ok", client.exchange(Channel.CONTROL, "interrupt_request", "{}").status());
        Message reply = client.receive(Channel.SHELL);
        assertEquals(cell, reply.parentId());
        assertEquals("interrupted", reply.content().get("evalue").getAsString());
        assertEquals(
            "[input " + (2 * i + 2) + ", stdout a]",
            client.execute("print a").outputs().toString());
      }
      assertEquals("", kernel.log());
    }
  }

  @Test
  void anInterruptWhileNothingRunsDoesNoHarm() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (int i = 0; i < 100; i++) {
        client.send(Channel.CONTROL, "interrupt_request", "{}");
        assertEquals("ok", client.execute("print a\nsleep 1").status());
      }
    }
  }
}
