package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class QuestionsTest {
  private static final String MAY_ASK = "{\"allow_stdin\": true}";

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

  private String send(String cell) {
    return client.send(Channel.SHELL, "execute_request", Client.request(cell, MAY_ASK));
  }

  @ParameterizedTest
  @CsvSource({"ask, false", "askSecretly, true"})
  void aCellAsksWhoeverSentIt(String verb, boolean secret) throws BadMessageException {
    try (Client other = kernel.client()) {
      String cell = send("print before\n" + verb + " how fast?");
      Message question = client.receive(Channel.STDIN);
      assertEquals("input_request", question.type());
      assertEquals(cell, question.parentId());
      assertEquals(
          "{\"prompt\":\"how fast?\",\"password\":" + secret + "}", question.content().toString());
      other.send(Channel.STDIN, "input_reply", "{\"value\": \"from another\"}");
      other.exchange(Channel.CONTROL, "kernel_info_request", "{}");
      client.send(Channel.STDIN, "input_reply", "{\"value\": \"7000 rpm\"}");
      assertEquals("ok", client.receive(Channel.SHELL).content().get("status").getAsString());
    }
  }

  @Test
  void whatWasPrintedShowsBeforeTheQuestionIsAnswered() throws BadMessageException {
    String cell = send("print before\nask how fast?");
    client.receive(Channel.STDIN);
    Message shown = client.receive(Channel.IOPUB);
    while (!shown.type().equals("stream")) {
      shown = client.receive(Channel.IOPUB);
    }
    assertEquals("before", shown.content().get("text").getAsString());
    client.send(Channel.STDIN, "input_reply", "{\"value\": \"7000 rpm\"}");
    Message answer = client.receive(Channel.IOPUB);
    assertEquals(cell, answer.parentId());
    assertEquals("<7000 rpm>", answer.content().get("text").getAsString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "input_reply | {}",
        "input_reply | {\"value\": 5}",
        "input_reply | []",
        "something   | {\"value\": \"wrong\"}",
      })
  void whatIsNoAnswerIsDropped(String type, String content) throws BadMessageException {
    String cell = send("ask how fast?");
    client.receive(Channel.STDIN);
    if (content.equals("[]")) {
      client.sendFrames(Channel.STDIN, java.util.List.of(new byte[] {1, 2, 3}));
    } else {
      client.send(Channel.STDIN, type, content);
    }
    client.send(Channel.STDIN, "input_reply", "{\"value\": \"right\"}");
    assertEquals(
        "[input 1, stdout <right>]",
        new Client.Exchange(client.receive(Channel.SHELL), client.published(cell))
            .outputs()
            .toString());
  }

  @Test
  void anAnswerThatComesTooLateIsNotTakenForTheNext() throws BadMessageException {
    client.send(Channel.STDIN, "input_reply", "{\"value\": \"late\"}");
    client.exchange(Channel.CONTROL, "kernel_info_request", "{}");
    String cell = send("ask how fast?");
    client.receive(Channel.STDIN);
    client.send(Channel.STDIN, "input_reply", "{\"value\": \"in time\"}");
    assertEquals(
        "[input 1, stdout <in time>]",
        new Client.Exchange(client.receive(Channel.SHELL), client.published(cell))
            .outputs()
            .toString());
  }

  @Test
  void whereAClientCannotBeAskedTheCellIsTold() throws BadMessageException {
    var exchange = client.execute("ask how fast?", "{\"allow_stdin\": false}");
    assertEquals(
        "this front end cannot ask the user",
        exchange.reply().content().get("evalue").getAsString());
  }

  @Test
  void anInterruptEndsTheQuestion() throws BadMessageException {
    for (int i = 0; i < 20; i++) {
      send("ask how fast?");
      client.receive(Channel.STDIN);
      client.exchange(Channel.CONTROL, "interrupt_request", "{}");
      assertEquals(
          "the question was interrupted",
          client.receive(Channel.SHELL).content().get("evalue").getAsString());
    }
    assertEquals("ok", client.execute("print a").status());
  }
}
