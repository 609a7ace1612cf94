package whorl.java;

import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.jspecify.annotations.Nullable;

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
  private volatile @Nullable JavaSession session;
  private volatile boolean asked;

  // Known to the thread of the Java side only.
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
   * Runs a cell, and waits for it. An interrupt of the thread that waits ends the cell.
   *
   * @param label how messages call the cell, as {@code cell [2]}
   * @param code its text, with or without a first line {@code %%java}
   */
  public JavaOutcome run(String label, String code, JavaOutput output) {
    asked = false;
    var run = new CellRun(output, sheet);
    return await(() -> run(new JavaText(label, code), run));
  }

  private JavaOutcome run(JavaText text, CellRun run) {
    JavaSession current = session();
    CellThread thread = current.thread();
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
      return interrupted(stop, current);
    } finally {
      run.end();
      thread.end();
    }
  }

  private JavaOutcome interrupted(Stop stop, JavaSession current) {
    return switch (stop.ending()) {
      case ENDED -> new JavaOutcome.Interrupted(false, "");
      case UNREACHED -> {
        current.leaveThread();
        yield new JavaOutcome.Interrupted(false, LEFT_BEHIND);
      }
      case IGNORED -> {
        current.close();
        session = null;
        yield new JavaOutcome.Interrupted(true, RESTARTED);
      }
    };
  }

  /** The session; called on the thread of the Java side only. */
  private JavaSession session() {
    JavaSession current = session;
    if (current == null) {
      if (!atHome) {
        SystemStreams.open();
        atHome = true;
      }
      current = new JavaSession();
      session = current;
    }
    return current;
  }

  /** Ends the cell or the function that runs, if one does; from any thread. */
  public void interrupt() {
    asked = true;
    JavaSession current = session;
    if (current != null) {
      current.thread().interrupt();
    }
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
          JavaSession current = session;
          if (current != null) {
            current.close();
            session = null;
          }
          if (atHome) {
            SystemStreams.close();
            atHome = false;
          }
          return Optional.empty();
        });
    control.shutdown();
  }
}
