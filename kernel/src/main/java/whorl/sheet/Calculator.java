package whorl.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import whorl.check.Checked;
import whorl.check.Checker;
import whorl.check.Formula;
import whorl.check.Meaning;
import whorl.check.Operation;
import whorl.check.Routine;
import whorl.check.Vocabulary;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.eval.NumericFailure;
import whorl.eval.Outcome;
import whorl.eval.ScalarEvaluator;
import whorl.eval.Value;
import whorl.syntax.Statement;

/** Checks a statement and works it out with the values that its names have. */
final class Calculator {
  private final Results results;
  private long evaluations;

  Calculator(Results results) {
    this.results = results;
  }

  Result result(Node node) {
    List<String> open =
        node.uses().stream()
            .filter(name -> results.of(name).isEmpty() && !isAtHand(name))
            .sorted()
            .toList();
    if (!open.isEmpty()) {
      return new Result.Waiting(open);
    }
    Checker.Result result = checked(node);
    if (result instanceof Checker.Result.Refused refused) {
      return new Result.Broken(refused.diagnostic(), null);
    }
    Checked checked = ((Checker.Result.Passed) result).checked();
    try {
      evaluations++;
      return workedOut(node, checked);
    } catch (NoResult failure) {
      return new Result.Broken(failure.diagnostic, null);
    }
  }

  private Checker.Result checked(Node node) {
    var checker = new Checker(results);
    Routine routine = node.routine();
    return node.statement() instanceof Statement.Published head && routine != null
        ? checker.check(head, routine)
        : checker.check(node.statement());
  }

  /**
   * The result of a statement that says what it said before, in another place of its cell. A value
   * is kept; what points into the text is made anew.
   */
  Result moved(Node node, Result was) {
    if (was instanceof Result.Waiting) {
      return was;
    }
    if (was instanceof Result.Valued valued
        && new Checker(results).check(node.statement()) instanceof Checker.Result.Passed passed
        && passed.checked() instanceof Checked.Value value) {
      return new Result.Valued(value, valued.value());
    }
    return result(node);
  }

  /** How many statements were worked out. */
  long evaluations() {
    return evaluations;
  }

  /** Whether a name means a function of the language because the sheet has none of that name. */
  private boolean isAtHand(String name) {
    return Vocabulary.isFunction(name) && results.definingNode(name).isEmpty();
  }

  private Result workedOut(Node node, Checked checked) throws NoResult {
    if (checked instanceof Checked.Function function) {
      return new Result.Callable(function);
    }
    double[] frame = frame(checked);
    if (checked instanceof Checked.Value value) {
      return new Result.Valued(value, value(node, checked, value.formula().operation(), frame));
    } else if (checked instanceof Checked.Condition condition) {
      return new Result.Judged(condition, verdict(node, condition, frame));
    }
    return compared(node, (Checked.Reproduction) checked, frame);
  }

  /** The numbers that a statement reads, each in its slots. */
  private double[] frame(Checked checked) {
    var frame = new double[checked.basis().frameSize().numbers()];
    for (Meaning.Input input : checked.basis().inputs()) {
      var valued = (Result.Valued) results.of(input.name()).orElseThrow();
      if (valued.value() instanceof Value.Real real) {
        frame[input.slot()] = real.value();
      } else if (valued.value() instanceof Value.Vector vector) {
        frame[input.slot()] = vector.x();
        frame[input.slot() + 1] = vector.y();
        frame[input.slot() + 2] = vector.z();
      } else if (valued.value() instanceof Value.Truth truth) {
        frame[input.slot()] = truth.holds() ? 1 : 0;
      }
    }
    return frame;
  }

  /** The things in space that a statement reads, each in its slot. */
  private Object[] things(Checked checked) {
    var things = new Object[checked.basis().frameSize().things()];
    for (Meaning.Input input : checked.basis().inputs()) {
      var valued = (Result.Valued) results.of(input.name()).orElseThrow();
      if (valued.value() instanceof Value.Thing thing) {
        things[input.slot()] = thing.content();
      }
    }
    return things;
  }

  private Value value(Node node, Checked checked, Operation operation, double[] frame)
      throws NoResult {
    Outcome outcome = ScalarEvaluator.of(operation, things(checked)).evaluate(frame);
    if (outcome instanceof Outcome.Done done) {
      return done.value();
    }
    NumericFailure failure = ((Outcome.Failed) outcome).failure();
    if (failure.reason() == NumericFailure.Reason.INTERRUPTED) {
      throw new Interruption();
    }
    throw new NoResult(
        NumericMessages.of(failure, node, Givens.of(node.statement(), checked, results), results));
  }

  private double number(Node node, Checked checked, Formula formula, double[] frame)
      throws NoResult {
    return ((Value.Real) value(node, checked, formula.operation(), frame)).value();
  }

  private Verdict verdict(Node node, Checked.Condition condition, double[] frame) throws NoResult {
    var comparisons = new ArrayList<Comparison>();
    boolean holds = holds(node, condition, condition.clause(), frame, comparisons);
    return new Verdict(holds, comparisons);
  }

  private boolean holds(
      Node node,
      Checked checked,
      Checked.Clause clause,
      double[] frame,
      List<Comparison> comparisons)
      throws NoResult {
    if (clause instanceof Checked.Clause.All all) {
      for (Checked.Clause part : all.clauses()) {
        if (!holds(node, checked, part, frame, comparisons)) {
          return false;
        }
      }
      return true;
    } else if (clause instanceof Checked.Clause.Any any) {
      for (Checked.Clause part : any.clauses()) {
        if (holds(node, checked, part, frame, comparisons)) {
          return true;
        }
      }
      return false;
    } else if (clause instanceof Checked.Clause.Compared compared) {
      double left = number(node, checked, compared.left(), frame);
      double right = number(node, checked, compared.right(), frame);
      Comparison comparison = comparison(compared, left, right);
      comparisons.add(comparison);
      return comparison.holds();
    }
    var plain = (Checked.Clause.Plain) clause;
    return ((Value.Truth) value(node, checked, plain.operation(), frame)).holds();
  }

  private static Comparison comparison(
      Checked.Clause.Compared compared, double left, double right) {
    boolean upward =
        switch (compared.text().relation()) {
          case LESS, AT_MOST -> true;
          case MORE, AT_LEAST -> false;
        };
    boolean holds =
        switch (compared.text().relation()) {
          case LESS -> left < right;
          case AT_MOST -> left <= right;
          case MORE -> left > right;
          case AT_LEAST -> left >= right;
        };
    double smaller = upward ? left : right;
    double larger = upward ? right : left;
    // A share is the part of a limit that is used: it says something only on one side of zero.
    boolean comparable =
        larger != 0 && smaller / larger >= 0 && !compared.left().unit().isReading();
    double share = larger > 0 ? smaller / larger : larger / smaller;
    return new Comparison(
        compared.text(),
        quantity(compared.left(), left),
        quantity(compared.right(), right),
        comparable && Double.isFinite(share) ? OptionalDouble.of(share) : OptionalDouble.empty(),
        new Quantity(
            new Value.Real(larger - smaller),
            compared.margin(),
            compared.right().chosen(),
            "",
            null),
        holds);
  }

  private static Quantity quantity(Formula formula, double value) {
    return Quantities.of(formula, new Value.Real(value));
  }

  private Result compared(Node node, Checked.Reproduction checked, double[] frame) throws NoResult {
    double computed = number(node, checked, checked.value(), frame);
    double stated = number(node, checked, checked.stated(), frame);
    double within = number(node, checked, checked.within(), frame);
    var statement = (Statement.Reproduction) node.statement();
    if (stated == 0) {
      throw new NoResult(SheetMessages.statedZero(statement));
    }
    double allowed = checked.relative() ? within : within / Math.abs(stated);
    if (allowed < 0) {
      throw new NoResult(SheetMessages.negativeDeviation(statement));
    }
    return new Result.Compared(
        checked,
        new Value.Real(computed),
        new Value.Real(stated),
        (computed - stated) / stated,
        allowed);
  }

  /** A part of a statement has no value. */
  private static final class NoResult extends Exception {
    private static final long serialVersionUID = 1;
    private final transient Diagnostic diagnostic;

    NoResult(Diagnostic diagnostic) {
      super(diagnostic.problem(), null, false, false);
      this.diagnostic = diagnostic;
    }
  }
}
