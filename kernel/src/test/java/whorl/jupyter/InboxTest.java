package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.jupyter.Inbox.Arrival;

class InboxTest {
  private final Inbox inbox = new Inbox();

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  private void add(String client, String what) {
    inbox.add(List.of(bytes(client), bytes(what)));
  }

  private List<String> take(int number) {
    var taken = new ArrayList<String>();
    for (int i = 0; i < number; i++) {
      Arrival arrival = inbox.take();
      String what = new String(arrival.frames().get(1), StandardCharsets.UTF_8);
      taken.add(what + (arrival.aborted() ? " aborted" : ""));
    }
    return taken;
  }

  @Test
  void requestsOfOneClientAreAbortedAndThoseOfOthersKeepTheirPlace() {
    add("a", "1");
    add("b", "2");
    add("a", "3");
    inbox.abort(bytes("a"), 0);
    add("a", "4");
    assertEquals(List.of("1 aborted", "2"), take(2));
    add("b", "5");
    inbox.abort(bytes("b"), 0);
    add("b", "6");
    assertEquals(List.of("3 aborted", "4", "5 aborted", "6"), take(4));
  }

  @Test
  void whatComesBeforeAMomentHasPassedIsAbortedToo() throws InterruptedException {
    var aborting = new Thread(() -> inbox.abort(bytes("a"), Long.MAX_VALUE));
    aborting.start();
    add("a", "1");
    while (aborting.getState() != Thread.State.TIMED_WAITING) {
      Thread.onSpinWait();
    }
    add("b", "2");
    add("a", "3");
    inbox.add(List.of());
    aborting.join();
    assertEquals(List.of("1 aborted", "2", "3 aborted"), take(3));
  }

  @Test
  void theEndOvertakesWhatWaits() {
    add("a", "1");
    inbox.end();
    assertTrue(inbox.take().frames().isEmpty());
  }

  @Test
  void theEndEndsTheWaitForAMoment() throws InterruptedException {
    var aborting = new Thread(() -> inbox.abort(bytes("a"), Long.MAX_VALUE));
    aborting.start();
    inbox.end();
    aborting.join();
    assertTrue(inbox.take().frames().isEmpty());
  }
}
