package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Dimension;
import whorl.units.Rational;

/**
 * One product: sorts its factors into an exact coefficient, a power of π and quantities, and has
 * the groupings of the quantities searched.
 */
final class Multiplication {
  private static final Kind INERTIA = Kind.named("rotational_inertia");
  private static final Kind FLYWHEEL_EFFECT = Kind.named("flywheel_effect");
  private static final Kind TEMPERATURE = Kind.named("temperature");
  private static final List<Kind> RATES =
      List.of(Kind.named("angular_velocity"), Kind.named("frequency"));
  private static final Kind ANGLE_TURNED = Kind.named("angle_turned");
  private static final Rational TWO = Rational.of(2);
  private static final Rational FOUR = Rational.of(4);
  private static final Rational QUARTER = Rational.of(1, 4);

  /** Exponents of more bits than this make numbers of a size that no coefficient has. */
  private static final int EXACT_BITS = 6;

  /** Numbers of seconds in a minute, and of turns per minute in a hertz, put in by hand. */
  private static final Set<Rational> CONVERSIONS = Set.of(Rational.of(60), Rational.of(30));

  private final List<Powered> factors;
  private final Map<Object, Powered> quantities = new LinkedHashMap<>();
  private final List<Rational> numerals = new ArrayList<>();

  /** Product of the numerals. */
  private Rational coefficient = Rational.ONE;

  /** Whether the coefficient holds all numbers but π. */
  private boolean exact = true;

  /** Net power of π. */
  private int turn;

  /** Whether there are numbers that are not numerals. */
  private boolean hasNumbers;

  private Multiplication(List<Powered> factors) {
    this.factors = factors;
  }

  static Judgement of(List<Powered> factors) {
    return new Multiplication(withInertiasOfFlywheelEffects(factors)).judgement();
  }

  /** Reads a flywheel effect with a 4 right behind the fraction bar as the inertia that it is. */
  private static List<Powered> withInertiasOfFlywheelEffects(List<Powered> factors) {
    List<Powered> read = new ArrayList<>(factors);
    for (int i = 0; i + 1 < read.size(); i++) {
      Powered effect = read.get(i);
      Powered four = read.get(i + 1);
      if (isFlywheelEffect(effect.operand())
          && FOUR.equals(four.operand().literal())
          && four.exponent().equals(effect.exponent().negate())) {
        read.set(
            i, new Powered(List.of(effect.key(), FOUR), Operand.of(INERTIA), effect.exponent()));
        read.remove(i + 1);
      }
    }
    return read;
  }

  private static boolean isFlywheelEffect(Operand operand) {
    return operand.readings().all(reading -> reading.kind() == FLYWHEEL_EFFECT);
  }

  private Judgement judgement() {
    for (Powered factor : factors) {
      Readings readings = factor.operand().readings();
      if (readings.all(reading -> reading.kind() == TEMPERATURE)) {
        return Judgement.refused(new Refusal.TemperatureReading());
      }
      Optional<Refusal> power = Raising.refusal(readings, factor.exponent());
      if (power.isPresent()) {
        return Judgement.refused(power.get());
      }
      sort(factor);
    }
    quantities.values().removeIf(factor -> factor.exponent().isZero());
    return refusal().map(Judgement::refused).orElseGet(this::accepted);
  }

  private void sort(Powered factor) {
    @Nullable Rational literal = factor.operand().literal();
    Readings readings = factor.operand().readings();
    if (literal != null) {
      numerals.add(literal);
      multiply(literal, factor.exponent());
    } else if (readings.all(Reading::isPlainNumber)) {
      exact = exact && isPi(readings);
      hasNumbers = hasNumbers || !isPi(readings);
      turn += turns(readings, factor.exponent());
    } else {
      quantities.merge(factor.key(), factor, Multiplication::merged);
    }
  }

  private static Powered merged(Powered first, Powered second) {
    return new Powered(first.key(), first.operand(), first.exponent().plus(second.exponent()));
  }

  private void multiply(Rational literal, Rational exponent) {
    boolean whole = exponent.isInteger() && exponent.numerator().bitLength() <= EXACT_BITS;
    if (whole && !(literal.isZero() && exponent.signum() < 0)) {
      coefficient = coefficient.times(literal.power(exponent.numerator().intValueExact()));
    } else {
      exact = false;
    }
  }

  private Optional<Refusal> refusal() {
    for (Rational numeral : numerals) {
      Optional<Refusal> refusal = NumericValueFormulas.STANDARD.refusal(numeral, this::kinds);
      if (refusal.isPresent()) {
        return refusal;
      }
    }
    return flywheelEffect();
  }

  /** All kinds for which a factor may stand. */
  private Set<Kind> kinds() {
    Set<Kind> kinds = new HashSet<>();
    for (Powered factor : factors) {
      kinds.addAll(factor.operand().readings().kinds());
    }
    return kinds;
  }

  /** A flywheel effect enters no product but with numbers and what else a rule names. */
  private Optional<Refusal> flywheelEffect() {
    List<Powered> others = new ArrayList<>();
    boolean present = false;
    for (Powered factor : quantities.values()) {
      if (isFlywheelEffect(factor.operand())) {
        present = true;
      } else {
        others.add(factor);
      }
    }
    boolean fits = !present || others.isEmpty() || mayMeetFlywheelEffect(others);
    return fits ? Optional.empty() : Optional.of(new Refusal.FlywheelEffect());
  }

  private static boolean mayMeetFlywheelEffect(List<Powered> others) {
    return of(others)
        .match(
            new Judgement.Cases<>() {
              @Override
              public Boolean accepted(Judgement.Accepted accepted) {
                return accepted.operand().readings().readings().stream()
                    .map(Reading::kind)
                    .anyMatch(
                        kind ->
                            !RuleBook.STANDARD.product(FLYWHEEL_EFFECT, kind).isEmpty()
                                || !RuleBook.STANDARD.quotient(FLYWHEEL_EFFECT, kind).isEmpty());
              }

              @Override
              public Boolean refused(Judgement.Refused refused) {
                return false;
              }
            });
  }

  private Judgement accepted() {
    if (quantities.isEmpty()) {
      boolean known = exact && turn == 0;
      return judgement(new Operand(Readings.number(turn), known ? coefficient : null));
    }
    List<ProductSearch.Part> parts = parts(quantities.values(), turn);
    if (parts.size() > ProductSearch.MOST_FACTORS) {
      return Judgement.refused(
          new Refusal.TooManyFactors(parts.size(), ProductSearch.MOST_FACTORS));
    }
    Set<Reading> found = searched(parts);
    addSquareOfProduct(found);
    var readings = new Readings(dimension(), withFlywheelEffect(found));
    return judgement(new Operand(readings, exact && coefficient.isZero() ? Rational.ZERO : null));
  }

  private static Set<Reading> searched(List<ProductSearch.Part> parts) {
    boolean untagged = parts.stream().anyMatch(part -> part.readings().isEmpty());
    return untagged ? new HashSet<>() : ProductSearch.readings(parts);
  }

  /** Where all exponents are even, as in {@code (r*w^2)^2}, the product is a square as well. */
  private void addSquareOfProduct(Set<Reading> found) {
    List<Powered> halves = new ArrayList<>();
    for (Powered factor : quantities.values()) {
      Rational half = factor.exponent().dividedBy(TWO);
      if (!half.isInteger()) {
        return;
      }
      halves.add(new Powered(factor.key(), factor.operand(), half));
    }
    if (halves.size() > 1 && turn % 2 == 0) {
      found.addAll(Combination.power(searched(parts(halves, turn / 2)), 2));
    }
  }

  private List<ProductSearch.Part> parts(Iterable<Powered> powers, int turn) {
    List<ProductSearch.Part> parts = new ArrayList<>();
    for (Powered factor : powers) {
      boolean below = factor.exponent().signum() < 0;
      Rational size = below ? factor.exponent().negate() : factor.exponent();
      Readings power = Raising.power(factor.operand().readings(), size);
      parts.add(new ProductSearch.Part(power.readings(), below));
    }
    boolean allBelow = parts.stream().allMatch(ProductSearch.Part::below);
    if (hasNumbers && turn != 0) {
      parts.add(new ProductSearch.Part(turnsOfNumber(Math.abs(turn)), turn < 0));
      allBelow = allBelow && turn < 0;
    } else if (turn != 0 || hasNumbers || allBelow) {
      parts.add(new ProductSearch.Part(Readings.number(turn).readings(), false));
      allBelow = false;
    }
    if (allBelow) {
      parts.add(new ProductSearch.Part(Readings.NUMBER.readings(), false));
    }
    return parts;
  }

  /** A number times 2π may also be the angle of that number of turns. */
  private static Set<Reading> turnsOfNumber(int turn) {
    Set<Reading> readings = new HashSet<>(Readings.number(turn).readings());
    readings.add(new Reading(ANGLE_TURNED, turn - 1, false));
    return readings;
  }

  private Dimension dimension() {
    Dimension dimension = Dimension.ONE;
    for (Powered factor : quantities.values()) {
      Dimension power = factor.operand().readings().dimension().power(factor.exponent());
      dimension = dimension.times(power);
    }
    return dimension;
  }

  /** GD² is four times the inertia: an exact factor tells that one is made of the other. */
  private Set<Reading> withFlywheelEffect(Set<Reading> found) {
    if (!exact) {
      return found;
    }
    Set<Reading> both = new HashSet<>(found);
    if (coefficient.equals(QUARTER) && found.equals(Set.of(Reading.of(FLYWHEEL_EFFECT)))) {
      both.add(Reading.of(INERTIA));
    }
    if (coefficient.dividedBy(FOUR).isInteger()
        && Settling.kinds(new Readings(INERTIA.dimension(), found)).contains(INERTIA)) {
      both.add(Reading.of(FLYWHEEL_EFFECT));
    }
    return both;
  }

  private Judgement judgement(Operand operand) {
    return new Judgement.Accepted(operand, remark());
  }

  private Optional<Remark> remark() {
    Optional<Rational> conversion = numerals.stream().filter(CONVERSIONS::contains).findFirst();
    return conversion.flatMap(
        numeral ->
            RATES.stream().filter(kinds()::contains).findFirst().map(k -> new Remark(numeral, k)));
  }

  private static boolean isPi(Readings readings) {
    return readings.equals(Readings.PI);
  }

  /** Turns of a power of a number; a root that does not divide them leaves a plain number. */
  private static int turns(Readings number, Rational exponent) {
    int turn = number.readings().stream().mapToInt(Reading::turn).max().orElse(0);
    Rational turns = Rational.of(turn).times(exponent);
    return turns.isInteger() ? turns.numerator().intValueExact() : 0;
  }
}
