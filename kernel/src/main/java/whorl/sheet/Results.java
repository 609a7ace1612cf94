package whorl.sheet;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import whorl.check.Checked;
import whorl.check.Meaning;
import whorl.check.Scope;

/** What the statements of a sheet came to, with the names that stand because of it. */
final class Results implements Scope {
  private final Graph graph;
  private final Map<Node, Result> settled;
  private final Map<Node, Result> staged = new HashMap<>();

  private Results(Graph graph, Map<Node, Result> settled) {
    this.graph = graph;
    this.settled = settled;
  }

  /** No results yet. */
  static Results of(Graph graph) {
    return new Results(graph, new HashMap<>());
  }

  /** The same results, over which new ones can be staged without touching these. */
  Results staging() {
    return new Results(graph, settled);
  }

  void stage(Node node, Result result) {
    staged.put(node, result);
  }

  /** Makes the staged results those of the sheet, and forgets those of removed statements. */
  void settle(Collection<Node> removed) {
    settled.keySet().removeAll(Set.copyOf(removed));
    settled.putAll(staged);
    staged.clear();
  }

  Optional<Result> of(Node node) {
    Result result = staged.get(node);
    return Optional.ofNullable(result == null ? settled.get(node) : result);
  }

  /** What a name came to, or empty where it has no definition that stands. */
  Optional<Result> of(String name) {
    return graph
        .definition(name)
        .flatMap(this::of)
        .filter(result -> result instanceof Result.Valued || result instanceof Result.Callable);
  }

  /** The statement that defines a name. */
  Optional<Node> definingNode(String name) {
    return graph.definition(name);
  }

  /** The quantity that a name stands for. */
  Optional<Quantity> quantity(String name) {
    return graph
        .definition(name)
        .flatMap(
            node ->
                of(node)
                    .filter(Result.Valued.class::isInstance)
                    .map(result -> Quantities.of(node, (Result.Valued) result)));
  }

  @Override
  public Optional<Meaning> meaning(String name) {
    return of(name).map(Results::meaning);
  }

  @Override
  public List<String> names() {
    return List.copyOf(graph.names());
  }

  private static Meaning meaning(Result result) {
    if (result instanceof Result.Callable callable) {
      return callable.checked().meaning();
    }
    Checked.Value checked = ((Result.Valued) result).checked();
    return new Meaning.Quantity(
        checked.formula().type(), checked.formula().unit(), checked.formula().chosen());
  }
}
