package whorl.sheet;

import java.util.List;

/**
 * How a condition stands.
 *
 * @param holds whether the whole condition holds
 * @param comparisons the comparisons in it that were worked out, in the order written
 */
public record Verdict(boolean holds, List<Comparison> comparisons) {
  /** Copies the list. */
  public Verdict {
    comparisons = List.copyOf(comparisons);
  }
}
