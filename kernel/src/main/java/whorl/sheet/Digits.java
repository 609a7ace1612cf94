package whorl.sheet;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers within messages: a few significant digits are enough to recognise a value. */
final class Digits {
  private static final MathContext SIX = new MathContext(6);

  private Digits() {}

  static String of(double value) {
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    BigDecimal rounded = new BigDecimal(value).round(SIX).stripTrailingZeros();
    int exponent = rounded.precision() - rounded.scale() - 1;
    String text =
        rounded.signum() != 0 && (exponent < -5 || exponent > 8)
            ? rounded.toString().replace("E+", "e").replace('E', 'e')
            : rounded.toPlainString();
    return text.replace('-', '−');
  }
}
