package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Worked examples and laws from outside the project, each written as a sheet. */
class PublishedCasesTest {
  private static final CaseTable FORMULAS = new CaseTable("published-cases.txt");
  private static final CaseTable IN_SPACE = new CaseTable("space-cases.txt");
  private static final Set<String> PROVENANCES = Set.of("published", "law", "memory");

  @TestFactory
  Stream<DynamicTest> sheetsGiveTheValuesOfTheirSources() throws IOException {
    assertTrue(FORMULAS.cases().size() >= 120);
    assertTrue(IN_SPACE.cases().size() >= 18);
    return cases()
        .map(
            one ->
                DynamicTest.dynamicTest(
                    one.title(),
                    () -> {
                      WorkedSheet sheet = WorkedSheet.of(one.section("sheet"));
                      sheet.assertWhole();
                      sheet.assertGives(one.section("gives"));
                    }));
  }

  private static Stream<CaseTable.Case> cases() throws IOException {
    return Stream.concat(FORMULAS.cases().stream(), IN_SPACE.cases().stream());
  }

  @Test
  void everyCaseNamesItsSource() throws IOException {
    for (CaseTable.Case one : cases().toList()) {
      assertFalse(one.fact("source").isBlank(), one.title());
      assertFalse(one.fact("method").isBlank(), one.title());
      assertTrue(PROVENANCES.contains(one.fact("provenance")), one.title());
    }
  }
}
