package whorl.report;

import whorl.sheet.Quantity;

/** Quantities in a few words, as the page shows them. */
public final class QuantityText {
  private QuantityText() {}

  /** A value in its unit, as {@code 26.21 kN·m·s}. */
  public static String value(Quantity quantity) {
    return Amounts.of(quantity).text().replace('\u00A0', ' ');
  }
}
