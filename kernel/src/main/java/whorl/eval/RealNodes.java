package whorl.eval;

import java.util.List;
import whorl.check.Operation.AngleBetween;
import whorl.check.Operation.Binary;
import whorl.check.Operation.Call;
import whorl.check.Operation.Choice;
import whorl.check.Operation.Constant;
import whorl.check.Operation.Dot;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Input;
import whorl.check.Operation.Magnitude;
import whorl.check.Operation.Negation;
import whorl.check.Operation.Part;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.RealCases;
import whorl.check.Operation.RealUse;
import whorl.check.Operation.Reduced;
import whorl.check.Operation.RoutineCall;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Term;
import whorl.check.Operation.Unary;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Operation.VariablePower;

/** Writes scalar operations into the graph. */
final class RealNodes implements RealCases<Integer> {
  private final RowGraphWriter writer;

  RealNodes(RowGraphWriter writer) {
    this.writer = writer;
  }

  private RowGraph graph() {
    return writer.graph();
  }

  @Override
  public Integer constant(Constant constant) {
    return graph().known(constant.value());
  }

  @Override
  public Integer input(Input input) {
    return writer.slot(input.slot());
  }

  @Override
  public Integer negation(Negation negation) {
    return negated(writer.real(negation.operand()));
  }

  private int negated(int node) {
    return graph().apply(RowArithmetic.NEGATE, node);
  }

  @Override
  public Integer sum(Sum sum) {
    List<Term> terms = sum.terms();
    int first = writer.real(terms.get(0).value());
    int node = terms.get(0).subtracted() ? negated(first) : first;
    for (Term term : terms.subList(1, terms.size())) {
      node =
          graph()
              .apply(
                  term.subtracted() ? RowArithmetic.SUBTRACT : RowArithmetic.ADD,
                  node,
                  writer.real(term.value()));
    }
    return node;
  }

  @Override
  public Integer product(Product product) {
    List<Factor> factors = product.factors();
    Factor first = factors.get(0);
    int value = writer.real(first.value());
    int node = first.divisor() ? writer.applied(graph().known(1), first, value) : value;
    for (Factor factor : factors.subList(1, factors.size())) {
      node = writer.applied(node, factor, writer.real(factor.value()));
    }
    return node;
  }

  @Override
  public Integer power(Power power) {
    return power(writer.real(power.base()), power.exponent());
  }

  @Override
  public Integer variablePower(VariablePower power) {
    int base = writer.real(power.base());
    int exponent = writer.real(power.exponent());
    return graph().node(exponent) instanceof RowGraph.Known known
        ? power(base, known.value())
        : graph().apply(RowArithmetic.POWER, base, exponent);
  }

  /** As {@link Arithmetic#power}, with the multiplications written out. */
  private int power(int base, double exponent) {
    if (exponent == 0.5) {
      return graph().apply(new RowFunction(UnaryFunction.SQRT), base);
    }
    if (!Arithmetic.isMultiplied(exponent)) {
      return graph().apply(RowArithmetic.POWER, base, graph().known(exponent));
    }
    int product = multiplied(base, (int) Math.abs(exponent));
    // The product may well be infinite, the power is then 0; but the base must have a value.
    int power =
        exponent < 0
            ? graph().applyUnguarded(RowArithmetic.DIVIDE, graph().known(1), product)
            : product;
    return graph().guarded(power, base);
  }

  private int multiplied(int base, int n) {
    if (n == 0) {
      return graph().known(1);
    }
    if (n == 1) {
      return base;
    }
    int half = multiplied(base, n / 2);
    int square = graph().apply(RowArithmetic.MULTIPLY, half, half);
    return n % 2 == 0 ? square : graph().apply(RowArithmetic.MULTIPLY, square, base);
  }

  @Override
  public Integer unary(Unary unary) {
    return graph().apply(new RowFunction(unary.function()), writer.real(unary.operand()));
  }

  @Override
  public Integer binary(Binary binary) {
    int first = writer.real(binary.first());
    int second = writer.real(binary.second());
    return graph().apply(RowArithmetic.of(binary.function()), first, second);
  }

  @Override
  public Integer choice(Choice choice) {
    int condition = writer.truth(choice.condition());
    int then = writer.real(choice.then());
    return graph().select(condition, then, writer.real(choice.otherwise()));
  }

  @Override
  public Integer part(Part part) {
    VectorNode vector = writer.vector(part.vector());
    int node =
        switch (part.axis()) {
          case X -> vector.x();
          case Y -> vector.y();
          case Z -> vector.z();
        };
    for (int needed : List.of(vector.x(), vector.y(), vector.z())) {
      node = graph().guarded(node, needed);
    }
    return node;
  }

  @Override
  public Integer magnitude(Magnitude magnitude) {
    return writer.magnitude(writer.vector(magnitude.vector()));
  }

  @Override
  public Integer dot(Dot dot) {
    VectorNode first = writer.vector(dot.first());
    VectorNode second = writer.vector(dot.second());
    VectorNode products = first.with(second, (a, b) -> graph().apply(RowArithmetic.MULTIPLY, a, b));
    int two = graph().apply(RowArithmetic.ADD, products.x(), products.y());
    return graph().apply(RowArithmetic.ADD, two, products.z());
  }

  /** As {@link VectorArithmetic#angle}. */
  @Override
  public Integer angleBetween(AngleBetween angle) {
    VectorNode u = writer.direction(writer.vector(angle.first()));
    VectorNode v = writer.direction(writer.vector(angle.second()));
    int apart = writer.magnitude(u.with(v, (a, b) -> graph().apply(RowArithmetic.SUBTRACT, a, b)));
    int along = writer.magnitude(u.with(v, (a, b) -> graph().apply(RowArithmetic.ADD, a, b)));
    return graph()
        .apply(
            RowArithmetic.MULTIPLY,
            graph().known(2),
            graph().apply(RowArithmetic.ATAN2, apart, along));
  }

  @Override
  public Integer call(Call call) {
    return writer.call(call.callee(), call.arguments()).get(0);
  }

  /** Routines are called row by row: a row that does not need one must not call it. */
  @Override
  public Integer routineCall(RoutineCall call) {
    throw new RowGraphWriter.RowByRow();
  }

  /** Laws are worked out row by row, so that each row is judged by where they hold. */
  @Override
  public Integer use(RealUse use) {
    throw new RowGraphWriter.RowByRow();
  }

  /** Courses are followed row by row: a row that does not need one must not. */
  @Override
  public Integer reduced(Reduced reduced) {
    throw new RowGraphWriter.RowByRow();
  }
}
