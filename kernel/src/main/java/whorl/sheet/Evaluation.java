package whorl.sheet;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import whorl.check.Checked;
import whorl.check.CourseInput;
import whorl.check.Formula;
import whorl.check.FrameSize;
import whorl.check.Meaning;
import whorl.check.Operation;
import whorl.check.Type;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.eval.Breach;
import whorl.eval.CourseEvaluator;
import whorl.eval.MotionEvaluator;
import whorl.eval.MotionOutcome;
import whorl.eval.NumericFailure;
import whorl.eval.Outcome;
import whorl.eval.ScalarEvaluator;
import whorl.eval.Value;
import whorl.syntax.Statement;

/** Works out one checked statement with the values that its names have. */
final class Evaluation {
  private final Node node;
  private final Checked checked;
  private final Results results;
  private final double[] frame;
  private final Object[] things;
  private final Set<Lapse> lapses = new LinkedHashSet<>();

  Evaluation(Node node, Checked checked, Results results) {
    this.node = node;
    this.checked = checked;
    this.results = results;
    FrameSize size = checked.basis().frameSize();
    this.frame = new double[size.numbers()];
    this.things = new Object[size.things()];
  }

  /** What the statement comes to. */
  Result result() {
    if (checked instanceof Checked.Function function) {
      return new Result.Callable(function);
    }
    fill();
    try {
      if (checked instanceof Checked.Motion motion) {
        return followed(motion);
      } else if (checked instanceof Checked.Value value) {
        return valued(value);
      } else if (checked instanceof Checked.Condition condition) {
        Verdict verdict = verdict(condition);
        return new Result.Judged(condition, verdict, lapses());
      } else if (checked instanceof Checked.Sketch sketch) {
        return sketched(sketch);
      }
      return compared((Checked.Reproduction) checked);
    } catch (NoResult failure) {
      return new Result.Broken(failure.diagnostic, null);
    }
  }

  private List<Lapse> lapses() {
    return List.copyOf(lapses);
  }

  /** Puts the values of the names that the statement reads in their slots. */
  private void fill() {
    for (Meaning.Input input : checked.basis().inputs()) {
      int slot = input.slot();
      Value value = results.value(input.name());
      if (value instanceof Value.Real real) {
        frame[slot] = real.value();
      } else if (value instanceof Value.Vector vector) {
        frame[slot] = vector.x();
        frame[slot + 1] = vector.y();
        frame[slot + 2] = vector.z();
      } else if (value instanceof Value.Truth truth) {
        frame[slot] = truth.holds() ? 1 : 0;
      } else if (value instanceof Value.Thing thing) {
        things[slot] = thing.content();
      }
    }
  }

  private Result valued(Checked.Value checkedValue) throws NoResult {
    Formula formula = checkedValue.formula();
    if (formula.type() instanceof Type.Course) {
      List<CourseInput> courses = checked.basis().courses();
      Value course = value(CourseEvaluator.evaluate(formula.operation(), courses, frame, things));
      return new Result.Valued(checkedValue, course, course, lapses());
    }
    Value value = value(formula.operation());
    Value seen = formula.seen() == formula.operation() ? value : value(formula.seen());
    return new Result.Valued(checkedValue, value, seen, lapses());
  }

  private Result followed(Checked.Motion motion) throws NoResult {
    MotionOutcome outcome = MotionEvaluator.evaluate(motion.plan(), frame, things);
    if (outcome instanceof MotionOutcome.Ran ran) {
      note(ran.breaches());
      return new Result.Ran(motion, ran.run(), lapses());
    }
    var failed = (MotionOutcome.Failed) outcome;
    NumericFailure failure = failed.failure();
    if (failure != null && failure.reason() == NumericFailure.Reason.INTERRUPTED) {
      throw new Interruption();
    }
    throw new NoResult(RunMessages.of(failed, motion, node, results));
  }

  private void note(List<Breach> breaches) {
    for (Breach breach : breaches) {
      lapses.add(new Lapse(breach.law(), breach.condition(), breach.inFunction()));
    }
  }

  private Value value(Operation operation) throws NoResult {
    return value(ScalarEvaluator.of(operation, things).evaluate(frame));
  }

  private Value value(Outcome outcome) throws NoResult {
    if (outcome instanceof Outcome.Done done) {
      note(done.breaches());
      return done.value();
    }
    NumericFailure failure = ((Outcome.Failed) outcome).failure();
    if (failure.reason() == NumericFailure.Reason.INTERRUPTED) {
      throw new Interruption();
    }
    throw new NoResult(
        NumericMessages.of(failure, node, Givens.of(node.statement(), checked, results), results));
  }

  private double number(Formula formula) throws NoResult {
    return ((Value.Real) value(formula.operation())).value();
  }

  private Verdict verdict(Checked.Condition condition) throws NoResult {
    var comparisons = new ArrayList<Comparison>();
    boolean holds = holds(condition.clause(), comparisons);
    return new Verdict(holds, comparisons);
  }

  private boolean holds(Checked.Clause clause, List<Comparison> comparisons) throws NoResult {
    if (clause instanceof Checked.Clause.All all) {
      for (Checked.Clause part : all.clauses()) {
        if (!holds(part, comparisons)) {
          return false;
        }
      }
      return true;
    } else if (clause instanceof Checked.Clause.Any any) {
      for (Checked.Clause part : any.clauses()) {
        if (holds(part, comparisons)) {
          return true;
        }
      }
      return false;
    } else if (clause instanceof Checked.Clause.Compared compared) {
      double left = number(compared.left());
      double right = number(compared.right());
      Comparison comparison = comparison(compared, left, right);
      comparisons.add(comparison);
      return comparison.holds();
    }
    var plain = (Checked.Clause.Plain) clause;
    return ((Value.Truth) value(plain.operation())).holds();
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

  private Result compared(Checked.Reproduction reproduction) throws NoResult {
    double computed = number(reproduction.value());
    double stated = number(reproduction.stated());
    double within = number(reproduction.within());
    var statement = (Statement.Reproduction) node.statement();
    if (stated == 0) {
      throw new NoResult(SheetMessages.statedZero(statement));
    }
    double allowed = reproduction.relative() ? within : within / Math.abs(stated);
    if (allowed < 0) {
      throw new NoResult(SheetMessages.negativeDeviation(statement));
    }
    return new Result.Compared(
        reproduction,
        new Value.Real(computed),
        new Value.Real(stated),
        (computed - stated) / stated,
        allowed,
        lapses());
  }

  private Result sketched(Checked.Sketch sketch) throws NoResult {
    var values = new ArrayList<Value>();
    var places = new ArrayList<Optional<Value.Thing>>();
    for (Checked.Drawn thing : sketch.things()) {
      values.add(value(thing.formula().operation()));
      Operation at = thing.at();
      places.add(at == null ? Optional.empty() : Optional.of((Value.Thing) value(at)));
    }
    return new Result.Sketched(sketch, values, places, lapses());
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
