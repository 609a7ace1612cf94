package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.stream.Stream;
import org.fhir.ucum.UcumException;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The rows of the catalogue against the definitions of UCUM, by their codes: exactly, to the last
 * digit of numerator and denominator.
 */
class UcumLibraryTest {

  private static final UcumDefinitions UCUM = new UcumDefinitions();

  /** Where UCUM 1.9 has less than the exact value, with the digits it has. */
  private static final Map<String, String> ROUNDED_THERE =
      Map.of(
          "[Btu_th]", "1054.350", // exact: 4.184 J/(g·K) by a pound by 5/9 K
          "eV", "1.60217733e-19"); // CODATA 1986; exact since the SI of 2019

  static Stream<Arguments> codes() {
    return CatalogueFile.rows().stream()
        .filter(row -> !row.isReading())
        .filter(row -> !row.kind().name().equals("amount_of_substance")) // a number in UCUM
        .flatMap(row -> row.ucum().stream().map(code -> Arguments.of(code, row)));
  }

  @ParameterizedTest
  @MethodSource("codes")
  void theDefinitionGivesTheSameSizeAndDimension(String code, CatalogueRow row)
      throws UcumException {
    UcumDefinitions.Size size = UCUM.size(code);
    assertEquals(row.kind().dimension(), size.dimension());
    if (ROUNDED_THERE.containsKey(code)) {
      assertEquals(Factor.parse(ROUNDED_THERE.getOrDefault(code, "")), size.factor());
      assertEquals(size.factor().doubleValue(), row.factor().doubleValue(), 1e-6 * 1055);
    } else {
      assertEquals(row.factor(), size.factor());
    }
  }

  /**
   * Rows that UCUM has no code for, by what the trade defines them as: the multiples are common
   * practice, the watts of the boiler and water horsepower those of NIST SP 811, Appendix B.
   */
  private static final Map<String, String> DEFINED_BY =
      Map.of(
          "tonf force", "2000.[lbf_av]",
          "kip·ft torque", "1000.[lbf_av].[ft_i]",
          "hp_M power", "75.kgf.m/s",
          "hp_E power", "746.W",
          "hp_S power", "98095.W/10",
          "hp_W power", "746043.W/1000",
          "tons_ref power", "12000.[Btu_IT]/h",
          "kgf·m^2 flywheel_effect", "kg.m2",
          "kgf·cm^2 flywheel_effect", "kg.cm2",
          "lb·ft^2 flywheel_effect", "[lb_av].[ft_i]2");

  static Stream<CatalogueRow> rowsWithoutCode() {
    return CatalogueFile.rows().stream().filter(row -> row.ucum().isEmpty());
  }

  @ParameterizedTest
  @MethodSource("rowsWithoutCode")
  void whatTheLibraryHasNoCodeForAgreesWithItsDefinition(CatalogueRow row) throws UcumException {
    String name = row.text().plain() + " " + row.kind().name();
    UcumDefinitions.Size size = UCUM.size(DEFINED_BY.getOrDefault(name, "no definition: " + name));
    assertEquals(row.kind().dimension(), size.dimension());
    assertEquals(row.factor(), size.factor());
  }

  @ParameterizedTest
  @MethodSource("randomCodes")
  void productsHaveTheSameSize(UnitText text, String code) throws UcumException {
    Unit unit = UnitCatalogue.standard().resolve(text);
    assertEquals(unit.factor(), UCUM.size(code).factor());
    assertEquals(unit.dimension(), UCUM.size(code).dimension());
  }

  static Stream<Arguments> randomCodes() {
    return RandomUnits.texts(17, 400)
        .filter(text -> text.members().stream().allMatch(UcumLibraryTest::isKnownToUcum))
        .flatMap(
            text ->
                UnitCatalogue.standard().ucumCode(text).stream()
                    .map(code -> Arguments.of(text, code)));
  }

  /** Prefixes of 2022 came after UCUM 1.9; readings and moles are not comparable. */
  private static boolean isKnownToUcum(UnitText.Power member) {
    return !member.symbol().matches("[QRqr].+|.*(mol|eV|Btu_th|deg[CF])");
  }
}
