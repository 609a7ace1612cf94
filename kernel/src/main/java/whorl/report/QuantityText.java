package whorl.report;

import java.util.ArrayList;
import java.util.List;
import whorl.sheet.Quantity;

/** Quantities in a few words, as the page shows them. */
public final class QuantityText {
  private QuantityText() {}

  /** A value in its unit, as {@code 26.21 kN·m·s}. */
  public static String value(Quantity quantity) {
    return Amounts.of(quantity).text().replace('\u00A0', ' ');
  }

  /**
   * A value in full: with the coherent unit where nobody converts to it in the head, and of a
   * vector its size.
   */
  public static List<String> inFull(Quantity quantity) {
    Amount amount = Amounts.of(quantity);
    var lines = new ArrayList<String>();
    lines.add((amount.exact() ? "" : "≈ ") + amount.text());
    Amounts.coherent(quantity).map(Amount::signed).ifPresent(lines::add);
    lines.addAll(amount.details());
    if (amount.details().isEmpty()) {
      Amounts.about(quantity.setting()).ifPresent(lines::add);
    }
    return lines.stream().map(line -> line.replace('\u00A0', ' ')).toList();
  }
}
