package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FactorTest {

  @ParameterizedTest
  @CsvSource({
    "1, 1",
    "0.001, 1/1000",
    "1/180*pi, 1/180·π",
    "0.0005*pi^-1, 1/2000·π^-1",
    "4.184*0.45359237*1000*5/9, 23722880951/22500000",
    "2*pi/pi, 2",
    "pi*pi/4, 1/4·π^2"
  })
  void productsAreReadExactly(String text, String exact) {
    assertEquals(exact, Factor.parse(text).toString());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "*", "pie", "2**pi", "pi^", "pi^x", "2 pi"})
  void otherTextsAreRefused(String text) {
    assertThrows(NumberFormatException.class, () -> Factor.parse(text));
  }

  @Test
  void aRevolutionPerMinuteIsExactlyAThirtiethOfPi() {
    Factor revolution = Factor.parse("2*pi");
    Factor minute = Factor.parse("60");
    assertEquals(Factor.parse("1/30*pi"), revolution.dividedBy(minute));
    assertEquals(Factor.ONE, revolution.times(revolution.power(-1)));
    assertTrue(revolution.dividedBy(revolution).isOne());
    assertEquals(Factor.parse("4*pi^2"), revolution.power(2));
  }

  @Test
  void doublesAreTheNearestOnes() {
    assertEquals(Math.PI, Factor.parse("pi").doubleValue());
    assertEquals(2 * Math.PI, Factor.parse("2*pi").doubleValue());
    assertEquals(4.4482216152605, Factor.parse("4.4482216152605").doubleValue());
    assertEquals(0.3183098861837907, Factor.parse("pi^-1").doubleValue());
  }

  @Test
  void piAgreesWithMachinsFormula() {
    // pi/4 = 4 arctan(1/5) - arctan(1/239), J. Machin 1706.
    var digits = new MathContext(70);
    BigDecimal pi =
        arctanOfInverse(5, digits)
            .multiply(BigDecimal.valueOf(4))
            .subtract(arctanOfInverse(239, digits))
            .multiply(BigDecimal.valueOf(4));
    for (int power = -3; power <= 3; power++) {
      BigDecimal reference =
          power >= 0 ? pi.pow(power, digits) : BigDecimal.ONE.divide(pi.pow(-power), digits);
      assertEquals(reference.doubleValue(), Factor.parse("pi^" + power).doubleValue());
    }
  }

  private static BigDecimal arctanOfInverse(int x, MathContext digits) {
    BigDecimal sum = BigDecimal.ZERO;
    for (int k = 0; k < 60; k++) {
      BigDecimal term =
          BigDecimal.ONE.divide(
              BigDecimal.valueOf(x).pow(2 * k + 1).multiply(BigDecimal.valueOf(2L * k + 1)),
              digits);
      sum = k % 2 == 0 ? sum.add(term) : sum.subtract(term);
    }
    return sum;
  }
}
