package whorl.check;

import java.util.List;
import java.util.Optional;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * A constant at hand in every sheet.
 *
 * @param symbol its name, folded
 * @param value its value in coherent SI units
 * @param readings what it reads as in a formula
 * @param unit the coherent unit of its value
 * @param words what it is
 * @param source where its value comes from; empty where nobody asks
 */
public record ConstantAtHand(
    String symbol, double value, Readings readings, Unit unit, String words, String source) {
  private static final ConstantAtHand PI =
      new ConstantAtHand(
          "π",
          Math.PI,
          Readings.PI,
          Unit.ONE,
          "ratio of the circumference of a circle to its diameter",
          "");

  private static final ConstantAtHand STANDARD_FREE_FALL =
      new ConstantAtHand(
          "g_n",
          9.80665,
          Readings.of(Kind.named("acceleration")),
          UnitCatalogue.standard().resolve(UnitReader.read("m/s^2")),
          "standard acceleration of free fall",
          "exact by convention, 3rd CGPM, 1901");

  private static final List<ConstantAtHand> ALL = List.of(PI, STANDARD_FREE_FALL);

  /** All constants. */
  public static List<ConstantAtHand> all() {
    return ALL;
  }

  /** The constant of a name, if it is one. */
  public static Optional<ConstantAtHand> named(String name) {
    return ALL.stream().filter(constant -> constant.symbol.equals(name)).findFirst();
  }
}
