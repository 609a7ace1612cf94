package whorl.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import whorl.diagnostic.Interruption;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/** Which statements rest on an assumption that fails now, or on a law outside its validity. */
final class Doubts {
  /** No doubts. */
  static final Doubts NONE = new Doubts(Map.of());

  /** A statement may rest on more failing assumptions than anybody would read. */
  private static final int MOST_NAMED = 10;

  /** An assumption that fails, or a definition that uses a law where it does not hold. */
  private record Failing(Node at, String text) {}

  private final Map<Node, List<List<Failing>>> doubts;

  private Doubts(Map<Node, List<List<Failing>>> doubts) {
    this.doubts = doubts;
  }

  /** The doubts on a sheet with these results. */
  static Doubts in(Graph graph, Results results) {
    // Assumptions on the same names cast doubt on the same statements.
    var failing = new LinkedHashMap<Set<String>, List<Failing>>();
    for (Node node : graph.assumptions()) {
      if (node.statement() instanceof Statement.Assumption assumption
          && results.of(node).orElse(null) instanceof Result.Judged judged
          && !judged.verdict().holds()) {
        failing
            .computeIfAbsent(node.uses(), names -> new ArrayList<>())
            .add(new Failing(node, Printer.expression(assumption.condition())));
      }
    }
    for (Node node : results.lapsed()) {
      node.defines()
          .filter(name -> graph.definition(name).filter(node::equals).isPresent())
          .ifPresent(
              name -> {
                List<Failing> ofName =
                    failing.computeIfAbsent(Set.of(name), names -> new ArrayList<>());
                for (Lapse lapse : results.of(node).map(Result::lapses).orElse(List.of())) {
                  ofName.add(new Failing(node, lapse.text() + ", in " + name));
                }
              });
    }
    failing.values().forEach(alike -> alike.sort(Comparator.comparing(Failing::text)));
    var doubts = new LinkedHashMap<Node, List<List<Failing>>>();
    failing.forEach(
        (names, assumptions) -> {
          Interruption.poll();
          for (Node doubtful : graph.downstream(names)) {
            doubts.computeIfAbsent(doubtful, key -> new ArrayList<>()).add(assumptions);
          }
        });
    return new Doubts(doubts);
  }

  /**
   * The failing assumptions that a statement rests on, as written, the first ten of the alphabet.
   */
  List<String> on(Node node) {
    return doubts.getOrDefault(node, List.of()).stream()
        .flatMap(alike -> firstOf(alike, node))
        .distinct()
        .sorted()
        .limit(MOST_NAMED)
        .toList();
  }

  private static Stream<String> firstOf(List<Failing> alike, Node node) {
    return alike.stream()
        .filter(failing -> failing.at() != node)
        .map(Failing::text)
        .distinct()
        .limit(MOST_NAMED);
  }

  /** The statements on which the doubts are not what they were. */
  Stream<Node> differingFrom(Doubts before) {
    Set<Node> all = new LinkedHashSet<>(before.doubts.keySet());
    all.addAll(doubts.keySet());
    return all.stream().filter(node -> !on(node).equals(before.on(node)));
  }
}
