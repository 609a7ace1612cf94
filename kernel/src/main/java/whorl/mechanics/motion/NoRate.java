package whorl.mechanics.motion;

import org.jspecify.annotations.Nullable;

/** Says from within {@link Rates} or a {@link Condition} that it has no value for a state. */
public final class NoRate extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final int index;

  /**
   * There is no value.
   *
   * @param index which state's rate it is, or −1 for something else
   * @param cause what stands in the way, if known
   */
  public NoRate(int index, @Nullable RuntimeException cause) {
    super("no value", cause, false, false);
    this.index = index;
  }

  /** Which state's rate it is, or −1 for something else. */
  public int index() {
    return index;
  }
}
