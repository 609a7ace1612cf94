package whorl.units;

import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/**
 * A value that is made when it is first asked for, and kept; safe for several threads.
 *
 * @param <T> type of the value
 */
final class Memo<T> {

  private final Supplier<T> maker;
  private @Nullable T value;

  Memo(Supplier<T> maker) {
    this.maker = maker;
  }

  synchronized T get() {
    if (value == null) {
      value = maker.get();
    }
    return value;
  }
}
