package whorl.sheet;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import whorl.diagnostic.Source;
import whorl.syntax.UnitWord;

/**
 * A cell that took effect.
 *
 * @param label how messages call it, as {@code cell [2]}
 * @param unitWords words that were read as units although a name could have been meant
 * @param typed whether it was typed in a console, so that it has no place on a page
 */
record CellContent(
    String label, Source source, List<Node> nodes, List<UnitWord> unitWords, boolean typed) {
  /** Copies the lists. */
  CellContent {
    nodes = List.copyOf(nodes);
    unitWords = List.copyOf(unitWords);
  }

  /** A cell that holds nothing. */
  static CellContent nothing(Source source) {
    return new CellContent("", source, List.of(), List.of(), false);
  }

  /** The cell without some of its statements, and without the words in them. */
  CellContent without(Set<Node> leaving) {
    return new CellContent(
        label,
        source,
        nodes.stream().filter(node -> !leaving.contains(node)).toList(),
        unitWords.stream()
            .filter(word -> leaving.stream().noneMatch(node -> node.contains(word.span())))
            .toList(),
        typed);
  }

  /** The words that were read as units. */
  Set<String> words() {
    return unitWords.stream().map(UnitWord::name).collect(Collectors.toSet());
  }
}
