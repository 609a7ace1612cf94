package whorl.units;

import java.math.BigDecimal;
import java.math.BigInteger;

/**
 * An exact fraction in lowest terms; the sign is the numerator's, zero is {@code 0/1}.
 *
 * @param numerator any integer
 * @param denominator positive in the finished value; not zero
 */
public record Rational(BigInteger numerator, BigInteger denominator)
    implements Comparable<Rational> {

  /** Zero. */
  public static final Rational ZERO = of(0);

  /** One. */
  public static final Rational ONE = of(1);

  /** Beyond this a decimal exponent is no longer a number anyone means, only a large allocation. */
  private static final int LARGEST_DECIMAL_EXPONENT = 400;

  private static final int DOUBLE_PRECISION = 53;

  /** The smallest positive double is 2 to minus this. */
  private static final int DOUBLE_SMALLEST = 1074;

  /** Brings the fraction to lowest terms with a positive denominator. */
  public Rational {
    if (denominator.signum() == 0) {
      throw new ArithmeticException("division by zero: " + numerator + "/0");
    }
    BigInteger divisor = numerator.gcd(denominator);
    if (denominator.signum() < 0) {
      divisor = divisor.negate();
    }
    if (!divisor.equals(BigInteger.ONE)) {
      numerator = numerator.divide(divisor);
      denominator = denominator.divide(divisor);
    }
  }

  /** The integer {@code value}. */
  public static Rational of(long value) {
    return new Rational(BigInteger.valueOf(value), BigInteger.ONE);
  }

  /** The fraction {@code numerator/denominator}. */
  public static Rational of(long numerator, long denominator) {
    return new Rational(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
  }

  /** The exact value of a decimal. */
  public static Rational of(BigDecimal value) {
    return value.scale() > 0
        ? new Rational(value.unscaledValue(), BigInteger.TEN.pow(value.scale()))
        : new Rational(value.toBigIntegerExact(), BigInteger.ONE);
  }

  /**
   * Reads a decimal, as {@code 1.5} or {@code 2e3}, or a fraction of two, as {@code 3/4}.
   *
   * @throws NumberFormatException if the text is neither, divides by zero, or has a decimal
   *     exponent beyond ±400
   */
  public static Rational parse(String text) {
    int slash = text.indexOf('/');
    if (slash < 0) {
      return decimal(text);
    }
    Rational denominator = decimal(text.substring(slash + 1));
    if (denominator.isZero()) {
      throw new NumberFormatException("division by zero: " + text);
    }
    return decimal(text.substring(0, slash)).dividedBy(denominator);
  }

  private static Rational decimal(String text) {
    var value = new BigDecimal(text);
    if (Math.abs((long) value.scale()) > LARGEST_DECIMAL_EXPONENT + (long) value.precision()) {
      throw new NumberFormatException("decimal exponent out of range: " + text);
    }
    return of(value);
  }

  /** The sum with another fraction. */
  public Rational plus(Rational other) {
    return new Rational(
        numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
        denominator.multiply(other.denominator));
  }

  /** The difference to another fraction. */
  public Rational minus(Rational other) {
    return plus(other.negate());
  }

  /** The product with another fraction. */
  public Rational times(Rational other) {
    return new Rational(
        numerator.multiply(other.numerator), denominator.multiply(other.denominator));
  }

  /**
   * The quotient by another fraction.
   *
   * @throws ArithmeticException if the other is zero
   */
  public Rational dividedBy(Rational other) {
    return new Rational(
        numerator.multiply(other.denominator), denominator.multiply(other.numerator));
  }

  /** The fraction with the opposite sign. */
  public Rational negate() {
    return new Rational(numerator.negate(), denominator);
  }

  /**
   * A whole power.
   *
   * @throws ArithmeticException if the fraction is zero and the exponent negative
   */
  public Rational power(int exponent) {
    return exponent >= 0
        ? new Rational(numerator.pow(exponent), denominator.pow(exponent))
        : new Rational(denominator.pow(-exponent), numerator.pow(-exponent));
  }

  /** −1, 0 or 1. */
  public int signum() {
    return numerator.signum();
  }

  /** Whether this is zero. */
  public boolean isZero() {
    return signum() == 0;
  }

  /** Whether the denominator is one. */
  public boolean isInteger() {
    return denominator.equals(BigInteger.ONE);
  }

  /** The nearest double, ties to even; infinite beyond the range of doubles. */
  public double doubleValue() {
    if (isZero()) {
      return 0.0;
    }
    BigInteger size = numerator.abs();
    int scale =
        Math.min(DOUBLE_PRECISION - (size.bitLength() - denominator.bitLength()), DOUBLE_SMALLEST);
    BigInteger significand = roundedQuotient(size, scale);
    if (significand.bitLength() > DOUBLE_PRECISION) {
      // Rounded again from the fraction, not from the rounded value: one rounding in all.
      scale--;
      significand = roundedQuotient(size, scale);
    }
    return signum() * Math.scalb(significand.doubleValue(), -scale);
  }

  /** {@code size/denominator·2^scale} to the nearest integer, ties to even. */
  private BigInteger roundedQuotient(BigInteger size, int scale) {
    BigInteger dividend = scale > 0 ? size.shiftLeft(scale) : size;
    BigInteger divisor = scale < 0 ? denominator.shiftLeft(-scale) : denominator;
    BigInteger[] quotient = dividend.divideAndRemainder(divisor);
    int half = quotient[1].shiftLeft(1).compareTo(divisor);
    boolean up = half > 0 || (half == 0 && quotient[0].testBit(0));
    return up ? quotient[0].add(BigInteger.ONE) : quotient[0];
  }

  @Override
  public int compareTo(Rational other) {
    return numerator.multiply(other.denominator).compareTo(other.numerator.multiply(denominator));
  }

  /** As {@code 3/4}, or {@code 5} for an integer. */
  @Override
  public String toString() {
    return isInteger() ? numerator.toString() : numerator + "/" + denominator;
  }
}
