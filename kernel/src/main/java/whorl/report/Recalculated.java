package whorl.report;

import java.util.ArrayList;
import java.util.Optional;
import whorl.sheet.CellOutcome;

/** Says in a line what running a cell did elsewhere on the sheet. */
final class Recalculated {
  private Recalculated() {}

  /**
   * {@code Recalculated elsewhere: L ≈ 26.21 kN·m·s (was 24.02 kN·m·s); FAILS now: check E ≤ 10
   * MJ}; empty where nothing changed.
   */
  static Optional<String> sentence(CellOutcome outcome) {
    var parts = new ArrayList<String>();
    for (CellOutcome.Change change : outcome.changes()) {
      String now = Amounts.of(change.now()).signed();
      String before = Amounts.of(change.before()).text();
      parts.add(change.name() + " " + now + " (was " + before + ")");
    }
    for (CellOutcome.Turn turn : outcome.turned()) {
      parts.add((turn.holds() ? "holds now: " : "FAILS now: ") + turn.text());
    }
    if (!outcome.stopped().isEmpty()) {
      parts.add("come to nothing now: " + String.join(", ", outcome.stopped()));
    }
    return parts.isEmpty()
        ? Optional.empty()
        : Optional.of(TextWrap.plain("Recalculated elsewhere: " + String.join("; ", parts)));
  }
}
