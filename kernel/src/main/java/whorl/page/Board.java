package whorl.page;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import whorl.report.CellReport;
import whorl.sheet.CellId;

/** What the cells of a page show. */
final class Board {
  private final Map<CellId, Shown> shown = new HashMap<>();

  /**
   * The steps that a cell shows.
   *
   * @param client the session for which it ran
   * @param count the number that the cell bears
   * @param notices sentences for the author that came with its steps
   * @param report its steps, without word of what happened elsewhere
   */
  record Shown(String client, int count, List<String> notices, CellReport report) {
    /** Copies the lists. */
    Shown {
      notices = List.copyOf(notices);
    }

    Shown with(CellReport newReport) {
      return new Shown(client, count, notices, newReport);
    }
  }

  Optional<Shown> of(CellId cell) {
    return Optional.ofNullable(shown.get(cell));
  }

  void put(CellId cell, Shown now) {
    shown.put(cell, now);
  }

  /** The cell shows no steps any more. */
  void clear(CellId cell) {
    shown.remove(cell);
  }
}
