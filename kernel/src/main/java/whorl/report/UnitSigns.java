package whorl.report;

import java.util.List;
import java.util.Map;
import whorl.units.Unit;
import whorl.units.UnitText;

/** Sets units: raised exponents, and signs of angle where a plain keyboard has only letters. */
final class UnitSigns {
  private static final Map<String, String> SIGNS = Map.of("deg", "°", "degC", "°C", "degF", "°F");

  private UnitSigns() {}

  /** A unit behind a number; nothing for the unit one. */
  static String of(Unit unit) {
    return unit.text().equals(UnitText.ONE) ? "" : of(unit.text());
  }

  /** A unit as written. */
  static String of(UnitText text) {
    return new UnitText(signs(text.over()), signs(text.under())).typeset();
  }

  private static List<UnitText.Power> signs(List<UnitText.Power> members) {
    return members.stream()
        .map(
            member ->
                new UnitText.Power(
                    SIGNS.getOrDefault(member.symbol(), member.symbol()), member.exponent()))
        .toList();
  }
}
