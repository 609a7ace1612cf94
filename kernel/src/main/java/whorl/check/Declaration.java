package whorl.check;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * A unit declared in brackets, with the kinds that it asks for.
 *
 * @param name what is declared, or null for a shown expression
 * @param wanted the kinds that fit, the usual one first; none where the unit is a compound of which
 *     only the dimension is known
 */
record Declaration(
    Expr.@Nullable Name name, Statement.Bracket bracket, Unit unit, List<Kind> wanted) {

  /** Copies the list. */
  Declaration {
    wanted = List.copyOf(wanted);
  }

  /** Reads a bracket. */
  static Declaration of(Expr.@Nullable Name name, Statement.Bracket bracket) {
    Unit unit = WrittenUnits.resolve(bracket.unit(), bracket.span());
    String words = bracket.kind();
    if (words == null) {
      return new Declaration(name, bracket, unit, WrittenUnits.unnamed(unit.kinds()));
    }
    Kind kind = Kind.find(words).orElseThrow(() -> CheckMessages.unknownKind(words, bracket, unit));
    Unit serving =
        UnitCatalogue.standard()
            .resolve(bracket.unit(), kind)
            .orElseThrow(() -> CheckMessages.kindNotInUnit(kind, bracket, unit));
    return new Declaration(name, bracket, serving, List.of(kind));
  }

  /** What a bare number in this unit reads as. */
  Readings usualReadings() {
    return wanted.isEmpty() ? unit.readings() : Readings.of(wanted.get(0));
  }

  /**
   * A value that fits, shown in the declared unit as a unit of the kind that it settled to.
   *
   * @param seen the same along the axes of the frame that it is seen from
   */
  Formula formula(Typed typed, Operation seen) {
    Readings readings = typed.operand().readings();
    Unit serving =
        readings.kinds().stream()
            .findFirst()
            .flatMap(kind -> UnitCatalogue.standard().resolve(bracket.unit(), kind))
            .filter(narrowed -> narrowed.factor().equals(unit.factor()))
            .orElse(unit);
    return new Formula(typed.operation(), typed.type(), serving, true, Kinds.words(readings), seen);
  }
}
