package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class FiguresTest {

  @ParameterizedTest
  @CsvSource({
    "0, '= 0'",
    "-0.0, '= 0'",
    "12, '= 12'",
    "0.25, '= 0.25'",
    "6000, '= 6000'",
    "-20, '= −20'",
    "9999, '= 9999'",
    // Trailing zeros of a rounded number are known digits, those of a whole one are not shown.
    "36.3988, '≈ 36.40'",
    "36.4, '= 36.4'",
    "26212.34, '≈ 26.21×10³'",
    "36398.85, '≈ 36.40×10³'",
    // A carry runs through to a new digit and to a new power of ten.
    "99.995, '≈ 100.0'",
    "9999.4, '≈ 9999'",
    "9999.5, '≈ 10.00×10³'",
    "999960, '≈ 1.000×10⁶'",
    "0.00099996, '≈ 0.001000'",
    // Ties go to the even digit, and only real ties are ties: 1.0005 is a double below it.
    "12345, '≈ 12.34×10³'",
    "12355, '≈ 12.36×10³'",
    "1.0005, '≈ 1.000'",
    "41.715, '≈ 41.72'",
    // Powers of ten in steps of three.
    "10000, '= 10×10³'",
    "210e9, '= 210×10⁹'",
    "0.001, '= 0.001'",
    "0.0009, '= 900×10⁻⁶'",
    "-1.23456e-5, '≈ −12.35×10⁻⁶'",
    "1e300, '= 1×10³⁰⁰'",
    "4.9e-324, '≈ 4.941×10⁻³²⁴'",
    "1.7976931348623157e308, '≈ 179.8×10³⁰⁶'",
    // The noise of binary fractions is no rounding.
    "0.30000000000000004, '= 0.3'",
    "450.00000000000006, '= 450'",
    "899.9999999999999, '= 900'",
    "0.3333333333333333, '≈ 0.3333'",
    "450.0000001, '≈ 450.0'",
  })
  void resultsShowFourDigitsAndSayWhetherThatIsAll(double value, String shown) {
    Figure figure = Figures.of(value);

    assertEquals(shown, figure.sign() + " " + figure.text());
  }

  @ParameterizedTest
  @CsvSource({
    "412, 412",
    "0.30, 0.30",
    "1.70, 1.70",
    "-20, −20",
    "2.1e11, 2.1×10¹¹",
    "0.5e-3, 0.5×10⁻³",
    "1E6, 1×10⁶",
  })
  void inputsKeepTheDigitsOfTheirAuthor(String written, String shown) {
    assertEquals(shown, Figures.asWritten(written).text());
  }

  @ParameterizedTest
  @CsvSource({
    "230.9, 230, 230.9",
    "230.00004, 230, 230.00004",
    "9.9999996, 10, 9.9999996",
    "10, 10, 10",
    "1.0000000000000002, 1, 1",
  })
  void comparedNumbersAreToldApart(double value, double other, String shown) {
    assertEquals(shown, Figures.apart(value, other).text());
  }

  @Test
  void partsOfAVectorShareOnePowerOfTenAndOnePlace() {
    List<Figure> parts = Figures.together(List.of(36398.85, -12.3, 0.0));

    assertEquals(List.of("36.40", "−0.01", "0"), significands(parts));
    assertEquals(List.of(3, 3, 3), parts.stream().map(Figure::exponent).toList());
    assertEquals(List.of(false, false, true), parts.stream().map(Figure::exact).toList());
  }

  @Test
  void aPartThatRoundsAwayHasNoSign() {
    assertEquals(
        List.of("12.35", "0.00", "3"),
        significands(Figures.together(List.of(12.3456, -1e-9, 3.0))));
  }

  @Test
  void aVectorOfWholeNumbersStaysWhole() {
    assertEquals(
        List.of("0", "0", "320"), significands(Figures.together(List.of(0.0, 0.0, 320.0))));
  }

  private static List<String> significands(List<Figure> figures) {
    return figures.stream().map(Figure::significand).toList();
  }

  static DoubleStream anyNumbers() {
    var random = new SplittableRandom(4118);
    return DoubleStream.generate(
            () -> (random.nextDouble() * 2 - 1) * Math.pow(10, random.nextInt(-40, 40)))
        .limit(200);
  }

  @ParameterizedTest
  @MethodSource("anyNumbers")
  void theNumberShownIsWithinHalfAPlaceOfTheNumber(double value) {
    Figure figure = Figures.of(value);
    BigDecimal shown =
        new BigDecimal(figure.significand().replace('−', '-')).scaleByPowerOfTen(figure.exponent());
    BigDecimal half = shown.ulp().multiply(new BigDecimal("0.5"));

    assertTrue(shown.subtract(new BigDecimal(value)).abs().compareTo(half) <= 0);
    assertEquals(0, figure.exponent() % 3);
    assertEquals(4, shown.precision());
  }

  @ParameterizedTest
  @MethodSource("anyNumbers")
  void neighboursThatDifferAreNeverShownAlike(double value) {
    double neighbour = value * (1 + 1e-13);

    assertNotEquals(Figures.apart(value, neighbour).text(), Figures.apart(neighbour, value).text());
  }
}
