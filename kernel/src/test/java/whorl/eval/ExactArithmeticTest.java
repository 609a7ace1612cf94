package whorl.eval;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.eval.Written.ANYWHERE;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Operation.Factor;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.Real;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Term;
import whorl.units.Rational;

/**
 * Formulas of sums, products, quotients and whole powers of small fractions, against exact
 * fractions. How far a double may be off follows from the rounding of each operation, half a unit
 * in the last place, carried through the formula (running error analysis: N. J. Higham, Accuracy
 * and Stability of Numerical Algorithms, 2nd edition, section 3.3; from memory).
 */
class ExactArithmeticTest {
  private static final double HALF_ULP = 0x1p-53;

  /** Sizes outside are left to other tests: their squares leave the range of a double. */
  private static final double LARGEST = 1e100;

  /**
   * A formula, its exact value and how far its double may be off. The bound is itself worked out in
   * doubles, in fewer than 1,000 operations, so that a part in 10⁹ covers their rounding.
   */
  private record Known(Real tree, Rational exact, double off) {
    double size() {
      return Math.abs(exact.doubleValue());
    }

    /** This with another tree, one rounding behind. */
    static Known rounded(Real tree, Rational exact, double off) {
      double size = Math.abs(exact.doubleValue());
      return new Known(tree, exact, (off + HALF_ULP * (size + off)) * (1 + 1e-9));
    }

    Known plus(Known other, boolean subtracted) {
      return rounded(
          tree, subtracted ? exact.minus(other.exact) : exact.plus(other.exact), off + other.off);
    }

    Known times(Known other) {
      return rounded(
          tree,
          exact.times(other.exact),
          size() * other.off + other.size() * off + off * other.off);
    }

    boolean canDivide() {
      return size() > 2 * off;
    }

    Known over(Known divisor) {
      Rational quotient = exact.dividedBy(divisor.exact);
      double size = Math.abs(quotient.doubleValue());
      return rounded(tree, quotient, (off + size * divisor.off) / (divisor.size() - divisor.off));
    }

    Known written(Real as) {
      return new Known(as, exact, off);
    }

    boolean isUsual() {
      return exact.isZero() ? off < 1 : size() < LARGEST && size() > 1 / LARGEST;
    }
  }

  private static final Known ONE = new Known(Written.constant(1), Rational.ONE, 0);

  /** Draws formulas; empty where a formula has no value or might have none. */
  private record Draw(SplittableRandom random) {
    Optional<Known> formula(int depth) {
      if (depth == 0) {
        return Optional.of(fraction());
      }
      return switch (random.nextInt(4)) {
        case 0 -> sum(depth);
        case 1, 2 -> product(depth);
        default -> power(depth);
      };
    }

    private Known fraction() {
      Rational value = Rational.of(random.nextInt(-9, 10), random.nextInt(1, 10));
      return Known.rounded(Written.constant(value.doubleValue()), value, 0);
    }

    private Optional<List<Known>> some(int depth) {
      List<Known> list = new ArrayList<>();
      int count = 2 + random.nextInt(2);
      for (int i = 0; i < count; i++) {
        Optional<Known> each = formula(random.nextInt(depth));
        if (each.isEmpty()) {
          return Optional.empty();
        }
        list.add(each.get());
      }
      return Optional.of(list);
    }

    private Optional<Known> sum(int depth) {
      return some(depth).map(this::sum).filter(Known::isUsual);
    }

    private Known sum(List<Known> values) {
      Known sum = values.get(0);
      List<Term> terms = new ArrayList<>(List.of(new Term(false, sum.tree())));
      for (Known value : values.subList(1, values.size())) {
        boolean subtracted = random.nextBoolean();
        terms.add(new Term(subtracted, value.tree()));
        sum = sum.plus(value, subtracted);
      }
      return sum.written(new Sum(ANYWHERE, terms));
    }

    private Optional<Known> product(int depth) {
      return some(depth).map(this::product).filter(Known::isUsual);
    }

    private Known product(List<Known> values) {
      Known product = values.get(0);
      List<Factor> factors = new ArrayList<>(List.of(new Factor(false, product.tree())));
      for (Known value : values.subList(1, values.size())) {
        boolean divisor = random.nextBoolean() && value.canDivide();
        factors.add(new Factor(divisor, value.tree()));
        product = divisor ? product.over(value) : product.times(value);
      }
      return product.written(new Product(ANYWHERE, factors));
    }

    private Optional<Known> power(int depth) {
      int exponent = random.nextInt(-4, 9);
      return formula(random.nextInt(depth))
          .filter(base -> exponent >= 0 || base.canDivide())
          .map(base -> power(base, exponent))
          .filter(Known::isUsual);
    }

    private static Known power(Known base, int exponent) {
      Known product = multiplied(base, Math.abs(exponent));
      Known power = exponent < 0 ? ONE.over(product) : product;
      return power.written(new Power(ANYWHERE, base.tree(), exponent));
    }

    private static Known multiplied(Known base, int n) {
      if (n == 0) {
        return ONE;
      }
      Known half = multiplied(base, n / 2);
      Known square = n == 1 ? ONE : half.times(half);
      return n % 2 == 0 ? square : n == 1 ? base : square.times(base);
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aResultIsOffByNoMoreThanItsRoundings(long seed) {
    Draw draw = new Draw(new SplittableRandom(seed));
    for (int i = 0; i < 100; i++) {
      draw.formula(5).ifPresent(ExactArithmeticTest::assertWithinRounding);
    }
  }

  static LongStream seeds() {
    return LongStream.range(0, 20);
  }

  private static void assertWithinRounding(Known formula) {
    Outcome outcome = ScalarEvaluator.of(formula.tree()).evaluate(new double[0]);
    double value = ((Value.Real) ((Outcome.Done) outcome).value()).value();
    Rational off = Rational.of(new BigDecimal(value)).minus(formula.exact());
    Rational allowed = Rational.of(new BigDecimal(formula.off()));

    assertTrue(
        off.compareTo(allowed) <= 0 && off.negate().compareTo(allowed) <= 0,
        () -> value + " is off by " + off.doubleValue() + ", allowed are " + formula.off());
  }

  @Test
  void mostFormulasDrawnHaveAValue() {
    Draw draw = new Draw(new SplittableRandom(0));

    assertTrue(LongStream.range(0, 1000).filter(i -> draw.formula(5).isPresent()).count() > 700);
  }
}
