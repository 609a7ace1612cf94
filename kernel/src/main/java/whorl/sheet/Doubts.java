package whorl.sheet;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
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
  /** No doubts. */
  static final Doubts NONE = new Doubts(Map.of());

  private final Map<Node, SortedSet<String>> doubts;

  private Doubts(Map<Node, SortedSet<String>> doubts) {
    this.doubts = doubts;
  }

  /** The doubts on a sheet as it stands. */
  static Doubts in(Graph graph, Results results) {
    var doubts = new LinkedHashMap<Node, SortedSet<String>>();
    for (Node node : graph.assumptions()) {
      if (node.statement() instanceof Statement.Assumption assumption
          && results.of(node).orElse(null) instanceof Result.Judged judged
          && !judged.verdict().holds()) {
        String text = Printer.expression(assumption.condition());
        for (Node doubtful : graph.downstream(node.uses())) {
          if (doubtful != node) {
            doubts.computeIfAbsent(doubtful, key -> new TreeSet<>()).add(text);
          }
        }
      }
    }
    return new Doubts(doubts);
  }

  /** The failing assumptions that a statement rests on, as written. */
  List<String> on(Node node) {
    return List.copyOf(doubts.getOrDefault(node, Collections.emptySortedSet()));
  }

  /** The statements on which the doubts are not what they were. */
  Stream<Node> differingFrom(Doubts before) {
    Set<Node> all = new LinkedHashSet<>(before.doubts.keySet());
    all.addAll(doubts.keySet());
    return all.stream().filter(node -> !on(node).equals(before.on(node)));
  }
}
