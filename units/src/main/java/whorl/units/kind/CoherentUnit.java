package whorl.units.kind;

import java.util.ArrayList;
import java.util.List;
import whorl.units.Dimension;
import whorl.units.Rational;
import whorl.units.UnitText;

/** What a quantity is measured in, made up of the base units of the SI and the radian. */
final class CoherentUnit {
  private static final Kind FREQUENCY = Kind.named("frequency");
  private static final Kind ANGLE = Kind.named("angle");

  private CoherentUnit() {}

  /** As {@code kg·m²·rad/s}: the radian shows that rotation took part. */
  static String text(Readings readings) {
    List<Kind> kinds = readings.kinds();
    if (kinds.equals(List.of(FREQUENCY))) {
      return "Hz";
    }
    if (kinds.equals(List.of(ANGLE))) {
      return "rad";
    }
    boolean rotation = readings.all(reading -> reading.tainted() && reading.turn() == 0);
    return readings.readings().stream()
        .map(Reading::kind)
        .filter(kind -> kind.isInternal() && !kind.words().equals(kind.name()))
        .findFirst()
        .map(Kind::words)
        .orElseGet(() -> text(readings.dimension(), rotation));
  }

  static String text(Dimension dimension, boolean rotation) {
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
