package whorl.units.kind;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import whorl.units.Rational;

/**
 * A product that is of a kind wanted and differs from the one written in one place only: likely
 * what the author meant.
 *
 * @param slip what was wrong
 * @param factor the text of the factor that differs; of all where the whole differs
 * @param formula the product put right
 */
record Repair(Slip slip, String factor, String formula) {

  /** What can be wrong with one factor of a product. */
  enum Slip {
    UPSIDE_DOWN,
    ROOT,
    EXPONENT,
    HIGH_EXPONENT,
    WRONG_SIDE,
    TOO_MANY
  }

  /** No place: without one of two factors no product is left. */
  private static final List<Integer> NONE = List.of();

  private record Attempt(Slip slip, String factor, List<Powered> factors) {}

  /** The first repair that makes a product of one of some kinds. */
  static Optional<Repair> of(List<Powered> factors, List<Kind> wanted) {
    if (factors.isEmpty()) {
      return Optional.empty();
    }
    boolean numbers = wanted.stream().anyMatch(kind -> kind.dimension().isOne());
    if (!numbers
        && operand(factors).filter(o -> isOf(KindAlgebra.root(o, 2), wanted)).isPresent()) {
      String whole = FactorText.product(factors);
      return Optional.of(new Repair(Slip.ROOT, whole, "sqrt(" + whole + ")"));
    }
    return attempts(factors).stream()
        .filter(attempt -> attempt.slip() != Slip.UPSIDE_DOWN || !numbers)
        .filter(attempt -> isOf(KindAlgebra.product(attempt.factors()), wanted))
        .map(a -> new Repair(a.slip(), a.factor(), FactorText.product(a.factors())))
        .findFirst();
  }

  private static List<Attempt> attempts(List<Powered> factors) {
    List<Attempt> attempts = new ArrayList<>();
    attempts.add(new Attempt(Slip.UPSIDE_DOWN, FactorText.product(factors), reciprocal(factors)));
    for (Slip slip : List.of(Slip.EXPONENT, Slip.HIGH_EXPONENT, Slip.WRONG_SIDE, Slip.TOO_MANY)) {
      List<Integer> quantities = lowestFirst(factors);
      for (int index : slip == Slip.TOO_MANY && quantities.size() < 3 ? NONE : quantities) {
        Powered factor = factors.get(index);
        for (Rational exponent : exponents(slip, factor.exponent())) {
          attempts.add(
              new Attempt(slip, factor.key().toString(), replaced(factors, index, exponent)));
        }
      }
    }
    return attempts;
  }

  private static List<Powered> reciprocal(List<Powered> factors) {
    return factors.stream().map(factor -> with(factor, factor.exponent().negate())).toList();
  }

  /** Where the quantities stand, those below the fraction bar first. */
  private static List<Integer> lowestFirst(List<Powered> factors) {
    return IntStream.range(0, factors.size())
        .boxed()
        .filter(i -> !factors.get(i).operand().readings().all(r -> r.kind().isNumber()))
        .sorted(Comparator.comparingInt(i -> factors.get(i).exponent().signum()))
        .toList();
  }

  /** The exponents that may be meant in place of one. */
  private static List<Rational> exponents(Slip slip, Rational written) {
    Rational step = Rational.of(written.signum());
    return switch (slip) {
      case UPSIDE_DOWN, ROOT -> List.of();
      case EXPONENT -> List.of(written.equals(step) ? step.plus(step) : written.minus(step));
      case HIGH_EXPONENT -> written.equals(step) ? List.of() : List.of(written.plus(step));
      case WRONG_SIDE -> List.of(written.negate());
      case TOO_MANY -> List.of(Rational.ZERO);
    };
  }

  private static List<Powered> replaced(List<Powered> factors, int index, Rational exponent) {
    List<Powered> replaced = new ArrayList<>(factors);
    replaced.set(index, with(factors.get(index), exponent));
    replaced.removeIf(factor -> factor.exponent().isZero());
    return List.copyOf(replaced);
  }

  private static Powered with(Powered factor, Rational exponent) {
    return new Powered(factor.key(), factor.operand(), exponent);
  }

  private static Optional<Operand> operand(List<Powered> factors) {
    return KindAlgebra.product(factors) instanceof Judgement.Accepted accepted
        ? Optional.of(accepted.operand())
        : Optional.empty();
  }

  /** Whether a judgement leaves a quantity of one of some kinds. */
  static boolean isOf(Judgement judgement, List<Kind> wanted) {
    return judgement instanceof Judgement.Accepted accepted
        && !accepted.operand().readings().isUntagged()
        && wanted.stream().anyMatch(accepted.operand().readings()::canBe);
  }
}
