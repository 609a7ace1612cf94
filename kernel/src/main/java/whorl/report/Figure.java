package whorl.report;

/**
 * A number as it is set on the page.
 *
 * @param significand its digits with sign and point
 * @param exponent the power of ten behind them, a multiple of three for results; 0 for none
 * @param exact whether the page shows the whole number; otherwise digits were rounded away
 */
public record Figure(String significand, int exponent, boolean exact) {

  /** The number as one text, as {@code 36.40×10³}. */
  public String text() {
    return significand + power();
  }

  /** The power of ten alone, as {@code ×10³}; empty where there is none. */
  String power() {
    return exponent == 0 ? "" : "×10" + Superscript.of(exponent);
  }

  /** {@code =} where the whole number is shown, {@code ≈} where it was rounded. */
  public String sign() {
    return exact ? "=" : "≈";
  }
}
