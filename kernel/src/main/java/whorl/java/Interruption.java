package whorl.java;

import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Tells the code of cells to end. A thread cannot be stopped from outside (that is no part of newer
 * JVMs), so that {@link Polls} puts a look at this flag into every loop and every method of a cell.
 */
public final class Interruption {
  private static final Set<CellThread> STOPPING = ConcurrentHashMap.newKeySet();

  // Read in the innermost loops: a plain flag that the compiler may not take out of the loop.
  private static volatile boolean raised;

  private Interruption() {}

  /** Ends the code that calls it, if it is to end. */
  public static void poll() {
    if (raised) {
      stop();
    }
  }

  private static void stop() {
    Thread current = Thread.currentThread();
    for (CellThread thread : STOPPING) {
      thread.stop(current);
    }
  }

  static synchronized void raise(CellThread thread) {
    STOPPING.add(thread);
    raised = true;
  }

  static synchronized void lower(CellThread thread) {
    STOPPING.remove(thread);
    raised = !STOPPING.isEmpty();
  }
}
