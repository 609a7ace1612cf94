package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Slips of the trade: refused where the text of a sheet shows them, and what is right instead. */
class TrapsTest {
  private static final CaseTable TABLE = new CaseTable("traps.txt");

  @TestFactory
  Stream<DynamicTest> slipsThatATextShowsAreAnsweredInTheseWords() throws IOException {
    if (Boolean.getBoolean("whorl.rewrite")) {
      TABLE.rewrite(TABLE.cases().stream().map(TrapsTest::answeredAnew).toList());
    }
    return tests(
        one -> one.has("slip"),
        one -> {
          String answer = WorkedSheet.of(one.section("slip")).messages();
          assertFalse(answer.isEmpty(), "the slip is not refused");
          assertEquals(one.section("answer"), answer);
        });
  }

  @TestFactory
  Stream<DynamicTest> theRightFormulaGivesTheRightValue() throws IOException {
    return tests(
        one -> one.has("right"),
        one -> {
          WorkedSheet sheet = WorkedSheet.of(one.section("right"));
          sheet.assertWhole();
          sheet.assertGives(one.section("gives"));
        });
  }

  @Test
  void whatMustBeRefusedHasASlip() throws IOException {
    List<CaseTable.Case> cases = TABLE.cases();
    assertTrue(cases.size() >= 30);
    for (CaseTable.Case one : cases) {
      assertTrue(one.has("slip") || one.has("right"), one.title());
      assertTrue(one.has("slip") || one.fact("verdict").equals("flag"), one.title());
    }
  }

  private static CaseTable.Case answeredAnew(CaseTable.Case one) {
    return one.has("slip")
        ? one.with("answer", WorkedSheet.of(one.section("slip")).messages())
        : one;
  }

  private interface Claim {
    void check(CaseTable.Case one);
  }

  private static Stream<DynamicTest> tests(Predicate<CaseTable.Case> chosen, Claim claim)
      throws IOException {
    return TABLE.cases().stream()
        .filter(chosen)
        .map(one -> DynamicTest.dynamicTest(one.title(), () -> claim.check(one)));
  }
}
