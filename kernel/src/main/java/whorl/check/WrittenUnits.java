package whorl.check;

import java.util.List;
import java.util.Set;
import whorl.diagnostic.Span;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitSyntaxException;
import whorl.units.UnitText;
import whorl.units.UnknownUnitException;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/** Units as they stand in a formula, and the kinds that they can stand for there. */
final class WrittenUnits {
  private static final Kind ENERGY = Kind.named("energy");
  private static final Kind TEMPERATURE = Kind.named("temperature");

  /**
   * Kinds that a unit means only where they are named or it is their own: an energy in N·m, a GD²
   * in kg·m² and a temperature in K differ from the usual reading by more than a name, so that
   * taking one for the other would hide a slip.
   */
  private static final Set<Kind> NAMED_ONLY =
      Set.of(ENERGY, TEMPERATURE, Kind.named("flywheel_effect"));

  /** How far the kind of a written-out quantity is left open to what stands beside it. */
  enum Reach {
    /** A factor of a product: the usual kind of the unit. */
    USUAL,
    /** A term of a sum: any kind that the unit serves without being named. */
    TERM,
    /** A side of a comparison: any kind that the unit serves, save an energy in N·m. */
    SIDE,
    /** The whole right side of a declaration, or an argument: any kind that the unit serves. */
    DECLARED
  }

  private WrittenUnits() {}

  static Unit resolve(UnitText text, Span span) {
    try {
      return UnitCatalogue.standard().resolve(text);
    } catch (UnknownUnitException unknown) {
      throw CheckMessages.unknownUnit(unknown, span);
    } catch (UnitSyntaxException tooLarge) {
      throw CheckMessages.exponentTooLarge(span);
    }
  }

  static Readings readings(Unit unit, Reach reach) {
    List<Kind> kinds = unit.kinds();
    if (kinds.isEmpty()) {
      return unit.readings();
    }
    return switch (reach) {
      case USUAL -> Readings.of(kinds.get(0));
      case TERM -> Readings.of(unnamed(kinds));
      case SIDE ->
          Readings.of(kinds.stream().filter(kind -> !isSecond(kind, ENERGY, kinds)).toList());
      case DECLARED -> Readings.of(kinds);
    };
  }

  /** The kinds that a declared unit asks for where none is named behind it. */
  static List<Kind> unnamed(List<Kind> kinds) {
    return kinds.stream()
        .filter(kind -> NAMED_ONLY.stream().noneMatch(named -> isSecond(kind, named, kinds)))
        .toList();
  }

  private static boolean isSecond(Kind kind, Kind named, List<Kind> kinds) {
    return kind == named && kinds.get(0) != named;
  }
}
