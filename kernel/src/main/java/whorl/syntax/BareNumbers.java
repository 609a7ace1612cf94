package whorl.syntax;

/**
 * Which values are made of bare numbers alone, so that a unit behind them would be taken for
 * theirs.
 */
final class BareNumbers {
  private static final String PI = "π";

  private BareNumbers() {}

  /** Whether a value is made of bare numbers by signs, powers, products and sums. */
  static boolean isPlain(Expr value) {
    return isBare(value, false);
  }

  /** The same for a value that may also use pi, be a vector, or carry a tolerance. */
  static boolean isInput(Expr value) {
    if (value instanceof Expr.Vector vector) {
      return isInput(vector.x()) && isInput(vector.y()) && isInput(vector.z());
    }
    if (value instanceof Expr.Tolerance tolerance) {
      return isInput(tolerance.value()) && isInput(tolerance.half());
    }
    return isBare(value, true);
  }

  private static boolean isBare(Expr value, boolean withPi) {
    if (value instanceof Expr.Numeral number) {
      return number.unit() == null;
    }
    if (value instanceof Expr.Name name) {
      return withPi && name.name().equals(PI);
    }
    if (value instanceof Expr.Negation negation) {
      return isBare(negation.operand(), withPi);
    }
    if (value instanceof Expr.Power power) {
      return isBare(power.base(), withPi) && isBare(power.exponent(), withPi);
    }
    if (value instanceof Expr.Product product) {
      return product.factors().stream().allMatch(factor -> isBare(factor.value(), withPi));
    }
    return value instanceof Expr.Sum sum
        && sum.terms().stream().allMatch(term -> isBare(term.value(), withPi));
  }
}
