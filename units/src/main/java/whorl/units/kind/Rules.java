package whorl.units.kind;

import java.util.List;
import java.util.Map;

/**
 * What {@code rules.txt} says, line by line.
 *
 * @param products rules for {@code first * second}
 * @param quotients rules for {@code first / second}
 * @param squares rules for the square of one quantity
 * @param turns what one turn's worth of a kind reads as
 * @param standsFor the readings of kinds that are kept as turns of another kind
 * @param inSeries as what a kind reads where it is added to that
 */
record Rules(
    List<Rule> products,
    List<Rule> quotients,
    List<Rule> squares,
    List<Turn> turns,
    Map<Kind, Reading> standsFor,
    Map<Kind, Kind> inSeries) {

  /**
   * The results of a product or a quotient.
   *
   * @param results none where the rule only keeps a special case from the rule for its parent
   */
  record Rule(Kind first, Kind second, List<Solvable> results) {
    Rule {
      results = List.copyOf(results);
    }
  }

  /**
   * One result of a rule.
   *
   * @param oneWay whether the rule must not be solved for its operands
   */
  record Solvable(Result result, boolean oneWay) {}

  /**
   * One turn's worth: a kind with that many turns may be taken as another kind.
   *
   * @param written only where no rotation took part
   */
  record Turn(Kind kind, int turns, Kind readsAs, boolean written) {}

  Rules {
    products = List.copyOf(products);
    quotients = List.copyOf(quotients);
    squares = List.copyOf(squares);
    turns = List.copyOf(turns);
    standsFor = Map.copyOf(standsFor);
    inSeries = Map.copyOf(inSeries);
  }
}
