package whorl.units;

import java.util.List;
import whorl.units.kind.KindAlgebra;
import whorl.units.kind.Operand;
import whorl.units.kind.Powered;
import whorl.units.kind.Readings;

/** Asks the rules of kinds what the product of a unit's members measures. */
final class MemberReadings {

  private MemberReadings() {}

  /** The readings of a product; those of its dimension alone where the rules have no answer. */
  static Readings of(Composition composition) {
    List<Powered> factors =
        composition.members().stream()
            .map(
                member ->
                    new Powered(
                        member.symbol(),
                        Operand.of(member.row().kind()),
                        Rational.of(member.exponent())))
            .toList();
    return KindAlgebra.unit(factors);
  }
}
