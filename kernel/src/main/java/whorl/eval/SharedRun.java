package whorl.eval;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Supplier;

/**
 * Rows worked out by several threads. Each takes the next few blocks when it is done with its last,
 * so that a processor that is busy elsewhere holds up nobody.
 */
final class SharedRun {
  /** Rows taken at a time. */
  private static final int SHARE = 32 * BlockRun.ROWS;

  /** Steps times rows from which on a second thread is worth its start. */
  private static final long WORTHWHILE = 2_000_000;

  private record Failure(int row, int formula, NumericFailure failure) {}

  private final Supplier<BlockRun> start;
  private final int from;
  private final int to;
  private final AtomicInteger next = new AtomicInteger();
  private final List<List<Failure>> failures = new ArrayList<>();

  /** Prepares rows; each thread gets a run of its own. */
  SharedRun(Supplier<BlockRun> start, int from, int to) {
    this.start = start;
    this.from = from;
    this.to = to;
    for (long row = from; row < to; row += SHARE) {
      failures.add(new ArrayList<>());
    }
  }

  /** Whether so many steps for so many rows are worth a second thread. */
  static boolean isWorthwhile(int steps, int rows) {
    return (long) steps * rows >= WORTHWHILE;
  }

  /** Works out all rows and tells of those without value, in their order. */
  void run(int threads, FailedRows sink) throws InterruptedException {
    Callable<Integer> work = this::takeShares;
    ExecutorService pool = Executors.newFixedThreadPool(threads, SharedRun::thread);
    try {
      for (Future<Integer> worker : pool.invokeAll(Collections.nCopies(threads, work))) {
        worker.get();
      }
    } catch (ExecutionException e) {
      throw unchecked(e);
    } finally {
      // A thread that still runs sees its interrupt before its next block.
      pool.shutdownNow();
      pool.awaitTermination(1, TimeUnit.SECONDS);
    }
    for (List<Failure> share : failures) {
      share.forEach(each -> sink.failed(each.row(), each.formula(), each.failure()));
    }
  }

  private static Thread thread(Runnable work) {
    Thread thread = new Thread(work, "whorl rows");
    thread.setDaemon(true);
    return thread;
  }

  private int takeShares() throws InterruptedException {
    BlockRun run = start.get();
    int taken = 0;
    for (int share = next.getAndIncrement();
        share < failures.size();
        share = next.getAndIncrement()) {
      int first = from + share * SHARE;
      List<Failure> failed = failures.get(share);
      run.rows(
          first,
          (int) Math.min((long) first + SHARE, to),
          (row, formula, failure) -> failed.add(new Failure(row, formula, failure)));
      taken++;
    }
    return taken;
  }

  private static RuntimeException unchecked(ExecutionException failed) {
    if (failed.getCause() instanceof Error error) {
      throw error;
    }
    return failed.getCause() instanceof RuntimeException cause
        ? cause
        : new IllegalStateException(failed);
  }
}
