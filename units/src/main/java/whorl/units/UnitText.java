package whorl.units;

import java.util.ArrayList;
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

  /** The largest exponent that is read, of either sign. */
  public static final int LARGEST_EXPONENT = 99;

  /**
   * A symbol with its exponent.
   *
   * @param symbol not empty
   * @param exponent not zero
   */
  public record Power(String symbol, int exponent) {

    /** Checks both. */
    public Power {
      if (symbol.isEmpty() || exponent == 0) {
        throw new IllegalArgumentException(
            "a member must have a symbol and an exponent that is not zero, but is \""
                + symbol
                + "\"^"
                + exponent);
      }
    }
  }

  /** Copies the members. */
  public UnitText {
    over = List.copyOf(over);
    under = List.copyOf(under);
  }

  /** A text of one symbol. */
  public static UnitText of(String symbol) {
    return new UnitText(List.of(new Power(symbol, 1)), List.of());
  }

  /** Whether this is one symbol, as {@code kN}, and no product, power or quotient. */
  public boolean isSymbol() {
    return under.isEmpty() && over.size() == 1 && over.get(0).exponent() == 1;
  }

  /** All members in order, those behind the solidus with their exponents turned round. */
  public List<Power> members() {
    List<Power> members = new ArrayList<>(over);
    for (Power member : under) {
      members.add(new Power(member.symbol(), -member.exponent()));
    }
    return members;
  }

  /**
   * The product of some powers, in their order; negative ones go behind the solidus.
   *
   * @param members with exponents of either sign
   */
  public static UnitText product(List<Power> members) {
    List<Power> over = new ArrayList<>();
    List<Power> under = new ArrayList<>();
    for (Power member : members) {
      if (member.exponent() > 0) {
        over.add(member);
      } else {
        under.add(new Power(member.symbol(), -member.exponent()));
      }
    }
    return new UnitText(over, under);
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
