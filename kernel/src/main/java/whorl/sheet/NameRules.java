package whorl.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.syntax.UnitWord;

/** One name, one definition; and no name for what was read as a unit. */
final class NameRules {
  private final Map<CellId, CellContent> cells;
  private final Graph graph;
  private final CellId cell;
  private final Map<String, Node> first = new HashMap<>();

  /** The rules as they bear on the statements of a cell that is to run. */
  NameRules(Map<CellId, CellContent> cells, Graph graph, CellId cell, List<Node> nodes) {
    this.cells = cells;
    this.graph = graph;
    this.cell = cell;
    nodes.forEach(node -> node.defines().ifPresent(name -> first.putIfAbsent(name, node)));
  }

  /** The rules that a statement's definition breaks. */
  List<Diagnostic> broken(Node node) {
    return node.defines()
        .map(name -> broken(node, name, SheetMessages.nameSpan(node.statement())))
        .orElse(List.of());
  }

  private List<Diagnostic> broken(Node node, String name, Span span) {
    Node above = first.getOrDefault(name, node);
    if (above != node) {
      return List.of(SheetMessages.definedAbove(name, span, above));
    }
    Optional<Node> elsewhere =
        graph.definition(name).filter(other -> !other.place().cell().equals(cell));
    if (elsewhere.isPresent()) {
      CellContent other = Objects.requireNonNull(cells.get(elsewhere.get().place().cell()));
      return List.of(SheetMessages.definedElsewhere(name, span, elsewhere.get(), other.label()));
    }
    var errors = new ArrayList<Diagnostic>();
    cells.forEach(
        (id, other) -> {
          if (!id.equals(cell)) {
            unitWord(other.unitWords(), name)
                .ifPresent(word -> errors.add(SheetMessages.readAsUnit(name, span, word, other)));
          }
        });
    return errors;
  }

  private static Optional<UnitWord> unitWord(List<UnitWord> words, String name) {
    return words.stream().filter(word -> word.name().equals(name)).findFirst();
  }
}
