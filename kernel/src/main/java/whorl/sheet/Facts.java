package whorl.sheet;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import whorl.check.Vocabulary;

/** Tells what a sheet knows of its names. */
final class Facts {
  private final Contents contents;

  Facts(Contents contents) {
    this.contents = contents;
  }

  /** All definitions, by cell in the order in which the cells first took effect. */
  List<Definition> definitions() {
    return contents.cells().values().stream()
        .flatMap(cell -> cell.nodes().stream())
        .flatMap(node -> node.defines().map(name -> definition(name, node)).stream())
        .toList();
  }

  private Definition definition(String name, Node node) {
    String label = contents.cellOf(node).label();
    Result result = contents.results().of(node).orElseThrow();
    Quantity quantity = null;
    String kind = "";
    Definition.State state = new Definition.State.Sound();
    if (result instanceof Result.Valued valued) {
      quantity = Quantities.of(node, valued);
      kind = quantity.kind();
    } else if (result instanceof Result.Callable callable) {
      kind = callable.checked().kind();
    } else if (result instanceof Result.Waiting waiting) {
      state = new Definition.State.Waiting(waiting.names());
    } else if (result instanceof Result.Broken broken) {
      state = new Definition.State.Broken(broken.diagnostic(), broken.last());
    }
    return new Definition(
        name, node.statement(), node.place().cell(), label, kind, quantity, state);
  }

  /** The card of a name; empty where it has no definition. */
  Optional<NameCard> card(String name) {
    return contents.graph().definition(name).map(node -> card(name, node));
  }

  private NameCard card(String name, Node node) {
    Graph graph = contents.graph();
    return new NameCard(
        definition(name, node),
        node.uses().stream().filter(used -> isOfSheet(used, graph)).toList(),
        graph.users(name).stream().flatMap(user -> user.defines().stream()).sorted().toList(),
        graph.downstream(Set.of(name)).stream()
            .flatMap(this::judged)
            .sorted(Comparator.comparing(NameCard.Judged::text))
            .toList(),
        contents.doubts().on(node));
  }

  private static boolean isOfSheet(String name, Graph graph) {
    return graph.definition(name).isPresent() || !Vocabulary.isFunction(name);
  }

  private Stream<NameCard.Judged> judged(Node node) {
    return node.judges()
        ? Stream.of(
            new NameCard.Judged(node.text(), contents.results().of(node).flatMap(Change::holds)))
        : Stream.empty();
  }
}
