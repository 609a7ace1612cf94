package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.io.IOException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.jupyter.Client.Exchange;
import whorl.page.CellRequest;

class ExecutionTest {
  private Served kernel;
  private Client client;

  @BeforeEach
  void serve() throws IOException, BadMessageException {
    kernel = new Served();
    client = kernel.client();
  }

  @AfterEach
  void end() {
    client.close();
    kernel.close();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "''                             | ''",
        "print a                        | stdout a",
        "print a;print b                | stdout ab",
        "print a;warn b;print c         | stdout a, stderr b, stdout c",
        "print a;display b;print c      | stdout a, display_data b, stdout c",
        "card b;update b                | display_data b, update_display_data new b",
        "result 5                       | execute_result 5",
        "print a;clear later;print b    | stdout a, clear_output {\"wait\":true}, stdout b",
        "clear now                      | clear_output {\"wait\":false}",
        "print a;fail it went wrong     | stdout a, error it went wrong",
      })
  void whatACellShowsComesInOrderBetweenItsInputAndItsEnd(String cell, String outputs)
      throws BadMessageException {
    var expected = outputs.isEmpty() ? "[input 1]" : "[input 1, " + outputs + "]";
    assertEquals(expected, client.execute(cell.replace(';', '\n')).outputs().toString());
  }

  @Test
  void outputsCanBeShownAnewByTheirId() throws BadMessageException {
    var published = client.execute("card x\nupdate x\ndisplay y\nresult z").published();
    assertEquals("{\"display_id\":\"x\"}", published.get(2).content().get("transient").toString());
    assertEquals("{\"display_id\":\"x\"}", published.get(3).content().get("transient").toString());
    assertEquals("{}", published.get(4).content().get("transient").toString());
    assertEquals(1, published.get(5).content().get("execution_count").getAsInt());
  }

  @Test
  void aCellThatSucceedsIsAnswered() throws BadMessageException {
    Instant before = Instant.now();
    Exchange exchange = client.execute("print a");
    assertEquals(
        "{\"execution_count\":1,\"user_expressions\":{},\"payload\":[],\"status\":\"ok\"}",
        exchange.reply().content().toString());
    String started = exchange.reply().metadata().get("started").getAsString();
    assertFalse(Instant.parse(started).isBefore(before.minusMillis(1)), started);
  }

  @Test
  void anErrorIsShownAndAnswered() throws BadMessageException {
    Exchange exchange = client.execute("fail it went wrong");
    assertEquals(
        "{\"ename\":\"ScriptError\",\"evalue\":\"it went wrong\","
            + "\"traceback\":[\"line 1\",\"it went wrong\"]}",
        exchange.published().get(2).content().toString());
    assertEquals(
        "{\"ename\":\"ScriptError\",\"evalue\":\"it went wrong\","
            + "\"traceback\":[\"line 1\",\"it went wrong\"],"
            + "\"execution_count\":1,\"status\":\"error\"}",
        exchange.reply().content().toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "overflow            | StackOverflowError",
        "exhaust the memory  | OutOfMemoryError",
        "break it            | IllegalStateException",
      })
  void aFailureOfThePageIsAnErrorOfTheCell(String cell, String name) throws BadMessageException {
    Exchange exchange = client.execute(cell);
    assertEquals("error", exchange.status());
    assertEquals(name, exchange.reply().content().get("ename").getAsString());
    assertEquals(1, exchange.reply().content().get("execution_count").getAsInt());
    assertTrue(kernel.log().startsWith("whorl: a failure while it ran this cell: "), kernel.log());
    assertEquals(1, kernel.log().lines().count(), kernel.log());
    assertEquals("ok", client.execute("print next").status());
  }

  @Test
  void onlyRememberedCellsAreCounted() throws BadMessageException {
    var counts = new ArrayList<String>();
    for (String more :
        List.of(
            "{\"store_history\": false}",
            "{\"silent\": true}",
            "{}",
            "{\"store_history\": null, \"silent\": null}",
            "{\"silent\": true, \"store_history\": true}",
            "{\"store_history\": false}",
            "{\"store_history\": true}")) {
      Exchange exchange = client.execute("print a", more);
      List<String> outputs = exchange.outputs();
      counts.add(
          exchange.reply().content().get("execution_count")
              + " "
              + (outputs.isEmpty() ? "silent" : outputs.get(0)));
    }
    assertEquals(
        List.of(
            "0 input 0",
            "0 silent",
            "1 input 1",
            "2 input 2",
            "2 silent",
            "2 input 2",
            "3 input 3"),
        counts);
    String history = "{\"hist_access_type\": \"tail\", \"n\": 10}";
    assertEquals(
        "[[1,1,\"print a\"],[1,2,\"print a\"],[1,3,\"print a\"]]",
        client
            .exchange(Channel.SHELL, "history_request", history)
            .reply()
            .content()
            .get("history")
            .toString());
  }

  @Test
  void aSilentCellShowsNothing() throws BadMessageException {
    String cell = "print a\nwarn b\ndisplay c\ncard d\nupdate d\nresult e\nclear now\nfail f";
    Exchange exchange = client.execute(cell, "{\"silent\": true}");
    assertEquals(List.of(), exchange.outputs());
    assertEquals("f", exchange.reply().content().get("evalue").getAsString());
  }

  @Test
  void expressionsAreWorkedOutEachForItself() throws BadMessageException {
    String expressions =
        "{\"user_expressions\": {\"a\": \"x\", \"b\": \"wrong\", \"c\": 5, \"d\": \"break\"}}";
    Exchange exchange = client.execute("print a", expressions);
    assertEquals("ok", exchange.status());
    JsonObject values = exchange.reply().content().getAsJsonObject("user_expressions");
    assertEquals(
        "{\"status\":\"ok\",\"data\":{\"text/plain\":\"value of x\"},\"metadata\":{}}",
        values.get("a").toString());
    assertEquals(
        "{\"ename\":\"ScriptError\",\"evalue\":\"no such name\",\"traceback\":[\"wrong\"],"
            + "\"status\":\"error\"}",
        values.get("b").toString());
    for (String name : List.of("c", "d")) {
      assertEquals("error", values.getAsJsonObject(name).get("status").getAsString());
    }
  }

  @Test
  void expressionsOfACellInErrorAreNotWorkedOut() throws BadMessageException {
    Exchange exchange = client.execute("fail f", "{\"user_expressions\": {\"a\": \"x\"}}");
    assertFalse(exchange.reply().content().has("user_expressions"));
  }

  @Test
  void cellsThatWaitWhenOneFailsAreAborted() throws BadMessageException {
    var cells = new ArrayList<String>();
    cells.add(send("sleep 500\nfail f", "{}"));
    cells.add(send("print a", "{}"));
    String question = client.send(Channel.SHELL, "kernel_info_request", "{}");
    cells.add(send("print b", "{\"stop_on_error\": false}"));

    Message first = client.receive(Channel.SHELL);
    assertEquals(cells.get(0), first.parentId());
    assertEquals("error", first.content().get("status").getAsString());
    String next = send("print c", "{}");
    assertEquals(
        List.of("aborted", "ok", "aborted", "ok"),
        List.of(status(cells.get(1)), status(question), status(cells.get(2)), status(next)));
    assertEquals(4, client.published(cells.get(0)).size());
    for (String aborted : cells.subList(1, 3)) {
      assertEquals(2, client.published(aborted).size());
    }
    assertEquals(4, client.published(next).size());
    assertEquals(2, kernel.page().requests().size());
  }

  @Test
  void cellsOfAnotherClientAreNotAborted() throws BadMessageException {
    try (Client other = kernel.client()) {
      String first = send("sleep 300\nfail f", "{}");
      kernel.awaitCell();
      String others = other.send(Channel.SHELL, "execute_request", Client.request("fail g", "{}"));
      String mine = send("print a", "{}");
      String othersNext =
          other.send(Channel.SHELL, "execute_request", Client.request("print b", "{}"));
      assertEquals("error", status(first));
      assertEquals("aborted", status(mine));
      Message reply = other.receive(Channel.SHELL);
      assertEquals(others, reply.parentId());
      assertEquals("g", reply.content().get("evalue").getAsString());
      Message next = other.receive(Channel.SHELL);
      assertEquals(othersNext, next.parentId());
      assertEquals("aborted", next.content().get("status").getAsString());
    }
  }

  @Test
  void cellsAreNotAbortedWhereAFailureIsNotToStopThem() throws BadMessageException {
    String first = send("sleep 300\nfail f", "{\"stop_on_error\": false}");
    String second = send("print a", "{}");
    assertEquals("error", status(first));
    assertEquals("ok", status(second));
  }

  @Test
  void whatIsSentAfterAnErrorWasReadRuns() throws BadMessageException {
    for (int i = 0; i < 50; i++) {
      client.send(Channel.SHELL, "execute_request", Client.request("fail f", "{}"));
      client.receive(Channel.SHELL);
      assertEquals("ok", status(send("print a", "{}")));
    }
  }

  @Test
  void fiftyCellsThatWaitRunInOrder() throws BadMessageException {
    var sent = new ArrayList<String>();
    for (int i = 0; i < 50; i++) {
      sent.add(send("print " + i, "{}"));
    }
    for (String id : sent) {
      assertEquals("ok", status(id));
    }
    assertEquals(
        List.of("print 0", "print 49"),
        List.of(kernel.page().requests().get(0).code(), kernel.page().requests().get(49).code()));
  }

  private String send(String cell, String more) {
    return client.send(Channel.SHELL, "execute_request", Client.request(cell, more));
  }

  /** How the request was answered that was sent longest ago. */
  private String status(String request) throws BadMessageException {
    Message reply = client.receive(Channel.SHELL);
    assertEquals(request, reply.parentId());
    return reply.content().get("status").getAsString();
  }

  @Test
  void theMetadataTellTheCell() throws BadMessageException {
    run("{\"cellId\": \"a-1\", \"deletedCells\": [\"b\", \"c\"]}");
    CellRequest request = kernel.page().requests().get(0);
    assertEquals(Optional.of("a-1"), request.cell());
    assertEquals(List.of("b", "c"), request.deleted());
    assertEquals(1, request.count());
    assertFalse(request.client().isEmpty());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "{}",
        "{\"cellId\": null, \"deletedCells\": null}",
        "{\"cellId\": 5, \"deletedCells\": \"b\"}",
        "{\"cellId\": {}, \"deletedCells\": [5, null, []]}"
      })
  void aClientNeedNotKnowCells(String metadata) throws BadMessageException {
    run(metadata);
    CellRequest request = kernel.page().requests().get(0);
    assertEquals(Optional.empty(), request.cell());
    assertEquals(List.of(), request.deleted());
  }

  private void run(String metadata) throws BadMessageException {
    client.exchange(Channel.SHELL, "execute_request", Client.request("print a", "{}"), metadata);
  }
}
