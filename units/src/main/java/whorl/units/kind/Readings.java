package whorl.units.kind;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import whorl.units.Dimension;

/**
 * All ways to read a quantity that its formula leaves open: {@code F*r} is a torque or an energy.
 * Which it is shows when it is declared or meets another quantity.
 *
 * <p>A quantity without readings is <em>untagged</em>: only its dimension is known, no rule having
 * fitted. It goes with any kind of that dimension. This is where the rules stay silent.
 *
 * @param dimension of the quantity
 * @param readings in the order of the table of kinds, so that what is said of them does not depend
 *     on how they were found; empty if untagged
 */
public record Readings(Dimension dimension, Set<Reading> readings) {
  private static final Comparator<Reading> ORDER =
      Comparator.<Reading>comparingInt(reading -> reading.kind().index())
          .thenComparing(Reading::tainted)
          .thenComparingInt(Reading::turn);

  private static final String NUMBER_OF_TURNS = "number of turns";

  private static final Kind ANGLE = Kind.named("angle");

  /** A pure number. */
  public static final Readings NUMBER = of(Kind.named("number"));

  /** The number π as written in a formula, which tells that half a turn is meant. */
  public static final Readings PI = number(1);

  /** Puts the readings in order. */
  public Readings {
    List<Reading> sorted = new ArrayList<>(readings);
    sorted.sort(ORDER);
    readings = Collections.unmodifiableSet(new LinkedHashSet<>(sorted));
  }

  /** A quantity stated to be of a kind. */
  public static Readings of(Kind kind) {
    return new Readings(kind.dimension(), Set.of(Reading.of(kind)));
  }

  /**
   * A quantity that may be any of some kinds, all of one dimension.
   *
   * @throws IllegalArgumentException if there is none or they differ in dimension
   */
  public static Readings of(Collection<Kind> kinds) {
    Set<Dimension> dimensions = kinds.stream().map(Kind::dimension).collect(Collectors.toSet());
    if (dimensions.size() != 1) {
      throw new IllegalArgumentException("kinds must be of one dimension, but are " + kinds);
    }
    return new Readings(
        dimensions.iterator().next(), kinds.stream().map(Reading::of).collect(Collectors.toSet()));
  }

  /** A quantity of which only the dimension is known. */
  public static Readings untagged(Dimension dimension) {
    return new Readings(dimension, Set.of());
  }

  /** A number with a net power of π. */
  static Readings number(int turn) {
    return new Readings(
        Dimension.ONE, Set.of(new Reading(KindTable.STANDARD.number(), turn, false)));
  }

  /** Whether only the dimension is known. */
  public boolean isUntagged() {
    return readings.isEmpty();
  }

  /** Whether there are readings and all of them are as asked. */
  boolean all(Predicate<Reading> asked) {
    return !readings.isEmpty() && readings.stream().allMatch(asked);
  }

  /** These readings but those that are not as asked. */
  Readings where(Predicate<Reading> asked) {
    return new Readings(dimension, readings.stream().filter(asked).collect(Collectors.toSet()));
  }

  /**
   * The kinds for which the quantity may stand as it is, with every turn paid; in the order of the
   * table. Empty if untagged, and also where no reading comes out even.
   */
  public List<Kind> kinds() {
    return Settling.kinds(this);
  }

  /** Whether a quantity so read may stand for one of a kind. */
  public boolean canBe(Kind kind) {
    return dimension.equals(kind.dimension())
        && (isUntagged() || kinds().stream().anyMatch(kind::goesWith));
  }

  /**
   * What the quantity may be, in words, as {@code torque or energy}. Internal kinds have no words:
   * where only those are left, or nothing is known, its unit in SI base units, as {@code kg·m²/s}.
   */
  public String words() {
    List<Kind> named = namedKinds();
    if (isNumberOfTurns()) {
      return NUMBER_OF_TURNS;
    }
    return named.isEmpty() ? unit() : joined(named.stream().map(Kind::words).toList());
  }

  /** The same as the object of a sentence: {@code a torque or an energy}. */
  public String withArticle() {
    List<Kind> named = namedKinds();
    if (isNumberOfTurns()) {
      return "a " + NUMBER_OF_TURNS;
    }
    return named.isEmpty()
        ? "a quantity in " + unit()
        : joined(named.stream().map(Kind::withArticle).toList());
  }

  /** The coherent SI unit of the quantity; in base units with radians where rotation took part. */
  public String unit() {
    return CoherentUnit.text(this);
  }

  /**
   * The kinds that have words. A special case of a kind that is itself there says nothing more, and
   * some kinds are named only where no other is left.
   */
  List<Kind> namedKinds() {
    List<Kind> kinds = kinds();
    List<Kind> named =
        kinds.stream()
            .filter(kind -> !kind.isInternal())
            .filter(kind -> kind.parent().filter(kinds::contains).isEmpty())
            .toList();
    List<Kind> usual = named.stream().filter(kind -> !kind.has(Kind.Mark.ASIDE)).toList();
    return usual.isEmpty() ? named : usual;
  }

  /** Whether this is an angle that is one turn short, as a frequency times a time. */
  private boolean isNumberOfTurns() {
    return all(reading -> reading.kind() == ANGLE && reading.turn() == -1);
  }

  private static String joined(List<String> words) {
    int last = words.size() - 1;
    return last == 0
        ? words.get(0)
        : String.join(", ", words.subList(0, last)) + " or " + words.get(last);
  }
}
