package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.units.Unit;

/** A checked statement. */
public sealed interface Checked {
  /** What it is worked out from. */
  Basis basis();

  /** A definition or a shown expression. */
  record Value(Basis basis, Formula formula) implements Checked {}

  /** A function; its inputs are what its body reads from the sheet. */
  record Function(Basis basis, Meaning.Function meaning, String kind) implements Checked {}

  /**
   * A motion.
   *
   * @param name what the sheet calls it
   */
  record Motion(Basis basis, String name, MotionPlan plan) implements Checked {
    /** What its name stands for. */
    public Meaning.Motion meaning() {
      var columns = new LinkedHashMap<String, Meaning.Quantity>();
      plan.columns().forEach(column -> columns.put(column.name(), column.quantity()));
      return new Meaning.Motion(name, columns);
    }

    /** Whether an equation names a state on its left side. */
    public static boolean names(MotionLine.Equation equation, String state) {
      var found = new ArrayList<Expr>();
      Expressions.walk(
          equation.rate(),
          part -> {
            if (part instanceof Expr.Name name && name.name().equals(state)) {
              found.add(part);
            }
          });
      return !found.isEmpty();
    }
  }

  /** A check or an assumption. */
  record Condition(Basis basis, Clause clause) implements Checked {}

  /**
   * A hand-worked value to be reproduced.
   *
   * @param relative whether {@code within} is a fraction of the stated value; otherwise it is of
   *     its kind
   */
  record Reproduction(Basis basis, Formula value, Formula stated, Formula within, boolean relative)
      implements Checked {}

  /** Things to be drawn. */
  record Sketch(Basis basis, List<Drawn> things) implements Checked {
    /** Copies the list. */
    public Sketch {
      things = List.copyOf(things);
    }
  }

  /**
   * Something to be drawn: a thing in space, or a vector.
   *
   * @param text what the author wrote for it
   * @param at what works out the point or axis that a vector is about; null for a free vector
   */
  record Drawn(Expr text, Formula formula, Operation.@Nullable Thing at) {}

  /** A condition taken apart into its comparisons, so that each can be shown with its numbers. */
  sealed interface Clause {
    /**
     * A comparison of two numbers.
     *
     * @param margin the unit that the margin is shown in
     */
    record Compared(Expr.Comparison text, Formula left, Formula right, Unit margin)
        implements Clause {}

    /** All must hold. */
    record All(List<Clause> clauses) implements Clause {
      /** Copies the list. */
      public All {
        clauses = List.copyOf(clauses);
      }
    }

    /** One must hold. */
    record Any(List<Clause> clauses) implements Clause {
      /** Copies the list. */
      public Any {
        clauses = List.copyOf(clauses);
      }
    }

    /** A condition with no comparison of its own, such as a name. */
    record Plain(Operation.Truth operation) implements Clause {}
  }
}
