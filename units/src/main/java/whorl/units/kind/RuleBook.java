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
  private final PairTable squares = new PairTable();
  private final Map<Kind, List<Kind>> squareRoots = new HashMap<>();

  /** Answers worked out from the tables; a formula asks the same few again and again. */
  private final Map<Integer, List<Result>> knownProducts = new ConcurrentHashMap<>();

  private final Map<Integer, List<Result>> knownQuotients = new ConcurrentHashMap<>();

  /** Results of rules by two kinds. */
  private static final class PairTable {
    private final Map<Integer, List<Result>> rows = new HashMap<>();

    /** Makes a row, if there is none yet. */
    List<Result> add(Kind first, Kind second) {
      return rows.computeIfAbsent(key(first, second), key -> new ArrayList<>(2));
    }

    void add(Kind first, Kind second, Result result) {
      List<Result> results = add(first, second);
      if (!results.contains(result)) {
        results.add(result);
      }
    }

    boolean has(Kind first, Kind second) {
      return rows.containsKey(key(first, second));
    }

    List<Result> exactly(Kind first, Kind second) {
      return rows.getOrDefault(key(first, second), List.of());
    }

    /** The rule for the kinds or, failing that, for their parents; none where no rule fits. */
    Optional<List<Result>> nearest(Kind first, Kind second) {
      for (@Nullable Kind a = first; a != null; a = a.parent().orElse(null)) {
        for (@Nullable Kind b = second; b != null; b = b.parent().orElse(null)) {
          @Nullable List<Result> results = rows.get(key(a, b));
          if (results != null) {
            return Optional.of(List.copyOf(results));
          }
        }
      }
      return Optional.empty();
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
    rules.quotients().forEach(this::addQuotient);
    rules.squares().forEach(this::addSquare);
    for (Kind kind : table.kinds()) {
      quotients.add(kind, kind, Result.of(number));
      if (!kind.dimension().isOne() && kind.parent().isEmpty() && !kind.has(Kind.Mark.ALONE)) {
        addFormalPowers(kind);
      }
      if (!kind.isNumber() && !squareRoots.containsKey(kind)) {
        powers.addRoot(kind);
      }
    }
  }

  private void addProduct(Rules.Rule rule) {
    Kind first = rule.first();
    Kind second = rule.second();
    products.add(first, second);
    products.add(second, first);
    for (Rules.Solvable solvable : rule.results()) {
      Result result = solvable.result();
      Kind kind = result.kind();
      products.add(first, second, result);
      products.add(second, first, result.swapped());
      if (!solvable.oneWay()) {
        boolean firstIsSolid = result.solid() == Result.Solid.FIRST;
        boolean secondIsSolid = result.solid() == Result.Solid.SECOND;
        quotients.add(kind, first, result.solvedFor(second, firstIsSolid));
        quotients.add(kind, second, result.solvedFor(first, secondIsSolid));
        if (first == second) {
          addRoot(kind, first);
        }
      }
    }
  }

  private void addQuotient(Rules.Rule rule) {
    quotients.add(rule.first(), rule.second());
    for (Rules.Solvable solvable : rule.results()) {
      quotients.add(rule.first(), rule.second(), solvable.result());
    }
  }

  private void addSquare(Rules.Rule rule) {
    for (Rules.Solvable solvable : rule.results()) {
      squares.add(rule.first(), rule.first(), solvable.result());
      addRoot(solvable.result().kind(), rule.first());
    }
  }

  private void addRoot(Kind square, Kind root) {
    squareRoots.computeIfAbsent(square, key -> new ArrayList<>(1)).add(root);
  }

  private void addFormalPowers(Kind kind) {
    if (!quotients.has(number, kind)) {
      powers.add(kind, -1);
    }
    if (!products.has(kind, kind)) {
      for (int exponent : new int[] {-3, -2, 2, 3}) {
        powers.add(kind, exponent);
      }
    }
  }

  /** What two kinds multiplied may be; empty if no rule says so. */
  List<Result> product(Kind first, Kind second) {
    @Nullable List<Result> known = knownProducts.get(key(first, second));
    if (known == null) {
      known = findProduct(first, second);
      knownProducts.put(key(first, second), known);
    }
    return known;
  }

  /** What a rule for just these two kinds, not for their parents, makes of their product. */
  List<Result> productOfJust(Kind first, Kind second) {
    return products.exactly(first, second);
  }

  private List<Result> findProduct(Kind first, Kind second) {
    Optional<List<Result>> rule = products.nearest(first, second);
    if (rule.isPresent()) {
      return rule.get();
    }
    if (first.isNumber() || second.isNumber()) {
      return List.of(Result.of(second.isNumber() ? asFactor(first) : second));
    }
    List<Result> results = formalPower(first, second, 1);
    if (results.isEmpty() && powers.exponent(second) < 0) {
      results = overInverse(first, second);
    }
    if (results.isEmpty() && powers.exponent(first) < 0) {
      results = overInverse(second, first).stream().map(Result::swapped).toList();
    }
    return results;
  }

  /** A number that is multiplied or divided by a number is no more than a number. */
  private Kind asFactor(Kind kind) {
    return kind.isNumber() ? number : kind;
  }

  private List<Result> overInverse(Kind kind, Kind inverse) {
    return powers.power(inverse, -1).map(divisor -> quotient(kind, divisor)).orElse(List.of());
  }

  /** What the square of one quantity may be where that says more than a product of two. */
  List<Result> square(Kind kind) {
    return squares.nearest(kind, kind).orElse(List.of());
  }

  /** What one kind divided by another may be; empty if no rule says so. */
  List<Result> quotient(Kind first, Kind second) {
    @Nullable List<Result> known = knownQuotients.get(key(first, second));
    if (known == null) {
      known = findQuotient(first, second);
      knownQuotients.put(key(first, second), known);
    }
    return known;
  }

  private List<Result> findQuotient(Kind first, Kind second) {
    Optional<List<Result>> rule = quotients.nearest(first, second);
    if (rule.isPresent()) {
      return rule.get();
    }
    if (second.isNumber()) {
      return List.of(Result.of(asFactor(first)));
    }
    if (first.isNumber()) {
      return powers.power(asParent(second), -1).map(Result::of).map(List::of).orElse(List.of());
    }
    List<Result> results = formalPower(first, second, -1);
    if (results.isEmpty() && powers.exponent(second) < 0) {
      results = powers.power(second, -1).map(factor -> product(first, factor)).orElse(List.of());
    }
    return results.isEmpty() ? upsideDown(first, second) : results;
  }

  /** If a/b is c, b/a is the reciprocal of c. */
  private List<Result> upsideDown(Kind dividend, Kind divisor) {
    List<Result> results = new ArrayList<>();
    for (Result result : quotients.nearest(divisor, dividend).orElse(List.of())) {
      for (Result reciprocal : quotient(number, result.kind())) {
        // 1/t is a frequency or a rate: it says anew what is counted, so nothing follows from it.
        if (reciprocal.equals(Result.of(reciprocal.kind()))) {
          results.add(result.reciprocal(reciprocal.kind()));
        }
      }
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

  private static Kind asParent(Kind kind) {
    return kind.parent().orElse(kind);
  }

  /**
   * The kinds of which some root is a kind. Where the rules have no square root, it is a formal
   * one, which fits no kind.
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
    if (degree == 2 && roots.isEmpty()) {
      powers.formalRoot(kind).ifPresent(roots::add);
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
    return turn.kind() == number || turn.written() || isWritten(turn.readsAs(), turn.kind());
  }

  private boolean isWritten(Kind from, Kind to) {
    return rules.turns().stream()
        .anyMatch(turn -> turn.kind() == from && turn.readsAs() == to && turn.written());
  }

  /** As what a kind reads where it is a term of a power series. */
  Optional<Kind> inSeries(Kind kind) {
    return Optional.ofNullable(rules.inSeries().get(kind));
  }
}
