package whorl.eval;

import java.util.Arrays;
import java.util.List;
import whorl.check.Operation;
import whorl.check.Operation.Binary;
import whorl.check.Operation.BinaryFunction;
import whorl.check.Operation.Body;
import whorl.check.Operation.Call;
import whorl.check.Operation.Comparison;
import whorl.check.Operation.Constant;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Input;
import whorl.check.Operation.Parts;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.Real;
import whorl.check.Operation.Relation;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Term;
import whorl.check.Operation.Truth;
import whorl.check.Operation.Unary;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Operation.VariablePower;
import whorl.check.Operation.Vector;
import whorl.diagnostic.Span;

/**
 * Trees for tests. Where a test asks for the part at fault, its nodes take their spans from a
 * formula as it would be written; elsewhere all share one.
 *
 * @param text the formula
 */
record Written(String text) {
  /** The span of nodes whose place does not matter. */
  static final Span ANYWHERE = new Span(0, 0);

  /** The whole formula. */
  Span all() {
    return new Span(0, text.length());
  }

  /** The first place of a part of the formula. */
  Span at(String part) {
    int start = text.indexOf(part);
    return new Span(start, start + part.length());
  }

  /** The input in a slot, written as {@code name}. */
  Real input(String name, int slot) {
    return new Input(at(name), slot);
  }

  static Real constant(double value) {
    return new Constant(ANYWHERE, value);
  }

  static Real input(int slot) {
    return new Input(ANYWHERE, slot);
  }

  static Real sum(Real first, Real... others) {
    return new Sum(ANYWHERE, terms(first, others));
  }

  static Real difference(Real left, Real right) {
    return new Sum(ANYWHERE, List.of(new Term(false, left), new Term(true, right)));
  }

  static List<Term> terms(Real first, Real... others) {
    Term[] terms = new Term[others.length + 1];
    terms[0] = new Term(false, first);
    for (int i = 0; i < others.length; i++) {
      terms[i + 1] = new Term(false, others[i]);
    }
    return List.of(terms);
  }

  static Real product(Real... factors) {
    return new Product(
        ANYWHERE, Arrays.stream(factors).map(factor -> new Factor(false, factor)).toList());
  }

  static Real quotient(Real dividend, Real divisor) {
    return new Product(ANYWHERE, over(dividend, divisor));
  }

  static List<Factor> over(Real dividend, Real divisor) {
    return List.of(new Factor(false, dividend), new Factor(true, divisor));
  }

  static Real power(Real base, double exponent) {
    return new Power(ANYWHERE, base, exponent);
  }

  static Real power(Real base, Real exponent) {
    return new VariablePower(ANYWHERE, base, exponent);
  }

  static Real unary(UnaryFunction function, Real operand) {
    return new Unary(ANYWHERE, function, operand);
  }

  static Real binary(BinaryFunction function, Real first, Real second) {
    return new Binary(ANYWHERE, function, first, second);
  }

  static Vector parts(Real x, Real y, Real z) {
    return new Parts(ANYWHERE, x, y, z);
  }

  static Truth less(Real left, Real right) {
    return new Comparison(ANYWHERE, left, Relation.LESS, right);
  }

  static Real call(Body callee, Operation... arguments) {
    return new Call(ANYWHERE, callee, List.of(arguments));
  }
}
