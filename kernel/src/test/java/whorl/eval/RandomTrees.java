package whorl.eval;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.Supplier;
import whorl.check.Operation;
import whorl.check.Operation.AllOf;
import whorl.check.Operation.AngleBetween;
import whorl.check.Operation.AnyOf;
import whorl.check.Operation.Axis;
import whorl.check.Operation.BinaryFunction;
import whorl.check.Operation.Body;
import whorl.check.Operation.Call;
import whorl.check.Operation.Choice;
import whorl.check.Operation.Comparison;
import whorl.check.Operation.Constant;
import whorl.check.Operation.Cross;
import whorl.check.Operation.Direction;
import whorl.check.Operation.Dot;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Input;
import whorl.check.Operation.Magnitude;
import whorl.check.Operation.Negation;
import whorl.check.Operation.Part;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.Real;
import whorl.check.Operation.Relation;
import whorl.check.Operation.Scaled;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Term;
import whorl.check.Operation.Truth;
import whorl.check.Operation.TruthCall;
import whorl.check.Operation.TruthChoice;
import whorl.check.Operation.TruthConstant;
import whorl.check.Operation.TruthInput;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Operation.VariablePower;
import whorl.check.Operation.Vector;
import whorl.check.Operation.VectorCall;
import whorl.check.Operation.VectorChoice;
import whorl.check.Operation.VectorInput;
import whorl.check.Operation.VectorNegation;
import whorl.check.Operation.VectorSum;
import whorl.check.Operation.VectorTerm;
import whorl.diagnostic.Span;

/**
 * Random well-formed trees of every form of operation, over a frame of {@link #REALS} numbers, then
 * one vector, then one truth value. Every node has a span of its own, so that two failures are
 * equal only if they name the same part.
 */
final class RandomTrees {
  static final int REALS = 4;
  static final int VECTOR_SLOT = REALS;
  static final int TRUTH_SLOT = REALS + 3;
  static final int FRAME_SIZE = REALS + 4;

  private final SplittableRandom random;
  private final List<Body> bodies = new ArrayList<>();
  private int spans;

  RandomTrees(long seed) {
    this.random = new SplittableRandom(seed);
    for (int i = 0; i < 3; i++) {
      bodies.add(new Body("f" + i, random.nextInt(3) == 0 ? vector(3) : real(3), FRAME_SIZE));
    }
    bodies.add(new Body("holds", truth(3), FRAME_SIZE));
  }

  private Span span() {
    return new Span(spans, ++spans);
  }

  /** A formula of any character. */
  Operation any(int depth) {
    return switch (random.nextInt(6)) {
      case 0 -> vector(depth);
      case 1 -> truth(depth);
      default -> real(depth);
    };
  }

  private <T> T oneOf(T[] values) {
    return values[random.nextInt(values.length)];
  }

  private <T> List<T> some(Supplier<T> each) {
    List<T> list = new ArrayList<>();
    int count = 1 + random.nextInt(3);
    for (int i = 0; i < count; i++) {
      list.add(each.get());
    }
    return list;
  }

  /**
   * A number such as occurs in formulas and, now and then, one at the edge of what a double holds.
   */
  double number() {
    return switch (random.nextInt(12)) {
      case 0 -> 0;
      case 1 -> -0.0;
      case 2 -> random.nextBoolean() ? 1e200 : -1e300;
      case 3 -> random.nextBoolean() ? 1e-200 : -1e-310;
      case 4, 5 -> random.nextInt(-3, 4);
      default -> random.nextDouble(-4, 4);
    };
  }

  Real real(int depth) {
    if (depth == 0 || random.nextInt(8) == 0) {
      return random.nextInt(4) == 0
          ? new Constant(span(), number())
          : new Input(span(), random.nextInt(REALS));
    }
    int below = depth - 1;
    return switch (random.nextInt(16)) {
      case 0 -> new Negation(span(), real(below));
      case 1, 2 -> new Sum(span(), some(() -> new Term(random.nextBoolean(), real(below))));
      case 3, 4, 5 -> new Product(span(), factors(below));
      case 6 -> new Power(span(), real(below), exponent());
      case 7 -> new VariablePower(span(), real(below), real(below));
      case 8, 9 -> new Operation.Unary(span(), oneOf(UnaryFunction.values()), real(below));
      case 10 ->
          new Operation.Binary(span(), oneOf(BinaryFunction.values()), real(below), real(below));
      case 11 -> new Choice(span(), truth(below), real(below), real(below));
      case 12 -> new Part(span(), vector(below), oneOf(Axis.values()));
      case 13 -> new Magnitude(span(), vector(below));
      case 14 ->
          random.nextBoolean()
              ? new Dot(span(), vector(below), vector(below))
              : new AngleBetween(span(), vector(below), vector(below));
      default -> realCall(below);
    };
  }

  private double exponent() {
    double[] exponents = {2, 3, 4, 5, 7, 8, 9, 0, 1, -1, -2, -3, 0.5, -0.5, 1.5, 1.0 / 3};
    return exponents[random.nextInt(exponents.length)];
  }

  private List<Factor> factors(int depth) {
    return some(() -> new Factor(random.nextBoolean(), real(depth)));
  }

  private List<Operation> arguments(int depth) {
    List<Operation> arguments = new ArrayList<>();
    for (int i = 0; i < REALS; i++) {
      arguments.add(real(depth / 2));
    }
    arguments.add(vector(depth / 2));
    arguments.add(truth(depth / 2));
    return arguments;
  }

  private Real realCall(int depth) {
    List<Body> callees = bodies.stream().filter(b -> b.body() instanceof Real).toList();
    return callees.isEmpty()
        ? new Negation(span(), real(depth))
        : new Call(span(), callees.get(random.nextInt(callees.size())), arguments(depth));
  }

  Vector vector(int depth) {
    if (depth == 0) {
      return new VectorInput(span(), VECTOR_SLOT);
    }
    int below = depth - 1;
    return switch (random.nextInt(9)) {
      case 0, 1 -> new Operation.Parts(span(), real(below), real(below), real(below));
      case 2 -> new VectorNegation(span(), vector(below));
      case 3 ->
          new VectorSum(span(), some(() -> new VectorTerm(random.nextBoolean(), vector(below))));
      case 4 -> new Scaled(span(), vector(below), factors(below));
      case 5 -> new Cross(span(), vector(below), vector(below));
      case 6 -> new Direction(span(), vector(below));
      case 7 -> new VectorChoice(span(), truth(below), vector(below), vector(below));
      default -> vectorCall(below);
    };
  }

  private Vector vectorCall(int depth) {
    List<Body> callees = bodies.stream().filter(b -> b.body() instanceof Vector).toList();
    return callees.isEmpty()
        ? new VectorNegation(span(), vector(depth))
        : new VectorCall(span(), callees.get(random.nextInt(callees.size())), arguments(depth));
  }

  Truth truth(int depth) {
    if (depth == 0) {
      return random.nextInt(4) == 0
          ? new TruthConstant(span(), random.nextBoolean())
          : new TruthInput(span(), TRUTH_SLOT);
    }
    int below = depth - 1;
    return switch (random.nextInt(8)) {
      case 0 -> new AllOf(span(), some(() -> truth(below)));
      case 1 -> new AnyOf(span(), some(() -> truth(below)));
      case 2 -> new TruthChoice(span(), truth(below), truth(below), truth(below));
      case 3 -> truthCall(below);
      default -> new Comparison(span(), real(below), oneOf(Relation.values()), real(below));
    };
  }

  private Truth truthCall(int depth) {
    List<Body> callees = bodies.stream().filter(b -> b.body() instanceof Truth).toList();
    return callees.isEmpty()
        ? new AllOf(span(), some(() -> truth(depth)))
        : new TruthCall(span(), callees.get(random.nextInt(callees.size())), arguments(depth));
  }
}
