package whorl.sheet;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import whorl.check.Checked;
import whorl.check.InputForm;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/** Makes the step of a statement from what it came to. */
final class StepMaker {
  /** Further names that have no definition are not looked up: a text with so many is no sheet. */
  private static final int MOST_SOUGHT = 10;

  private final Results results;
  private final String label;
  private final Doubts allDoubts;
  private final SimilarNames near;
  private final Set<String> sought = new HashSet<>();

  /**
   * Makes the steps of a cell.
   *
   * @param label how messages call the cell
   * @param doubts on any statement
   * @param near names spelled like one that has no definition
   */
  StepMaker(Results results, String label, Doubts doubts, SimilarNames near) {
    this.results = results;
    this.label = label;
    this.allDoubts = doubts;
    this.near = near;
  }

  /** The step of a statement. */
  Step step(Node node) {
    Result result = results.of(node).orElseThrow();
    var standing = new Standing(allDoubts.on(node), result.lapses());
    Place place = node.place();
    Statement statement = node.statement();
    if (result instanceof Result.Waiting waiting) {
      return new Step.Waiting(
          place, statement, waiting.names(), waiting.names().stream().map(this::near).toList());
    } else if (result instanceof Result.Broken broken) {
      return new Step.Broken(place, statement, broken.diagnostic(), broken.last());
    } else if (result instanceof Result.Callable callable) {
      if (statement instanceof Statement.Published published) {
        return new Step.Published(place, label, published, callable.checked().kind());
      }
      return new Step.Function(
          place,
          (Statement.Function) statement,
          given(statement, callable.checked()),
          callable.checked().kind(),
          standing);
    } else if (result instanceof Result.Compared compared) {
      Checked.Reproduction checked = compared.checked();
      return new Step.Reproduced(
          place,
          (Statement.Reproduction) statement,
          given(statement, checked),
          Quantities.of(checked.value(), compared.computed()),
          Quantities.of(checked.stated(), compared.stated()),
          compared.deviation(),
          compared.within(),
          compared.holds(),
          standing);
    } else if (result instanceof Result.Judged judged) {
      List<Given> given = given(statement, judged.checked());
      return statement instanceof Statement.Check check
          ? new Step.Checked(place, check, given, judged.verdict(), standing)
          : new Step.Assumed(
              place, (Statement.Assumption) statement, given, judged.verdict(), standing);
    }
    var valued = (Result.Valued) result;
    Quantity gives = Quantities.of(node, valued);
    List<Given> given = given(statement, valued.checked());
    if (statement instanceof Statement.Definition definition) {
      boolean input = InputForm.isInput(definition.value());
      return new Step.Defined(place, definition, input, given, gives, standing);
    }
    var show = (Statement.Show) statement;
    boolean name = show.value() instanceof Expr.Name;
    return new Step.Shown(place, show, name ? List.of() : given, gives, standing);
  }

  private List<Given> given(Statement statement, Checked checked) {
    return Givens.of(statement, checked, results);
  }

  private List<String> near(String name) {
    if (sought.size() < MOST_SOUGHT) {
      sought.add(name);
    }
    return sought.contains(name) ? near.to(name) : List.of();
  }
}
