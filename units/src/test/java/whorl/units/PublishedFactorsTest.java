package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.units.kind.Kind;

/** Sizes of units against published tables; the files say which, and how they were read. */
class PublishedFactorsTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  private static Factor factor(String unit) {
    return CATALOGUE.resolve(UnitReader.read(unit)).factor();
  }

  @ParameterizedTest
  @CsvFileSource(resources = "published-factors.csv", numLinesToSkip = 1)
  void agreeToThePrintedDigits(String unit, BigDecimal printed, boolean exact, String readAs) {
    if (exact) {
      assertEquals(Factor.of(Rational.of(printed)), factor(unit), readAs);
    } else {
      BigDecimal halfDigit = printed.ulp().movePointLeft(1).multiply(BigDecimal.valueOf(5));
      double deviation = factor(unit).doubleValue() - printed.doubleValue();
      assertTrue(Math.abs(deviation) <= halfDigit.doubleValue() * (1 + 1e-9), readAs);
    }
  }

  @ParameterizedTest
  @CsvFileSource(resources = "conversion-cases.csv", numLinesToSkip = 1)
  void conversionsAgree(
      String id, double given, String from, double expected, String to, double tolerance) {
    double converted =
        CATALOGUE
            .resolve(UnitReader.read(to))
            .fromSi(CATALOGUE.resolve(UnitReader.read(from)).toSi(given));
    assertEquals(expected, converted, Math.abs(expected) * tolerance, id);
  }

  @ParameterizedTest
  @CsvSource({
    // 1 kgf·m² of GD² is an inertia of 1/4 kg·m²: J = (G/g)·D²/4 with G the weight
    "100, kg·m^2, 25",
    "100, kgf·m·s^2, 2.5492905324448207",
    "100, lb·ft^2, 593.2590101057983"
  })
  void aQuarterOfTheFlywheelEffectIsTheInertia(double given, String unit, double inertia) {
    Unit flywheelEffect =
        CATALOGUE.resolve(UnitReader.read("kgf·m^2"), Kind.named("flywheel_effect")).orElseThrow();
    double shown = CATALOGUE.resolve(UnitReader.read(unit)).fromSi(flywheelEffect.toSi(given) / 4);
    assertEquals(inertia, shown, inertia * 1e-12);
  }
}
