package whorl.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.sheet.CellId;
import whorl.sheet.Given;
import whorl.sheet.PublishedFunction;
import whorl.sheet.Sheet;
import whorl.sheet.Step;

class CellReportTest {
  private static final boolean REWRITE = Boolean.getBoolean("whorl.rewriteGolden");

  /** Elements and attributes that the pages of untrusted notebooks keep. */
  private static final Set<String> KEPT_ELEMENTS =
      Set.of("div", "span", "table", "thead", "tbody", "tr", "th", "td", "sup", "sub", "i", "pre");

  private static final Set<String> KEPT_ATTRIBUTES = Set.of("style", "title", "colspan", "scope");

  /**
   * Style properties that the pages of untrusted notebooks keep, of those that are of use here;
   * read from the list in JupyterLab 4, {@code packages/apputils/src/sanitizer.ts}.
   */
  private static final Set<String> KEPT_PROPERTIES =
      Set.of(
          "background",
          "border",
          "border-bottom",
          "border-collapse",
          "border-left",
          "border-right",
          "border-top",
          "color",
          "display",
          "font-family",
          "font-size",
          "font-style",
          "font-weight",
          "letter-spacing",
          "line-height",
          "margin",
          "margin-left",
          "min-width",
          "opacity",
          "overflow-x",
          "padding",
          "padding-left",
          "page-break-inside",
          "position",
          "table-layout",
          "text-align",
          "text-indent",
          "vertical-align",
          "white-space",
          "width");

  private static CellReport flywheel() {
    SampleNote note = SampleNote.flywheel();
    return CellReport.of(note.source, note.steps, List.of("I hides the law of that name"));
  }

  @Test
  void textIsAlignedAndRuled() throws IOException {
    assertGolden("flywheel.txt", flywheel().text() + "\n");
  }

  @Test
  void recordIsWhatToolsExpect() throws IOException {
    assertGolden("flywheel.json", NoteRecord.text(flywheel().record()));
  }

  @Test
  void pageIsAsReviewed() throws IOException {
    // One element a line, so that a change is read where it is.
    assertGolden("flywheel.html", flywheel().html().replace("><", ">\n<") + "\n");
  }

  private static void assertGolden(String name, String actual) throws IOException {
    Path file = Path.of("src/test/resources/whorl/report", name);
    if (REWRITE) {
      Files.createDirectories(file.getParent());
      Files.writeString(file, actual);
    }
    assertEquals(Files.readString(file, StandardCharsets.UTF_8), actual);
  }

  @Test
  void noLineOfTextIsWiderThanThePage() {
    for (String line : flywheel().text().lines().toList()) {
      assertTrue(TextWidth.of(line) <= 108, line);
    }
  }

  @Test
  void anUntrustedPageKeepsEveryElementAndStyle() {
    assertOnlyKeptMarkup(Page.of(flywheel().html()));
  }

  private static void assertOnlyKeptMarkup(Page page) {
    for (Element element : page.elements()) {
      assertTrue(KEPT_ELEMENTS.contains(element.getTagName()), element.getTagName());
      for (int i = 0; i < element.getAttributes().getLength(); i++) {
        String attribute = element.getAttributes().item(i).getNodeName();
        assertTrue(KEPT_ATTRIBUTES.contains(attribute), attribute);
      }
      for (String declaration : element.getAttribute("style").split(";", -1)) {
        if (!declaration.isEmpty()) {
          assertTrue(KEPT_PROPERTIES.contains(declaration.split(":", 2)[0]), declaration);
        }
      }
    }
  }

  @Test
  void themeVariablesOnlyAddColourToWords() {
    for (Element element : Page.of(flywheel().html()).elements()) {
      for (String declaration : element.getAttribute("style").split(";", -1)) {
        if (declaration.contains("var(")) {
          assertTrue(declaration.startsWith("color:") && declaration.endsWith("inherit))"));
        }
      }
    }
  }

  @Test
  void textOfAUserNeverBecomesMarkup() {
    var random = new SplittableRandom(7031);
    String alphabet = "<>&\"'/=;:()ab \t\u0000\u001B\u202E\uD800\uDFFF\uFFFEω≈]]>";
    for (int i = 0; i < 100; i++) {
      var hostile = new StringBuilder("x");
      for (int k = 0; k < 20; k++) {
        hostile.append(alphabet.charAt(random.nextInt(alphabet.length())));
      }
      Page page = Page.of(report(hostile.toString()).html());

      assertOnlyKeptMarkup(page);
      assertTrue(page.text().contains(Page.of(Html.text(hostile.toString()).toString()).text()));
    }
  }

  @Test
  void scriptInARemarkIsShownAsTyped() {
    CellReport report = report("<script>alert('x')</script>");

    assertTrue(Page.of(report.html()).text().contains("<script>alert('x')</script>"));
    assertFalse(report.html().contains("<script"));
  }

  /** A report with the same text wherever a user can put text. */
  private static CellReport report(String text) {
    var quantity = SampleNote.real(2, "kg", text);
    Step.Defined defined =
        SampleNote.derived(
            "m", Trees.name(text), quantity, text, List.of(text), new Given(text, quantity));
    var waiting =
        new Step.Waiting(
            defined.place(), defined.statement(), List.of(text), List.of(List.of(text)));
    var broken =
        new Step.Broken(
            defined.place(),
            defined.statement(),
            new Diagnostic("code", text, new Span(0, 1), text, List.of(), text, text),
            null);
    return CellReport.of(
        new Source("m = " + text),
        List.of(defined, waiting, broken),
        List.of(text),
        Recalculated.NOTHING,
        List.of(text));
  }

  @Test
  void everyStateIsSaidInWords() {
    String text = flywheel().text().replaceAll("\\s+", " ");

    assertTrue(text.contains("holds"));
    assertTrue(text.contains("FAILS"));
    assertTrue(text.contains("waits for n_O"));
    assertTrue(text.contains("does not stand"));
    assertTrue(text.contains("was 74.9 s, now stale"));
  }

  @Test
  void aChangeSaysWhatItDidElsewhere() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell [1]", "n = 3\n");
    sheet.run(new CellId("2"), "cell [2]", "k = 2 * n\ncheck k <= 8\n");

    CellReport report = CellReport.of(sheet.run(new CellId("1"), "cell [1]", "n = 5\n"));

    assertTrue(report.text().contains("FAILS now: check k ≤ 8\nnow k = 10, was 6"), report.text());
  }

  @Test
  void aCellWithoutStepsLeavesNothing() {
    CellReport report = CellReport.of(new Source(""), List.of(), List.of());

    assertEquals("", report.html());
    assertEquals("", report.text());
  }

  @Test
  void aFunctionFromJavaShowsItsHeadAndItsCell() {
    var sheet = new Sheet();
    var id = new CellId("java");
    var function =
        new PublishedFunction("drag(v [km/h], A [m²], c_w) [N]  # wind <tunnel>", x -> x[0]);
    CellReport report = CellReport.of(sheet.publish(id, "cell [3]", List.of(function)));
    assertEquals(
        """
        quantity         rule            with                   gives  why
        ────────────────────────────────────────────────────────────────────────────
        drag(v, A, c_w)  Java, cell [3]  v in km/h              force  wind <tunnel>
                                         A in m²                in N
                                         c_w is a plain number
        ────────────────────────────────────────────────────────────────────────────""",
        report.text());
    assertEquals(
        "{\"drag\":{\"kind\":\"force\",\"unit\":\"N\",\"head\":\"drag(v [km/h], A [m^2], c_w) [N]\"}}",
        report.record().get("published").toString());
    assertOnlyKeptMarkup(Page.of(report.html()));
    assertTrue(report.html().contains("Java, cell [3]"), report.html());
    assertTrue(report.html().contains("wind &lt;tunnel&gt;"), report.html());
    sheet.run(new CellId("a"), "cell [1]", "F = drag(3 km/h, 1 m², 1)");
    assertFalse(
        CellReport.of(sheet.run(new CellId("b"), "cell [2]", "x = 2")).record().has("published"));
    var taking = new PublishedFunction("peak() [1]", x -> 1);
    String line =
        CellReport.of(sheet.publish(id, "cell [3]", List.of(taking)))
            .text()
            .lines()
            .toList()
            .get(2);
    assertEquals("peak() Java, cell [3] number", line.replaceAll(" +", " "));
  }

  @Test
  void aFailingAssumptionIsNamedOnceForTheRowsThatFollow() {
    var sheet = new Sheet();
    String text =
        """
        n [rpm] = 6000
        assume n <= 5000 rpm
        a = 2 * n
        b = 3 * n
        k = 1
        c = a + b
        assume a <= 1 rpm
        d = 4 * a
        e = 4 * n""";
    List<Row> rows = StepRows.of(sheet.run(new CellId("a"), "cell [1]", text).steps());
    assertEquals(
        List.of(
            "",
            "",
            "rests on an assumption that fails: n ≤ 5000 rpm",
            "rests on that assumption too",
            "",
            "rests on an assumption that fails: a ≤ 1 rpm; n ≤ 5000 rpm",
            "rests on an assumption that fails: n ≤ 5000 rpm",
            "rests on an assumption that fails: a ≤ 1 rpm; n ≤ 5000 rpm",
            "rests on an assumption that fails: n ≤ 5000 rpm"),
        rows.stream().map(CellReportTest::words).toList());
  }

  private static String words(Row row) {
    return row.why().stream()
        .flatMap(line -> line.pieces().stream())
        .map(
            piece ->
                piece instanceof Piece.State state ? state.text() : ((Piece.Words) piece).text())
        .collect(Collectors.joining());
  }

  @Test
  void whatAChangeElsewhereStoppedIsSaid() {
    var sheet = new Sheet();
    sheet.run(new CellId("a"), "cell [1]", "n = 1");
    sheet.run(new CellId("b"), "cell [2]", "m = 2 * n\ncheck m < 7");
    assertEquals(
        "Note: n is withdrawn from cell [1]; it was 1.\n" + "without result now: check m < 7, m",
        CellReport.of(sheet.withdraw("n")).text());
  }
}
