package whorl.jupyter;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;

/** Requests of one channel that wait to be served: any thread adds them, one takes them. */
final class Inbox {
  /**
   * A request as it arrived.
   *
   * @param frames its parts; none after the last request
   * @param aborted whether it is not to run, for it waited already when a cell before it failed
   */
  record Arrival(List<byte[]> frames, boolean aborted) {}

  private final BlockingQueue<List<byte[]>> waiting = new LinkedBlockingQueue<>();
  private final Queue<List<byte[]>> aborted = new ArrayDeque<>();

  void add(List<byte[]> frames) {
    waiting.add(frames);
  }

  /** Ends the waiting; what waits now is not taken any more. */
  void end() {
    waiting.clear();
    waiting.add(List.of());
  }

  /** Waits for the next request. An interrupt is meant for a cell, and does not end the waiting. */
  Arrival take() {
    List<byte[]> first = aborted.poll();
    if (first != null) {
      return new Arrival(first, true);
    }
    while (true) {
      try {
        return new Arrival(waiting.take(), false);
      } catch (InterruptedException e) {
        // It came too late for the cell.
      }
    }
  }

  /** Marks what waits now. */
  void abort() {
    var now = new ArrayList<List<byte[]>>();
    waiting.drainTo(now);
    aborted.addAll(now);
  }
}
