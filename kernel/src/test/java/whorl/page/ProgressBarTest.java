package whorl.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

class ProgressBarTest {
  private final List<String> seen = new ArrayList<>();
  private final Front front =
      new Front() {
        @Override
        public void print(Stream stream, String text) {
          seen.add("print");
        }

        @Override
        public void display(Bundle bundle, @Nullable String id) {
          seen.add("display " + id + " " + bundle.data().get("text/plain").getAsString());
        }

        @Override
        public void update(Bundle bundle, String id) {
          seen.add("update " + id + " " + bundle.data().get("text/html").getAsString());
        }

        @Override
        public void result(Bundle bundle) {
          seen.add("result");
        }

        @Override
        public void clear(boolean wait) {
          seen.add("clear");
        }

        @Override
        public String ask(String prompt, boolean secret) {
          return "";
        }
      };

  @Test
  void longWorkShowsOneBarThatIsGoneAtTheEnd() {
    var bar = new ProgressBar(front, "c/progress");
    bar.at(120, 400);
    bar.at(240, 400);
    bar.end();
    assertEquals("display c/progress Recalculating: 120 of 400 statements.", seen.get(0));
    assertTrue(seen.get(1).contains("<progress value=\"240\" max=\"400\">"), seen.get(1));
    assertEquals(List.of("clear"), seen.subList(2, seen.size()));
  }

  @Test
  void shortWorkShowsNothing() {
    new ProgressBar(front, "c/progress").end();
    assertEquals(List.of(), seen);
  }
}
