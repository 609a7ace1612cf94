package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GreekNamesTest {
  @ParameterizedTest
  @CsvSource({"ω_max, omega_max", "σ1, sigma1", "ΔT, DeltaT", "T_b, T_b", "T_ω, T_omega"})
  void namesCanBeSpelledOnAPlainKeyboard(String name, String spelled) {
    assertEquals(spelled, GreekNames.spelled(name));
  }
}
