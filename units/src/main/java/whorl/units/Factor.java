package whorl.units;

/**
 * An exact conversion factor: a fraction times a whole power of π. A degree is {@code 1/180·π}, a
 * millimetre per revolution {@code 1/2000·π^-1}. All units of the catalogue are of this form, so
 * that two ways to the same unit agree to the last digit.
 *
 * @param coefficient the fraction; positive for a unit
 * @param piExponent the exponent of π
 */
public record Factor(Rational coefficient, int piExponent) {

  /** One. */
  public static final Factor ONE = new Factor(Rational.ONE, 0);

  /** π to 65 digits, enough that one rounding to a double decides everything. */
  private static final Rational PI =
      Rational.parse("3.1415926535897932384626433832795028841971693993751058209749445923");

  /** A fraction without π. */
  public static Factor of(Rational coefficient) {
    return new Factor(coefficient, 0);
  }

  /**
   * Reads a product of decimals and powers of {@code pi}, worked from left to right, as {@code
   * 1/180*pi}, {@code 0.0005*pi^-1} or {@code 4.184*5/9}.
   *
   * @throws NumberFormatException if a member is neither a decimal nor a power of pi
   */
  public static Factor parse(String text) {
    var product = ONE;
    int start = 0;
    char operator = '*';
    for (int end = 0; end <= text.length(); end++) {
      if (end == text.length() || text.charAt(end) == '*' || text.charAt(end) == '/') {
        Factor member = member(text.substring(start, end));
        product = operator == '*' ? product.times(member) : product.dividedBy(member);
        operator = end == text.length() ? operator : text.charAt(end);
        start = end + 1;
      }
    }
    return product;
  }

  private static Factor member(String text) {
    if (text.equals("pi")) {
      return new Factor(Rational.ONE, 1);
    }
    if (text.startsWith("pi^")) {
      return new Factor(Rational.ONE, Integer.parseInt(text.substring(3)));
    }
    return of(Rational.parse(text));
  }

  /** The product with another factor. */
  public Factor times(Factor other) {
    return new Factor(
        coefficient.times(other.coefficient), Math.addExact(piExponent, other.piExponent));
  }

  /**
   * The quotient by another factor.
   *
   * @throws ArithmeticException if the other is zero
   */
  public Factor dividedBy(Factor other) {
    return new Factor(
        coefficient.dividedBy(other.coefficient), Math.subtractExact(piExponent, other.piExponent));
  }

  /** A whole power. */
  public Factor power(int exponent) {
    return new Factor(coefficient.power(exponent), Math.multiplyExact(piExponent, exponent));
  }

  /** Whether this is exactly one. */
  public boolean isOne() {
    return equals(ONE);
  }

  /** The nearest double. */
  public double doubleValue() {
    return piExponent == 0
        ? coefficient.doubleValue()
        : coefficient.times(PI.power(piExponent)).doubleValue();
  }

  /** As {@code 1/180·π}; {@link #parse} reads the same with {@code *} and {@code pi}. */
  @Override
  public String toString() {
    return switch (piExponent) {
      case 0 -> coefficient.toString();
      case 1 -> coefficient + "·π";
      default -> coefficient + "·π^" + piExponent;
    };
  }
}
