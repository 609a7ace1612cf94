package whorl.page;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.Function;
import whorl.sheet.CellId;
import whorl.sheet.Quantity;

/**
 * What cells in Java read from the sheet. They are not run by themselves when it changes; the page
 * says so.
 */
final class JavaReads {
  private final Map<CellId, Reading> readings = new LinkedHashMap<>();

  /**
   * What one cell read.
   *
   * @param told names of which the author was told that they changed
   */
  private record Reading(String label, Map<String, Optional<Quantity>> saw, Set<String> told) {}

  /** Notes what a cell read when it ran. */
  void note(CellId cell, String label, Map<String, Optional<Quantity>> saw) {
    readings.remove(cell);
    if (!saw.isEmpty()) {
      readings.put(cell, new Reading(label, new TreeMap<>(saw), new HashSet<>()));
    }
  }

  /** The cell is gone, or no longer in Java. */
  void forget(CellId cell) {
    readings.remove(cell);
  }

  /**
   * A sentence about cells other than the one that ran which read something that is no longer so;
   * each change is told once.
   */
  Optional<String> outdated(CellId ran, Function<String, Optional<Quantity>> now) {
    var parts = new ArrayList<String>();
    readings.forEach(
        (cell, reading) -> {
          var fresh = new ArrayList<String>();
          reading
              .saw()
              .forEach(
                  (name, quantity) -> {
                    if (quantity.equals(now.apply(name))) {
                      reading.told().remove(name);
                    } else if (reading.told().add(name)) {
                      fresh.add(name);
                    }
                  });
          if (!fresh.isEmpty() && !cell.equals(ran)) {
            parts.add(reading.label() + " read " + Words.list(fresh));
          }
        });
    return parts.isEmpty()
        ? Optional.empty()
        : Optional.of(
            "Changed since Java used it, so run again: " + String.join("; ", parts) + ".");
  }
}
