package whorl.java;

import com.google.gson.JsonObject;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.locks.ReentrantLock;
import org.jspecify.annotations.Nullable;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.check.Routine;
import whorl.check.RoutineFailure;

/**
 * The Java cells of a page. JShell starts with the first that runs. One thread at a time uses it,
 * save {@link #interrupt}.
 */
public final class JavaSide implements AutoCloseable {
  private static final String LEFT_BEHIND =
      "The cell was interrupted within code of a library, which does not look for interrupts. It was"
          + " left behind: its thread ends when it comes back from there. All declarations are kept.";
  private static final String RESTARTED =
      "The cell did not end when it was interrupted, for it caught the error that was to end it."
          + " Java was started anew: the declarations of all cells in Java are gone, and the sheet is"
          + " kept. The old code runs on in its thread until it ends; restarting the kernel ends it.";

  private final SheetReading sheet;
  private final ExecutorService control =
      Executors.newSingleThreadExecutor(
          task -> {
            var thread = new Thread(task, "java side");
            thread.setDaemon(true);
            return thread;
          });

  /** A cell or a function at a time. */
  private final ReentrantLock turn = new ReentrantLock();

  private volatile CellThread thread = new CellThread();
  private volatile boolean asked;

  // Known to the thread of the Java side only.
  private @Nullable JavaSession session;
  private boolean atHome;

  /**
   * Java cells beside a sheet.
   *
   * @param sheet what they read; asked while a cell runs, from its thread
   */
  public JavaSide(SheetReading sheet) {
    this.sheet = sheet;
  }

  /**
   * Runs a cell, and waits for it. An interrupt of the thread that waits is one of the cell.
   *
   * @param label how messages call the cell, as {@code cell [2]}
   * @param code its text, with or without a first line {@code %%java}
   */
  public JavaOutcome run(String label, String code, JavaOutput output) {
    asked = false;
    JavaOutcome outcome = await(() -> run(new JavaText(label, code), output));
    if (outcome instanceof JavaOutcome.Interrupted) {
      Thread.interrupted();
    }
    return outcome;
  }

  private JavaOutcome run(JavaText text, JavaOutput output) {
    JavaSession current = session();
    var run = new CellRun(output, sheet, function -> routine(function, current.frames()));
    turn.lock();
    thread.begin(run);
    if (asked) {
      thread.interrupt();
    }
    try {
      current.run(text, run);
      return new JavaOutcome.Done(run.functions(), run.reads());
    } catch (Failure failure) {
      return new JavaOutcome.Failed(failure.name(), text.source(), failure.errors(), run.reads());
    } catch (Stop stop) {
      return interrupted(stop.ending());
    } finally {
      run.end();
      thread.end();
      turn.unlock();
    }
  }

  private JavaOutcome interrupted(Stop.Ending ending) {
    if (ending == Stop.Ending.ENDED) {
      return new JavaOutcome.Interrupted(false, "");
    }
    thread = new CellThread();
    if (ending == Stop.Ending.UNREACHED) {
      return new JavaOutcome.Interrupted(false, LEFT_BEHIND);
    }
    closeSession();
    return new JavaOutcome.Interrupted(true, RESTARTED);
  }

  private JavaSession session() {
    JavaSession current = session;
    if (current == null) {
      if (!atHome) {
        SystemStreams.open();
        atHome = true;
      }
      current = new JavaSession(() -> thread);
      session = current;
    }
    return current;
  }

  private void closeSession() {
    JavaSession current = session;
    if (current != null) {
      current.close();
      session = null;
    }
  }

  private Routine routine(SheetFunction function, Frames frames) {
    return arguments -> {
      try {
        turn.lockInterruptibly();
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
        throw RoutineFailure.ofInterrupt();
      }
      thread.begin();
      try {
        return thread.call(() -> function.apply(arguments));
      } catch (Stop stop) {
        if (stop.ending() != Stop.Ending.ENDED) {
          thread = new CellThread();
        }
        throw RoutineFailure.ofInterrupt();
      } catch (ExecutionException e) {
        throw new RoutineFailure(frames.summary(Objects.requireNonNullElse(e.getCause(), e)));
      } catch (Exception e) {
        throw new RoutineFailure(frames.summary(e));
      } finally {
        thread.end();
        turn.unlock();
      }
    };
  }

  /**
   * What could be typed at a place of a cell.
   *
   * @param cursor an index into the text
   */
  public Completion complete(String code, int cursor) {
    return await(() -> session().services().complete(code, within(code, cursor)));
  }

  /** What is known of the word at a place of a cell: texts by media type. */
  public Optional<JsonObject> inspect(String code, int cursor) {
    return await(() -> session().services().inspect(code, within(code, cursor)));
  }

  private static int within(String code, int cursor) {
    return Math.max(0, Math.min(cursor, code.length()));
  }

  /** Whether a console may run a text as it is. */
  public Completeness completeness(String code) {
    return await(() -> session().services().completeness(code));
  }

  /** Ends the cell or the function that runs, if one does; from any thread. */
  public void interrupt() {
    asked = true;
    thread.interrupt();
  }

  private <T> T await(Callable<T> task) {
    Future<T> future = control.submit(task);
    boolean interrupted = false;
    try {
      while (true) {
        try {
          return future.get();
        } catch (InterruptedException e) {
          interrupted = true;
          interrupt();
        }
      }
    } catch (ExecutionException e) {
      throw new IllegalStateException(e.getCause());
    } finally {
      if (interrupted) {
        Thread.currentThread().interrupt();
      }
    }
  }

  /** Ends what was started. */
  @Override
  public void close() {
    interrupt();
    await(
        () -> {
          closeSession();
          if (atHome) {
            SystemStreams.close();
            atHome = false;
          }
          return Optional.empty();
        });
    control.shutdown();
    thread.close();
  }
}
