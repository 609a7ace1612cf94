package whorl.sheet;

import java.util.List;
import java.util.Set;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;

/**
 * What running a cell came to. With errors the sheet stays as it was and only {@code standing} and
 * {@code attempted} say more.
 *
 * @param source the text of the cell, into which the messages point
 * @param errors mistakes, in the order in which they stand
 * @param notices what the author should know though the cell took effect
 * @param steps the steps of the cell; with errors those that still stand from before
 * @param changes definitions anywhere on the sheet that came to something else
 * @param turned checks and assumptions anywhere that now stand otherwise
 * @param refreshed other cells whose steps are no longer what they were
 * @param attempted the names that the cell defines, or would have defined
 */
public record CellOutcome(
    Source source,
    List<Diagnostic> errors,
    List<Diagnostic> notices,
    List<Step> steps,
    List<Change> changes,
    List<Turn> turned,
    Set<CellId> refreshed,
    Set<String> attempted) {

  /** A definition outside the cell that came to something else. */
  public record Change(String name, Quantity before, Quantity now) {}

  /** A check or assumption that turned, as written. */
  public record Turn(String text, boolean holds) {}

  /** Copies the collections. */
  public CellOutcome {
    errors = List.copyOf(errors);
    notices = List.copyOf(notices);
    steps = List.copyOf(steps);
    changes = List.copyOf(changes);
    turned = List.copyOf(turned);
    refreshed = java.util.Collections.unmodifiableSet(new java.util.LinkedHashSet<>(refreshed));
    attempted = java.util.Collections.unmodifiableSet(new java.util.LinkedHashSet<>(attempted));
  }

  /** Whether the cell took effect. */
  public boolean tookEffect() {
    return errors.isEmpty();
  }
}
