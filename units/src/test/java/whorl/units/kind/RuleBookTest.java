package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.units.Rational;

class RuleBookTest {
  private static final KindTable KINDS = KindTable.STANDARD;

  private static List<Kind> kinds(List<Result> results) {
    return results.stream().map(Result::kind).toList();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "torque times time -> energy",
        "torque",
        "torque % time -> energy",
        "torque +1 looks like energy"
      })
  void lineThatIsNoRuleIsRefused(String line) {
    var thrown =
        assertThrows(IllegalStateException.class, () -> new RuleBook(KINDS, List.of(line)));
    assertEquals("not a rule: " + line, thrown.getMessage());
  }

  @Test
  void ruleThatIsWrongInItsDimensionsIsRefused() {
    var thrown =
        assertThrows(
            IllegalStateException.class,
            () -> new RuleBook(KINDS, List.of("torque * time -> energy")));
    assertEquals("wrong in its dimensions: torque * time -> energy", thrown.getMessage());
  }

  @Test
  void productRuleIsSolvedForItsOperandsUnlessItGoesOneWay() {
    var rules =
        new RuleBook(
            KINDS, List.of("torque * time -> angular_momentum", "mass * length -> unbalance?"));
    assertEquals(
        List.of(Kind.named("time")),
        kinds(rules.quotient(Kind.named("angular_momentum"), Kind.named("torque"))));
    assertEquals(List.of(), kinds(rules.quotient(Kind.named("unbalance"), Kind.named("length"))));
  }

  @Test
  void ruleWithNoResultKeepsASpecialCaseFromItsParentsRule() {
    var rules = new RuleBook(KINDS, List.of("length * time -> nothing"));
    assertEquals(List.of(), rules.product(Kind.named("radius"), Kind.named("time")));
  }

  static List<Kind> namedKinds() {
    return Kind.all().stream()
        .filter(kind -> !kind.isInternal() && kind != Kind.named("temperature"))
        .toList();
  }

  @ParameterizedTest
  @MethodSource("namedKinds")
  void anyKindOverItselfIsANumber(Kind kind) {
    Readings ratio = product(Readings.of(kind), 1, Readings.of(kind), -1, "a", "b");
    assertTrue(ratio.canBe(Kind.named("number")), ratio::toString);
  }

  /**
   * Temperatures and flywheel effects enter no products; a plain number has no quantity to return.
   */
  static List<Kind> multipliedKinds() {
    return namedKinds().stream()
        .filter(kind -> !kind.has(Kind.Mark.ALONE) && !kind.isNumber())
        .toList();
  }

  @ParameterizedTest
  @MethodSource("multipliedKinds")
  void reciprocalOfTheReciprocalIsTheKind(Kind kind) {
    Readings reciprocal = product(Readings.NUMBER, 1, Readings.of(kind), -1, "n", "a");
    Readings again = product(Readings.NUMBER, 1, reciprocal, -1, "n", "a");
    assertTrue(again.canBe(kind), () -> kind + ": " + again);
  }

  @ParameterizedTest
  @MethodSource("multipliedKinds")
  void productWithAnyKindReturnsOnDivision(Kind kind) {
    for (Kind other : multipliedKinds()) {
      Readings product = product(Readings.of(kind), 1, Readings.of(other), 1, "a", "b");
      Readings back =
          product.isUntagged()
              ? Readings.of(kind)
              : FormulaKinds.accepted(
                      KindAlgebra.product(
                          List.of(
                              factor("a", Readings.of(kind), 1),
                              factor("b", Readings.of(other), 1),
                              factor("c", Readings.of(other), -1))))
                  .readings();
      assertTrue(back.canBe(kind), () -> kind + " * " + other + " / " + other + ": " + back);
    }
  }

  @ParameterizedTest
  @CsvSource({
    "torque, 2",
    "force, 3",
    "torsional_stiffness, 2",
    "energy, 2",
    "angular_velocity, 2"
  })
  void rootOfThePowerIsTheKind(String name, int degree) {
    Kind kind = Kind.named(name);
    Readings power = product(Readings.of(kind), degree, Readings.NUMBER, 1, "a", "n");
    Readings root = FormulaKinds.accepted(KindAlgebra.root(Operand.of(power), degree)).readings();
    assertEquals(List.of(kind), root.kinds());
  }

  private static Powered factor(String key, Readings readings, int exponent) {
    return new Powered(key, Operand.of(readings), Rational.of(exponent));
  }

  private static Readings product(
      Readings first, int m, Readings second, int n, String firstKey, String secondKey) {
    return FormulaKinds.accepted(
            KindAlgebra.product(List.of(factor(firstKey, first, m), factor(secondKey, second, n))))
        .readings();
  }
}
