package whorl.sheet;

import java.util.List;

/**
 * What the argument of a step rests on and does not hold.
 *
 * @param doubts the assumptions, as written, that fail now and on whose names the step depends, and
 *     the laws that were used outside their validity on the way to it; ten at most
 * @param lapses the laws that the step itself uses outside their validity
 */
public record Standing(List<String> doubts, List<Lapse> lapses) {
  /** Nothing speaks against the step. */
  public static final Standing FIRM = new Standing(List.of(), List.of());

  /** Copies the lists. */
  public Standing {
    doubts = List.copyOf(doubts);
    lapses = List.copyOf(lapses);
  }

  /** Whether nothing speaks against the step. */
  public boolean isFirm() {
    return doubts.isEmpty() && lapses.isEmpty();
  }
}
