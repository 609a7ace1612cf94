package whorl.check;

import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.Printer;
import whorl.units.Rational;
import whorl.units.kind.Powered;

/**
 * The factors of a product as the kind algebra judges them: nested products and integer powers
 * taken apart, each factor with a key that is equal for equal text.
 */
final class KindFactors {
  private final List<Powered> factors = new ArrayList<>();

  /** Adds an expression to a power. */
  void add(Expr expr, Typed typed, Rational exponent) {
    factors.addAll(of(expr, typed, exponent));
  }

  /** Starts again from one factor that stands for all so far. */
  void restart(Span span, Typed typed) {
    factors.clear();
    factors.add(new Powered(span, typed.operand(), Rational.ONE));
  }

  List<Powered> list() {
    return List.copyOf(factors);
  }

  /** The factors of an expression to a power. */
  static List<Powered> of(Expr expr, Typed typed, Rational exponent) {
    if (typed.factors().isEmpty() || !exponent.isInteger()) {
      return List.of(new Powered(Printer.expression(expr), typed.operand(), exponent));
    }
    return typed.factors().stream()
        .map(
            factor ->
                new Powered(factor.key(), factor.operand(), factor.exponent().times(exponent)))
        .toList();
  }
}
