package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitReaderTest {

  @ParameterizedTest
  @CsvSource({
    "kg·m²/s, kg·m^2/s",
    "kg*m^2/s, kg·m^2/s",
    "N.m, N·m",
    "N m, N·m",
    "J/(kg K), J/(kg·K)",
    "W / ( m² · K ), W/(m^2·K)",
    "W/(m²), W/m^2",
    "m⁻¹, m^-1",
    "m^-1, m^-1",
    "m^+2, m^2",
    "m¹⁰, m^10",
    "1, 1",
    "1/s, 1/s",
    "1 / (m·s), 1/(m·s)",
    "kg m ^ 2, kg·m^2",
    "°C, °C",
    "Δ°C, Δ°C",
    "°/s, °/s",
    "30 %, ",
    "ppm/K, ppm/K",
    "%, %",
    "Btu_IT/h, Btu_IT/h",
    "g0, g0",
  })
  void unitsAreReadInAllStyles(String text, String canonical) {
    if (canonical == null) {
      assertThrows(UnitSyntaxException.class, () -> UnitReader.read(text));
    } else {
      assertEquals(canonical, UnitReader.read(text).plain());
    }
  }

  @ParameterizedTest
  @CsvSource({
    "\u00b5m, \u03bcm",
    "\u2126, \u03a9",
    "N\u22c5m, N·m",
    "N\u2219m, N·m",
    "N\u2217m, N·m",
    "m^\u22121, m^-1",
    "N\u00a0m, N·m",
    "kg\u202fm, kg·m",
    "N\u2009m, N·m"
  })
  void charactersThatLookAlikeAreOne(String text, String canonical) {
    assertEquals(canonical, UnitReader.read(text).plain());
  }

  @Test
  void theOrderAndSymbolsOfTheAuthorStay() {
    UnitText text = UnitReader.read("m·N/turn");
    assertEquals("m·N/turn", text.plain());
    assertEquals("m·N/turn", text.typeset());
  }

  @ParameterizedTest
  @CsvSource({
    "'', EMPTY, 0, 0, ",
    "'  ', EMPTY, 0, 2, ",
    "m/s/s, SECOND_SLASH, 3, 1, m/s^2",
    "J/kg/K, SECOND_SLASH, 4, 1, J/(kg·K)",
    "J/(kg·K)/s, SECOND_SLASH, 8, 1, J/(kg·K·s)",
    "W/m²·K, PRODUCT_BEHIND_SLASH, 4, 1, W/(m^2·K)",
    "W/m² K, PRODUCT_BEHIND_SLASH, 5, 1, W/(m^2·K)",
    "W/m²·K/s, PRODUCT_BEHIND_SLASH, 4, 1, W/(m^2·K·s)",
    "ft-lbf, HYPHEN, 2, 1, ft·lbf",
    "kg m-3, HYPHEN, 4, 1, kg·m^-3",
    "m**2, MEMBER_MISSING, 2, 1, m^2",
    "m·, MEMBER_MISSING, 2, 0, ",
    "/s, MEMBER_MISSING, 0, 1, ",
    "m/, MEMBER_MISSING, 2, 0, ",
    "m/(), MEMBER_MISSING, 3, 1, ",
    "m/(s, PARENTHESIS, 2, 1, ",
    "m/s), PARENTHESIS, 3, 1, ",
    "(N·m)/A, PARENTHESIS, 0, 1, ",
    "m^2.5, EXPONENT, 1, 2, ",
    "m^(1/2), EXPONENT, 1, 1, ",
    "m^x, EXPONENT, 1, 1, ",
    "m^0, EXPONENT, 1, 2, ",
    "m⁻, EXPONENT, 1, 1, ",
    "m^2^3, EXPONENT, 3, 1, ",
    "m^100, EXPONENT_RANGE, 1, 4, ",
    "m^99999999999, EXPONENT_RANGE, 1, 12, ",
    "5 m, NUMBER, 0, 1, ",
    "10³ kg, NUMBER, 0, 1, ",
    "1 m, NUMBER, 0, 1, ",
    "kg€, CHARACTER, 2, 1, ",
    "'m\"', CHARACTER, 1, 1, ",
    "𝄞, CHARACTER, 0, 1, ",
    "m/s𝄞, CHARACTER, 3, 1, ",
  })
  void whatIsNoUnitIsRefusedWithPlaceReasonAndRemedy(
      String text, UnitSyntaxException.Reason reason, int offset, int length, String remedy) {
    var refused = assertThrows(UnitSyntaxException.class, () -> UnitReader.read(text));
    assertEquals(reason, refused.reason());
    assertEquals(offset, refused.offset());
    assertEquals(length, refused.length());
    assertEquals(remedy, refused.suggestion().orElse(null));
    assertTrue(String.valueOf(refused.getMessage()).contains(reason.sentence()));
  }

  @ParameterizedTest
  @ValueSource(strings = {"m/s^2", "J/(kg·K)", "W/(m^2·K·s)", "ft·lbf", "kg·m^-3"})
  void theRemedyIsItselfReadable(String remedy) {
    assertEquals(remedy, UnitReader.read(remedy).plain());
  }

  @Test
  void lengthAndNumberOfMembersAreBounded() {
    assertEquals(
        UnitSyntaxException.Reason.TOO_LONG,
        assertThrows(UnitSyntaxException.class, () -> UnitReader.read("m".repeat(201))).reason());
    assertEquals(20, UnitReader.read("m·".repeat(19) + "m").over().size());
    assertEquals(
        UnitSyntaxException.Reason.TOO_LONG,
        assertThrows(UnitSyntaxException.class, () -> UnitReader.read("m·".repeat(20) + "m"))
            .reason());
  }
}
