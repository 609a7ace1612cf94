package whorl.units.kind;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import whorl.units.Dimension;
import whorl.units.Rational;
import whorl.units.UnitCatalogue;
import whorl.units.UnitText;

/** The coherent SI unit of a quantity, as the trade writes it. */
final class CoherentUnit {
  private static final Set<String> BASE_UNITS =
      Arrays.stream(Dimension.Base.values())
          .map(Dimension.Base::unit)
          .collect(Collectors.toUnmodifiableSet());

  /**
   * A derived unit that is usual with some powers of the metre behind it.
   *
   * @param least exponent of the metre, and the greatest
   */
  private record Derived(String symbol, Dimension dimension, int least, int greatest) {
    Optional<String> times(Dimension whole) {
      Dimension rest = whole.dividedBy(dimension);
      Rational metres = rest.exponent(Dimension.Base.LENGTH);
      boolean fits =
          metres.isInteger()
              && rest.equals(Dimension.of(Dimension.Base.LENGTH).power(metres))
              && metres.compareTo(Rational.of(least)) >= 0
              && metres.compareTo(Rational.of(greatest)) <= 0;
      return fits ? Optional.of(typeset(metres.numerator().intValueExact())) : Optional.empty();
    }

    private String typeset(int metres) {
      var unit = new UnitText.Power(symbol, 1);
      return metres == 0
          ? symbol
          : UnitText.product(List.of(unit, new UnitText.Power("m", metres))).typeset();
    }
  }

  private static final List<Derived> DERIVED =
      List.of(
          new Derived("Pa", Dimension.of("M L^-1 T^-2"), 0, 0),
          new Derived("N", Dimension.of("M L T^-2"), -4, 2),
          new Derived("W", Dimension.of("M L^2 T^-3"), -3, 0));

  private CoherentUnit() {}

  /**
   * The unit of the kind that comes first to mind, as {@code W}; else what the dimension gives.
   * Made up of base units it shows the radian where rotation took part, as {@code kg·m²·rad/s}.
   */
  static String text(Readings readings) {
    Optional<UnitText> unit =
        readings.namedKinds().stream()
            .findFirst()
            .map(kind -> UnitCatalogue.standard().usual(kind).coherent().text());
    if (unit.filter(text -> !isOfBaseUnits(text)).isPresent()) {
      return unit.get().typeset();
    }
    boolean rotation = readings.all(reading -> reading.tainted() && reading.turn() == 0);
    return readings.readings().stream()
        .map(Reading::kind)
        .filter(kind -> kind.isInternal() && !kind.words().equals(kind.name()))
        .findFirst()
        .map(Kind::words)
        .orElseGet(() -> text(readings.dimension(), rotation));
  }

  private static boolean isOfBaseUnits(UnitText text) {
    return text.members().stream().map(UnitText.Power::symbol).allMatch(BASE_UNITS::contains);
  }

  /** The unit of a dimension, in newtons, pascals or watts where that is usual. */
  static String text(Dimension dimension, boolean rotation) {
    return rotation
        ? ofBaseUnits(dimension, true)
        : derived(dimension).orElseGet(() -> ofBaseUnits(dimension, false));
  }

  private static Optional<String> derived(Dimension dimension) {
    return DERIVED.stream().flatMap(unit -> unit.times(dimension).stream()).findFirst();
  }

  private static String ofBaseUnits(Dimension dimension, boolean rotation) {
    List<UnitText.Power> over = new ArrayList<>();
    List<UnitText.Power> under = new ArrayList<>();
    List<String> roots = new ArrayList<>();
    for (Dimension.Base base : Dimension.Base.values()) {
      Rational exponent = dimension.exponent(base);
      if (!exponent.isInteger()) {
        roots.add(base.unit() + "^(" + exponent + ")");
      } else if (exponent.signum() > 0) {
        over.add(new UnitText.Power(base.unit(), exponent.numerator().intValueExact()));
      } else if (exponent.signum() < 0) {
        under.add(new UnitText.Power(base.unit(), -exponent.numerator().intValueExact()));
      }
    }
    if (rotation) {
      over.add(new UnitText.Power("rad", 1));
    }
    boolean whole = !over.isEmpty() || !under.isEmpty();
    if (whole || roots.isEmpty()) {
      roots.add(0, new UnitText(over, under).typeset());
    }
    return String.join("·", roots);
  }
}
