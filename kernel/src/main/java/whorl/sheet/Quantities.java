package whorl.sheet;

import org.jspecify.annotations.Nullable;
import whorl.check.Anchor;
import whorl.check.Checked;
import whorl.check.ConstantAtHand;
import whorl.check.Formula;
import whorl.check.Reference;
import whorl.check.Type;
import whorl.eval.Value;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.UnitText;

/** Results as the sheet shows them. */
final class Quantities {
  private Quantities() {}

  /** A value of a formula. */
  static Quantity of(Formula formula, Value value) {
    return new Quantity(value, formula.unit(), formula.chosen(), formula.kind(), null);
  }

  /** The value of a constant, with all its digits. */
  static Quantity of(ConstantAtHand constant) {
    return new Quantity(
        new Value.Real(constant.value()),
        constant.unit(),
        true,
        "",
        Double.toString(constant.value()));
  }

  /** What a definition or shown expression came to, with its digits as written for an input. */
  static Quantity of(Node node, Result.Valued valued) {
    Checked.Value checked = valued.checked();
    Formula formula = checked.formula();
    return new Quantity(
        valued.seen(),
        formula.unit(),
        formula.chosen(),
        formula.kind(),
        written(node, formula),
        setting(formula.type()));
  }

  private static Setting setting(Type type) {
    Reference reference = type.about();
    Anchor frame =
        type instanceof Type.Vector vector
            ? vector.frame()
            : type instanceof Type.Tensor tensor ? tensor.frame() : null;
    return reference == null && frame == null
        ? Setting.NONE
        : new Setting(
            reference == null ? "" : reference.about().text(), frame == null ? "" : frame.text());
  }

  private static @Nullable String written(Node node, Formula formula) {
    if (!(node.statement() instanceof Statement.Definition definition)) {
      return null;
    }
    Expr value = definition.value();
    boolean negative = value instanceof Expr.Negation;
    if (value instanceof Expr.Negation negation) {
      value = negation.operand();
    }
    if (!(value instanceof Expr.Numeral numeral)) {
      return null;
    }
    UnitText shown = formula.unit().text();
    if (numeral.unit() != null && !numeral.unit().text().equals(shown)) {
      return null;
    }
    return (negative ? "-" : "") + numeral.digits();
  }
}
