package whorl.syntax;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.diagnostic.Source;

/** Canonical text reads as the tree that it was made from. */
class PrinterTest {
  static LongStream seeds() {
    return LongStream.range(0, 100);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aPrintedTreeReadsAsTheSameTree(long seed) {
    var trees = new RandomExpressions(new SplittableRandom(seed));
    for (int i = 0; i < 30; i++) {
      Expr tree = trees.expression(1 + i % 5);
      String text = "x = " + Printer.expression(tree);
      Parsed parsed = parsed(text);
      assertEquals(List.of(), parsed.errors(), text);
      var definition = (Statement.Definition) parsed.statements().get(0);
      assertEquals(Unplaced.of(tree), Unplaced.of(definition.value()), text);
      assertEquals(text, Printer.text(parsed));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      textBlock =
          """
          (-a + b) [m]                                    ; (-a + b) [m]
          check (nominal (a) < b)                         ; refused call-blank
          x = -(5 m @ ship)                               ; x = -5 m @ ship
          x = (5).y                                       ; x = (5).y
          x = v/(2 s)                                     ; x = v / 2 s
          x = 1/((1/2) in)                                ; x = 1 / ((1 / 2) in)
          x = a ± (u(k = 2)) (k = 3)                      ; x = a ± (u(k = 2)) (k = 3)
          x = (a + b) + c                                 ; x = (a + b) + c
          x = if (if a then b else c) then d else e       ; x = if (if a then b else c) then d else e
          x = 2^(3 m)                                     ; x = 2^(3 m)
          """)
  void parenthesesStandWhereTheTextWouldReadOtherwise(String written, String canonical) {
    Parsed parsed = parsed(written);
    String printed =
        parsed.errors().isEmpty()
            ? Printer.text(parsed)
            : "refused " + parsed.errors().get(0).code();
    assertEquals(canonical, printed);
  }

  @Test
  void remarksKeepTheirPlaceBetweenStatementsAndRows() {
    String text =
        """
        # head
        cases s: a  # of the yard
            # first
            calm 1
            rough -2  # log
        #
        x = 1  # one; two""";
    assertEquals(text, Printer.text(parsed(text)));
  }

  private static Parsed parsed(String text) {
    return Parser.parse(new Source(text), name -> false, CatalogueWords.STANDARD);
  }
}
