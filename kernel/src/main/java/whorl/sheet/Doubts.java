package whorl.sheet;

import java.util.Collection;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.Stream;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/** Which statements rest on names of an assumption that fails now. */
final class Doubts {
  private final Map<Node, SortedSet<String>> doubts = new HashMap<>();

  private Doubts() {}

  /** The doubts on a sheet as it stands. */
  static Doubts in(Collection<CellContent> cells, Graph graph, Results results) {
    var found = new Doubts();
    for (CellContent cell : cells) {
      for (Node node : cell.nodes()) {
        if (node.statement() instanceof Statement.Assumption assumption
            && results.of(node).orElse(null) instanceof Result.Judged judged
            && !judged.verdict().holds()) {
          String text = Printer.expression(assumption.condition());
          for (Node doubtful : graph.downstream(node.uses())) {
            if (doubtful != node) {
              found.doubts.computeIfAbsent(doubtful, key -> new TreeSet<>()).add(text);
            }
          }
        }
      }
    }
    return found;
  }

  /** The failing assumptions that a statement rests on, as written. */
  List<String> on(Node node) {
    return List.copyOf(doubts.getOrDefault(node, Collections.emptySortedSet()));
  }

  /** The statements on which the doubts are not what they were. */
  Stream<Node> differingFrom(Doubts before) {
    Set<Node> all = new java.util.LinkedHashSet<>(before.doubts.keySet());
    all.addAll(doubts.keySet());
    return all.stream().filter(node -> !on(node).equals(before.on(node)));
  }
}
