package whorl.report;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import whorl.eval.Course;
import whorl.eval.Value;
import whorl.sheet.Quantity;
import whorl.sheet.Setting;
import whorl.units.Rational;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;

/** Sets quantities: the unit in which each is shown, and its digits in that unit. */
final class Amounts {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  private Amounts() {}

  /**
   * A quantity in its unit: an input with the digits its author wrote, a result rounded, at a
   * readable multiple where the author chose no unit.
   */
  static Amount of(Quantity quantity) {
    if (quantity.value() instanceof Value.Real real) {
      if (quantity.written() != null) {
        return in(quantity.unit(), Figures.asWritten(quantity.written()));
      }
      Unit unit = shownIn(quantity, real.value());
      return in(unit, Figures.of(unit.fromSi(real.value())));
    }
    if (quantity.value() instanceof Value.Vector vector) {
      return vector(quantity, vector);
    }
    if (quantity.value() instanceof Value.Thing thing && thing.content() instanceof Course course) {
      return course(quantity, course);
    }
    if (quantity.value() instanceof Value.Thing thing) {
      return ThingAmounts.of(thing, quantity.setting());
    }
    boolean holds = quantity.value() instanceof Value.Truth truth && truth.holds();
    return new Amount(true, holds ? "holds" : "does not hold", "", "", List.of());
  }

  /** A course by where it lies: its least and its largest value. */
  private static Amount course(Quantity quantity, Course course) {
    if (course.width() > 1) {
      return new Amount(true, "a course of vectors", "", "", List.of());
    }
    double least = course.least().value();
    double peak = course.peak().value();
    Unit unit = shownIn(quantity, Math.max(Math.abs(least), Math.abs(peak)));
    List<Figure> ends = Figures.together(List.of(unit.fromSi(least), unit.fromSi(peak)));
    return new Amount(
        ends.stream().allMatch(Figure::exact),
        ends.get(0).significand() + " to " + ends.get(1).significand(),
        ends.get(0).power(),
        UnitSigns.of(unit),
        List.of("during the motion"));
  }

  /**
   * The same quantity in the coherent unit, where its own differs from that by more than a power of
   * ten: nobody multiplies revolutions per minute or inches out in the head.
   */
  static Optional<Amount> coherent(Quantity quantity) {
    if (!(quantity.value() instanceof Value.Real real) || isDecimal(quantity.unit())) {
      return Optional.empty();
    }
    Unit coherent = quantity.unit().coherent();
    return Optional.of(in(coherent, Figures.of(coherent.fromSi(real.value()))));
  }

  /** Two quantities that are compared, told apart as far as they differ. */
  static List<Amount> compared(Quantity left, Quantity right) {
    boolean comparable =
        left.value() instanceof Value.Real
            && right.value() instanceof Value.Real
            && UnitSigns.of(shown(left)).equals(UnitSigns.of(shown(right)));
    if (!comparable) {
      return List.of(of(left), of(right));
    }
    return List.of(against(left, right), against(right, left));
  }

  private static Amount against(Quantity quantity, Quantity other) {
    if (quantity.written() != null) {
      return of(quantity);
    }
    Unit unit = shown(quantity);
    return in(unit, Figures.apart(inUnit(unit, quantity), inUnit(unit, other)));
  }

  private static double inUnit(Unit unit, Quantity quantity) {
    return unit.fromSi(((Value.Real) quantity.value()).value());
  }

  private static Unit shown(Quantity quantity) {
    return shownIn(quantity, ((Value.Real) quantity.value()).value());
  }

  private static Unit shownIn(Quantity quantity, double size) {
    return quantity.chosen() || quantity.written() != null
        ? quantity.unit()
        : UNITS.readable(quantity.unit(), size);
  }

  private static Amount vector(Quantity quantity, Value.Vector vector) {
    double size = Math.hypot(Math.hypot(vector.x(), vector.y()), vector.z());
    Unit unit = shownIn(quantity, size);
    Amount length = in(unit, Figures.of(unit.fromSi(size)));
    Setting setting = quantity.setting();
    var details = new ArrayList<String>();
    details.add(axes(setting) + ", size " + length.signed());
    about(setting).ifPresent(details::add);
    return triple(vector.x(), vector.y(), vector.z(), unit, details);
  }

  /** Three parts in a unit, at one power of ten. */
  static Amount triple(double x, double y, double z, Unit unit, List<String> details) {
    List<Figure> parts = Figures.together(List.of(unit.fromSi(x), unit.fromSi(y), unit.fromSi(z)));
    boolean exact = parts.stream().allMatch(Figure::exact);
    String inside = String.join(", ", parts.stream().map(Figure::significand).toList());
    return new Amount(exact, "(" + inside + ")", parts.get(0).power(), UnitSigns.of(unit), details);
  }

  /** Along whose axes parts are shown. */
  static String axes(Setting setting) {
    return setting.frame().isEmpty() ? "world axes" : "axes of " + setting.frame();
  }

  /** What a quantity is taken about, if it is about something. */
  static Optional<String> about(Setting setting) {
    return setting.about().isEmpty() ? Optional.empty() : Optional.of("about " + setting.about());
  }

  private static Amount in(Unit unit, Figure figure) {
    return Amount.of(figure, UnitSigns.of(unit));
  }

  /** Whether a unit is its coherent unit but for a power of ten. */
  private static boolean isDecimal(Unit unit) {
    Rational size = unit.factor().coefficient();
    return !unit.isReading()
        && unit.factor().piExponent() == 0
        && isPowerOfTen(size.numerator())
        && isPowerOfTen(size.denominator());
  }

  private static boolean isPowerOfTen(BigInteger number) {
    return new BigDecimal(number).stripTrailingZeros().unscaledValue().equals(BigInteger.ONE);
  }
}
