package whorl.eval;

import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import whorl.check.Operation.BinaryFunction;
import whorl.check.Operation.UnaryFunction;

/**
 * The functions of the language on doubles. One formula at a time and blocks of rows use these same
 * functions, so that both come to the same bits.
 *
 * <p>For finite operands the result is finite exactly where the function has a value; otherwise it
 * is infinite or NaN. Sums, products, quotients and square roots are correctly rounded; the other
 * functions are those of {@link Math}, within 1 ulp (2 ulp for {@code atan2}). Nothing is snapped:
 * {@code sin(pi)} is 1.2e-16, the sine of the double next to π, and {@code tan(pi/2)} is 1.6e16.
 */
final class Arithmetic {
  /** Exponents up to this size, if whole, are worked out by multiplication. */
  static final int LARGEST_MULTIPLIED_EXPONENT = 8;

  /**
   * How far beyond ±1 an argument of an arc may be to be taken as ±1: four ulps. A cosine that was
   * worked out, such as a dot product over two magnitudes, often is an ulp or two beyond 1 where
   * the exact one is 1. A larger excess has another cause.
   */
  private static final double LARGEST_ARC_ARGUMENT = 1 + 4 * Math.ulp(1.0);

  /** Squares between these bounds add up without overflow and without loss of digits. */
  private static final double SMALLEST_SAFE_SQUARE = 0x1p-900;

  private static final double LARGEST_SAFE_SQUARE = 0x1p1000;

  private Arithmetic() {}

  static DoubleUnaryOperator of(UnaryFunction function) {
    return switch (function) {
      case SQRT -> Math::sqrt;
      case CBRT -> Math::cbrt;
      case EXP -> Math::exp;
      case LN -> Math::log;
      case LOG10 -> Math::log10;
      case SIN -> Math::sin;
      case COS -> Math::cos;
      case TAN -> Math::tan;
      case ASIN -> Arithmetic::arcSine;
      case ACOS -> Arithmetic::arcCosine;
      case ATAN -> Math::atan;
      case ABS -> Math::abs;
      case FLOOR -> Math::floor;
      case CEIL -> Math::ceil;
      case ROUND -> Arithmetic::rounded;
    };
  }

  static DoubleBinaryOperator of(BinaryFunction function) {
    return switch (function) {
      case ATAN2 -> Arithmetic::angleOfPoint;
      case MIN -> Math::min;
      case MAX -> Math::max;
    };
  }

  private static double arcSine(double x) {
    return Math.asin(withinOne(x));
  }

  private static double arcCosine(double x) {
    return Math.acos(withinOne(x));
  }

  private static double withinOne(double x) {
    return Math.abs(x) <= LARGEST_ARC_ARGUMENT ? Math.max(-1, Math.min(1, x)) : Double.NaN;
  }

  /** To the nearest whole number, halves away from zero, as rounding is taught. */
  private static double rounded(double x) {
    double size = Math.abs(x);
    double whole = Math.floor(size);
    return Math.copySign(size - whole >= 0.5 ? whole + 1 : whole, x);
  }

  /** The angle of the point (x, y); the point (0, 0) has none. */
  static double angleOfPoint(double y, double x) {
    return x == 0 && y == 0 ? Double.NaN : Math.atan2(y, x);
  }

  /**
   * A power. The exponent one half is the square root. Whole exponents up to {@value
   * #LARGEST_MULTIPLIED_EXPONENT} are worked out by repeated squaring: n factors carry at most n −
   * 1 roundings, a reciprocal one more. Anything to the power 0 is 1.
   */
  static double power(double base, double exponent) {
    if (exponent == 0.5) {
      return Math.sqrt(base);
    }
    if (isMultiplied(exponent)) {
      int n = (int) exponent;
      return n < 0 ? 1 / multiplied(base, -n) : multiplied(base, n);
    }
    return Math.pow(base, exponent);
  }

  /** Whether a power with this exponent is worked out by multiplication. */
  static boolean isMultiplied(double exponent) {
    return exponent == Math.rint(exponent) && Math.abs(exponent) <= LARGEST_MULTIPLIED_EXPONENT;
  }

  private static double multiplied(double base, int n) {
    if (n == 0) {
      return 1;
    }
    if (n == 1) {
      return base;
    }
    double half = multiplied(base, n / 2);
    return n % 2 == 0 ? half * half : half * half * base;
  }

  /** The magnitude of a vector, scaled where the squares would leave the range of a double. */
  static double magnitude(double x, double y, double z) {
    double squares = x * x + y * y + z * z;
    if (squares >= SMALLEST_SAFE_SQUARE && squares <= LARGEST_SAFE_SQUARE) {
      return Math.sqrt(squares);
    }
    double largest = Math.max(Math.abs(x), Math.max(Math.abs(y), Math.abs(z)));
    if (largest == 0) {
      return 0;
    }
    // A power of two scales without rounding.
    int exponent = Math.getExponent(largest);
    double a = Math.scalb(x, -exponent);
    double b = Math.scalb(y, -exponent);
    double c = Math.scalb(z, -exponent);
    return Math.scalb(Math.sqrt(a * a + b * b + c * c), exponent);
  }
}
