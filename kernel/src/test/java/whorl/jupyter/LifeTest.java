package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.Writer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import whorl.page.PlainLanguage;

/** A kernel from its start to its end. */
class LifeTest {
  @ParameterizedTest
  @CsvSource({"SHELL, kernel_info_request", "CONTROL, kernel_info_request"})
  void everyRequestIsFramedByBusyAndIdleWithItAsParent(Channel channel, String type)
      throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      var exchange = client.exchange(channel, type, "{}");
      assertEquals("ok", exchange.status());
      assertEquals(
          "[busy, idle]",
          exchange.published().stream()
              .map(status -> status.content().get("execution_state").getAsString())
              .toList()
              .toString());
    }
  }

  @Test
  void controlIsServedWhileACellRuns() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String cell = client.send(Channel.SHELL, "execute_request", Client.request("forever", "{}"));
      assertEquals("ok", client.exchange(Channel.CONTROL, "kernel_info_request", "{}").status());
      client.sendFrames(
          Channel.HEARTBEAT,
          java.util.List.of("beat".getBytes(java.nio.charset.StandardCharsets.US_ASCII)));
      assertEquals("beat", client.socket(Channel.HEARTBEAT).recvStr());
      kernel.awaitCell();
      assertEquals("ok", client.exchange(Channel.CONTROL, "interrupt_request", "{}").status());
      assertEquals(cell, client.receive(Channel.SHELL).parentId());
    }
  }

  @ParameterizedTest
  @EnumSource(
      value = Channel.class,
      names = {"SHELL", "CONTROL"})
  void aKernelThatIsShutDownAnswersFirst(Channel channel) throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      client.execute("print before");
      var exchange = client.exchange(channel, "shutdown_request", "{\"restart\": true}");
      assertEquals("{\"restart\":true,\"status\":\"ok\"}", exchange.reply().content().toString());
      assertEquals("shutdown_reply", exchange.published().get(1).type());
      kernel.join();
      assertTrue(kernel.page().isClosed());
      assertEquals("", kernel.log());
    }
  }

  @Test
  void aCellThatRunsAtTheEndIsInterrupted() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      client.send(Channel.SHELL, "execute_request", Client.request("forever", "{}"));
      client.send(Channel.SHELL, "execute_request", Client.request("print never", "{}"));
      kernel.awaitCell();
      client.exchange(Channel.CONTROL, "shutdown_request", "{}");
      assertEquals("error", client.receive(Channel.SHELL).content().get("status").getAsString());
      kernel.join();
      assertEquals(1, kernel.page().requests().size());
    }
  }

  @Test
  void aPortThatIsTakenIsNamed() throws Exception {
    try (var kernel = new Served()) {
      var e =
          assertThrows(
              KernelException.class,
              () ->
                  new Kernel(
                      kernel.connection(),
                      PlainLanguage.SHEET,
                      ScriptPage::new,
                      new PrintWriter(Writer.nullWriter())));
      assertTrue(e.getMessage().contains("(shell_port)"), e::getMessage);
      assertFalse(e.getMessage().contains("hb_port"), e::getMessage);
    }
  }
}
