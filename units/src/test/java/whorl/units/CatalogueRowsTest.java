package whorl.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.units.kind.Kind;

/** What must be true of each row of the catalogue, whoever adds one. */
class CatalogueRowsTest {

  private static final UnitCatalogue CATALOGUE = UnitCatalogue.standard();

  static List<CatalogueRow> rows() {
    return CatalogueFile.rows();
  }

  static Stream<CatalogueRow> products() {
    return rows().stream().filter(row -> !row.isSymbol());
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theRowServesItsKind(CatalogueRow row) {
    Unit unit = CATALOGUE.resolve(row.text(), row.kind()).orElseThrow();
    assertEquals(row.factor(), unit.factor());
    assertEquals(row.kind().dimension(), unit.dimension());
    assertEquals(row.isReading(), unit.isReading());
    assertEquals(List.of(row.kind()), unit.kinds());
  }

  @ParameterizedTest
  @MethodSource("products")
  void theFactorOfAProductIsTheProductOfTheFactors(CatalogueRow row) {
    Factor ofMembers = CATALOGUE.composition(row.text()).factor();
    if (CATALOGUE.composition(row.text()).dimension().equals(row.kind().dimension())) {
      assertEquals(ofMembers, row.factor());
    } else {
      // A flywheel effect stated with the weight: a force stands for the mass it is the weight of.
      assertEquals("flywheel_effect", row.kind().name());
      assertEquals(ofMembers.dividedBy(Factor.parse("9.80665")), row.factor());
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void aliasesAreTheSameUnit(CatalogueRow row) {
    Unit unit = CATALOGUE.resolve(row.text(), row.kind()).orElseThrow();
    for (UnitText alias : row.aliases()) {
      Unit other = CATALOGUE.resolve(alias, row.kind()).orElseThrow();
      assertEquals(unit.factor(), other.factor());
      assertTrue(CATALOGUE.isRow(alias));
    }
    for (String heading : row.inFiles()) {
      assertEquals(unit.factor(), CATALOGUE.resolveHeading(heading).factor());
    }
  }

  @ParameterizedTest
  @MethodSource("rows")
  void theCoherentUnitHasFactorOneAndTheSameDimension(CatalogueRow row) {
    Unit unit = CATALOGUE.resolve(row.text(), row.kind()).orElseThrow();
    assertTrue(unit.coherent().factor().isOne());
    assertFalse(unit.coherent().isReading());
    assertEquals(unit.dimension(), unit.coherent().dimension());
    assertEquals(unit.kinds(), unit.coherent().kinds());
  }

  @Test
  void noRowStandsTwice() {
    Set<String> seen = new HashSet<>();
    for (CatalogueRow row : rows()) {
      assertTrue(seen.add(row.text() + " " + row.kind()), () -> row.text() + " stands twice");
    }
  }

  @Test
  void everyKindThatPeopleNameHasAUnit() {
    for (Kind kind : Kind.all()) {
      if (!kind.isInternal()) {
        assertFalse(CATALOGUE.unitsOf(kind).isEmpty(), kind::words);
      }
    }
  }
}
