package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonObject;
import java.io.IOException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CodeQuestionsTest {
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

  private JsonObject ask(String type, String code, String more) throws BadMessageException {
    return client.exchange(Channel.SHELL, type, Client.request(code, more)).reply().content();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        // Text, cursor in code points; text before it, start and end in code points.
        "ab cd  | 4    | ab c   | 3 | 4",
        "𝜔 𝜔x   | 3    | 𝜔 𝜔    | 2 | 3",
        "𝜔𝜔𝜔    | 2    | 𝜔𝜔     | 0 | 2",
        "𝜔 a    | null | 𝜔 a    | 2 | 3",
        "𝜔 a    | 99   | 𝜔 a    | 2 | 3",
        "𝜔 a    | 1e99 | 𝜔 a    | 2 | 3",
      })
  void placesAreCountedInCodePoints(String code, String cursor, String before, int start, int end)
      throws BadMessageException {
    String more = "{\"cursor_pos\": " + cursor + "}";
    assertEquals(
        String.format(
            "{\"matches\":[\"%1$s\",\"b\"],\"cursor_start\":%2$d,\"cursor_end\":%3$d,"
                + "\"metadata\":{\"_jupyter_types_experimental\":["
                + "{\"text\":\"%1$s\",\"type\":\"variable\",\"start\":%2$d,\"end\":%3$d,"
                + "\"signature\":\"1 m\"},"
                + "{\"text\":\"b\",\"type\":\"unit\",\"start\":%2$d,\"end\":%3$d,"
                + "\"signature\":\"\"}]},\"status\":\"ok\"}",
            before, start, end),
        ask("complete_request", code, more).toString());
    assertEquals(
        "{\"found\":true,\"data\":{\"text/plain\":\""
            + before
            + "/1\"},\"metadata\":{},"
            + "\"status\":\"ok\"}",
        ask("inspect_request", code, more.replace("}", ", \"detail_level\": 1}")).toString());
  }

  @ParameterizedTest
  @CsvSource({"0", "-5"})
  void nothingFoundIsAnAnswer(int cursor) throws BadMessageException {
    String more = "{\"cursor_pos\": " + cursor + "}";
    assertEquals(
        "{\"matches\":[],\"cursor_start\":0,\"cursor_end\":0,"
            + "\"metadata\":{\"_jupyter_types_experimental\":[]},\"status\":\"ok\"}",
        ask("complete_request", "abc", more).toString());
    assertEquals(
        "{\"found\":false,\"data\":{},\"metadata\":{},\"status\":\"ok\"}",
        ask("inspect_request", "abc", more).toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "complete   | {\"status\":\"complete\"}",
        "incomplete | {\"status\":\"incomplete\",\"indent\":\"  \"}",
        "invalid    | {\"status\":\"invalid\"}",
        "other      | {\"status\":\"unknown\"}",
      })
  void aConsoleIsToldWhetherToSend(String code, String answer) throws BadMessageException {
    assertEquals(answer, ask("is_complete_request", code, "{}").toString());
  }

  @Test
  void anUnknownCommTargetIsClosedAtOnce() throws BadMessageException {
    String open = "{\"comm_id\": \"c\", \"target_name\": \"nowhere\", \"data\": {}}";
    String id = client.send(Channel.SHELL, "comm_open", open);
    var published = client.published(id);
    assertEquals(3, published.size());
    assertEquals("comm_close", published.get(1).type());
    assertEquals("{\"comm_id\":\"c\",\"data\":{}}", published.get(1).content().toString());
  }

  @ParameterizedTest
  @CsvSource({"comm_msg", "comm_close"})
  void messagesOfUnknownCommsAreTakenWithoutAnAnswer(String type) throws BadMessageException {
    String id = client.send(Channel.SHELL, type, "{\"comm_id\": \"c\", \"data\": {}}");
    assertEquals(2, client.published(id).size());
    assertEquals("", kernel.log());
  }

  @Test
  void noCommsAreOpen() throws BadMessageException {
    var exchange = client.exchange(Channel.SHELL, "comm_info_request", "{\"target_name\": \"x\"}");
    assertEquals("{\"comms\":{},\"status\":\"ok\"}", exchange.reply().content().toString());
  }
}
