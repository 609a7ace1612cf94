package whorl.sheet;

import java.nio.file.Path;
import java.util.Collection;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/**
 * What a sheet holds: its cells, their statements as a graph, what these came to, and the doubts on
 * them.
 */
final class Contents {
  private final Map<CellId, CellContent> cells = new LinkedHashMap<>();
  private final Map<String, Set<CellId>> readAsUnit = new HashMap<>();
  private final Graph graph = new Graph();
  private final Results results;
  private Doubts doubts = Doubts.NONE;
  private SimilarNames near = new SimilarNames(graph.names());

  /**
   * Nothing yet.
   *
   * @param folder of the note, below which files are read
   */
  Contents(Path folder) {
    results = Results.of(graph, folder);
  }

  Graph graph() {
    return graph;
  }

  Results results() {
    return results;
  }

  Doubts doubts() {
    return doubts;
  }

  /** The cells that took effect, in the order in which they first did. */
  Map<CellId, CellContent> cells() {
    return Collections.unmodifiableMap(cells);
  }

  @Nullable CellContent cell(CellId id) {
    return cells.get(id);
  }

  /** The content of the cell in which a statement stands. */
  CellContent cellOf(Node node) {
    return Objects.requireNonNull(cells.get(node.place().cell()));
  }

  /** The cells that have read a word as a unit, in no order. */
  Collection<CellId> cellsThatReadAsUnit(String word) {
    return readAsUnit.getOrDefault(word, Set.of());
  }

  /** Notes what a cell holds now; a cell without statements is none. Its graph was seen to. */
  void put(CellId id, CellContent content) {
    CellContent before = cells.get(id);
    if (before != null) {
      before.words().forEach(word -> forget(word, id));
    }
    if (content.nodes().isEmpty()) {
      cells.remove(id);
    } else {
      cells.put(id, content);
      content
          .words()
          .forEach(word -> readAsUnit.computeIfAbsent(word, w -> new LinkedHashSet<>()).add(id));
    }
  }

  /** Takes statements that nothing depends on out of a cell. */
  void forget(CellId id, Predicate<Node> forgotten) {
    CellContent content = Objects.requireNonNull(cells.get(id));
    Set<Node> leaving = content.nodes().stream().filter(forgotten).collect(Collectors.toSet());
    graph.remove(leaving);
    results.settle(leaving);
    put(id, content.without(leaving));
  }

  private void forget(String word, CellId id) {
    Set<CellId> left = readAsUnit.get(word);
    if (left != null && left.remove(id) && left.isEmpty()) {
      readAsUnit.remove(word);
    }
  }

  /** Notes the doubts that are left by a change that was done. */
  void settle(Doubts left) {
    doubts = left;
    near = new SimilarNames(graph.names());
  }

  /** The steps of a cell. */
  List<Step> steps(CellContent content) {
    var maker = new StepMaker(results, content.label(), doubts, near);
    return content.nodes().stream().map(maker::step).toList();
  }
}
