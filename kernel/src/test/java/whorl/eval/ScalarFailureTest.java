package whorl.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Operation;
import whorl.check.Operation.AngleBetween;
import whorl.check.Operation.Binary;
import whorl.check.Operation.BinaryFunction;
import whorl.check.Operation.Body;
import whorl.check.Operation.Call;
import whorl.check.Operation.Cross;
import whorl.check.Operation.Direction;
import whorl.check.Operation.Dot;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Magnitude;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.Real;
import whorl.check.Operation.Scaled;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Unary;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Operation.VariablePower;
import whorl.check.Operation.VectorInput;
import whorl.check.Operation.VectorSum;
import whorl.check.Operation.VectorTerm;
import whorl.diagnostic.Span;
import whorl.eval.NumericFailure.Reason;

/** Every way in which a part of a formula can have no value, with the part that is named. */
class ScalarFailureTest {
  @ParameterizedTest(name = "{0} with {2}")
  @MethodSource({"divisions", "powers", "functions", "tooLarge", "vectors"})
  void theInnermostPartAtFaultIsNamedWithItsNumber(
      Written formula,
      Operation tree,
      List<Double> frame,
      Reason reason,
      String part,
      double operand) {
    Outcome outcome = ScalarEvaluator.of(tree).evaluate(numbers(frame));

    assertEquals(
        new Outcome.Failed(new NumericFailure(reason, formula.at(part), "", operand)), outcome);
  }

  static Stream<Arguments> divisions() {
    Written quotient = new Written("a / (b - c)");
    Real difference =
        new Sum(
            quotient.at("b - c"),
            List.of(
                new Operation.Term(false, quotient.input("b", 1)),
                new Operation.Term(true, quotient.input("c", 2))));
    Operation overDifference =
        new Product(quotient.all(), Written.over(quotient.input("a", 0), difference));
    Written nested = new Written("1 / (1 / x)");
    Real inner =
        new Product(nested.at("1 / x"), Written.over(Written.constant(1), nested.input("x", 0)));
    Operation twice = new Product(nested.all(), Written.over(Written.constant(1), inner));
    Written leading = new Written("/ x");
    Operation reciprocal =
        new Product(leading.all(), List.of(new Factor(true, leading.input("x", 0))));
    return Stream.of(
        arguments(
            quotient,
            overDifference,
            List.of(3.0, 2.0, 2.0),
            Reason.DIVISION_BY_ZERO,
            "b - c",
            0.0),
        arguments(
            quotient,
            overDifference,
            List.of(0.0, 2.0, 2.0),
            Reason.DIVISION_BY_ZERO,
            "b - c",
            0.0),
        arguments(
            quotient,
            overDifference,
            List.of(1e300, 1e-300, 0.0),
            Reason.OVERFLOW,
            "a / (b - c)",
            1e-300),
        arguments(nested, twice, List.of(0.0), Reason.DIVISION_BY_ZERO, "x", 0.0),
        arguments(nested, twice, List.of(-0.0), Reason.DIVISION_BY_ZERO, "x", -0.0),
        arguments(nested, twice, List.of(1e-310), Reason.OVERFLOW, "1 / x", 1e-310),
        arguments(leading, reciprocal, List.of(0.0), Reason.DIVISION_BY_ZERO, "x", 0.0));
  }

  static Stream<Arguments> powers() {
    return Stream.of(
        power(-2, 0.5, Reason.ROOT_OF_NEGATIVE, "x"),
        power(-8, 1.0 / 3, Reason.ROOT_OF_NEGATIVE, "x"),
        power(-8, -1.5, Reason.ROOT_OF_NEGATIVE, "x"),
        power(0, -2, Reason.ZERO_TO_NEGATIVE_POWER, "x"),
        power(0, -0.5, Reason.ZERO_TO_NEGATIVE_POWER, "x"),
        power(0, -1.0 / 3, Reason.ZERO_TO_NEGATIVE_POWER, "x"),
        power(1e200, 2, Reason.OVERFLOW, "x ^ n"),
        power(-1e200, 3, Reason.OVERFLOW, "x ^ n"),
        power(1e-200, -2, Reason.OVERFLOW, "x ^ n"),
        power(10, 309, Reason.OVERFLOW, "x ^ n"),
        variablePower(-8, 1.0 / 3, Reason.ROOT_OF_NEGATIVE, "x"),
        variablePower(0, -2, Reason.ZERO_TO_NEGATIVE_POWER, "x"),
        variablePower(1e200, 2, Reason.OVERFLOW, "x ^ n"));
  }

  private static final Written POWER = new Written("x ^ n");

  private static Arguments power(double base, double exponent, Reason reason, String part) {
    Operation tree = new Power(POWER.all(), POWER.input("x", 0), exponent);
    return arguments(POWER, tree, List.of(base), reason, part, base);
  }

  private static Arguments variablePower(double base, double exponent, Reason reason, String part) {
    Operation tree = new VariablePower(POWER.all(), POWER.input("x", 0), POWER.input("n", 1));
    return arguments(POWER, tree, List.of(base, exponent), reason, part, base);
  }

  static Stream<Arguments> functions() {
    Written point = new Written("atan2(y, x)");
    Operation angle =
        new Binary(point.all(), BinaryFunction.ATAN2, point.input("y", 0), point.input("x", 1));
    return Stream.of(
        unary(UnaryFunction.SQRT, -1e-300, Reason.ROOT_OF_NEGATIVE, "x"),
        unary(UnaryFunction.LN, 0, Reason.LOGARITHM_OF_NON_POSITIVE, "x"),
        unary(UnaryFunction.LN, -1, Reason.LOGARITHM_OF_NON_POSITIVE, "x"),
        unary(UnaryFunction.LOG10, 0, Reason.LOGARITHM_OF_NON_POSITIVE, "x"),
        unary(UnaryFunction.ASIN, 1 + 5 * Math.ulp(1.0), Reason.ARC_OUT_OF_RANGE, "x"),
        unary(UnaryFunction.ACOS, -1 - 5 * Math.ulp(1.0), Reason.ARC_OUT_OF_RANGE, "x"),
        unary(UnaryFunction.EXP, 710, Reason.OVERFLOW, "f(x)"),
        arguments(point, angle, List.of(0.0, -0.0), Reason.DIRECTION_OF_ZERO, "atan2(y, x)", 0.0));
  }

  private static Arguments unary(UnaryFunction function, double x, Reason reason, String part) {
    Written formula = new Written("f(x)");
    Operation tree = new Unary(formula.all(), function, formula.input("x", 0));
    return arguments(formula, tree, List.of(x), reason, part, x);
  }

  static Stream<Arguments> tooLarge() {
    Written sum = new Written("a + b + c");
    Operation added =
        new Sum(sum.all(), Written.terms(sum.input("a", 0), sum.input("b", 1), sum.input("c", 2)));
    Written product = new Written("a * b / c");
    Operation multiplied =
        new Product(
            product.all(),
            List.of(
                new Factor(false, product.input("a", 0)),
                new Factor(false, product.input("b", 1)),
                new Factor(true, product.input("c", 2))));
    return Stream.of(
        arguments(
            sum, added, List.of(1e308, 1.5e308, -1e308), Reason.OVERFLOW, "a + b + c", 1.5e308),
        arguments(
            product,
            multiplied,
            List.of(1e200, 2e200, 1e300),
            Reason.OVERFLOW,
            "a * b / c",
            2e200));
  }

  static Stream<Arguments> vectors() {
    Written magnitude = new Written("|v|");
    Written direction = new Written("unit(v)");
    Written scaled = new Written("v / k");
    Written two = new Written("u . v");
    List<Double> huge = List.of(1.5e308, 1e308, -1e308);
    List<Double> hugeTwice = List.of(1.5e308, 1e308, -1e308, 1.5e308, 1e308, -1e308);
    List<Double> firstZero = List.of(0.0, 0.0, 0.0, 1.0, 2.0, 3.0);
    List<Double> secondZero = List.of(1.0, 2.0, 3.0, 0.0, 0.0, 0.0);
    VectorInput u = new VectorInput(two.at("u"), 0);
    VectorInput v = new VectorInput(two.at("v"), 3);
    Operation sum =
        new VectorSum(two.all(), List.of(new VectorTerm(false, u), new VectorTerm(false, v)));
    return Stream.of(
        arguments(
            magnitude,
            new Magnitude(magnitude.all(), vector(magnitude)),
            huge,
            Reason.OVERFLOW,
            "|v|",
            1.5e308),
        arguments(
            direction,
            new Direction(direction.all(), vector(direction)),
            List.of(0.0, -0.0, 0.0),
            Reason.DIRECTION_OF_ZERO,
            "v",
            0.0),
        arguments(
            direction,
            new Direction(direction.all(), vector(direction)),
            huge,
            Reason.OVERFLOW,
            "unit(v)",
            1.5e308),
        arguments(
            scaled,
            new Scaled(
                scaled.all(), vector(scaled), List.of(new Factor(true, scaled.input("k", 3)))),
            List.of(1.0, 2.0, 3.0, 0.0),
            Reason.DIVISION_BY_ZERO,
            "k",
            0.0),
        arguments(
            scaled,
            new Scaled(
                scaled.all(), vector(scaled), List.of(new Factor(true, scaled.input("k", 3)))),
            List.of(1.0, 0.0, 0.0, 1e-310),
            Reason.OVERFLOW,
            "v / k",
            1e-310),
        arguments(
            two, new AngleBetween(two.all(), u, v), firstZero, Reason.DIRECTION_OF_ZERO, "u", 0.0),
        arguments(
            two, new AngleBetween(two.all(), u, v), secondZero, Reason.DIRECTION_OF_ZERO, "v", 0.0),
        arguments(two, new Dot(two.all(), u, v), hugeTwice, Reason.OVERFLOW, "u . v", 1.5e308),
        arguments(two, new Cross(two.all(), u, v), hugeTwice, Reason.OVERFLOW, "u . v", 1.5e308),
        arguments(two, sum, hugeTwice, Reason.OVERFLOW, "u . v", 1.5e308));
  }

  private static VectorInput vector(Written formula) {
    return new VectorInput(formula.at("v"), 0);
  }

  @Test
  void aFailureWithinAFunctionNamesTheFunction() {
    Written inner = new Written("sqrt(x)");
    Body root =
        new Body("root", new Unary(inner.all(), UnaryFunction.SQRT, inner.input("x", 0)), 1);
    Body outer = new Body("outer", Written.sum(Written.call(root, Written.input(0))), 1);
    Operation tree = new Call(new Span(40, 50), outer, List.of(Written.input(0)));

    assertEquals(
        new Outcome.Failed(new NumericFailure(Reason.ROOT_OF_NEGATIVE, inner.at("x"), "root", -4)),
        ScalarEvaluator.of(tree).evaluate(new double[] {-4}));
  }

  @Test
  void anArgumentThatTheFunctionDoesNotReadMustHaveAValue() {
    Written formula = new Written("f(a, 1 / b)");
    Body first = new Body("f", Written.input(0), 2);
    Real quotient =
        new Product(formula.at("1 / b"), Written.over(Written.constant(1), formula.input("b", 1)));
    Operation tree = new Call(formula.all(), first, List.of(formula.input("a", 0), quotient));

    assertEquals(
        new Outcome.Failed(new NumericFailure(Reason.DIVISION_BY_ZERO, formula.at("b"), "", 0)),
        ScalarEvaluator.of(tree).evaluate(new double[] {5, 0}));
  }

  private static double[] numbers(List<Double> frame) {
    return frame.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
