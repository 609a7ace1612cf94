package whorl.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;

/**
 * Decides which digits of a number the page shows.
 *
 * <p>A result gets four significant digits, trailing zeros included, since they are known; a number
 * that needs no more than four is shown whole, without trailing zeros, and is not marked as
 * rounded. Rounding is half to even on the exact decimal value of the double. Numbers that would
 * need more than three places in front of the point or behind it carry a power of ten whose
 * exponent is a multiple of three.
 *
 * <p>A double is taken to be the whole number it stands next to if it agrees with that in its first
 * fourteen digits: {@code 0.1 + 0.2} is {@code 0.3}, and a length that went from millimetres to
 * metres and back is still {@code 900}.
 */
public final class Figures {
  /** Significant digits of a result. */
  static final int USUAL_DIGITS = 4;

  private static final int MOST_DIGITS = 15;
  private static final MathContext WITHOUT_NOISE = new MathContext(14, RoundingMode.HALF_EVEN);

  /** Beside a number of size one, as many digits down as are taken for noise behind it. */
  private static final double NOISE = 1e-14;

  private static final int LARGEST_PLAIN_ORDER = 3;
  private static final int SMALLEST_PLAIN_ORDER = -3;

  private Figures() {}

  /** A result to the usual number of digits. */
  public static Figure of(double value) {
    return of(value, USUAL_DIGITS);
  }

  /**
   * A result to a given number of significant digits.
   *
   * @param value a finite number
   */
  public static Figure of(double value, int digits) {
    if (value == 0) {
      return new Figure("0", 0, true);
    }
    BigDecimal whole = withoutNoise(value);
    BigDecimal shown = rounded(value, digits);
    return placed(shown, exponentFor(order(shown)), whole.compareTo(shown) == 0);
  }

  private static BigDecimal withoutNoise(double value) {
    return new BigDecimal(value).round(WITHOUT_NOISE).stripTrailingZeros();
  }

  /** The number that is shown: the whole number if it is short enough, else a rounded one. */
  private static BigDecimal rounded(double value, int digits) {
    BigDecimal whole = withoutNoise(value);
    return whole.precision() <= digits
        ? whole
        : new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
  }

  /**
   * Several numbers that stand together, as the parts of a vector: one power of ten, and all
   * rounded to the place of the last digit of the largest.
   */
  public static List<Figure> together(List<Double> values) {
    double largest = values.stream().mapToDouble(Math::abs).max().orElse(0);
    if (largest == 0) {
      return values.stream().map(Figures::of).toList();
    }
    Figure lead = of(largest);
    int exponent = lead.exponent();
    int point = lead.significand().indexOf('.');
    int leadPlaces = point < 0 ? 0 : lead.significand().length() - point - 1;
    int order = order(new BigDecimal(largest).round(new MathContext(USUAL_DIGITS)));
    // Parts that are whole at four digits of the largest keep their own short form.
    int places = Math.max(leadPlaces, USUAL_DIGITS - 1 - (order - exponent));
    return values.stream()
        .map(value -> atPlace(isNoise(value, largest) ? 0 : value, exponent, places))
        .toList();
  }

  /** Whether a part is what rounding leaves of zero beside the largest. */
  private static boolean isNoise(double value, double largest) {
    return Math.abs(value) < largest * NOISE;
  }

  private static Figure atPlace(double value, int exponent, int places) {
    BigDecimal scaled = new BigDecimal(value).scaleByPowerOfTen(-exponent);
    BigDecimal shown = scaled.setScale(places, RoundingMode.HALF_EVEN);
    BigDecimal whole = scaled.round(WITHOUT_NOISE).stripTrailingZeros();
    boolean exact = whole.compareTo(shown) == 0;
    String digits = exact ? whole.toPlainString() : shown.toPlainString();
    return new Figure(
        minus(shown.signum() == 0 ? digits.replace("-", "") : digits), exponent, exact);
  }

  /**
   * The first of two numbers with as many digits as it takes to tell it from the second: a limit
   * passed in the sixth digit must not read as a limit met.
   */
  public static Figure apart(double value, double other) {
    return apart(value, other, USUAL_DIGITS);
  }

  /** The same with fewer digits, or more, to begin with. */
  static Figure apart(double value, double other, int least) {
    int digits = least;
    while (digits < MOST_DIGITS
        && value != other
        && rounded(value, digits).compareTo(rounded(other, digits)) == 0) {
      digits++;
    }
    return of(value, digits);
  }

  /**
   * A number with the digits its author wrote.
   *
   * @param digits canonical digits, as {@code 0.5e-3}
   */
  public static Figure asWritten(String digits) {
    int e = Math.max(digits.indexOf('e'), digits.indexOf('E'));
    if (e < 0) {
      return new Figure(minus(digits), 0, true);
    }
    int exponent = Integer.parseInt(digits.substring(e + 1));
    return new Figure(minus(digits.substring(0, e)), exponent, true);
  }

  private static Figure placed(BigDecimal shown, int exponent, boolean exact) {
    return new Figure(minus(shown.scaleByPowerOfTen(-exponent).toPlainString()), exponent, exact);
  }

  private static int exponentFor(int order) {
    return order >= SMALLEST_PLAIN_ORDER && order <= LARGEST_PLAIN_ORDER
        ? 0
        : Math.floorDiv(order, 3) * 3;
  }

  /** The power of ten of the first significant digit. */
  private static int order(BigDecimal value) {
    return value.precision() - value.scale() - 1;
  }

  private static String minus(String digits) {
    return digits.replace('-', '−');
  }
}
