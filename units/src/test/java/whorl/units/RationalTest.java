package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class RationalTest {

  @ParameterizedTest
  @CsvSource({
    "1.5, 3/2",
    "3/4, 3/4",
    "2e3, 2000",
    "-0.25, -1/4",
    "6/-4, -3/2",
    "0, 0",
    "1.2/0.8, 3/2",
    "4.4482216152605, 8896443230521/2000000000000",
    "1E-2, 1/100"
  })
  void decimalsAndFractionsAreReadExactly(String text, String inLowestTerms) {
    assertEquals(inLowestTerms, Rational.parse(text).toString());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "a", "1/0", "1/2/3", "1e999999999", "1e-2147483648", " 1", "1/"})
  void otherTextsAreNoNumbers(String text) {
    assertThrows(NumberFormatException.class, () -> Rational.parse(text));
  }

  @Test
  void theSignIsKeptInTheNumerator() {
    assertEquals(Rational.of(-3, 4), Rational.of(6, -8));
    assertEquals(BigInteger.valueOf(4), Rational.of(6, -8).denominator());
    assertEquals(Rational.ZERO, Rational.of(0, -8));
  }

  @Test
  void nothingIsDividedByZero() {
    assertThrows(ArithmeticException.class, () -> Rational.ONE.dividedBy(Rational.ZERO));
    assertThrows(ArithmeticException.class, () -> Rational.ZERO.power(-1));
  }

  @Test
  void powersRunBothWays() {
    assertEquals(Rational.of(8, 27), Rational.of(2, 3).power(3));
    assertEquals(Rational.of(-27, 8), Rational.of(-2, 3).power(-3));
    assertEquals(Rational.ONE, Rational.of(2, 3).power(0));
  }

  @Test
  void orderIsThatOfTheNumberLine() {
    assertTrue(Rational.of(1, 3).compareTo(Rational.of(333, 1000)) > 0);
    assertTrue(Rational.of(-1, 3).compareTo(Rational.of(-1, 4)) < 0);
    assertEquals(0, Rational.of(2, 4).compareTo(Rational.of(1, 2)));
  }

  @ParameterizedTest
  @MethodSource("doubles")
  void aDoubleTakenExactlyComesBackUnchanged(double value) {
    assertEquals(value, Rational.of(new BigDecimal(value)).doubleValue());
  }

  @ParameterizedTest
  @MethodSource("doubles")
  void theNearestDoubleIsTakenWithTiesToEven(double value) {
    Rational here = Rational.of(new BigDecimal(value));
    Rational next = Rational.of(new BigDecimal(Math.nextUp(value)));
    Rational middle = here.plus(next).dividedBy(Rational.of(2));
    Rational sliver = next.minus(here).dividedBy(Rational.of(1_000_000_000_000L));
    boolean even = (Double.doubleToLongBits(value) & 1) == 0;
    assertEquals(value, middle.minus(sliver).doubleValue());
    assertEquals(even ? value : Math.nextUp(value), middle.doubleValue());
    assertEquals(Math.nextUp(value), middle.plus(sliver).doubleValue());
  }

  static Stream<Double> doubles() {
    var random = new SplittableRandom(71);
    return Stream.concat(
        Stream.of(1.0, -1.0, Double.MIN_VALUE, Double.MIN_NORMAL, Math.PI, 1e300, -1e-300),
        Stream.generate(() -> Double.longBitsToDouble(random.nextLong()))
            .filter(value -> Math.abs(value) < 1e308)
            .limit(100));
  }

  @ParameterizedTest
  @MethodSource("triples")
  void fieldLawsHold(Rational a, Rational b, Rational c) {
    assertEquals(a.times(b.plus(c)), a.times(b).plus(a.times(c)));
    assertEquals(a, a.plus(b).minus(b));
    assertEquals(a, a.times(c).dividedBy(c));
    assertEquals(a, Rational.parse(a.toString()));
  }

  static Stream<Rational[]> triples() {
    var random = new SplittableRandom(72);
    return Stream.generate(
            () -> new Rational[] {fraction(random), fraction(random), fraction(random)})
        .limit(100);
  }

  private static Rational fraction(SplittableRandom random) {
    return Rational.of(random.nextLong(1, 1_000_000) * 2 - 999_999, random.nextLong(1, 1000));
  }

  @Test
  void beyondTheRangeOfDoublesIsInfinite() {
    assertEquals(Double.POSITIVE_INFINITY, Rational.parse("1e400").doubleValue());
    assertEquals(Double.NEGATIVE_INFINITY, Rational.parse("-1e400").doubleValue());
    assertEquals(0.0, Rational.parse("1e-400").doubleValue());
  }
}
