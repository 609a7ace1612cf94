package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class UcumCodesTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  @ParameterizedTest
  @CsvSource({
    "[lbf_av].[ft_i], lbf·ft",
    "circ/min, rpm",
    "kg.m2/s, kg·m^2/s",
    "[in_i], in",
    "10*3.circ/min, krpm",
    "V/(10*3.circ/min), V/krpm",
    "[lbf_av].[in_i]/16, ozf·in",
    "N.m/(circ/min), N·m/rpm",
    "{cycles}/min, CPM",
    "{cycle}/s, cycle/s",
    "Cel, degC",
    "[degF], degF",
    "[sin_i], in^2",
    "10*-6.[in_i], uin",
    "um, μm",
    "dag, dag",
    "mL, mL",
    "l, L",
    "/s, 1/s",
    "/(m.s), 1/(m·s)",
    "m/s2, m/s^2",
    "m.s-2, m/s^2",
    "J/kg/K, J/(kg·K)",
    "W/(m2.K), W/(m^2·K)",
    "10*3.m, km",
    "1000.m, km",
    "m/1000, mm",
    "10*-3.g.m, mg·m",
    "10*3.[psi], ksi",
    "10*3.[lbf_av].[ft_i], kip·ft",
    "m/(10*3.circ/min), m/krpm",
    "m/10*3.circ/min, mm·rev/min",
    "[in_i]4, in^4",
    "1, 1",
    "'', "
  })
  void codesAreRead(String code, String unit) {
    if (unit == null) {
      assertThrows(UnitSyntaxException.class, () -> UnitReader.readUcum(code));
    } else {
      assertEquals(unit, UnitReader.readUcum(code).plain());
    }
  }

  @ParameterizedTest
  @CsvSource({
    "{rev}/min, ANNOTATION, 0, 5, circ/min",
    "m{shaft}, ANNOTATION, 1, 7, ",
    "[foo], UNKNOWN_CODE, 0, 5, ",
    "m.qx, UNKNOWN_CODE, 2, 2, ",
    "m[in_i], UNKNOWN_CODE, 0, 7, ",
    "k[psi], UNKNOWN_CODE, 0, 6, ",
    "m/, MEMBER_MISSING, 2, 0, ",
    "m..s, MEMBER_MISSING, 2, 1, ",
    "(m, PARENTHESIS, 0, 1, ",
    "m), PARENTHESIS, 1, 1, ",
    "m0, EXPONENT, 1, 1, ",
    "m100, EXPONENT_RANGE, 1, 3, ",
    "kg m, CHARACTER, 2, 1, ",
    "µm, CHARACTER, 0, 1, ",
    "10*3.d, NUMBER, 0, 6, ",
    "7.m, NUMBER, 0, 3, ",
    "0.m, NUMBER, 0, 1, "
  })
  void otherCodesAreRefused(
      String code, UnitSyntaxException.Reason reason, int offset, int length, String remedy) {
    var refused = assertThrows(UnitSyntaxException.class, () -> UnitReader.readUcum(code));
    assertEquals(reason, refused.reason());
    assertEquals(offset, refused.offset());
    assertEquals(length, refused.length());
    assertEquals(remedy, refused.suggestion().orElse(null));
  }

  @ParameterizedTest
  @ValueSource(strings = {"hp_M", "kgf·m²·hp_E", "rpm²", "tonf"})
  void whatHasNoCodeIsNotWritten(String unit) {
    assertEquals(Optional.empty(), CATALOGUE.ucumCode(UnitReader.read(unit)));
  }

  @ParameterizedTest
  @MethodSource("written")
  void aWrittenCodeIsReadAsTheSameSize(UnitText text, String code) {
    Unit unit = CATALOGUE.resolve(text);
    Unit again = CATALOGUE.resolve(UnitReader.readUcum(code));
    assertEquals(unit.factor(), again.factor());
    assertEquals(unit.dimension(), again.dimension());
    assertEquals(unit.isReading(), again.isReading());
  }

  static Stream<Arguments> written() {
    return Stream.concat(CATALOGUE.texts().stream(), RandomUnits.texts(9, 200))
        .flatMap(text -> CATALOGUE.ucumCode(text).stream().map(code -> Arguments.of(text, code)));
  }
}
