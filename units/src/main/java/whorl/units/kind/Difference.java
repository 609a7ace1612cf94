package whorl.units.kind;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import whorl.units.Dimension;

/**
 * The quantity by which one kind differs from another, where a rule knows one: an angular momentum
 * over a torque is a time.
 *
 * @param found what is there
 * @param by the kind that makes one of the other
 * @param wanted what it becomes
 * @param divided whether it becomes that over the kind; else times it
 */
record Difference(Kind found, Kind by, Kind wanted, boolean divided) {

  /** The first in the order of the table of kinds, quotients before products. */
  static Optional<Difference> between(List<Kind> found, List<Kind> wanted) {
    for (boolean divided : new boolean[] {true, false}) {
      for (Kind from : found) {
        for (Kind to : wanted) {
          boolean named = !from.isInternal() && !to.isInternal();
          Optional<Difference> difference = named ? between(from, to, divided) : Optional.empty();
          if (difference.isPresent()) {
            return difference;
          }
        }
      }
    }
    return Optional.empty();
  }

  private static Optional<Difference> between(Kind from, Kind to, boolean divided) {
    Dimension missing =
        divided
            ? from.dimension().dividedBy(to.dimension())
            : to.dimension().dividedBy(from.dimension());
    return Kind.all().stream()
        .filter(by -> by.dimension().equals(missing))
        .filter(by -> !by.isInternal() && !by.has(Kind.Mark.ALONE) && by.parent().isEmpty())
        .filter(by -> combined(from, by, divided).kinds().contains(to))
        .map(by -> new Difference(from, by, to, divided))
        .findFirst();
  }

  private static Readings combined(Kind from, Kind by, boolean divided) {
    Set<Reading> found = new HashSet<>();
    Set<Reading> first = Set.of(Reading.of(from));
    Set<Reading> second = Set.of(Reading.of(by));
    if (divided) {
      Combination.addQuotients(first, second, found);
    } else {
      Combination.addProducts(first, second, found);
    }
    Dimension dimension =
        divided
            ? from.dimension().dividedBy(by.dimension())
            : from.dimension().times(by.dimension());
    return new Readings(dimension, found);
  }
}
