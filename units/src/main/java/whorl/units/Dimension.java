package whorl.units;

import java.math.BigInteger;
import java.util.Arrays;

/**
 * The dimension of a quantity: a product of rational powers of the seven base dimensions of the SI.
 *
 * <p>An angle has dimension one; that it is an angle all the same is told by its kind.
 *
 * <p>Source: SI Brochure, 9th edition, section 2.3.3.
 */
public final class Dimension {

  /** A base dimension of the SI, in the order in which a product is written. */
  public enum Base {
    /** Mass, in kg. */
    MASS(0, "M", "kg"),
    /** Length, in m. */
    LENGTH(1, "L", "m"),
    /** Time, in s. */
    TIME(2, "T", "s"),
    /** Electric current, in A. */
    ELECTRIC_CURRENT(3, "I", "A"),
    /** Thermodynamic temperature, in K; written Th. */
    TEMPERATURE(4, "Th", "K"),
    /** Amount of substance, in mol. */
    AMOUNT_OF_SUBSTANCE(5, "N", "mol"),
    /** Luminous intensity, in cd. */
    LUMINOUS_INTENSITY(6, "J", "cd");

    /** Where the exponent stands in a dimension. */
    private final int place;

    private final String symbol;
    private final String unit;

    Base(int place, String symbol, String unit) {
      this.place = place;
      this.symbol = symbol;
      this.unit = unit;
    }

    /** The symbol of the dimension. */
    public String symbol() {
      return symbol;
    }

    /** The symbol of its SI base unit. */
    public String unit() {
      return unit;
    }
  }

  private static final Base[] BASES = Base.values();

  /** The dimension of a pure number. */
  public static final Dimension ONE = new Dimension(new long[BASES.length], 1);

  /** Exponents times the common denominator, by the place of the base dimension. */
  private final long[] numerators;

  /** Positive, and without a factor common to all numerators, so that equal means same. */
  private final long denominator;

  private Dimension(long[] numerators, long denominator) {
    long divisor = denominator;
    for (long numerator : numerators) {
      divisor = gcd(numerator, divisor);
    }
    this.numerators = numerators;
    this.denominator = denominator / divisor;
    if (divisor != 1) {
      for (int i = 0; i < numerators.length; i++) {
        numerators[i] /= divisor;
      }
    }
  }

  private static long gcd(long a, long b) {
    return b == 0 ? Math.abs(a) : gcd(b, a % b);
  }

  /** A base dimension. */
  public static Dimension of(Base base) {
    long[] exponents = new long[BASES.length];
    exponents[base.place] = 1;
    return new Dimension(exponents, 1);
  }

  /**
   * Reads a product of powers separated by blanks, in any order, as {@code M L^2 T^-2}, {@code
   * M^1/2} or {@code 1}.
   *
   * @throws IllegalArgumentException if a symbol or an exponent cannot be read
   */
  public static Dimension of(String text) {
    var product = ONE;
    for (String member : text.strip().split(" +", -1)) {
      if (!member.equals("1")) {
        int caret = member.indexOf('^');
        Base base = base(caret < 0 ? member : member.substring(0, caret));
        Rational exponent = caret < 0 ? Rational.ONE : Rational.parse(member.substring(caret + 1));
        product = product.times(of(base).power(exponent));
      }
    }
    return product;
  }

  private static Base base(String symbol) {
    for (Base base : BASES) {
      if (base.symbol.equals(symbol)) {
        return base;
      }
    }
    throw new IllegalArgumentException("no dimension has the symbol \"" + symbol + "\"");
  }

  /** The exponent of a base dimension. */
  public Rational exponent(Base base) {
    return Rational.of(numerators[base.place], denominator);
  }

  /**
   * The dimension of a product.
   *
   * @throws ArithmeticException if an exponent leaves the range of a long
   */
  public Dimension times(Dimension other) {
    return plus(other, 1);
  }

  /**
   * The dimension of a quotient.
   *
   * @throws ArithmeticException if an exponent leaves the range of a long
   */
  public Dimension dividedBy(Dimension other) {
    return plus(other, -1);
  }

  private Dimension plus(Dimension other, int sign) {
    long[] sums = new long[BASES.length];
    for (int i = 0; i < sums.length; i++) {
      sums[i] =
          Math.addExact(
              Math.multiplyExact(numerators[i], other.denominator),
              Math.multiplyExact(sign * other.numerators[i], denominator));
    }
    return new Dimension(sums, Math.multiplyExact(denominator, other.denominator));
  }

  /**
   * The dimension of a power or root.
   *
   * @throws ArithmeticException if an exponent leaves the range of a long
   */
  public Dimension power(Rational exponent) {
    long over = exact(exponent.numerator());
    long[] products = new long[BASES.length];
    for (int i = 0; i < products.length; i++) {
      products[i] = Math.multiplyExact(numerators[i], over);
    }
    return new Dimension(products, Math.multiplyExact(denominator, exact(exponent.denominator())));
  }

  private static long exact(BigInteger value) {
    return value.longValueExact();
  }

  /** Whether this is the dimension of a pure number. */
  public boolean isOne() {
    return equals(ONE);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Dimension that
        && denominator == that.denominator
        && Arrays.equals(numerators, that.numerators);
  }

  @Override
  public int hashCode() {
    return 31 * Arrays.hashCode(numerators) + Long.hashCode(denominator);
  }

  /** As {@code M L^2 T^-2}; {@code 1} for a pure number. */
  @Override
  public String toString() {
    var text = new StringBuilder();
    for (Base base : BASES) {
      Rational exponent = exponent(base);
      if (!exponent.isZero()) {
        text.append(text.length() == 0 ? "" : " ").append(base.symbol);
        if (!exponent.equals(Rational.ONE)) {
          text.append('^').append(exponent);
        }
      }
    }
    return text.length() == 0 ? "1" : text.toString();
  }
}
