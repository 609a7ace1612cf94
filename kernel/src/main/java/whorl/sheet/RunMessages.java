package whorl.sheet;

import java.util.ArrayList;
import java.util.List;
import whorl.check.Checked;
import whorl.check.MotionPlan;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.eval.MotionOutcome;
import whorl.eval.NumericFailure;
import whorl.eval.Value;
import whorl.syntax.MotionLine;
import whorl.syntax.Statement;
import whorl.units.Unit;

/** The messages about motions that could not be followed: the one place for their wording. */
final class RunMessages {
  private RunMessages() {}

  /** Why a motion has no result. */
  static Diagnostic of(
      MotionOutcome.Failed failed, Checked.Motion motion, Node node, Results results) {
    var statement = (Statement.Motion) node.statement();
    NumericFailure failure = failed.failure();
    return switch (failed.obstacle()) {
      case LIMIT ->
          Diagnostic.of(
              "no-limit", "The time limit has to be above zero.", limit(statement), "", "");
      case NO_VALUE -> {
        if (failure == null) {
          throw new IllegalStateException("a formula without a value names its part");
        }
        Diagnostic plain =
            NumericMessages.of(failure, node, Givens.of(statement, motion, results), results);
        yield failed.states().isEmpty() ? plain : behind(plain, failed, motion);
      }
      case RUNAWAY ->
          Diagnostic.of(
              "runaway",
              "The rate of "
                  + state(failed, motion)
                  + " grows without bound, so "
                  + motion.name()
                  + " cannot be followed past "
                  + time(failed)
                  + ".",
              equation(statement, state(failed, motion)),
              there(failed, motion),
              "Check the signs in its equation. If the motion is meant to end before that, say when:"
                  + " stop when …");
      case TO_AND_FRO ->
          Diagnostic.of(
              "to-and-fro",
              "A rate of " + motion.name() + " jumps to and fro from " + time(failed) + " on.",
              statement.name().span(),
              there(failed, motion),
              "Either side of an if drives the motion back to the other, as dry friction does to a"
                  + " body at rest. Stop there, or give the rate that holds in between.");
      case TOO_MANY_STEPS ->
          Diagnostic.of(
              "too-many-steps",
              motion.name() + " takes too many steps and was stopped at " + time(failed) + ".",
              statement.name().span(),
              there(failed, motion),
              "A time limit far beyond what happens, or a rate that jumps to and fro, makes many"
                  + " steps.");
    };
  }

  /** A message about a formula, with the instant of the motion at which it arose. */
  private static Diagnostic behind(
      Diagnostic plain, MotionOutcome.Failed failed, Checked.Motion motion) {
    return new Diagnostic(
        plain.code(),
        motion.name()
            + (failed.time() == 0 ? " cannot start. " : " cannot be followed past ")
            + (failed.time() == 0 ? "" : time(failed) + ". ")
            + plain.problem(),
        plain.span(),
        plain.label(),
        plain.further(),
        there(failed, motion),
        plain.fix());
  }

  private static String state(MotionOutcome.Failed failed, Checked.Motion motion) {
    return motion.plan().states().get(Math.max(0, failed.state())).name();
  }

  private static String time(MotionOutcome.Failed failed) {
    return "t = " + Digits.of(failed.time()) + " s";
  }

  /** The states at the last instant. */
  private static String there(MotionOutcome.Failed failed, Checked.Motion motion) {
    var said = new ArrayList<String>();
    List<MotionPlan.Column> columns =
        motion.plan().columns().stream().filter(MotionPlan.Column::isState).toList();
    for (int i = 0; i < Math.min(columns.size(), failed.states().size()); i++) {
      Unit unit = columns.get(i).quantity().unit();
      if (failed.states().get(i) instanceof Value.Real real) {
        String symbol = unit.symbol().equals("1") ? "" : " " + unit.symbol();
        said.add(columns.get(i).name() + " = " + Digits.of(unit.fromSi(real.value())) + symbol);
      }
    }
    return said.isEmpty() ? "" : "There " + String.join(", ", said) + ".";
  }

  private static Span limit(Statement.Motion motion) {
    return motion.lines().stream()
        .filter(MotionLine.Limit.class::isInstance)
        .map(MotionLine::span)
        .findFirst()
        .orElse(motion.name().span());
  }

  private static Span equation(Statement.Motion motion, String state) {
    return motion.lines().stream()
        .filter(
            line ->
                line instanceof MotionLine.Equation equation
                    && Checked.Motion.names(equation, state))
        .map(MotionLine::span)
        .findFirst()
        .orElse(motion.name().span());
  }
}
