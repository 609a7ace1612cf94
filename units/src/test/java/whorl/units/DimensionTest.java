package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DimensionTest {

  @ParameterizedTest
  @CsvSource({
    "L^2 M T^-2, M L^2 T^-2",
    "T^-1, T^-1",
    "1, 1",
    "M L M^-1, L",
    "Th^-1 L^2 T^-2, L^2 T^-2 Th^-1",
    "M^1/2 L^3/2, M^1/2 L^3/2",
    "I N J, I N J"
  })
  void productsOfPowersAreWrittenInOneOrder(String text, String canonical) {
    assertEquals(canonical, Dimension.of(text).toString());
    assertEquals(Dimension.of(text), Dimension.of(canonical));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "Q", "M^", "M^x", "MLT", "L^2M"})
  void otherTextsAreRefused(String text) {
    assertThrows(IllegalArgumentException.class, () -> Dimension.of(text));
  }

  @Test
  void aSquareRootOfASquareIsTheDimensionItself() {
    var energy = Dimension.of("M L^2 T^-2");
    var half = Rational.of(1, 2);
    assertEquals(energy, energy.times(energy).power(half));
    assertEquals(energy, energy.power(half).times(energy.power(half)));
    assertEquals(energy.hashCode(), energy.power(half).power(Rational.of(2)).hashCode());
  }

  @Test
  void aQuotientByItselfIsAPureNumber() {
    var force = Dimension.of("M L T^-2");
    assertTrue(force.dividedBy(force).isOne());
    assertTrue(force.power(Rational.ZERO).isOne());
    assertFalse(force.isOne());
    assertEquals(Dimension.ONE, Dimension.of("1"));
  }

  @Test
  void exponentsAreReadByBaseDimension() {
    var root = Dimension.of("M^1/2 T^-1");
    assertEquals(Rational.of(1, 2), root.exponent(Dimension.Base.MASS));
    assertEquals(Rational.of(-1), root.exponent(Dimension.Base.TIME));
    assertEquals(Rational.ZERO, root.exponent(Dimension.Base.LENGTH));
  }

  @Test
  void anExponentOutOfRangeIsAnErrorAndNotAWrongDimension() {
    var huge = Dimension.of("M").power(Rational.of(Long.MAX_VALUE));
    assertThrows(ArithmeticException.class, () -> huge.times(huge));
    assertThrows(ArithmeticException.class, () -> huge.power(Rational.of(2)));
  }
}
