package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.CountDownLatch;
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
  void theFirstToComeIsWelcomedAndToldThatTheKernelStarts() throws Exception {
    try (var kernel = new Served();
        var first = kernel.client();
        var second = kernel.client()) {
      Message starting = first.receive(Channel.IOPUB);
      assertEquals("starting", starting.content().get("execution_state").getAsString());
      assertEquals("{}", starting.parent().toString());
      assertEquals("iopub_welcome", first.receive(Channel.IOPUB).type());
      second.send(Channel.SHELL, "kernel_info_request", "{}");
      for (Client client : List.of(first, second)) {
        Message busy = client.receive(Channel.IOPUB);
        assertEquals("busy", busy.content().get("execution_state").getAsString());
      }
    }
  }

  @Test
  void aTopicMayBeSubscribedToAlone() throws Exception {
    try (var kernel = new Served();
        var peer = new RawPeer(kernel.connection(), Channel.IOPUB);
        var client = kernel.client()) {
      peer.subscribe("str");
      client.execute("display a\nprint b");
      assertTrue(peer.hears("stream"));
    }
  }

  @Test
  void controlIsServedWhileACellRuns() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String cell = client.send(Channel.SHELL, "execute_request", Client.request("forever", "{}"));
      assertEquals("ok", client.exchange(Channel.CONTROL, "kernel_info_request", "{}").status());
      client.sendFrames(Channel.HEARTBEAT, List.of("beat".getBytes(StandardCharsets.US_ASCII)));
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
  void aKernelWithoutAPageEndsWithOneLine() throws Exception {
    var log = new StringWriter();
    var kernel =
        new Kernel(
            new ConnectionFile("127.0.0.1", Served.freePorts(), ""),
            PlainLanguage.SHEET,
            () -> {
              throw new IllegalStateException("no page");
            },
            () -> {},
            new PrintWriter(log));
    assertThrows(KernelException.class, kernel::run);
    assertTrue(
        log.toString()
            .startsWith(
                "whorl: the thread page failed: java.lang.IllegalStateException: no page, at "),
        log::toString);
    assertEquals(1, log.toString().lines().count());
  }

  @Test
  void aWarmUpThatFailsLeavesTheKernelAlive() throws Exception {
    var failed = new CountDownLatch(1);
    Runnable failing =
        () -> {
          failed.countDown();
          throw new IllegalStateException("cold");
        };
    try (var kernel = new Served(Served.KEY, failing);
        var client = kernel.client()) {
      failed.await();
      assertEquals("ok", client.exchange(Channel.CONTROL, "kernel_info_request", "{}").status());
      client.execute("print a");
      kernel.stop();
      kernel.join();
      assertTrue(kernel.log().startsWith("whorl: a failure in the warm-up: "), kernel::log);
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
                      () -> {},
                      new PrintWriter(Writer.nullWriter())));
      assertTrue(e.getMessage().contains("(shell_port)"), e::getMessage);
      assertFalse(e.getMessage().contains("hb_port"), e::getMessage);
    }
  }
}
