package whorl.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.params.provider.Arguments.arguments;
import static whorl.eval.Written.ANYWHERE;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Operation;
import whorl.check.Operation.AllOf;
import whorl.check.Operation.AngleBetween;
import whorl.check.Operation.AnyOf;
import whorl.check.Operation.Axis;
import whorl.check.Operation.BinaryFunction;
import whorl.check.Operation.Body;
import whorl.check.Operation.Choice;
import whorl.check.Operation.Comparison;
import whorl.check.Operation.Cross;
import whorl.check.Operation.Direction;
import whorl.check.Operation.Dot;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Magnitude;
import whorl.check.Operation.Negation;
import whorl.check.Operation.Part;
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
import whorl.check.Operation.Vector;
import whorl.check.Operation.VectorCall;
import whorl.check.Operation.VectorChoice;
import whorl.check.Operation.VectorInput;
import whorl.check.Operation.VectorNegation;
import whorl.check.Operation.VectorSum;
import whorl.check.Operation.VectorTerm;
import whorl.eval.NumericFailure.Reason;

class ScalarEvaluatorTest {
  private static final Real FAILS = Written.quotient(Written.constant(1), Written.constant(0));

  @Test
  void termsAndFactorsAreTakenFromLeftToRight() {
    Real left =
        new Sum(
            ANYWHERE,
            List.of(
                new Term(true, Written.constant(1)),
                new Term(false, Written.constant(1e16)),
                new Term(true, Written.constant(1e16))));

    // (-1 + 1e16) - 1e16, where the double next below 1e16 is 1e16 - 2 and the tie goes to 1e16.
    assertReal(-1 + 1e16 - 1e16, left);
    assertReal(
        6.0 / 4 * 3,
        new Operation.Product(
            ANYWHERE,
            List.of(
                new Factor(false, Written.constant(6)),
                new Factor(true, Written.constant(4)),
                new Factor(false, Written.constant(3)))));
  }

  @ParameterizedTest
  @CsvSource({
    "SQRT, 2, 1.4142135623730951",
    "CBRT, -27, -3",
    "EXP, 1, 2.718281828459045",
    "LN, 10, 2.302585092994046",
    "LOG10, 1000, 3",
    "SIN, 0.5235987755982988, 0.49999999999999994",
    "COS, 0, 1",
    "TAN, 0.7853981633974483, 0.9999999999999999",
    "ASIN, 1, 1.5707963267948966",
    "ACOS, -1, 3.141592653589793",
    "ATAN, 1, 0.7853981633974483",
    "ABS, -2.5, 2.5",
    "FLOOR, -2.5, -3",
    "CEIL, -2.5, -2",
    "ROUND, 2.5, 3",
    "ROUND, -2.5, -3",
    "ROUND, 0.49999999999999994, 0",
    "ROUND, 4503599627370497, 4503599627370497"
  })
  void functionsAtHandGiveTheirValue(UnaryFunction function, double operand, double value) {
    assertReal(value, Written.unary(function, Written.constant(operand)));
  }

  @ParameterizedTest
  @CsvSource({"1", "2", "3", "4"})
  void anArcTakesAnArgumentAFewUlpsBeyondOneAsOne(int ulps) {
    double beyond = 1 + ulps * Math.ulp(1.0);

    assertReal(Math.PI / 2, Written.unary(UnaryFunction.ASIN, Written.constant(beyond)));
    assertReal(Math.PI, Written.unary(UnaryFunction.ACOS, Written.constant(-beyond)));
  }

  @ParameterizedTest
  @CsvSource({
    "ATAN2, 1, -1, 2.356194490192345",
    "ATAN2, 0, -1, 3.141592653589793",
    "MIN, 2, -3, -3",
    "MAX, 2, -3, 2"
  })
  void functionsOfTwoNumbersGiveTheirValue(
      BinaryFunction function, double first, double second, double value) {
    assertReal(value, Written.binary(function, Written.constant(first), Written.constant(second)));
  }

  @ParameterizedTest
  @CsvSource({
    "3, 2, 9",
    "-2, 3, -8",
    "2, -2, 0.25",
    "-2, -3, -0.125",
    "0, 0, 1",
    "0, 3, 0",
    "9, 0.5, 3",
    "4, 1.5, 8",
    "-2, 9, -512",
    "-2, 10, 1024",
    "1e200, -2, 0",
    "2, 0.3333333333333333, 1.2599210498948732"
  })
  void powersGiveTheirValueHoweverTheExponentIsGiven(double base, double exponent, double value) {
    assertReal(value, Written.power(Written.constant(base), exponent));
    assertReal(value, Written.power(Written.constant(base), Written.constant(exponent)));
  }

  @Test
  void aSmallWholePowerIsTheProductAsWritten() {
    double x = 1.1;

    assertReal(x * x, Written.power(Written.constant(x), 2));
    assertReal(x * x * x, Written.power(Written.constant(x), 3));
    assertReal(1 / (x * x), Written.power(Written.constant(x), -2));
  }

  @Test
  void aNumberTooSmallForADoubleIsZero() {
    assertReal(0, Written.product(Written.constant(1e-200), Written.constant(1e-200)));
    assertReal(0, Written.unary(UnaryFunction.EXP, Written.constant(-1000)));
  }

  @Test
  void onlyTheBranchTakenIsWorkedOut() {
    Truth yes = new TruthConstant(ANYWHERE, true);
    Truth no = new TruthConstant(ANYWHERE, false);
    Vector noVector = new Direction(ANYWHERE, vector(0, 0, 0));
    Truth noTruth = Written.less(FAILS, FAILS);

    assertReal(1, new Choice(ANYWHERE, yes, Written.constant(1), FAILS));
    assertReal(2, new Choice(ANYWHERE, no, FAILS, Written.constant(2)));
    assertVector(1, 2, 3, new VectorChoice(ANYWHERE, yes, vector(1, 2, 3), noVector));
    assertTruth(true, new TruthChoice(ANYWHERE, no, noTruth, yes));
  }

  @Test
  void conditionsBehindOneThatDecidesAreNotWorkedOut() {
    Truth yes = new TruthConstant(ANYWHERE, true);
    Truth no = new TruthConstant(ANYWHERE, false);
    Truth fails = Written.less(FAILS, FAILS);

    assertTruth(false, new AllOf(ANYWHERE, List.of(yes, no, fails)));
    assertTruth(true, new AnyOf(ANYWHERE, List.of(no, yes, fails)));
    assertTruth(true, new AllOf(ANYWHERE, List.of(yes, yes)));
    assertTruth(false, new AnyOf(ANYWHERE, List.of(no, no)));
    assertEquals(Reason.DIVISION_BY_ZERO, reason(new AllOf(ANYWHERE, List.of(yes, fails, no))));
  }

  @ParameterizedTest
  @CsvSource({
    "LESS, true, false, false",
    "AT_MOST, true, true, false",
    "MORE, false, false, true",
    "AT_LEAST, false, true, true"
  })
  void numbersAreCompared(Relation relation, boolean oneTwo, boolean oneOne, boolean twoOne) {
    assertTruth(oneTwo, comparison(1, relation, 2));
    assertTruth(oneOne, comparison(1, relation, 1));
    assertTruth(twoOne, comparison(2, relation, 1));
  }

  private static Truth comparison(double left, Relation relation, double right) {
    return new Comparison(ANYWHERE, Written.constant(left), relation, Written.constant(right));
  }

  @Test
  void vectorsAreWorkedOutPartByPart() {
    Vector a = vector(1, 2, 3);
    Vector b = vector(-4, 5, 6);

    assertVector(-1, -2, -3, new VectorNegation(ANYWHERE, a));
    assertVector(
        5,
        -3,
        -3,
        new VectorSum(ANYWHERE, List.of(new VectorTerm(false, a), new VectorTerm(true, b))));
    assertVector(
        -5,
        3,
        3,
        new VectorSum(ANYWHERE, List.of(new VectorTerm(true, a), new VectorTerm(false, b))));
    assertVector(-3, -18, 13, new Cross(ANYWHERE, a, b));
    assertReal(24, new Dot(ANYWHERE, a, b));
    assertVector(
        1.5,
        3,
        4.5,
        new Scaled(
            ANYWHERE,
            a,
            List.of(
                new Factor(false, Written.constant(3)), new Factor(true, Written.constant(2)))));
    assertReal(2, new Part(ANYWHERE, a, Axis.Y));
    assertVector(0.6, 0, 0.8, new Direction(ANYWHERE, vector(3, 0, 4)));
  }

  @ParameterizedTest
  @CsvSource({"1", "1e-200", "1e200", "4.9e-324"})
  void aMagnitudeKeepsItsDigitsAtAnySize(double size) {
    assertReal(
        Math.abs(3 * size / size) == 3 ? 5 * size : Double.NaN,
        new Magnitude(ANYWHERE, vector(3 * size, 0, 4 * size)));
  }

  @ParameterizedTest
  @MethodSource
  void anAngleBetweenVectorsKeepsItsDigits(Vector first, Vector second, double angle) {
    double value = real(new AngleBetween(ANYWHERE, first, second));

    assertEquals(angle, value, 4 * Math.ulp(angle));
  }

  static Stream<Arguments> anAngleBetweenVectorsKeepsItsDigits() {
    return Stream.of(
        arguments(vector(1, 0, 0), vector(1, 0, 0), 0.0),
        arguments(vector(1, 0, 0), vector(0, 5, 0), Math.PI / 2),
        arguments(vector(1, 0, 0), vector(-7, 0, 0), Math.PI),
        arguments(vector(1, 1e-9, 0), vector(1, 0, 0), 1e-9),
        arguments(vector(1e200, 1e200, 0), vector(1e-200, 0, 0), Math.PI / 4));
  }

  @Test
  void functionsReadTheirArgumentsInTheOrderOfTheirSlots() {
    Vector v = new VectorInput(ANYWHERE, 1);
    Truth doubled = new TruthInput(ANYWHERE, 4);
    Real magnitude = new Magnitude(ANYWHERE, v);
    Body body =
        new Body(
            "f",
            new Choice(
                ANYWHERE,
                doubled,
                Written.product(Written.input(0), magnitude),
                new Negation(ANYWHERE, Written.input(0))),
            5);

    assertReal(10, call(body, true));
    assertReal(-2, call(body, false));
  }

  private static Real call(Body body, boolean truth) {
    return Written.call(
        body, Written.constant(2), vector(3, 0, 4), new TruthConstant(ANYWHERE, truth));
  }

  @Test
  void functionsGiveVectorsAndTruthValues() {
    Body turned = new Body("turned", new VectorNegation(ANYWHERE, new VectorInput(ANYWHERE, 0)), 3);
    Body positive = new Body("positive", Written.less(Written.constant(0), Written.input(0)), 1);

    assertVector(-1, -2, -3, new VectorCall(ANYWHERE, turned, List.of(vector(1, 2, 3))));
    assertTruth(true, new TruthCall(ANYWHERE, positive, List.of(Written.constant(1))));
  }

  @Test
  void aThousandFunctionsInAChainAreWorkedOut() {
    assertReal(1000, Written.call(chain(1000), Written.constant(0)));
  }

  @Test
  void functionsThatNestTooDeepAreRefused() {
    assertEquals(Reason.TOO_DEEP, reason(Written.call(chain(5000), Written.constant(0))));
  }

  /** f1(x) = x + 1, f2(x) = f1(x) + 1, ... */
  private static Body chain(int length) {
    Body last = new Body("f", Written.sum(Written.input(0), Written.constant(1)), 1);
    for (int i = 1; i < length; i++) {
      last =
          new Body("f", Written.sum(Written.call(last, Written.input(0)), Written.constant(1)), 1);
    }
    return last;
  }

  @Test
  void workThatDoublesWithEveryFunctionIsEnded() {
    Operation tree = Written.call(doubling(200), Written.constant(0));

    Outcome outcome = ScalarEvaluator.of(tree).evaluate(new double[0], 100_000);

    NumericFailure failure = ((Outcome.Failed) outcome).failure();
    assertEquals(Reason.TOO_LONG, failure.reason());
    assertTrue(failure.operand() < 101_000, "ended after " + failure.operand());
  }

  /** f1(x) = x + x, f2(x) = f1(x + 1) + f1(x), ... */
  private static Body doubling(int length) {
    Body last = new Body("f", Written.sum(Written.input(0), Written.input(0)), 1);
    for (int i = 1; i < length; i++) {
      Real next = Written.sum(Written.input(0), Written.constant(1));
      last =
          new Body(
              "f", Written.sum(Written.call(last, next), Written.call(last, Written.input(0))), 1);
    }
    return last;
  }

  @Test
  void anInterruptEndsALongEvaluation() throws InterruptedException {
    ScalarEvaluator evaluator =
        ScalarEvaluator.of(Written.call(doubling(200), Written.constant(0)));
    Outcome[] outcome = new Outcome[1];
    Thread thread =
        new Thread(() -> outcome[0] = evaluator.evaluate(new double[0], Long.MAX_VALUE - 1));
    thread.start();
    thread.interrupt();
    thread.join();

    assertEquals(Reason.INTERRUPTED, ((Outcome.Failed) outcome[0]).failure().reason());
  }

  @Test
  void aFrameWithANumberThatIsNotFiniteIsRefused() {
    ScalarEvaluator evaluator = ScalarEvaluator.of(Written.input(0));

    assertThrows(
        IllegalArgumentException.class, () -> evaluator.evaluate(new double[] {Double.NaN}));
  }

  @Test
  void oneEvaluatorServesSeveralThreads() {
    ScalarEvaluator evaluator = ScalarEvaluator.of(Written.call(chain(20), Written.input(0)));

    assertTrue(
        IntStream.range(0, 10_000)
            .parallel()
            .allMatch(
                i ->
                    evaluator
                        .evaluate(new double[] {i})
                        .equals(new Outcome.Done(new Value.Real(i + 20.0)))));
  }

  private static Vector vector(double x, double y, double z) {
    return Written.parts(Written.constant(x), Written.constant(y), Written.constant(z));
  }

  private static Outcome outcome(Operation tree) {
    return ScalarEvaluator.of(tree).evaluate(new double[0]);
  }

  private static Reason reason(Operation tree) {
    return ((Outcome.Failed) outcome(tree)).failure().reason();
  }

  private static double real(Real tree) {
    return ((Value.Real) ((Outcome.Done) outcome(tree)).value()).value();
  }

  private static void assertReal(double expected, Real tree) {
    assertEquals(expected, real(tree));
  }

  private static void assertVector(double x, double y, double z, Vector tree) {
    assertEquals(new Outcome.Done(new Value.Vector(x, y, z)), outcome(tree));
  }

  private static void assertTruth(boolean expected, Truth tree) {
    assertEquals(new Outcome.Done(new Value.Truth(expected)), outcome(tree));
  }
}
