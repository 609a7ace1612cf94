package whorl.sheet;

import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import whorl.check.DefinedNames;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;

/**
 * What running a cell came to. With errors the sheet stays as it was and only {@code steps} and
 * {@code attempted} say more.
 *
 * @param source the text of the cell, into which the messages point
 * @param errors mistakes, in the order in which they stand
 * @param interrupted whether the run was interrupted, which its one error then says
 * @param notices what the author should know though the cell took effect
 * @param steps the steps of the cell; with errors those that still stand from before
 * @param changes definitions anywhere on the sheet that came to something else
 * @param turned checks and assumptions anywhere that now stand otherwise
 * @param stopped definitions, by name, and checks and assumptions, as written, elsewhere that came
 *     to something before and now wait or are broken
 * @param refreshed other cells whose steps are no longer what they were
 * @param attempted the names that the cell defines, or would have defined
 */
public record CellOutcome(
    Source source,
    List<Diagnostic> errors,
    boolean interrupted,
    List<Diagnostic> notices,
    List<Step> steps,
    List<Change> changes,
    List<Turn> turned,
    List<String> stopped,
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
    stopped = List.copyOf(stopped);
    refreshed = Collections.unmodifiableSet(new LinkedHashSet<>(refreshed));
    attempted = Collections.unmodifiableSet(new LinkedHashSet<>(attempted));
  }

  static CellOutcome refused(
      Source source, List<Diagnostic> errors, List<Step> steps, Set<String> attempted) {
    return without(source, errors, false, steps, attempted);
  }

  static CellOutcome interrupted(
      Source source, Diagnostic message, List<Step> steps, Set<String> attempted) {
    return without(source, List.of(message), true, steps, attempted);
  }

  private static CellOutcome without(
      Source source,
      List<Diagnostic> errors,
      boolean interrupted,
      List<Step> steps,
      Set<String> attempted) {
    return new CellOutcome(
        source,
        errors,
        interrupted,
        List.of(),
        steps,
        List.of(),
        List.of(),
        List.of(),
        Set.of(),
        attempted);
  }

  /** Whether the cell took effect. */
  public boolean tookEffect() {
    return errors.isEmpty();
  }

  /** The names that the cell defines now; with errors those that it still defines from before. */
  public List<String> standing() {
    return steps.stream().flatMap(step -> DefinedNames.in(step.statement()).stream()).toList();
  }
}
