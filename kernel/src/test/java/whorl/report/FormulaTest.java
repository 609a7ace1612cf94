package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static whorl.report.Trees.call;
import static whorl.report.Trees.compare;
import static whorl.report.Trees.magnitude;
import static whorl.report.Trees.minus;
import static whorl.report.Trees.name;
import static whorl.report.Trees.num;
import static whorl.report.Trees.power;
import static whorl.report.Trees.product;
import static whorl.report.Trees.squared;
import static whorl.report.Trees.sum;

import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.syntax.Expr;

class FormulaTest {
  private static final Expr A = name("a");
  private static final Expr B = name("b");
  private static final Expr C = name("c");
  private static final Expr ONE = num("1");
  private static final Expr TWO = num("2");

  static Stream<Arguments> formulas() {
    return Stream.of(
        Arguments.of(
            product(ONE, "/", TWO, "*", name("m"), "*", squared(product(name("D"), "/", TWO))),
            "1/2·m·(D/2)²",
            "½ m (D/2)²"),
        Arguments.of(product(A, "/", B, "*", C), "a/b·c", "{a|b} c"),
        Arguments.of(product(A, "*", B, "/", C), "a·b/c", "{a b|c}"),
        Arguments.of(product(A, "/", B, "/", C), "a/(b·c)", "{a|b c}"),
        Arguments.of(
            product(name("pi"), "/", num("4"), "*", squared(name("d_c")), "/", name("k_f")),
            "π/4·d_c²/k_f",
            "{π|4} {d²c|kf}"),
        Arguments.of(
            product(sum(A, "+", B), "/", sum(A, "-", B)), "(a + b)/(a − b)", "{a + b|a − b}"),
        Arguments.of(product(A, "*", product(B, "/", C)), "a·b/c", "a {b|c}"),
        Arguments.of(product(A, "*", product(B, "*", C)), "a·(b·c)", "a (b c)"),
        Arguments.of(product(A, "*", sum(B, "+", C)), "a·(b + c)", "a (b + c)"),
        Arguments.of(sum(A, "-", sum(B, "-", C)), "a − (b − c)", "a − (b − c)"),
        Arguments.of(sum(A, "-", minus(B)), "a − (−b)", "a − (−b)"),
        Arguments.of(sum(A, "-", num("-273.15", "degC")), "a − (−273.15 °C)", "a − (−273.15 °C)"),
        Arguments.of(minus(squared(A)), "−a²", "−a²"),
        Arguments.of(squared(minus(A)), "(−a)²", "(−a)²"),
        Arguments.of(power(A, product(ONE, "/", TWO)), "a^(1/2)", "a^½"),
        Arguments.of(power(A, minus(ONE)), "a⁻¹", "a⁻¹"),
        Arguments.of(squared(num("5", "m")), "(5 m)²", "(5 m)²"),
        Arguments.of(call("sqrt", sum(squared(A), "+", squared(B))), "√(a² + b²)", "√a² + b²"),
        Arguments.of(call("cbrt", A), "∛a", "∛a"),
        Arguments.of(call("abs", sum(A, "-", B)), "|a − b|", "|a − b|"),
        Arguments.of(magnitude(name("v")), "|v|", "|v|"),
        Arguments.of(call("atan2", A, B), "atan2(a, b)", "atan2(a, b)"),
        Arguments.of(product(TWO, "*", num("3")), "2·3", "2 × 3"),
        Arguments.of(product(A, "*", TWO), "a·2", "a · 2"),
        Arguments.of(product(minus(A), "*", B), "−a·b", "−a b"),
        Arguments.of(product(A, "*", minus(B)), "a·(−b)", "a (−b)"),
        Arguments.of(product(name("mass"), "*", A), "mass·a", "mass · a"),
        Arguments.of(product(num("9.81", "m/s²"), "*", A), "9.81 m/s²·a", "9.81 m/s² · a"),
        Arguments.of(product(name("A"), "×", name("B")), "A × B", "A × B"),
        Arguments.of(
            compare(A, Expr.Relation.AT_MOST, product(B, "/", num("3"))), "a ≤ b/3", "a ≤ {b|3}"),
        Arguments.of(num("2.1e11", "Pa"), "2.1×10¹¹ Pa", "2.1×10¹¹ Pa"));
  }

  @ParameterizedTest
  @MethodSource("formulas")
  void plainTextIsOneLineThatReadsBackTheSame(Expr formula, String text, String page) {
    assertEquals(text, FormulaText.of(FormulaLayout.of(formula, Set.of())));
  }

  @ParameterizedTest
  @MethodSource("formulas")
  void thePageStacksOneLevelOfFractions(Expr formula, String text, String page) {
    assertEquals(page, seen(FormulaHtml.of(FormulaLayout.of(formula, Set.of()))));
  }

  @ParameterizedTest
  @MethodSource("formulas")
  void whoCopiesThePageGetsAFormulaWithoutBars(Expr formula, String text, String page) {
    Html html = FormulaHtml.of(FormulaLayout.of(formula, Set.of()));
    String copied = Page.of(html.toString()).text();

    assertEquals(slashes(text), slashes(copied.replace("½", "1/2")));
  }

  private static long slashes(String text) {
    return text.chars().filter(c -> c == '/').count();
  }

  @Test
  void sumsOverABarAreCopiedInParentheses() {
    Expr fraction = product(sum(A, "+", B), "/", sum(A, "-", B));
    Html html = FormulaHtml.of(FormulaLayout.of(fraction, Set.of()));

    assertEquals("(a + b)/(a − b)", Page.of(html.toString()).text().replace('\u00A0', ' '));
  }

  private static String seen(Html html) {
    return Page.of(html.toString()).seen().replace('\u00A0', ' ').replace('\u2009', ' ');
  }
}
