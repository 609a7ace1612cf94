package whorl.units.kind;

import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;

/**
 * Quantities multiplied, divided or raised to a power: each reading of one with each of another.
 */
final class Combination {
  private static final RuleBook RULES = RuleBook.STANDARD;

  private Combination() {}

  /** Adds the readings of a product. */
  static void addProducts(Set<Reading> first, Set<Reading> second, Set<Reading> found) {
    for (Reading a : first) {
      for (Reading b : second) {
        addProduct(a, b, found);
      }
    }
  }

  /** Adds the readings of a quotient. */
  static void addQuotients(Set<Reading> first, Set<Reading> second, Set<Reading> found) {
    for (Reading a : first) {
      for (Reading b : second) {
        for (Result result : RULES.quotient(a.kind(), b.kind())) {
          found.add(result.reading(a, b, -1));
        }
      }
    }
  }

  private static void addProduct(Reading first, Reading second, Set<Reading> found) {
    for (Result result : RULES.product(first.kind(), second.kind())) {
      found.add(result.reading(first, second, 1));
    }
    addBareCycles(first, second, found);
    addBareCycles(second, first, found);
  }

  /** A rule may name a kind that is kept as turns of another: it holds for just that reading. */
  private static void addBareCycles(Reading cycles, Reading other, Set<Reading> found) {
    if (cycles.turn() == 0) {
      return;
    }
    for (Map.Entry<Kind, Reading> kept : RULES.standsFor().entrySet()) {
      Reading reading = kept.getValue();
      if (cycles.kind() == reading.kind() && cycles.turn() == reading.turn()) {
        for (Result result : RULES.productOfJust(kept.getKey(), other.kind())) {
          found.add(result.reading(cycles, other, 1));
        }
      }
    }
  }

  /**
   * The readings of a power. A quantity is of one kind, so that each reading meets itself only.
   *
   * @param exponent positive
   */
  static Set<Reading> power(Set<Reading> base, int exponent) {
    Set<Reading> found = new LinkedHashSet<>();
    for (Reading reading : base) {
      found.addAll(power(reading, exponent));
    }
    return found;
  }

  private static Set<Reading> power(Reading base, int exponent) {
    Set<Reading> power = Set.of(base);
    for (int i = 1; i < exponent && !power.isEmpty(); i++) {
      Set<Reading> next = new HashSet<>();
      if (i == 1 && !RULES.square(base.kind()).isEmpty()) {
        RULES.square(base.kind()).forEach(result -> next.add(result.reading(base, base, 1)));
      } else {
        addProducts(power, Set.of(base), next);
      }
      power = next;
    }
    return power;
  }

  /**
   * The readings of a root. A number of turns that the degree does not divide is rounded down: what
   * is left can then only be too few.
   */
  static Set<Reading> root(Set<Reading> radicand, int degree) {
    Set<Reading> found = new HashSet<>();
    for (Reading reading : radicand) {
      int turn = Math.floorDiv(reading.turn(), degree);
      if (reading.kind().isNumber()) {
        boolean even = turn * degree == reading.turn();
        found.add(new Reading(RULES.number(), even ? turn : 0, reading.tainted()));
      }
      for (Kind root : RULES.roots(reading.kind(), degree)) {
        found.add(new Reading(root, turn, reading.tainted()));
      }
    }
    return found;
  }
}
