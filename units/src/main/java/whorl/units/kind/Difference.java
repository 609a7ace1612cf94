package whorl.units.kind;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import whorl.units.Dimension;

/**
 * The quantity by which one kind differs from another, where a rule knows one: an angular momentum
 * over a torque is a time. Only such kinds are named as would come to an engineer's mind: those
 * marked {@link Kind.Mark#PLAIN}.
 *
 * @param found what is there
 * @param by the kind that makes one of the other
 * @param wanted what it becomes
 * @param divided whether it becomes that over the kind; else times it
 */
record Difference(Kind found, Kind by, Kind wanted, boolean divided) {

  /** The first in the order of the table of kinds: a time comes before an angular velocity. */
  static Optional<Difference> between(List<Kind> found, List<Kind> wanted) {
    return Kind.all().stream()
        .filter(by -> by.has(Kind.Mark.PLAIN))
        .flatMap(by -> all(found, by, wanted))
        .filter(difference -> difference.fits())
        .findFirst();
  }

  /** The ways to get from one kind to the other that agree in dimension. */
  private static Stream<Difference> all(List<Kind> found, Kind by, List<Kind> wanted) {
    return found.stream()
        .filter(from -> !from.isInternal() && from != by)
        .flatMap(
            from ->
                wanted.stream()
                    .filter(to -> !to.isInternal())
                    .flatMap(
                        to ->
                            Stream.of(
                                new Difference(from, by, to, false),
                                new Difference(from, by, to, true))))
        .filter(difference -> difference.dimension().equals(difference.wanted.dimension()));
  }

  private Dimension dimension() {
    return divided
        ? found.dimension().dividedBy(by.dimension())
        : found.dimension().times(by.dimension());
  }

  private boolean fits() {
    return made().kinds().stream().anyMatch(wanted::goesWith);
  }

  private Readings made() {
    Set<Reading> made = new HashSet<>();
    Set<Reading> first = Set.of(Reading.of(found));
    Set<Reading> second = Set.of(Reading.of(by));
    if (divided) {
      Combination.addQuotients(first, second, made);
    } else {
      Combination.addProducts(first, second, made);
    }
    return new Readings(dimension(), made);
  }
}
