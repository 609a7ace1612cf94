package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class NearSymbolsTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  @ParameterizedTest
  @CsvSource({
    // powers without a sign
    "m2, m^2",
    "mm3, mm^3",
    "in4, in^4",
    "s2, s^2",
    // products without a sign
    "MNm, MN·m",
    "kgcm2, kg·cm^2",
    "gmm, g·mm",
    "kNmm, kN·mm",
    "gmm2, g·mm^2",
    // slips of case
    "KG, kg",
    "Kg, kg",
    "KW, kW",
    "hz, Hz",
    "KPa, kPa",
    "khz, kHz",
    "KNM, kN·m",
    "SEC, s",
    // words
    "Newton, N",
    "Newtons, N",
    "kilowatt, kW",
    "Kilowatts, kW",
    "millimetres, mm",
    "megapascals, MPa",
    "Degrees, deg",
    "Pounds, lb",
    // the trade
    "mtr, m",
    "lbs, lb",
    "gms, g",
    "ftlb, ft·lbf",
    "inlb, lbf·in",
    "cfm, ft^3/min",
    "psig, psi",
    "bhp, hp",
    "micron, μm",
    "rmp, rpm",
    "F, degF"
  })
  void theUsualSpellingIsOffered(String written, String usual) {
    var unknown = unknown(written);
    assertEquals(usual, unknown.usualSpelling().orElse(""));
    assertEquals(usual, unknown.near().get(0));
  }

  private static UnknownUnitException unknown(String symbol) {
    return assertThrows(UnknownUnitException.class, () -> CATALOGUE.resolve(UnitText.of(symbol)));
  }

  @ParameterizedTest
  @CsvSource({
    "lbs, lb lbf",
    "slgu, slug",
    "slugg, slug slugs",
    "Torrr, Torr",
    "KN, kN kn",
    "krmp, krpm",
    "inlbs, lbf·in lb·in"
  })
  void nearSymbolsAreOffered(String written, String near) {
    assertEquals(near, String.join(" ", CATALOGUE.near(written)));
  }

  @ParameterizedTest
  @ValueSource(strings = {"qx", "x", "zzzz", "hello", "∂", ""})
  void nothingIsOfferedForWhatIsFar(String written) {
    assertEquals(List.of(), CATALOGUE.near(written));
  }

  static Stream<Arguments> tradeSpellings() {
    return CommaSeparated.lines("trade-spellings.csv", 2).stream()
        .map(cells -> Arguments.of(cells.get(0), CommaSeparated.words(cells.get(1))));
  }

  @ParameterizedTest
  @MethodSource("tradeSpellings")
  void aTradeSpellingIsUnknownAndWhatItMeansIsKnown(String written, List<String> meant) {
    assertFalse(CATALOGUE.knows(written));
    for (String unit : meant) {
      assertEquals(unit, CATALOGUE.resolve(UnitReader.read(unit)).toString());
    }
  }
}
