package whorl.check;

import java.util.LinkedHashSet;
import java.util.Set;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Statement;

/**
 * The names that a statement takes from the sheet, in order of first mention: not its parameters
 * and not the constants. Functions at hand are among them, since a sheet may define one of its own.
 */
public final class FreeNames {
  private FreeNames() {}

  /** The names of the sheet that a statement uses. */
  public static Set<String> in(Statement statement) {
    var names = new LinkedHashSet<String>();
    for (Expr expr : Expressions.of(statement)) {
      Expressions.walk(expr, part -> collect(part, names));
    }
    if (statement instanceof Statement.Function function) {
      function.parameters().forEach(parameter -> names.remove(parameter.name().name()));
    }
    if (statement instanceof Statement.Motion motion) {
      names.removeAll(ownNames(motion));
    }
    return names;
  }

  /** The names that mean something in a motion only: its states and its locals. */
  private static Set<String> ownNames(Statement.Motion motion) {
    var names = new LinkedHashSet<String>();
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Start start) {
        names.add(start.state().name());
      } else if (line instanceof MotionLine.Local local) {
        names.add(local.name().name());
      } else if (line instanceof MotionLine.Equation equation) {
        Expressions.walk(
            equation.rate(),
            part -> {
              if (part instanceof Expr.Rate rate && rate.of() instanceof Expr.Name name) {
                names.add(name.name());
              }
            });
      }
    }
    return names;
  }

  private static void collect(Expr expr, Set<String> names) {
    if (expr instanceof Expr.Name name && ConstantAtHand.named(name.name()).isEmpty()) {
      names.add(name.name());
    }
    if (expr instanceof Expr.Call call) {
      names.add(call.function().name());
    }
  }
}
