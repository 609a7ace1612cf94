package whorl.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import org.junit.jupiter.api.Test;

class WarmUpTest {
  /** A cell that failed by mistake would leave much of what a first cell runs cold. */
  @Test
  void itsCellsRunAndOnlyTheLastIsRefused() {
    try (var page = new LivePage(PlainLanguage.SHEET)) {
      var shown = new ShownPage(page);
      int last = WarmUp.CELLS.size() - 1;
      for (int cell = 0; cell < last; cell++) {
        assertEquals(new CellAnswer.Done(), shown.run("c" + cell, WarmUp.CELLS.get(cell)));
      }
      assertInstanceOf(CellAnswer.Failed.class, shown.run("last", WarmUp.CELLS.get(last)));
    }
  }
}
