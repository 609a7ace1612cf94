package whorl.java;

import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.Callable;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ForkJoinWorkerThread;
import java.util.concurrent.FutureTask;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import org.jspecify.annotations.Nullable;

/**
 * The thread that runs the code of cells. Code that does not end soon after an interrupt is left
 * behind with its thread; the object is of no use then, and another takes its place.
 */
final class CellThread {
  /** How long code may take to notice an interrupt. */
  private static final Duration GRACE = Duration.ofMillis(150);

  /** How long code may take to end that has noticed it. */
  private static final Duration LONGEST_GRACE = Duration.ofSeconds(1);

  /** How often code that is to end is looked after. */
  private static final Duration LOOK = Duration.ofMillis(20);

  /** How long code that was told to end is left in peace to put its things in order. */
  private static final Duration PEACE = Duration.ofMillis(70);

  private static final InheritableThreadLocal<@Nullable CellThread> OWNER =
      new InheritableThreadLocal<>();
  private static volatile @Nullable CellThread latest;

  private final Thread thread = new Thread(this::work, "java cells");
  private final BlockingQueue<FutureTask<?>> tasks = new LinkedBlockingQueue<>();
  private final Map<Thread, Long> told = new ConcurrentHashMap<>();
  private volatile @Nullable CellRun run;
  private volatile boolean left;
  private volatile boolean ignored;

  // Guarded by this object.
  private boolean open;
  private boolean asked;
  private boolean busy;
  private boolean shielded;
  private long askedAt;

  CellThread() {
    thread.setDaemon(true);
  }

  /** The one whose code the current thread runs, which may be another that the code started. */
  static Optional<CellThread> current() {
    // The threads of a pool serve whoever runs, not whoever happened to start them.
    return Optional.ofNullable(
        Thread.currentThread() instanceof ForkJoinWorkerThread ? latest : OWNER.get());
  }

  /** The run that the code belongs to; none once it was left behind. */
  Optional<CellRun> run() {
    return left ? Optional.empty() : Optional.ofNullable(run);
  }

  /** Lets libraries that the code calls find its classes. */
  void use(ClassLoader loader) {
    thread.setContextClassLoader(loader);
  }

  /** Begins a run, which may consist of several calls. */
  synchronized void begin(CellRun begun) {
    run = begun;
    begin();
  }

  /** Begins calls that are no run of a cell. */
  synchronized void begin() {
    latest = this;
    open = true;
    asked = false;
    ignored = false;
  }

  /** Ends the run; what it printed may still come from threads that it started. */
  synchronized void end() {
    open = false;
    if (!left) {
      Interruption.lower(this);
      told.clear();
    }
  }

  /** Whether the run is to end. */
  synchronized boolean isStopping() {
    return asked;
  }

  /** Ends the run, if there is one; from any thread. */
  synchronized void interrupt() {
    if (!open || asked) {
      return;
    }
    asked = true;
    askedAt = System.nanoTime();
    Interruption.raise(this);
    if (busy && !shielded) {
      thread.interrupt();
    }
    notifyAll();
  }

  /** Ends the thread, as far as its code lets it. */
  synchronized void close() {
    left = true;
    Interruption.raise(this);
    thread.interrupt();
  }

  /**
   * Runs a task on the thread and waits for it. An interrupt of the caller is one of the task.
   *
   * @throws Stop if it was interrupted, however it ended
   * @throws Exception as the task throws
   */
  <T extends @Nullable Object> T call(Callable<T> task) throws Exception {
    if (Thread.currentThread() == thread) {
      return shielded(false, task);
    }
    var future = new FutureTask<>(task);
    start(future);
    await();
    try {
      return future.get();
    } catch (ExecutionException e) {
      throw e.getCause() instanceof Exception thrown ? thrown : e;
    }
  }

  /** Runs a part of a task that an interrupt must not break off. */
  <T extends @Nullable Object> T shielded(Callable<T> part) throws Exception {
    return shielded(true, part);
  }

  private <T extends @Nullable Object> T shielded(boolean shield, Callable<T> part)
      throws Exception {
    boolean before = shield(shield);
    try {
      return part.call();
    } finally {
      shield(before);
    }
  }

  private synchronized boolean shield(boolean shield) {
    boolean before = shielded;
    shielded = shield;
    if (shield) {
      Thread.interrupted();
    } else if (asked) {
      thread.interrupt();
    }
    return before;
  }

  private synchronized void start(FutureTask<?> task) throws Stop {
    if (asked) {
      throw new Stop(Stop.Ending.ENDED);
    }
    if (thread.getState() == Thread.State.NEW) {
      thread.start();
    }
    busy = true;
    tasks.add(task);
  }

  private synchronized void await() throws Stop {
    boolean interrupted = false;
    try {
      while (busy) {
        try {
          if (asked) {
            awaitEnd();
          } else {
            wait();
          }
        } catch (InterruptedException e) {
          interrupted = true;
          interrupt();
        }
      }
    } finally {
      if (interrupted) {
        Thread.currentThread().interrupt();
      }
    }
    if (asked) {
      throw new Stop(Stop.Ending.ENDED);
    }
  }

  private synchronized void awaitEnd() throws Stop, InterruptedException {
    boolean noticed = !told.isEmpty() || !thread.isInterrupted();
    Duration grace = noticed && !ignored ? LONGEST_GRACE : GRACE;
    long remaining = askedAt + grace.toNanos() - System.nanoTime();
    if (remaining > 0) {
      // Whether it has noticed may change meanwhile.
      TimeUnit.NANOSECONDS.timedWait(this, Math.min(remaining, LOOK.toNanos()));
      return;
    }
    left = true;
    if (told.isEmpty()) {
      throw new Stop(Stop.Ending.UNREACHED);
    }
    // To tell it again and again would only cost the next cells time.
    Interruption.lower(this);
    throw new Stop(Stop.Ending.IGNORED);
  }

  private void work() {
    OWNER.set(this);
    while (!left) {
      try {
        tasks.take().run();
      } catch (InterruptedException e) {
        // Interrupted without a task, it was closed.
      }
      rest();
    }
    Interruption.lower(this);
  }

  private synchronized void rest() {
    Thread.interrupted();
    busy = false;
    notifyAll();
  }

  /** Ends the code of the current thread, if it is to end and runs for this one. */
  void stop(Thread current) {
    boolean mine = current == thread || (!left && current().filter(this::equals).isPresent());
    if (!mine) {
      return;
    }
    long now = System.nanoTime();
    @Nullable Long before = told.get(current);
    if (before == null || now - before > PEACE.toNanos()) {
      ignored |= before != null && current == thread;
      told.put(current, now);
      throw new CellStopped();
    }
  }
}
