package whorl.check;

import java.util.List;
import java.util.Optional;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/** The constants at hand in every sheet. */
public enum ConstantAtHand {
  /** The ratio of a circle's circumference to its diameter. */
  PI("π", Math.PI, Readings.PI, "1"),
  /** Standard acceleration of free fall, exact by convention (3rd CGPM, 1901). */
  STANDARD_FREE_FALL("g_n", 9.80665, Readings.of(Kind.named("acceleration")), "m/s^2");

  private final String symbol;
  private final double value;
  private final Readings readings;
  private final Unit unit;

  ConstantAtHand(String symbol, double value, Readings readings, String unit) {
    this.symbol = symbol;
    this.value = value;
    this.readings = readings;
    this.unit = UnitCatalogue.standard().resolve(UnitReader.read(unit));
  }

  /** The constant of a name, if it is one. */
  public static Optional<ConstantAtHand> named(String name) {
    return List.of(values()).stream().filter(constant -> constant.symbol.equals(name)).findFirst();
  }

  /** Its name, folded. */
  public String symbol() {
    return symbol;
  }

  /** Its value in coherent SI units. */
  public double value() {
    return value;
  }

  /** What it reads as in a formula. */
  Readings readings() {
    return readings;
  }

  /** The coherent unit of its value. */
  public Unit unit() {
    return unit;
  }
}
