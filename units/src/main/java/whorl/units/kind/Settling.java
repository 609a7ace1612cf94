package whorl.units.kind;

import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/** Which kinds a quantity may stand for as it is, its account of turns closed. */
final class Settling {
  private static final RuleBook RULES = RuleBook.STANDARD;
  private static final Kind ANGLE = Kind.named("angle");

  private Settling() {}

  /** The kinds of some readings, in the order of the table. */
  static List<Kind> kinds(Readings readings) {
    Set<Kind> kinds = new TreeSet<>(Comparator.comparingInt(Kind::index));
    for (Reading reading : readings.readings()) {
      settle(reading, kinds);
    }
    boolean multipleOfPi = readings.readings().stream().anyMatch(reading -> reading.turn() != 0);
    if (multipleOfPi && readings.all(reading -> reading.kind().isNumber())) {
      kinds.add(ANGLE);
    }
    return List.copyOf(kinds);
  }

  private static void settle(Reading reading, Set<Kind> kinds) {
    if (reading.turn() == 0 || !reading.tainted()) {
      kinds.add(reading.kind());
    }
    for (Rules.Turn turn : RULES.turns()) {
      if (turn.kind() == reading.kind() && pays(reading, turn)) {
        kinds.add(turn.readsAs());
      }
    }
  }

  /** Where no rotation took part, π may come with any factor, as in a section through a circle. */
  private static boolean pays(Reading reading, Rules.Turn turn) {
    return reading.tainted()
        ? !turn.written() && reading.turn() == turn.turns()
        : reading.turn() * turn.turns() > 0;
  }
}
