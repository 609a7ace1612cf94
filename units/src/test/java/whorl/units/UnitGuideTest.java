package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class UnitGuideTest {
  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();
  private static final UnitGuide GUIDE = CATALOGUE.guide();

  @ParameterizedTest
  @CsvSource({
    "kN, kilonewton",
    "rpm, revolution per minute",
    "MN·m, meganewton metre",
    "W/(m^2·K), watt per square metre kelvin",
    "N·s^2/m^3, newton second squared per cubic metre",
    "1/min, one per minute",
    "m^5, metre to the power 5",
    "s^-1, reciprocal second",
    "1, one"
  })
  void unitsHaveNames(String unit, String words) {
    assertEquals(words, GUIDE.words(UnitReader.read(unit)));
  }

  @Test
  void everyWayToWriteAUnitIsListedOnceAndMeansTheRowWithItsPrefix() {
    var seen = new HashSet<UnitText>();
    for (UnitGuide.Entry entry : GUIDE.entries()) {
      assertTrue(seen.add(entry.text()), entry.toString());
      assertTrue(CATALOGUE.isRow(entry.text()), entry.toString());
    }
    assertTrue(seen.contains(UnitReader.read("kJ/(kg·K)")));
    assertTrue(seen.contains(UnitReader.read("mrad")));
  }

  @Test
  void nearPrefixesStandInFrontOfFarOnes() {
    List<String> newtons =
        GUIDE.entries().stream()
            .map(entry -> entry.text().plain())
            .filter(text -> text.length() == 2 && text.endsWith("N"))
            .limit(4)
            .toList();
    assertEquals(List.of("kN", "mN", "MN", "μN"), newtons);
  }

  @Test
  void sizesHaveSources() {
    assertEquals(List.of("NIST SP 811 App. B"), GUIDE.sources(UnitReader.read("lbf")));
    assertEquals(
        List.of("NIST SP 811 App. B", "SI brochure 9th ed. Table 8"),
        GUIDE.sources(UnitReader.read("lbf·h")));
  }
}
