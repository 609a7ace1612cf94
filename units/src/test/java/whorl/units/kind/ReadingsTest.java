package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import whorl.units.Dimension;

class ReadingsTest {
  private static final String INPUTS =
      "I:rotational_inertia n:angular_velocity F:force r:length m:mass T:torque f:frequency t:time"
          + " k:torsional_stiffness h:[M_T^-3_Th^-1]";

  private static Readings readings(String formula) {
    return FormulaKinds.accepted(FormulaKinds.judge(formula, INPUTS, "untagged")).readings();
  }

  @ParameterizedTest
  @CsvSource({
    "F*r, torque or energy, N·m",
    "I*n, angular momentum, kg·m²·rad/s",
    "f, frequency, Hz",
    "1/n, s/rad, s/rad",
    "n^2, rad²/s², rad²/s²",
    "T^2, kg²·m⁴/s⁴, kg²·m⁴/s⁴",
    "h, kg/(s³·K), kg/(s³·K)",
    "sqrt(m), kg^(1/2), kg^(1/2)",
    "f*T, W, W",
    "k, torsional stiffness, N·m/rad",
    "F*r*F*r/F/r/F/r, number, 1"
  })
  void isNamedInWordsOrElseInUnits(String formula, String words, String unit) {
    assertEquals(words, readings(formula).words());
    assertEquals(unit, readings(formula).unit());
  }

  @ParameterizedTest
  @CsvSource({"F*r, a torque or an energy", "1/n, a quantity in s/rad", "I, a moment of inertia"})
  void takesItsArticle(String formula, String words) {
    assertEquals(words, readings(formula).withArticle());
  }

  @Test
  void kindsOfDifferentDimensionsAreNoReadingsOfOneQuantity() {
    assertThrows(
        IllegalArgumentException.class,
        () -> Readings.of(List.of(Kind.named("force"), Kind.named("torque"))));
    assertThrows(IllegalArgumentException.class, () -> Readings.of(List.of()));
  }

  @Test
  void untaggedCanBeAnythingOfItsDimension() {
    Readings untagged = Readings.untagged(Dimension.of("T^-1"));
    assertEquals(true, untagged.canBe(Kind.named("frequency")));
    assertEquals(false, untagged.canBe(Kind.named("time")));
    assertEquals(List.of(), untagged.kinds());
  }
}
