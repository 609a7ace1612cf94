package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class CanonicalJsonTest {

  /**
   * Expected: what {@code json.dumps} of Python 3.11 writes for what {@code JSON.stringify} of Node
   * writes for the number.
   */
  @ParameterizedTest
  @CsvSource({
    "412.0, 412",
    "-0.0, 0",
    "0.1, 0.1",
    "-2.5, -2.5",
    "3.9341637021558714E-4, 0.00039341637021558714",
    "1.0E-4, 0.0001",
    "5.0E-5, 5e-05",
    "-1.25E-7, -1.25e-07",
    "1.5E-300, 1.5e-300",
    "6.283185307179586E15, 6283185307179586",
    "1.2345678901234568E20, 123456789012345680000",
    "1.0E21, 1e+21",
    "-6.02214076E23, -6.02214076e+23",
    "1.7976931348623157E308, 1.7976931348623157e+308",
    "4.9E-324, 5e-324",
    "2.2250738585072014E-308, 2.2250738585072014e-308",
    "2.0E-3, 0.002",
    "5.684341886080802E-14, 5.684341886080802e-14",
  })
  void numbersAreSpelledAsJupyterLeavesThem(double value, String spelled) {
    assertEquals(spelled, CanonicalJson.spelled(value));
  }

  static DoubleStream numbers() {
    var random = new SplittableRandom(7);
    return DoubleStream.generate(() -> Double.longBitsToDouble(random.nextLong()))
        .filter(Double::isFinite)
        .limit(200);
  }

  @ParameterizedTest
  @MethodSource("numbers")
  void noDigitIsLost(double value) {
    assertEquals(value, Double.parseDouble(CanonicalJson.spelled(value)));
  }
}
