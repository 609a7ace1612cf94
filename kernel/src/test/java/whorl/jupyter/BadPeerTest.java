package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.locks.LockSupport;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Whatever comes over the wire, the kernel goes on to serve, and says once what was wrong. */
class BadPeerTest {
  private static final int SIGNATURE = 1;
  private static final int HEADER = 2;
  private static final int PARENT = 3;
  private static final int METADATA = 4;
  private static final int CONTENT = 5;

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /** Replaces a frame of a good message, and signs it if told so. */
  private static Arguments changed(String name, int frame, String text, String problem) {
    UnaryOperator<List<byte[]>> change =
        frames -> {
          var changed = new ArrayList<>(frames);
          changed.set(frame, bytes(text));
          if (frame != SIGNATURE) {
            changed.set(
                SIGNATURE, new Signatures(Served.KEY).of(changed.subList(HEADER, CONTENT + 1)));
          }
          return changed;
        };
    return Arguments.of(name, change, problem);
  }

  private static Arguments kept(String name, int frames, String problem) {
    UnaryOperator<List<byte[]>> change = all -> all.subList(0, frames);
    return Arguments.of(name, change, problem);
  }

  static List<Arguments> badFrames() {
    String header = "{\"msg_id\": \"i\", \"msg_type\": \"execute_request\"}";
    return List.of(
        changed("wrong signature", SIGNATURE, "0".repeat(64), "its signature is wrong"),
        changed("short signature", SIGNATURE, "0", "its signature is wrong"),
        changed("no delimiter", 0, "<IDS>", "parts of it are missing"),
        kept("no content", CONTENT, "parts of it are missing"),
        kept("delimiter only", 1, "parts of it are missing"),
        changed("header in pieces", HEADER, "{\"msg_id\": ", "its header is not a JSON object"),
        changed("lenient JSON", HEADER, "{msg_id: 'i'}", "its header is not a JSON object"),
        changed("list for header", HEADER, "[]", "its header is not a JSON object"),
        changed("two headers", HEADER, header + header, "its header is not a JSON object"),
        changed("no bytes at all", HEADER, "", "its header is not a JSON object"),
        changed("empty header", HEADER, "{}", "its header has no msg_type or no msg_id"),
        changed(
            "number for type",
            HEADER,
            "{\"msg_id\": \"i\", \"msg_type\": 5}",
            "its header has no msg_type or no msg_id"),
        changed("text for parent", PARENT, "\"x\"", "its parent header is not a JSON object"),
        changed("number for metadata", METADATA, "5", "its metadata is not a JSON object"),
        changed("null for content", CONTENT, "null", "its content is not a JSON object"),
        changed(
            "deep nesting",
            CONTENT,
            "{\"a\": " + "[".repeat(1_000_000) + "}",
            "its content is not a JSON object"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("badFrames")
  void whatIsNoMessageIsIgnoredWithOneLine(
      String name, UnaryOperator<List<byte[]>> change, String problem) throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (Channel channel : List.of(Channel.SHELL, Channel.CONTROL)) {
        client.sendFrames(channel, change.apply(good(client)));
        assertEquals("ok", client.exchange(channel, "kernel_info_request", "{}").status());
      }
      assertEquals(
          "whorl: a message on shell_port was ignored: "
              + problem
              + "\nwhorl: a message on control_port was ignored: "
              + problem
              + "\n",
          kernel.log());
    }
  }

  private static List<byte[]> good(Client client) {
    return client
        .format()
        .write(
            new Message(
                List.of(),
                new Session("x").header("execute_request"),
                Client.object("{}"),
                Client.object("{}"),
                Client.object("{\"code\": \"print a\"}"),
                List.of()));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "execute_request  | {}                                     | code is missing",
        "execute_request  | {\"code\": 5}                          | code must be a text, but is 5",
        "execute_request  | {\"code\": null}                       | code is missing",
        "execute_request  | {\"code\": \"\", \"silent\": 1}        | silent must be true or false, but is 1",
        "execute_request  | {\"code\": \"\", \"store_history\": []} | store_history must be true or false, but is []",
        "execute_request  | {\"code\": \"\", \"user_expressions\": 5} | user_expressions must be an object, but is 5",
        "complete_request | {\"cursor_pos\": 1}                    | code is missing",
        "complete_request | {\"code\": \"a\", \"cursor_pos\": \"1\"} | cursor_pos must be a number, but is \"1\"",
        "inspect_request  | {\"code\": {}, \"cursor_pos\": 0}      | code must be a text, but is {}",
        "is_complete_request | {\"code\": true}                    | code must be a text, but is true",
        "history_request  | {\"hist_access_type\": \"all\"}        | hist_access_type must be tail, range or search, but is all",
        "history_request  | {\"hist_access_type\": \"search\", \"pattern\": 1} | pattern must be a text, but is 1",
        "shutdown_request | {\"restart\": \"yes\"}                 | restart must be true or false, but is \"yes\"",
      })
  void aRequestThatSaysNonsenseIsAnsweredWithWhatIsWrong(
      String type, String content, String problem) throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      var reply = client.exchange(Channel.SHELL, type, content).reply();
      assertEquals(type.replace("request", "reply"), reply.type());
      assertEquals("error", reply.content().get("status").getAsString());
      assertEquals(type + ": " + problem, reply.content().get("evalue").getAsString());
      assertEquals("whorl: " + type + ": " + problem + "\n", kernel.log());
      assertEquals("ok", client.execute("print a").status());
    }
  }

  @ParameterizedTest
  @CsvSource({"connect_request", "debug_request", "no_such_request", "input_reply"})
  void aMessageOfAnUnknownTypeIsIgnoredWithOneLine(String type) throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      client.send(Channel.SHELL, type, "{}");
      assertEquals("ok", client.execute("print a").status());
      assertEquals("whorl: a message of the unknown type " + type + " was ignored\n", kernel.log());
    }
  }

  @Test
  void aCommWithoutAnIdIsIgnoredWithOneLine() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String id = client.send(Channel.SHELL, "comm_open", "{\"target_name\": \"x\"}");
      assertEquals(2, client.published(id).size());
      assertEquals("whorl: comm_open: comm_id is missing\n", kernel.log());
    }
  }

  @Test
  void aHeaderNeedsNoMoreThanTypeAndId() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String header =
          "{\"msg_id\": \"i\", \"msg_type\": \"kernel_info_request\", \"username\": null,"
              + " \"subshell_id\": null, \"extra\": [1]}";
      client.sendFrames(
          Channel.SHELL,
          client
              .format()
              .write(
                  new Message(
                      List.of(),
                      Client.object(header),
                      Client.object("{}"),
                      Client.object("{}"),
                      Client.object("{}"),
                      List.of(bytes("a buffer")))));
      Message reply = client.receive(Channel.SHELL);
      assertEquals(Client.object(header), reply.parent());
    }
  }

  @Test
  void aMessageThatIsSentTwiceIsServedTwice() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      List<byte[]> frames = good(client);
      client.sendFrames(Channel.SHELL, frames);
      client.sendFrames(Channel.SHELL, frames);
      assertEquals(1, client.receive(Channel.SHELL).content().get("execution_count").getAsInt());
      assertEquals(2, client.receive(Channel.SHELL).content().get("execution_count").getAsInt());
    }
  }

  @Test
  void aCellOfTwentyMegabytesRuns() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String cell = "x".repeat(20_000_000);
      var exchange = client.execute(cell);
      assertEquals("ok", exchange.status());
      assertEquals(cell, exchange.published().get(1).content().get("code").getAsString());
      assertEquals("ok", client.execute("print a").status());
    }
  }

  @Test
  void aClientThatGoesAwayWhileItsCellPrintsDoesNoHarm() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (int i = 0; i < 5; i++) {
        try (var leaving = kernel.client()) {
          leaving.send(
              Channel.SHELL,
              "execute_request",
              Client.request("lines 1000000\nask anyone?", "{\"allow_stdin\": true}"));
          leaving.receive(Channel.IOPUB);
        }
        client.exchange(Channel.CONTROL, "interrupt_request", "{}");
        while (kernel.page().isRunning()) {
          client.exchange(Channel.CONTROL, "interrupt_request", "{}");
        }
      }
      assertEquals("ok", client.execute("print a").status());
    }
  }

  @Test
  void aPeerThatGreetsRightIsHeard() throws Exception {
    try (var kernel = new Served();
        var peer = new RawPeer(kernel.connection(), Channel.HEARTBEAT)) {
      peer.send(RawPeer.greeting("DEALER"));
      assertTrue(peer.hears("ROUTER"));
      peer.send(new byte[] {0, 4, 'b', 'e', 'a', 't'});
      assertTrue(peer.hears("beat"));
    }
  }

  static List<Arguments> badBytes() {
    return List.of(
        Arguments.of("a web browser", List.of(bytes("GET / HTTP/1.1\r\nHost: x\r\n\r\n"))),
        Arguments.of("nothing", List.of()),
        Arguments.of("zeros", List.of(new byte[1_000])),
        Arguments.of("half a greeting", List.of(Arrays.copyOf(RawPeer.greeting("DEALER"), 30))),
        Arguments.of(
            "half a message",
            List.of(RawPeer.greeting("DEALER"), new byte[] {1, 3, 'a', 'b', 'c'})),
        Arguments.of(
            "half a frame", List.of(RawPeer.greeting("DEALER"), new byte[] {1, 30, 'a', 'b', 'c'})),
        Arguments.of(
            "a frame of a terabyte",
            List.of(RawPeer.greeting("DEALER"), new byte[] {2, 0, 0, 1, 0, 0, 0, 0, 0, 0})),
        Arguments.of(
            "a frame of less than nothing",
            List.of(RawPeer.greeting("DEALER"), new byte[] {2, -1, 0, 0, 0, 0, 0, 0, 0})));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("badBytes")
  void whateverConnectsToAPortTheKernelServes(String name, List<byte[]> parts) throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (Channel channel : Channel.values()) {
        try (var peer = new RawPeer(kernel.connection(), channel)) {
          for (byte[] part : parts) {
            peer.send(part);
            client.exchange(Channel.CONTROL, "kernel_info_request", "{}");
          }
        } catch (IOException e) {
          // The kernel may hang up first.
        }
      }
      assertEquals("ok", client.execute("print a").status());
      client.sendFrames(Channel.HEARTBEAT, List.of(bytes("beat")));
      assertEquals("beat", client.socket(Channel.HEARTBEAT).recvStr());
    }
  }

  @Test
  void clientsThatComeAndGoAreServed() throws Exception {
    try (var kernel = new Served()) {
      for (int i = 0; i < 3; i++) {
        try (var client = kernel.client()) {
          assertTrue(client.execute("print a").outputs().contains("stdout a"));
        }
      }
    }
  }

  @Test
  void aClientThatReadsSlowlyMissesNothing() throws Exception {
    try (var kernel = new Served();
        var slow = new RawPeer(kernel.connection(), Channel.IOPUB);
        var client = kernel.client()) {
      slow.subscribe("");
      client.send(Channel.SHELL, "execute_request", Client.request("displays 5000", "{}"));
      // Shorter than the kernel's patience.
      LockSupport.parkNanos(500_000_000);
      for (int i = 0; i < 5000; i++) {
        assertTrue(slow.hears("display " + i + " "));
      }
    }
  }

  @Test
  void aClientThatReadsNothingHoldsUpNoOther() throws Exception {
    try (var kernel = new Served();
        var stalled = new RawPeer(kernel.connection(), Channel.IOPUB);
        var client = kernel.client()) {
      stalled.subscribe("");
      assertEquals(5003, client.execute("displays 5000").published().size());
      assertEquals("[input 2, stdout a]", client.execute("print a").outputs().toString());
    }
  }
}
