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

/**
 * One name, one definition; and no name for what was read as a unit. What is typed in a console
 * takes over a name that has its definition elsewhere, and leaves it to whoever defines it next: it
 * has no place on a page where its author could change it.
 */
final class NameRules {
  private final Contents contents;
  private final CellId cell;
  private final boolean typed;
  private final Map<String, Node> first = new HashMap<>();

  /**
   * The rules as they bear on the statements of a cell that is to run.
   *
   * @param typed whether it is typed in a console
   */
  NameRules(Contents contents, CellId cell, List<Node> nodes, boolean typed) {
    this.contents = contents;
    this.cell = cell;
    this.typed = typed;
    nodes.forEach(node -> node.defines().ifPresent(name -> first.putIfAbsent(name, node)));
  }

  /** The rules that a statement's definition breaks. */
  List<Diagnostic> broken(Node node) {
    return node.defines()
        .map(name -> broken(node, name, SheetMessages.nameSpan(node.statement())))
        .orElse(List.of());
  }

  /** The definition in another cell that a statement takes the place of. */
  Optional<Node> takenOver(Node node) {
    return node.defines().flatMap(this::elsewhere).filter(this::yields);
  }

  private Optional<Node> elsewhere(String name) {
    return contents.graph().definition(name).filter(other -> !other.place().cell().equals(cell));
  }

  private boolean yields(Node definition) {
    return typed || contents.cellOf(definition).typed();
  }

  private List<Diagnostic> broken(Node node, String name, Span span) {
    Node above = first.getOrDefault(name, node);
    if (above != node) {
      return List.of(SheetMessages.definedAbove(name, span, above));
    }
    Optional<Node> refusing = elsewhere(name).filter(other -> !yields(other));
    if (refusing.isPresent()) {
      String label = contents.cellOf(refusing.get()).label();
      return List.of(SheetMessages.definedElsewhere(name, span, refusing.get(), label));
    }
    var errors = new ArrayList<Diagnostic>();
    for (CellId id : contents.cellsThatReadAsUnit(name)) {
      if (!id.equals(cell)) {
        CellContent other = Objects.requireNonNull(contents.cell(id));
        unitWord(other.unitWords(), name)
            .ifPresent(word -> errors.add(SheetMessages.readAsUnit(name, span, word, other)));
      }
    }
    return errors;
  }

  private static Optional<UnitWord> unitWord(List<UnitWord> words, String name) {
    return words.stream().filter(word -> word.name().equals(name)).findFirst();
  }
}
