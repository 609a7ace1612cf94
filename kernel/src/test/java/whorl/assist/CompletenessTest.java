package whorl.assist;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CompletenessTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      ignoreLeadingAndTrailingWhitespace = true,
      value = {
        "''                                   | complete",
        "E = 1/2 * m * v^2                    | complete",
        "E = 1/2 * m⏎F = 3 N⏎                 | complete",
        "# a remark                           | complete",
        "check E <= 3 J                       | complete",
        "f(x [m]) = (x +⏎    3 m)             | complete",
        "review                               | complete",
        "E = 1/2 *                            | incomplete 4",
        "E = 1/2 * # half                     | incomplete 4",
        "E =                                  | incomplete 4",
        "F = 3 N⏎E = max(3 J,                 | incomplete 4",
        "E = (1/2 * m                         | incomplete 4",
        "E = max(a                            | incomplete 4",
        "W [N·m                               | incomplete 4",
        "x = if a < b then                    | incomplete 4",
        "check a < b and                      | incomplete 4",
        "σ_2 = σ_t with                       | incomplete 4",
        "cases sea: T_p [s], θ_p [deg]        | incomplete 4",
        "motion run_up                        | incomplete 4",
        "data log: t [s], n [rpm]⏎  0, 3      | incomplete 2",
        "cases sea: T_p [s]⏎    calm 5.5      | incomplete 4",
        "motion r⏎    ω [rpm] starts (3 +     | incomplete 4",
        "cases sea: T_p [s]⏎    calm 5.5⏎     | complete",
        "cases sea from \"a.csv\": T_p [s]    | complete",
        "cases sea: T_p [s]⏎                  | invalid",
        "E = 1/2 *⏎                           | invalid",
        "E = (1/2 * m⏎                        | invalid",
        "E = (1/2 * m⏎F = 3 N                 | invalid",
        "E = 3 kg m                           | invalid",
        "E = )                                | invalid",
        "E = 3 kg m⏎F = 2 *                   | invalid",
        "check                                | invalid",
        "x = \"abc                            | invalid",
        "'    x = 3'                          | invalid",
      })
  void aTextIsReadyOrWaitsForMore(String text, String expected) {
    Completeness completeness = Assistant.completeness(text.replace("⏎", "\n"));
    String answer =
        completeness instanceof Completeness.Incomplete incomplete
            ? "incomplete " + incomplete.indent().length()
            : completeness.getClass().getSimpleName().toLowerCase(java.util.Locale.ROOT);
    assertEquals(expected, answer, text);
  }
}
