package whorl.sheet;

import java.util.List;
import whorl.check.Checked;
import whorl.check.InputForm;
import whorl.syntax.Expr;
import whorl.syntax.Statement;

/** Makes the step of a statement from what it came to. */
final class StepMaker {
  private final Results results;
  private final String label;

  /**
   * Makes the steps of a cell.
   *
   * @param label how messages call the cell
   */
  StepMaker(Results results, String label) {
    this.results = results;
    this.label = label;
  }

  /**
   * The step of a statement.
   *
   * @param near names spelled like one that has no definition
   */
  Step step(Node node, Result result, List<String> doubts, SimilarNames near) {
    Place place = node.place();
    Statement statement = node.statement();
    if (result instanceof Result.Waiting waiting) {
      return new Step.Waiting(
          place, statement, waiting.names(), waiting.names().stream().map(near::to).toList());
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
          doubts);
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
          doubts);
    } else if (result instanceof Result.Judged judged) {
      List<Given> given = given(statement, judged.checked());
      return statement instanceof Statement.Check check
          ? new Step.Checked(place, check, given, judged.verdict(), doubts)
          : new Step.Assumed(
              place, (Statement.Assumption) statement, given, judged.verdict(), doubts);
    }
    var valued = (Result.Valued) result;
    Quantity gives = Quantities.of(node, valued);
    List<Given> given = given(statement, valued.checked());
    if (statement instanceof Statement.Definition definition) {
      boolean input = InputForm.isInput(definition.value());
      return new Step.Defined(place, definition, input, given, gives, doubts);
    }
    var show = (Statement.Show) statement;
    boolean name = show.value() instanceof Expr.Name;
    return new Step.Shown(place, show, name ? List.of() : given, gives, doubts);
  }

  private List<Given> given(Statement statement, Checked checked) {
    return Givens.of(statement, checked, results);
  }
}
