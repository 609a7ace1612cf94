package whorl.jupyter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WildcardsTest {
  @ParameterizedTest
  @CsvSource({
    "'', '', true",
    "'', a, false",
    "*, '', true",
    "*, abc, true",
    "a*, abc, true",
    "a*, bac, false",
    "*c, abc, true",
    "*c, abcd, false",
    "a*c*e, abcde, true",
    "a*c*e, acbe, true",
    "a*c*e, aec, false",
    "*ab, aab, true",
    "**a**, bab, true",
    "a?c, abc, true",
    "a?c, ac, false",
    "?, '', false",
    "x [mm]*, x [mm] = 5, true",
    "x [mm], x m, false",
    "2*pi, 2*pi, true",
  })
  void aPatternMatchesTheWholeText(String pattern, String text, boolean matches) {
    assertEquals(matches, new Wildcards(pattern).match(text));
  }

  @Test
  void manyStarsTakeNoLongTime() {
    assertFalse(new Wildcards("*a".repeat(50) + "b").match("a".repeat(100_000)));
  }
}
