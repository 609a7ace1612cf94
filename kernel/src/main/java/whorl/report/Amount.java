package whorl.report;

import java.util.List;

/**
 * A value as it is set on the page.
 *
 * @param exact whether all its digits are shown
 * @param number its digits, or the parts of a vector in parentheses, or the words of a truth value
 * @param power the power of ten behind the digits, as {@code ×10³}; empty for none
 * @param unit typeset; empty for a plain number
 * @param details what a vector or a thing in space has to say besides, such as its axes and its
 *     size; none for numbers
 */
record Amount(boolean exact, String number, String power, String unit, List<String> details) {
  private static final String NO_BREAK = "\u00A0";

  /** Copies the list. */
  Amount {
    details = List.copyOf(details);
  }

  /** A number in a unit, which is empty for a plain number. */
  static Amount of(Figure figure, String unit) {
    return new Amount(figure.exact(), figure.significand(), figure.power(), unit, List.of());
  }

  /** {@code =}, or {@code ≈} where digits were rounded away. */
  String sign() {
    return exact ? "=" : "≈";
  }

  /** Number and unit. */
  String text() {
    return number + scale();
  }

  /** What stands behind the digits: power of ten and unit. */
  String scale() {
    return power + gap(unit) + unit;
  }

  /** Sign, number and unit. */
  String signed() {
    return sign() + NO_BREAK + text();
  }

  /** What stands between a number and its unit: signs of angle stand close. */
  static String gap(String unit) {
    return unit.isEmpty() || unit.equals("°") || unit.equals("′") || unit.equals("″")
        ? ""
        : NO_BREAK;
  }
}
