package whorl.syntax;

import java.util.List;
import java.util.Set;
import whorl.units.UnitText;

final class TestUnits implements UnitWords {
  static final UnitWords WORDS = new TestUnits();
  private static final Set<String> PLAIN =
      Set.of(
          "kg", "min", "h", "d", "deg", "°", "°C", "degC", "ddegC", "rpm", "%", "‰", "′", "″", "in",
          "ft", "lbf", "lb", "psi", "rev", "arcmin");
  private static final Set<String> PREFIXABLE =
      Set.of(
          "m", "g", "s", "A", "K", "N", "J", "W", "Pa", "V", "Ω", "eV", "rad", "t", "Hz", "Wh", "L",
          "C");
  private static final Set<String> ROWS =
      Set.of(
          "N·m",
          "m/s^2",
          "kg/s",
          "J/(kg·K)",
          "N·m·s",
          "N·m/rad",
          "m/s",
          "rad/s",
          "°/s",
          "kg·m^2",
          "ft·lbf",
          "m",
          "s");

  @Override
  public boolean knows(String symbol) {
    return PLAIN.contains(symbol)
        || PREFIXABLE.contains(symbol)
        || (symbol.length() > 1
            && "kMGmuμcd".indexOf(symbol.charAt(0)) >= 0
            && PREFIXABLE.contains(symbol.substring(1)));
  }

  @Override
  public boolean isRow(UnitText text) {
    return ROWS.contains(text.plain()) || ROWS.contains(text.plain().replaceAll("^k", ""));
  }

  @Override
  public List<String> near(String symbol) {
    return List.of();
  }

  @Override
  public String usualSpelling(String word) {
    return "";
  }
}
