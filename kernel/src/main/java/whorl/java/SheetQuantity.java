package whorl.java;

/**
 * A quantity of the sheet as a cell in Java sees it.
 *
 * @param value in {@code unit}
 * @param unit the unit in which the sheet shows it, as {@code kN·m·s}; {@code 1} for a number
 * @param kind what kind of quantity it is, as {@code angular momentum}; empty where only its
 *     dimension is known
 * @param text value and unit for people
 */
public record SheetQuantity(double value, String unit, String kind, String text) {
  @Override
  public String toString() {
    return text;
  }
}
