package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.units.Rational;

class FactorTextTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          E * w       | E * w
          -ζ * ω      | -ζ * ω
          v / r       | (v / r)
          a + b       | (a + b)
          412 lb      | (412 lb)
          sqrt(k / I) | sqrt(k / I)
          r × F       | (r × F)
          """)
  void parenthesesStandWhereAFurtherFactorWouldBeReadWrongly(String text, String dividend) {
    assertEquals(dividend, FactorText.dividend(text));
  }

  @Test
  void productHasOneFractionBar() {
    assertEquals(
        "16 * T / (π * d^3)",
        FactorText.product(
            List.of(factor("16", 1), factor("T", 1), factor("π", -1), factor("d", -3))));
  }

  @Test
  void reciprocalHasAOneAbove() {
    assertEquals("1 / (a + b)", FactorText.product(List.of(factor("a + b", -1))));
  }

  private static Powered factor(String text, long exponent) {
    return new Powered(text, Operand.of(Readings.NUMBER), Rational.of(exponent));
  }
}
