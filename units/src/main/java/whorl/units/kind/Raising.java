package whorl.units.kind;

import java.math.BigInteger;
import java.util.Optional;
import java.util.Set;
import whorl.units.Dimension;
import whorl.units.Rational;

/** Powers and roots with an exponent known before run time. */
final class Raising {
  /** Fourth roots arise in specific speeds, cube roots in diameters; others in empirical fits. */
  private static final BigInteger HIGHEST_ROOT = BigInteger.valueOf(4);

  private static final BigInteger HIGHEST_POWER = BigInteger.valueOf(100);
  private static final Kind LENGTH = Kind.named("length");

  private Raising() {}

  /** Why a quantity must not be raised to a power, if it must not. */
  static Optional<Refusal> refusal(Readings base, Rational exponent) {
    return isUsual(exponent) || base.all(reading -> reading.kind().isNumber())
        ? Optional.empty()
        : Optional.of(new Refusal.FractionalPower(base, exponent));
  }

  /**
   * The readings of a power.
   *
   * @param exponent positive, and not refused for the base
   */
  static Readings power(Readings base, Rational exponent) {
    if (!isUsual(exponent)) {
      return Readings.NUMBER;
    }
    int numerator = exponent.numerator().intValueExact();
    int degree = exponent.denominator().intValueExact();
    if (degree == 1) {
      return power(base, numerator);
    }
    Readings powerOfRoot = power(root(base, degree), numerator);
    return powerOfRoot.isUntagged() ? root(power(base, numerator), degree) : powerOfRoot;
  }

  private static boolean isUsual(Rational exponent) {
    return exponent.denominator().compareTo(HIGHEST_ROOT) <= 0
        && exponent.numerator().abs().compareTo(HIGHEST_POWER) <= 0;
  }

  private static Readings power(Readings base, int exponent) {
    return new Readings(
        base.dimension().power(Rational.of(exponent)),
        Combination.power(base.readings(), exponent));
  }

  private static Readings root(Readings radicand, int degree) {
    if (degree == 4) {
      return root(root(radicand, 2), 2);
    }
    Dimension dimension = radicand.dimension().power(Rational.of(1, degree));
    Set<Reading> found = Combination.root(radicand.readings(), degree);
    // Whatever kind of quantity a cube of a length is, as T/τ for a shaft: its root is a length.
    boolean unnamed = found.isEmpty() && !radicand.isUntagged();
    return unnamed && dimension.equals(LENGTH.dimension())
        ? Readings.of(LENGTH)
        : new Readings(dimension, found);
  }
}
