package whorl.jupyter;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;

/** Requests of one channel that wait to be served: any thread adds them, one takes them. */
final class Inbox {
  /** A stream of requests that does not end is not watched for longer, in nanoseconds. */
  private static final long LONGEST_WATCH = TimeUnit.SECONDS.toNanos(10);

  /**
   * A request as it arrived.
   *
   * @param frames its parts; none after the last request
   * @param aborted whether it is not to run, for a cell failed while it waited
   */
  record Arrival(List<byte[]> frames, boolean aborted) {
    private boolean isLast() {
      return frames.isEmpty();
    }

    private Arrival abortedIfFrom(byte[] client) {
      boolean same = !isLast() && Arrays.equals(frames.get(0), client);
      return new Arrival(frames, aborted || same);
    }
  }

  private final BlockingQueue<Arrival> waiting = new LinkedBlockingQueue<>();

  /** Those that {@link #abort} has seen, in order, before all others. */
  private final Queue<Arrival> seen = new ArrayDeque<>();

  void add(List<byte[]> frames) {
    waiting.add(new Arrival(frames, false));
  }

  /** Ends the waiting; what waits now is not taken any more. */
  void end() {
    waiting.clear();
    add(List.of());
  }

  /** Waits for the next request. An interrupt is meant for a cell, and does not end the waiting. */
  Arrival take() {
    Arrival first = seen.poll();
    while (first == null) {
      try {
        first = waiting.take();
      } catch (InterruptedException e) {
        // It came too late for the cell.
      }
    }
    return first;
  }

  /**
   * Aborts what waits from a client, and what comes from it until a moment passes in which nothing
   * comes.
   *
   * @param client first part of its requests
   * @param moment in milliseconds; 0 if nothing more is expected
   */
  void abort(byte[] client, long moment) {
    List<Arrival> before = List.copyOf(seen);
    seen.clear();
    before.forEach(arrival -> seen.add(arrival.abortedIfFrom(client)));
    long end = System.nanoTime() + LONGEST_WATCH;
    try {
      Arrival next = waiting.poll(moment, TimeUnit.MILLISECONDS);
      while (next != null) {
        seen.add(next.abortedIfFrom(client));
        boolean last = next.isLast() || System.nanoTime() > end;
        next = last ? null : waiting.poll(moment, TimeUnit.MILLISECONDS);
      }
    } catch (InterruptedException e) {
      // Somebody wants an end to this.
    }
  }
}
