package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.units.Dimension;
import whorl.units.Rational;

class KindAlgebraTest {

  private static Operand quantity(String kind) {
    return Operand.of(Kind.named(kind));
  }

  private static Operand numeral(String value) {
    return Operand.numeral(Rational.parse(value));
  }

  private static Powered factor(Operand operand, int exponent) {
    return new Powered(new Object(), operand, Rational.of(exponent));
  }

  private static Readings readings(Judgement judgement) {
    return FormulaKinds.accepted(judgement).readings();
  }

  private static Refusal refusal(Judgement judgement) {
    return assertInstanceOf(Judgement.Refused.class, judgement).refusal();
  }

  private static Refusal refusal(String formula, String inputs, String kind) {
    return refusal(FormulaKinds.judge(formula, inputs, kind));
  }

  static Stream<List<Powered>> randomProducts() {
    var random = new SplittableRandom(20_261_201);
    List<Kind> kinds =
        Kind.all().stream()
            .filter(kind -> !kind.isInternal() && !kind.has(Kind.Mark.ALONE))
            .toList();
    return Stream.generate(
            () -> {
              List<Powered> factors = new ArrayList<>();
              for (int i = random.nextInt(2, 6); i > 0; i--) {
                Kind kind = kinds.get(random.nextInt(kinds.size()));
                factors.add(factor(Operand.of(kind), random.nextBoolean() ? 1 : -1));
              }
              factors.add(factor(Operand.of(Readings.PI), random.nextInt(-1, 2) * 2 + 1));
              return factors;
            })
        .limit(100);
  }

  @ParameterizedTest
  @MethodSource("randomProducts")
  void orderOfFactorsNeverMatters(List<Powered> factors) {
    Judgement asWritten = KindAlgebra.product(factors);
    List<Powered> shuffled = new ArrayList<>(factors);
    Collections.shuffle(shuffled, new Random(factors.size()));
    assertEquals(asWritten, KindAlgebra.product(shuffled));
  }

  @ParameterizedTest
  @ValueSource(strings = {"2*pi*f*T*eta", "T*eta*f*pi*2", "f*(2*T)*(eta*pi)", "(pi*f)*2/(1/T)*eta"})
  void nestingOfProductsNeverMatters(String formula) {
    Judgement judgement = FormulaKinds.judge(formula, "f:frequency T:torque eta:number", "power");
    assertEquals(List.of(Kind.named("power")), readings(judgement).kinds());
  }

  @Test
  void numeralsAreWorkedOutExactly() {
    Judgement third =
        KindAlgebra.product(List.of(factor(numeral("2"), 1), factor(numeral("6"), -1)));
    assertEquals(Optional.of(Rational.of(1, 3)), FormulaKinds.accepted(third).value());
    Judgement sum = KindAlgebra.plus(FormulaKinds.accepted(third), numeral("1"));
    assertEquals(Optional.of(Rational.of(4, 3)), FormulaKinds.accepted(sum).value());
  }

  @Test
  void productWithPiHasNoExactValue() {
    Judgement product =
        KindAlgebra.product(List.of(factor(numeral("2"), 1), factor(Operand.of(Readings.PI), 1)));
    assertEquals(Optional.empty(), FormulaKinds.accepted(product).value());
  }

  @Test
  void zeroIsZeroOfAnyKind() {
    Operand zero = numeral("0");
    Operand torque = quantity("torque");
    assertEquals(torque.readings(), readings(KindAlgebra.plus(zero, torque)));
    assertEquals(torque.readings(), readings(KindAlgebra.compared(torque, zero)));
    Kind energy = Kind.named("energy");
    assertEquals(
        Readings.of(energy),
        readings(KindAlgebra.assigned(zero, List.of(energy), energy.dimension())));
  }

  @Test
  void declaredUnitSettlesToTheFirstKindThatFits() {
    List<Kind> newtonMetre = List.of(Kind.named("torque"), Kind.named("energy"));
    Dimension dimension = newtonMetre.get(0).dimension();
    Operand either = Operand.of(Readings.of(newtonMetre));
    assertEquals(
        Readings.of(newtonMetre.get(0)),
        readings(KindAlgebra.assigned(either, newtonMetre, dimension)));
    assertEquals(
        Readings.of(newtonMetre.get(1)),
        readings(KindAlgebra.assigned(quantity("energy"), newtonMetre, dimension)));
  }

  @Test
  void whereTheUnitTellsOnlyItsDimensionTheReadingsStay() {
    Operand torque = quantity("torque");
    assertEquals(
        torque.readings(),
        readings(KindAlgebra.assigned(torque, List.of(), torque.readings().dimension())));
    assertInstanceOf(
        Refusal.WrongKind.class,
        refusal(KindAlgebra.assigned(torque, List.of(), Dimension.of("M"))));
  }

  @Test
  void compoundOfUnitsIsCheckedByItsReadings() {
    Readings unit =
        KindAlgebra.unit(List.of(factor(quantity("torque"), 2), factor(quantity("number"), 1)));
    Judgement squares =
        KindAlgebra.product(List.of(new Powered("T", quantity("torque"), Rational.of(2))));
    assertEquals(unit, readings(KindAlgebra.assigned(FormulaKinds.accepted(squares), unit)));
    Judgement others =
        KindAlgebra.product(List.of(new Powered("E", quantity("energy"), Rational.of(2))));
    assertInstanceOf(
        Refusal.WrongKind.class,
        refusal(KindAlgebra.assigned(FormulaKinds.accepted(others), unit)));
  }

  @Test
  void unitWithASecondThatMayBeOnePerRadianTellsOnlyItsDimension() {
    Readings unit =
        KindAlgebra.unit(List.of(factor(quantity("mass"), 1), factor(quantity("time"), -2)));
    assertTrue(unit.isUntagged(), unit::toString);
  }

  @Test
  void crossProductOfArmAndForceIsATorqueOnly() {
    Judgement cross = KindAlgebra.cross(quantity("length"), quantity("force"));
    assertEquals(List.of(Kind.named("torque")), readings(cross).kinds());
  }

  @Test
  void dotProductOfForceAndWayIsAnEnergyOnly() {
    Judgement dot = KindAlgebra.dot(quantity("force"), quantity("length"));
    assertEquals(List.of(Kind.named("energy")), readings(dot).kinds());
  }

  @Test
  void partOfATorqueAlongADirectionIsATorque() {
    Judgement dot = KindAlgebra.dot(quantity("torque"), quantity("number"));
    assertEquals(List.of(Kind.named("torque")), readings(dot).kinds());
  }

  @Test
  void vectorProductOfTheWrongCharacterIsRefused() {
    var dot = refusal(KindAlgebra.dot(quantity("force"), quantity("radius")));
    assertEquals(new Refusal.WrongCharacter(false, Readings.of(Kind.named("torque"))), dot);
    Operand work = Operand.of(Readings.of(Kind.named("energy")));
    var cross = refusal(KindAlgebra.cross(work, quantity("number")));
    assertEquals(new Refusal.WrongCharacter(true, work.readings()), cross);
  }

  @Test
  void moreThanNineQuantitiesAreRefusedWithTheirNumber() {
    List<Powered> factors = new ArrayList<>(Collections.nCopies(9, factor(quantity("length"), 1)));
    for (int i = 0; i < factors.size(); i++) {
      factors.set(i, factor(quantity("length"), 1));
    }
    assertInstanceOf(Judgement.Accepted.class, KindAlgebra.product(factors));
    factors.add(factor(quantity("length"), -1));
    assertEquals(new Refusal.TooManyFactors(10, 9), refusal(KindAlgebra.product(factors)));
  }

  @Test
  void numeralsAndEqualFactorsDoNotCountTowardsTheLimit() {
    List<Powered> factors = new ArrayList<>();
    for (int i = 0; i < 12; i++) {
      factors.add(factor(numeral("3"), 1));
      factors.add(new Powered("l", quantity("length"), Rational.ONE));
      factors.add(factor(quantity("number"), 1));
    }
    assertInstanceOf(Judgement.Accepted.class, KindAlgebra.product(factors));
  }

  @ParameterizedTest
  @CsvSource({"1/2", "1/3", "3/2", "2/3", "3/4", "-1/2"})
  void rootsOfMechanicsAreTaken(String exponent) {
    assertInstanceOf(
        Judgement.Accepted.class, KindAlgebra.power(quantity("length"), Rational.parse(exponent)));
  }

  @ParameterizedTest
  @CsvSource({"0.3", "2.8", "1/7", "101"})
  void powersOfEmpiricalFitsAreLeftToNumbers(String exponent) {
    Rational power = Rational.parse(exponent);
    Operand velocity = quantity("velocity");
    assertEquals(
        new Refusal.FractionalPower(velocity.readings(), power),
        refusal(KindAlgebra.power(velocity, power)));
    assertEquals(Readings.NUMBER, readings(KindAlgebra.power(quantity("number"), power)));
  }

  @ParameterizedTest
  @CsvSource({
    "T2 - T1, temperature_difference", "T1 + d, temperature", "d + T1, temperature",
    "T1 - d, temperature", "'max(T1, T2)', temperature", "T1 + (T2 - T1)/2, temperature"
  })
  void temperaturesOnAScaleHaveDifferencesAndAnOrder(String formula, String kind) {
    Judgement judgement =
        FormulaKinds.judge(formula, "T1:temperature T2:temperature d:temperature_difference", kind);
    assertEquals(List.of(Kind.named(kind)), readings(judgement).kinds());
  }

  @ParameterizedTest
  @ValueSource(strings = {"T1 + T2", "d - T1", "T1 > d"})
  void temperaturesOnAScaleHaveNoSum(String formula) {
    assertInstanceOf(
        Refusal.TemperatureSum.class,
        refusal(formula, "T1:temperature T2:temperature d:temperature_difference", "untagged"));
  }

  @ParameterizedTest
  @CsvSource({"2*T1", "T1^2", "sqrt(T1)", "m*c*T1"})
  void temperatureOnAScaleIsNeverMultiplied(String formula) {
    assertEquals(
        new Refusal.TemperatureReading(),
        refusal(formula, "T1:temperature m:mass c:specific_heat", "untagged"));
  }

  @ParameterizedTest
  @CsvSource({
    "9549*P/n, 9549",
    "P*60/n*9.55, 9.55",
    "T*n/5252, 5252",
    "T*n/63025, 63025",
    "716.2*P/n, 716.2"
  })
  void constantOfANumericValueFormulaIsRefusedByName(String formula, String constant) {
    var refusal = refusal(formula, "P:power T:torque n:angular_velocity", "untagged");
    assertEquals(
        Rational.parse(constant), assertInstanceOf(Refusal.NumericValue.class, refusal).constant());
  }

  @Test
  void sameNumberBesideOtherQuantitiesIsNone() {
    assertInstanceOf(Judgement.Accepted.class, FormulaKinds.judge("375*m", "m:mass", "mass"));
  }

  @ParameterizedTest
  @CsvSource({"n*T/60, 60", "f/30, 30"})
  void conversionByHandIsRemarked(String formula, String numeral) {
    Judgement judgement =
        FormulaKinds.judge(formula, "n:angular_velocity T:torque f:frequency", "untagged");
    var operand = assertInstanceOf(Judgement.Accepted.class, judgement).operand();
    assertTrue(operand.value().isEmpty());
    Judgement product =
        KindAlgebra.product(
            List.of(factor(quantity("angular_velocity"), 1), factor(numeral(numeral), -1)));
    assertEquals(
        Optional.of(new Remark(Rational.parse(numeral), Kind.named("angular_velocity"))),
        assertInstanceOf(Judgement.Accepted.class, product).remark());
  }

  @ParameterizedTest
  @CsvSource({
    "GD2/4*w^2/2, energy",
    "w^2*GD2/4, energy",
    "(GD2/4)^2, untagged",
    "GD2*0.25, rotational_inertia",
    "GD2*(w/w2)^2, flywheel_effect",
    "GD2/GD3, number",
    "sqrt(GD2/m), length"
  })
  void flywheelEffectEntersWhereItMay(String formula, String kind) {
    assertInstanceOf(
        Judgement.Accepted.class,
        FormulaKinds.judge(
            formula,
            "GD2:flywheel_effect GD3:flywheel_effect w:angular_velocity w2:angular_velocity m:mass",
            kind));
  }

  @ParameterizedTest
  @ValueSource(strings = {"GD2*w", "1/2*GD2*w^2", "GD2*al", "GD2/t"})
  void flywheelEffectIsNoInertia(String formula) {
    assertEquals(
        new Refusal.FlywheelEffect(),
        refusal(
            formula,
            "GD2:flywheel_effect w:angular_velocity al:angular_acceleration t:time",
            "untagged"));
  }

  @ParameterizedTest
  @CsvSource({
    "sin(w), SINE",
    "sin(0.5), SINE",
    "asin(th), ARC",
    "exp(w), EXPONENTIAL",
    "exp(f*t), EXPONENTIAL",
    "ln(th), LOGARITHM",
    "2^w, VARIABLE_POWER",
    "w^x, VARIABLE_POWER"
  })
  void functionRefusesWhatItCannotTake(String formula, FunctionFamily function) {
    var refusal =
        refusal(formula, "w:angular_velocity th:angle f:frequency t:time x:number", "untagged");
    assertEquals(function, assertInstanceOf(Refusal.WrongArgument.class, refusal).function());
  }

  @Test
  void untaggedQuantityGoesWithAnyOfItsDimension() {
    Operand untagged = Operand.of(Readings.untagged(Dimension.of("M L^2 T^-2")));
    assertEquals(
        quantity("torque").readings(), readings(KindAlgebra.plus(untagged, quantity("torque"))));
    assertInstanceOf(Refusal.Unlike.class, refusal(KindAlgebra.plus(untagged, quantity("force"))));
  }

  @Test
  void sumWithRotationInOneTermKeepsTheAccountOfTurns() {
    assertInstanceOf(
        Refusal.WrongKind.class,
        refusal(
            "2*pi*n*(m*r*v + I*w)",
            "n:angular_velocity m:mass r:radius v:velocity I:rotational_inertia w:angular_velocity",
            "torque"));
  }
}
