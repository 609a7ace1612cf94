package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class HistoryTest {
  /** Wanted; codes found. Five cells ran: a, b, a*, ca, a. */
  private static final List<List<String>> CASES =
      List.of(
          List.of("'hist_access_type': 'tail', 'n': 2", "4 ca, 5 a"),
          List.of("'hist_access_type': 'tail', 'n': 99", "1 a, 2 b, 3 a*, 4 ca, 5 a"),
          List.of("'hist_access_type': 'tail', 'n': 0", ""),
          List.of("'hist_access_type': 'tail', 'n': -1", ""),
          List.of("", "1 a, 2 b, 3 a*, 4 ca, 5 a"),
          List.of("'hist_access_type': 'range', 'start': 2, 'stop': 4", "2 b, 3 a*"),
          List.of("'hist_access_type': 'range', 'session': 1, 'start': 5", "5 a"),
          List.of(
              "'hist_access_type': 'range', 'session': 0, 'start': -2, 'stop': null", "4 ca, 5 a"),
          List.of("'hist_access_type': 'range', 'session': 0, 'start': 1, 'stop': -3", "1 a, 2 b"),
          List.of("'hist_access_type': 'range', 'session': -1", ""),
          List.of("'hist_access_type': 'range', 'session': 7", ""),
          List.of("'hist_access_type': 'search', 'pattern': 'a*'", "1 a, 3 a*, 5 a"),
          List.of("'hist_access_type': 'search', 'pattern': 'a*', 'unique': true", "3 a*, 5 a"),
          List.of("'hist_access_type': 'search', 'pattern': '*a*', 'n': 2", "4 ca, 5 a"),
          List.of("'hist_access_type': 'search', 'pattern': '?a'", "4 ca"),
          List.of("'hist_access_type': 'search', 'pattern': 'z*'", ""));

  @Test
  void cellsAreFound() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      for (String cell : List.of("a", "b", "a*", "ca", "a")) {
        client.execute(cell);
      }
      for (List<String> wanted : CASES) {
        for (boolean withOutput : List.of(false, true)) {
          String fields = wanted.get(0).replace('\'', '"');
          String request =
              "{" + fields + (fields.isEmpty() ? "" : ",") + "\"output\": " + withOutput + "}";
          var found = new java.util.ArrayList<String>();
          for (var item :
              client
                  .exchange(Channel.SHELL, "history_request", request)
                  .reply()
                  .content()
                  .getAsJsonArray("history")) {
            var entry = item.getAsJsonArray();
            assertEquals(1, entry.get(0).getAsInt());
            var code = withOutput ? entry.get(2).getAsJsonArray().get(0) : entry.get(2);
            found.add(entry.get(1) + " " + code.getAsString());
          }
          assertEquals(wanted.get(1), String.join(", ", found), request);
        }
      }
    }
  }

  @Test
  void theOldestIsForgottenWhenItBecomesTooMuch() throws Exception {
    try (var kernel = new Served();
        var client = kernel.client()) {
      String large = "x".repeat(6 << 20);
      for (String cell : List.of(large, "a", large, large)) {
        client.execute(cell);
      }
      var history =
          client
              .exchange(Channel.SHELL, "history_request", "{}")
              .reply()
              .content()
              .getAsJsonArray("history");
      assertEquals(3, history.size());
      assertEquals(2, history.get(0).getAsJsonArray().get(1).getAsInt());
    }
  }
}
