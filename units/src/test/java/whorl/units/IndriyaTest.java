package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import java.util.stream.Stream;
import javax.measure.IncommensurableException;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.format.SimpleUnitFormat;
import tech.units.indriya.unit.Units;

/** Products of prefixed SI units against the reference implementation of JSR 385, Indriya 2.2. */
class IndriyaTest {

  private static final String[] UNITS = {"m", "g", "s", "A", "K", "N", "Pa", "J", "W", "V", "C"};
  private static final String[] PREFIXES = {"", "k", "M", "G", "m", "n", "p", "c", "h", "T"};

  static Stream<String> products() {
    var random = new SplittableRandom(385);
    return Stream.generate(() -> member(random) + "·" + member(random) + "/" + member(random))
        .limit(200);
  }

  private static String member(SplittableRandom random) {
    String symbol = PREFIXES[random.nextInt(PREFIXES.length)] + UNITS[random.nextInt(UNITS.length)];
    int exponent = random.nextInt(1, 4);
    return symbol + (exponent == 1 ? "" : "^" + exponent);
  }

  @ParameterizedTest
  @MethodSource("products")
  void sizesAgree(String product) throws IncommensurableException {
    javax.measure.Unit<?> theirs = SimpleUnitFormat.getInstance().parse(product);
    Unit ours = UnitCatalogue.standard().resolve(UnitReader.read(product));
    double expected = theirs.getConverterToAny(theirs.getSystemUnit()).convert(1.0);
    assertEquals(expected, ours.factor().doubleValue(), expected * 1e-14);
    assertEquals(theirs.getSystemUnit().getDimension(), coherent(ours).getDimension());
  }

  @ParameterizedTest
  @ValueSource(doubles = {-273.15, -40, 0, 20, 451})
  void readingsOfTemperatureAgree(double reading) {
    Unit ours = UnitCatalogue.standard().resolve(UnitReader.read("°C"));
    double kelvin = Units.CELSIUS.getConverterTo(Units.KELVIN).convert(reading);
    assertEquals(kelvin, ours.toSi(reading), 1e-12);
    assertEquals(reading, ours.fromSi(kelvin), 1e-12);
  }

  private static javax.measure.Unit<?> coherent(Unit unit) {
    javax.measure.Unit<?> product = AbstractUnit.ONE;
    for (Dimension.Base base : Dimension.Base.values()) {
      int exponent = unit.dimension().exponent(base).numerator().intValueExact();
      product = product.multiply(SimpleUnitFormat.getInstance().parse(base.unit()).pow(exponent));
    }
    return product;
  }
}
