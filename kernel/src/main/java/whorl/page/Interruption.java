package whorl.page;

import org.jspecify.annotations.Nullable;

/** Lets another thread end what a page is doing, and nothing that it does later. */
final class Interruption {
  private @Nullable Thread busy;

  /** This thread does something that may be ended. */
  synchronized void begin() {
    busy = Thread.currentThread();
  }

  /** It is over; an interrupt that came too late is forgotten. */
  synchronized void over() {
    busy = null;
    Thread.interrupted();
  }

  /** Ends what goes on, if anything does. */
  synchronized void interrupt() {
    if (busy != null) {
      busy.interrupt();
    }
  }
}
