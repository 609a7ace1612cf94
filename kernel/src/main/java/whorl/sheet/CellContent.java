package whorl.sheet;

import java.util.List;
import whorl.diagnostic.Source;
import whorl.syntax.UnitWord;

/**
 * A cell that took effect.
 *
 * @param label how messages call it, as {@code cell [2]}
 * @param unitWords words that were read as units although a name could have been meant
 */
record CellContent(String label, Source source, List<Node> nodes, List<UnitWord> unitWords) {
  /** Copies the lists. */
  CellContent {
    nodes = List.copyOf(nodes);
    unitWords = List.copyOf(unitWords);
  }
}
