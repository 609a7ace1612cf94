package whorl.units.kind;

import java.util.Optional;

/**
 * A quantity that would be of the kind wanted if its turns came out even.
 *
 * @param shortfall the power of 2π by which it would have to be multiplied; negative if it has too
 *     many
 */
record TurnSlip(int shortfall) {

  /**
   * The smallest number of turns by which some reading misses a kind, if one misses it by turns.
   */
  static Optional<TurnSlip> between(Readings found, Kind wanted) {
    return found.readings().stream()
        .filter(Reading::tainted)
        .flatMap(
            reading ->
                RuleBook.STANDARD.turnsWanted(reading, wanted).stream()
                    .map(turns -> turns - reading.turn()))
        .filter(shortfall -> shortfall != 0)
        .min((a, b) -> Integer.compare(Math.abs(a), Math.abs(b)))
        .map(TurnSlip::new);
  }
}
