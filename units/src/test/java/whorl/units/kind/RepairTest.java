package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.units.Rational;

class RepairTest {

  /** Factors written as {@code I:rotational_inertia^1}. */
  private static List<Powered> factors(String text) {
    List<Powered> factors = new ArrayList<>();
    for (String factor : text.strip().split(" ", -1)) {
      String[] parts = factor.split("[:^]", -1);
      factors.add(
          new Powered(parts[0], Operand.of(Kind.named(parts[1])), Rational.parse(parts[2])));
    }
    return factors;
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          U:unbalance^1 w:angular_velocity^1             | force            | EXPONENT      | w | U * w^2
          I:rotational_inertia^1 w:angular_velocity^2    | angular_momentum | EXPONENT      | w | I * w
          p:density^1 d:length^2                         | mass             | HIGH_EXPONENT | d | p * d^3
          w:angular_velocity^1 t:time^-1                 | angle            | WRONG_SIDE    | t | w * t
          F:force^1 r:radius^1 w:angular_velocity^1      | torque           | TOO_MANY      | w | F * r
          c:damping^1 m:mass^-1                          | time             | UPSIDE_DOWN   | c / m | m / c
          k:torsional_stiffness^1 I:rotational_inertia^-1 | angular_velocity | ROOT         | k / I | sqrt(k / I)
          """)
  void oneSlipIsFound(
      String factors, String wanted, Repair.Slip slip, String where, String formula) {
    assertEquals(
        Optional.of(new Repair(slip, where, formula)),
        Repair.of(factors(factors), List.of(Kind.named(wanted))));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          I:rotational_inertia^1 n:angular_velocity^1 | time
          w:angular_velocity^1 t:time^1               | number
          P:power^1 t:time^1                          | power
          """)
  void whereNoSlipOrSeveralWouldHaveToBeMendedNothingIsOffered(String factors, String wanted) {
    assertEquals(Optional.empty(), Repair.of(factors(factors), List.of(Kind.named(wanted))));
  }

  @Test
  void numberThatMayBeADampingRatioIsFound() {
    assertEquals(
        Optional.of(new CloserKind("z", Kind.named("damping_ratio"))),
        CloserKind.narrower(
            factors("z:number^-1 w:angular_velocity^-1"), List.of(Kind.named("time"))));
  }

  @Test
  void numberThatMayLackTheUnitOfAnAccelerationIsFound() {
    assertEquals(
        Optional.of(new CloserKind("g", Kind.named("acceleration"))),
        CloserKind.lackingUnit(factors("m:mass^1 g:number^1"), List.of(Kind.named("force"))));
  }

  @Test
  void wholeNumberIsNotTakenForAQuantity() {
    List<Powered> factors =
        List.of(
            new Powered("m", Operand.of(Kind.named("mass")), Rational.ONE),
            new Powered("2", Operand.numeral(Rational.of(2)), Rational.ONE));
    assertEquals(Optional.empty(), CloserKind.lackingUnit(factors, List.of(Kind.named("force"))));
  }
}
