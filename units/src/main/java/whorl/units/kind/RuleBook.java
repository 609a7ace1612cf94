package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.jspecify.annotations.Nullable;

/**
 * What becomes of two kinds in a product or a quotient: the rules of {@code rules.txt}, completed
 * by those that need no writing down. Like over like is a number; a kind times a number is the
 * kind; a kind without a named reciprocal, square or cube has a formal one.
 */
final class RuleBook {
  static final RuleBook STANDARD = new RuleBook(KindTable.STANDARD, ResourceLines.of("rules.txt"));

  private final Kind number;
  private final FormalPowers powers;
  private final Rules rules;
  private final PairTable products = new PairTable();
  private final PairTable quotients = new PairTable();
  private final Map<Kind, List<Kind>> squareRoots = new HashMap<>();

  /** Answers worked out from the tables; a formula asks the same few again and again. */
  private final Map<Integer, List<Result>> knownProducts = new ConcurrentHashMap<>();

  private final Map<Integer, List<Result>> knownQuotients = new ConcurrentHashMap<>();

  /** Results of rules by two kinds. */
  private static final class PairTable {
    private final Map<Integer, List<Result>> rows = new HashMap<>();

    void add(Kind first, Kind second, Result result) {
      List<Result> results = rows.computeIfAbsent(key(first, second), key -> new ArrayList<>(2));
      if (!results.contains(result)) {
        results.add(result);
      }
    }

    List<Result> exactly(Kind first, Kind second) {
      return rows.getOrDefault(key(first, second), List.of());
    }

    /** The rule for the kinds or, failing that, for their parents. */
    List<Result> nearest(Kind first, Kind second) {
      for (@Nullable Kind a = first; a != null; a = a.parent().orElse(null)) {
        for (@Nullable Kind b = second; b != null; b = b.parent().orElse(null)) {
          List<Result> results = exactly(a, b);
          if (!results.isEmpty()) {
            return results;
          }
        }
      }
      return List.of();
    }
  }

  private static Integer key(Kind first, Kind second) {
    return first.index() << 16 | second.index();
  }

  RuleBook(KindTable table, List<String> lines) {
    number = table.number();
    powers = new FormalPowers(table);
    rules = new RuleReader(powers).read(lines);
    rules.products().forEach(this::addProduct);
    for (Rules.Rule rule : rules.quotients()) {
      quotients.add(rule.first(), rule.second(), rule.result());
    }
    for (Kind kind : table.kinds()) {
      quotients.add(kind, kind, Result.of(number));
      if (!kind.dimension().isOne() && kind.parent().isEmpty() && !kind.has(Kind.Mark.ALONE)) {
        addFormalPowers(kind);
      }
    }
  }

  private void addProduct(Rules.Rule rule) {
    Kind first = rule.first();
    Kind second = rule.second();
    Kind result = rule.result().kind();
    products.add(first, second, rule.result());
    products.add(second, first, rule.result());
    if (!rule.oneWay()) {
      quotients.add(result, first, rule.result().turnedRound(second));
      quotients.add(result, second, rule.result().turnedRound(first));
      if (first == second) {
        squareRoots.computeIfAbsent(result, key -> new ArrayList<>(1)).add(first);
      }
    }
  }

  private void addFormalPowers(Kind kind) {
    if (quotients.exactly(number, kind).isEmpty()) {
      powers.add(kind, -1);
    }
    if (products.exactly(kind, kind).isEmpty()) {
      for (int exponent : new int[] {-3, -2, 2, 3}) {
        powers.add(kind, exponent);
      }
    }
  }

  /** What two kinds multiplied may be; empty if no rule says so. */
  List<Result> product(Kind first, Kind second) {
    return knownProducts.computeIfAbsent(key(first, second), key -> findProduct(first, second));
  }

  /** What a rule for just these two kinds, not for their parents, makes of their product. */
  List<Result> productOfJust(Kind first, Kind second) {
    return products.exactly(first, second);
  }

  private List<Result> findProduct(Kind first, Kind second) {
    List<Result> results = products.nearest(first, second);
    if (results.isEmpty()) {
      results = formalPower(first, second, 1);
    }
    if (results.isEmpty() && powers.exponent(second) < 0 && !first.isNumber()) {
      results = dividedByInverse(first, second);
    }
    if (results.isEmpty() && powers.exponent(first) < 0 && !second.isNumber()) {
      results = dividedByInverse(second, first);
    }
    return results.isEmpty() ? timesNumber(first, second) : List.copyOf(results);
  }

  private List<Result> dividedByInverse(Kind kind, Kind inverse) {
    return powers.power(inverse, -1).map(divisor -> quotient(kind, divisor)).orElse(List.of());
  }

  private List<Result> timesNumber(Kind first, Kind second) {
    if (second.isNumber()) {
      return List.of(Result.of(first.isNumber() ? number : first));
    }
    return first.isNumber() ? List.of(Result.of(second)) : List.of();
  }

  /** What one kind divided by another may be; empty if no rule says so. */
  List<Result> quotient(Kind first, Kind second) {
    return knownQuotients.computeIfAbsent(key(first, second), key -> findQuotient(first, second));
  }

  private List<Result> findQuotient(Kind first, Kind second) {
    List<Result> results = quotients.nearest(first, second);
    if (!results.isEmpty()) {
      return List.copyOf(results);
    }
    if (second.isNumber()) {
      return List.of(Result.of(first.isNumber() ? number : first));
    }
    if (first.isNumber()) {
      return powers.power(base(second), -1).map(Result::of).map(List::of).orElse(List.of());
    }
    results = formalPower(first, second, -1);
    if (results.isEmpty() && powers.exponent(second) < 0) {
      results = powers.power(second, -1).map(factor -> product(first, factor)).orElse(List.of());
    }
    return List.copyOf(results);
  }

  /** Powers of one kind, multiplied or divided. */
  private List<Result> formalPower(Kind first, Kind second, int sign) {
    Kind base = powers.base(first);
    if (base != powers.base(second) || base.isNumber()) {
      return List.of();
    }
    int exponent = powers.exponent(first) + sign * powers.exponent(second);
    return exponent == 0
        ? List.of(Result.of(number))
        : powers.power(base, exponent).map(Result::of).map(List::of).orElse(List.of());
  }

  private static Kind base(Kind kind) {
    return kind.parent().orElse(kind);
  }

  /**
   * The kinds of which some root is a kind, by the rules.
   *
   * @param degree 2 or 3
   */
  List<Kind> roots(Kind kind, int degree) {
    Set<Kind> roots = new LinkedHashSet<>();
    if (degree == 2) {
      roots.addAll(squareRoots.getOrDefault(kind, List.of()));
    }
    int exponent = powers.exponent(kind);
    if (exponent != 1 && exponent % degree == 0) {
      powers.power(powers.base(kind), exponent / degree).ifPresent(roots::add);
    }
    return List.copyOf(roots);
  }

  Kind number() {
    return number;
  }

  /** The reading of a quantity stated to be of a kind. */
  Reading reading(Kind kind) {
    @Nullable Reading reading = rules.standsFor().get(kind);
    return reading == null ? new Reading(kind, 0, false) : reading;
  }

  /** Kinds that are kept as turns of another, with the reading they stand for. */
  Map<Kind, Reading> standsFor() {
    return rules.standsFor();
  }

  /** What one turn's worth of a kind may be taken as. */
  List<Rules.Turn> turns() {
    return rules.turns();
  }

  /**
   * The turns with which a reading's kind would pass for a kind wanted. Kinds that differ by a turn
   * but are quantities of their own, as torque and energy, count only where a turn is there
   * already.
   */
  Set<Integer> turnsWanted(Reading reading, Kind wanted) {
    Set<Integer> turns = new LinkedHashSet<>();
    if (reading.kind().goesWith(wanted)) {
      turns.add(0);
    }
    for (Rules.Turn turn : rules.turns()) {
      if (turn.kind() == reading.kind()
          && turn.readsAs().goesWith(wanted)
          && (reading.turn() != 0 || !isOfItsOwn(turn))) {
        turns.add(turn.turns());
      }
    }
    return turns;
  }

  private boolean isOfItsOwn(Rules.Turn turn) {
    return turn.kind() == number
        || rules.turns().stream().anyMatch(back -> back.kind() == turn.readsAs() && back.written());
  }

  /** As what a kind reads where it is a term of a power series. */
  Optional<Kind> inSeries(Kind kind) {
    return Optional.ofNullable(rules.inSeries().get(kind));
  }
}
