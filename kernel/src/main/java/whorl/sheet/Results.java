package whorl.sheet;

import java.nio.file.Path;
import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import whorl.check.Checked;
import whorl.check.Meaning;
import whorl.check.Scope;
import whorl.eval.Value;
import whorl.laws.ThingSort;

/** What the statements of a sheet came to, with the names that stand because of it. */
final class Results implements Scope {
  private final Graph graph;
  private final Path folder;
  private final Map<Node, Result> settled;
  private final Map<Node, Result> staged = new HashMap<>();

  /** The settled statements that use a law outside its validity: few, and asked for often. */
  private final Set<Node> settledLapsed;

  private Results(Graph graph, Path folder, Map<Node, Result> settled, Set<Node> settledLapsed) {
    this.graph = graph;
    this.folder = folder;
    this.settled = settled;
    this.settledLapsed = settledLapsed;
  }

  /** No results yet. */
  static Results of(Graph graph, Path folder) {
    return new Results(graph, folder, new HashMap<>(), new LinkedHashSet<>());
  }

  /** The same results, over which new ones can be staged without touching these. */
  Results staging() {
    return new Results(graph, folder, settled, settledLapsed);
  }

  void stage(Node node, Result result) {
    staged.put(node, result);
  }

  /** Makes the staged results those of the sheet, and forgets those of removed statements. */
  void settle(Collection<Node> removed) {
    settled.keySet().removeAll(Set.copyOf(removed));
    Set<Node> lapsed = lapsed();
    lapsed.removeAll(Set.copyOf(removed));
    settledLapsed.clear();
    settledLapsed.addAll(lapsed);
    settled.putAll(staged);
    staged.clear();
  }

  /** The statements that use a law outside its validity. */
  Set<Node> lapsed() {
    var lapsed = new LinkedHashSet<>(settledLapsed);
    staged.forEach(
        (node, result) -> {
          if (result.lapses().isEmpty()) {
            lapsed.remove(node);
          } else {
            lapsed.add(node);
          }
        });
    return lapsed;
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
        .filter(
            result ->
                result instanceof Result.Valued
                    || result instanceof Result.Callable
                    || result instanceof Result.Ran);
  }

  /** The value that a formula reads under a name which has one. */
  Value value(String name) {
    Result result = of(name).orElseThrow();
    return result instanceof Result.Ran ran
        ? new Value.Thing(ThingSort.MOTION, ran.run())
        : ((Result.Valued) result).value();
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
  public Path folder() {
    return folder;
  }

  @Override
  public List<String> names() {
    return List.copyOf(graph.names());
  }

  private static Meaning meaning(Result result) {
    if (result instanceof Result.Callable callable) {
      return callable.checked().meaning();
    }
    if (result instanceof Result.Ran ran) {
      return ran.checked().meaning();
    }
    Checked.Value checked = ((Result.Valued) result).checked();
    return new Meaning.Quantity(
        checked.formula().type(), checked.formula().unit(), checked.formula().chosen());
  }
}
