package whorl.units.kind;

import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Rational;

/** Two quantities that must be alike: in a sum, a difference or a comparison. */
final class Meeting {
  private static final Kind TEMPERATURE = Kind.named("temperature");
  private static final Kind DIFFERENCE = Kind.named("temperature_difference");

  private final Joining joining;
  private final Operand left;
  private final Operand right;

  private Meeting(Joining joining, Operand left, Operand right) {
    this.joining = joining;
    this.left = left;
    this.right = right;
  }

  static Judgement of(Joining joining, Operand left, Operand right) {
    return new Meeting(joining, left, right).judgement();
  }

  private Judgement judgement() {
    // Zero is zero of any kind, and a sum with it is the other term.
    if (left.isZero()) {
      return Judgement.accepted(right);
    }
    if (right.isZero()) {
      return Judgement.accepted(left);
    }
    Readings first = left.readings();
    Readings second = right.readings();
    if (!first.dimension().equals(second.dimension())) {
      return unlike();
    }
    if (isTemperature(first) || isTemperature(second)) {
      return temperatures(first, second);
    }
    if (first.isUntagged() || second.isUntagged()) {
      return Judgement.accepted(first.isUntagged() ? second : first);
    }
    Readings both = first.where(second.readings()::contains);
    if (both.isUntagged()) {
      both = settled(first, second);
    }
    return both.isUntagged() ? unlike() : Judgement.accepted(new Operand(both, value()));
  }

  private Judgement unlike() {
    return Judgement.refused(new Refusal.Unlike(joining, left.readings(), right.readings()));
  }

  private static boolean isTemperature(Readings readings) {
    return readings.all(reading -> reading.kind() == TEMPERATURE);
  }

  /** Readings of a scale have differences and an order, but no sum. */
  private Judgement temperatures(Readings first, Readings second) {
    boolean firstIsReading = isTemperature(first);
    boolean secondIsReading = isTemperature(second);
    if (firstIsReading && secondIsReading && joining != Joining.ADD) {
      return Judgement.accepted(joining == Joining.SUBTRACT ? Readings.of(DIFFERENCE) : first);
    }
    if (firstIsReading && !secondIsReading && joining != Joining.COMPARE) {
      return Judgement.accepted(first);
    }
    if (!firstIsReading && joining == Joining.ADD) {
      return Judgement.accepted(second);
    }
    return Judgement.refused(new Refusal.TemperatureSum(joining, first, second));
  }

  /**
   * The kinds that both may stand for once turns are paid; where one is a case of the other, the
   * wider.
   */
  private static Readings settled(Readings first, Readings second) {
    List<Kind> mine = first.kinds();
    List<Kind> theirs = second.kinds();
    Set<Kind> both = common(mine, theirs);
    if (both.isEmpty()) {
      both = common(withSeries(mine), withSeries(theirs));
    }
    boolean rotation = first.all(Reading::tainted) || second.all(Reading::tainted);
    Set<Reading> readings = new HashSet<>();
    for (Kind kind : both) {
      Reading reading = Reading.of(kind);
      readings.add(new Reading(reading.kind(), reading.turn(), reading.tainted() || rotation));
    }
    return new Readings(first.dimension(), readings);
  }

  private static Set<Kind> common(List<Kind> first, List<Kind> second) {
    Set<Kind> common = new LinkedHashSet<>();
    for (Kind a : first) {
      for (Kind b : second) {
        if (a.goesWith(b)) {
          common.add(a.isA(b) ? b : a);
        }
      }
    }
    return common;
  }

  /** In a power series an even power of an angle is a number. */
  private static List<Kind> withSeries(List<Kind> kinds) {
    Set<Kind> all = new LinkedHashSet<>(kinds);
    for (Kind kind : kinds) {
      RuleBook.STANDARD.inSeries(kind).ifPresent(all::add);
    }
    return List.copyOf(all);
  }

  private @Nullable Rational value() {
    Optional<Rational> first = left.value();
    Optional<Rational> second = right.value();
    if (first.isEmpty() || second.isEmpty()) {
      return null;
    }
    return switch (joining) {
      case ADD -> first.get().plus(second.get());
      case SUBTRACT -> first.get().minus(second.get());
      case COMPARE -> null;
    };
  }
}
