package whorl.units;

import java.util.List;

/**
 * A unit as written: powers of symbols above and below the solidus, in the order and with the
 * symbols of the author ({@code °C} stays {@code °C}, {@code degC} stays {@code degC}). Whether the
 * symbols are known is the catalogue's business.
 *
 * @param over members in front of the solidus; none for a plain {@code 1}
 * @param under members behind the solidus
 */
public record UnitText(List<Power> over, List<Power> under) {
  /** The unit one, written {@code 1}. */
  public static final UnitText ONE = new UnitText(List.of(), List.of());

  /**
   * A symbol with its exponent.
   *
   * @param exponent not zero
   */
  public record Power(String symbol, int exponent) {}

  /** Copies the members. */
  public UnitText {
    over = List.copyOf(over);
    under = List.copyOf(under);
  }

  /** Canonical text for a plain keyboard, as {@code kg·m^2/s}, {@code W/(m^2·K)}, {@code 1/s}. */
  public String plain() {
    return text(false);
  }

  /** Canonical text with raised exponents, as {@code kg·m²/s}. */
  public String typeset() {
    return text(true);
  }

  private String text(boolean raised) {
    String above = over.isEmpty() ? "1" : product(over, raised);
    if (under.isEmpty()) {
      return above;
    }
    String below = product(under, raised);
    return above + "/" + (under.size() == 1 ? below : "(" + below + ")");
  }

  private static String product(List<Power> members, boolean raised) {
    var text = new StringBuilder();
    for (Power member : members) {
      if (text.length() > 0) {
        text.append('·');
      }
      text.append(member.symbol());
      if (member.exponent() != 1) {
        text.append(raised ? raised(member.exponent()) : "^" + member.exponent());
      }
    }
    return text.toString();
  }

  private static String raised(int exponent) {
    var text = new StringBuilder();
    for (char c : Integer.toString(exponent).toCharArray()) {
      text.append(c == '-' ? '⁻' : "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(c - '0'));
    }
    return text.toString();
  }

  @Override
  public String toString() {
    return plain();
  }
}
