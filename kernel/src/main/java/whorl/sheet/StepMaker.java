package whorl.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Stream;
import whorl.check.Checked;
import whorl.check.InputForm;
import whorl.check.Meaning;
import whorl.check.MotionPlan;
import whorl.eval.Value;
import whorl.mechanics.motion.MotionRun;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Kind;

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
    if (result instanceof Result.Ran ran) {
      var motion = (Statement.Motion) statement;
      return new Step.Ran(
          place, motion, given(statement, ran.checked()), followed(motion, ran), standing);
    } else if (result instanceof Result.Sketched sketched) {
      return new Step.Sketched(place, (Statement.Sketch) statement, depicted(sketched), standing);
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

  private Followed followed(Statement.Motion statement, Result.Ran ran) {
    MotionPlan plan = ran.checked().plan();
    MotionRun run = ran.run().motion();
    Unit second = UnitCatalogue.standard().usual(Kind.named("time"));
    return new Followed(
        new Quantity(new Value.Real(run.duration()), second, false, "time", null),
        run.ending(),
        run.steps(),
        plan.columns().stream().map(column -> column(column, ran)).toList(),
        plan.columns().stream()
            .map(MotionPlan.Column::name)
            .filter(name -> results.definingNode(name).isPresent())
            .toList(),
        statement.lines().stream().flatMap(line -> balance(line, plan)).toList(),
        run.kept());
  }

  private static Followed.Column column(MotionPlan.Column column, Result.Ran ran) {
    Meaning.Quantity quantity = column.quantity();
    return new Followed.Column(
        column.name(),
        Objects.requireNonNull(ran.run().columns().get(column.name())),
        quantity.unit(),
        quantity.chosen(),
        column.kind());
  }

  private static Stream<Followed.Balance> balance(MotionLine line, MotionPlan plan) {
    if (!(line instanceof MotionLine.Equation equation)) {
      return Stream.empty();
    }
    return plan.states().stream()
        .filter(
            state ->
                state.balance() != MotionPlan.Balance.NONE
                    && state.rate().span().equals(equation.value().span()))
        .map(
            state ->
                new Followed.Balance(equation, state.balance() == MotionPlan.Balance.SAME_MATTER));
  }

  private static List<Depicted> depicted(Result.Sketched sketched) {
    var depicted = new ArrayList<Depicted>();
    for (int i = 0; i < sketched.values().size(); i++) {
      Checked.Drawn drawn = sketched.checked().things().get(i);
      depicted.add(
          new Depicted(
              Printer.expression(drawn.text()),
              Quantities.of(drawn.formula(), sketched.values().get(i)),
              sketched.at().get(i)));
    }
    return depicted;
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
