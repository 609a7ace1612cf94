package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * All readings of a product over all ways to group its factors, so that the order in which a
 * formula is written never matters.
 *
 * <p>A set of factors is a bit mask. The readings of each set are worked out once, from every split
 * of it into two smaller ones: 3ⁿ/2 combinations for n factors.
 */
final class ProductSearch {
  /** With more factors than this the search would be felt while typing. */
  static final int MOST_FACTORS = 9;

  /**
   * A factor.
   *
   * @param readings of the factor
   * @param below whether it stands below the fraction bar
   */
  record Part(Set<Reading> readings, boolean below) {}

  private final List<Set<Reading>> readings;
  private final int above;

  private ProductSearch(List<Part> parts) {
    int above = 0;
    readings = new ArrayList<>(1 << parts.size());
    for (int i = 0; i < parts.size(); i++) {
      above |= parts.get(i).below() ? 0 : 1 << i;
    }
    this.above = above;
    readings.add(Set.of());
    for (int group = 1; group < 1 << parts.size(); group++) {
      readings.add(
          Integer.bitCount(group) == 1
              ? parts.get(Integer.numberOfTrailingZeros(group)).readings()
              : readingsOf(group));
    }
  }

  /**
   * The readings of a product.
   *
   * @param parts at least one above the fraction bar, at most {@link #MOST_FACTORS}
   */
  static Set<Reading> readings(List<Part> parts) {
    var search = new ProductSearch(parts);
    return search.readings.get(search.readings.size() - 1);
  }

  private Set<Reading> readingsOf(int group) {
    Set<Reading> found = new HashSet<>();
    for (int part = (group - 1) & group; part > 0; part = (part - 1) & group) {
      int rest = group ^ part;
      if (part > rest) {
        combine(part, rest, found);
      }
    }
    return found;
  }

  /** A set with nothing above the bar stands for the product that it divides by. */
  private void combine(int part, int rest, Set<Reading> found) {
    boolean partDivides = (part & above) == 0;
    boolean restDivides = (rest & above) == 0;
    if (partDivides == restDivides) {
      Combination.addProducts(readings.get(part), readings.get(rest), found);
    } else if (restDivides) {
      Combination.addQuotients(readings.get(part), readings.get(rest), found);
    } else {
      Combination.addQuotients(readings.get(rest), readings.get(part), found);
    }
  }
}
