package whorl.sheet;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Queue;
import java.util.Set;
import java.util.function.IntFunction;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import whorl.check.Vocabulary;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;

/**
 * A change of what a cell holds, with all that follows from it. It is worked out on the side and
 * done whole or not at all.
 */
final class Edit {
  private static final int MOST_ERRORS = 10;

  private final Contents contents;
  private final Graph graph;
  private final @Nullable CellId cell;
  private final CellContent content;
  private final List<Node> leaving = new ArrayList<>();
  private final Set<String> attempted = new LinkedHashSet<>();
  private long evaluations;

  /** The statement being worked out. */
  private @Nullable Node at;

  /**
   * Plans a change.
   *
   * @param cell the cell, or null where statements only leave
   * @param content what it is to hold
   * @param taken statements of other cells that leave with the change
   */
  Edit(Contents contents, @Nullable CellId cell, CellContent content, Collection<Node> taken) {
    this.contents = contents;
    this.graph = contents.graph();
    this.cell = cell;
    this.content = content;
    CellContent before = cell == null ? null : contents.cell(cell);
    if (before != null) {
      leaving.addAll(before.nodes());
    }
    leaving.addAll(taken);
  }

  /** The same change of a cell that defines these names, or would have defined them. */
  Edit attempting(Set<String> names) {
    attempted.addAll(names);
    return this;
  }

  /** How many statements were worked out. */
  long evaluations() {
    return evaluations;
  }

  /**
   * Does it.
   *
   * @param faults mistakes found before, with which nothing is done
   * @param notices what the author should know of the change itself
   * @param pace gives for the number of statements to be worked out who is told how far that has
   *     come
   */
  CellOutcome done(List<Diagnostic> faults, List<Diagnostic> notices, IntFunction<Pace> pace) {
    return attempt(faults, notices, pace).get();
  }

  /** Tries it, and gives what to tell once the graph is as it is to be. */
  private Supplier<CellOutcome> attempt(
      List<Diagnostic> faults, List<Diagnostic> notices, IntFunction<Pace> pace) {
    Map<Node, Node> kept = kept();
    Set<Node> stays = identical(kept.values());
    List<Node> removed = leaving.stream().filter(node -> !stays.contains(node)).toList();
    List<Node> added = content.nodes().stream().filter(node -> !kept.containsKey(node)).toList();
    graph.remove(leaving);
    graph.add(content.nodes());
    boolean done = false;
    try {
      var changed = names(removed);
      changed.addAll(names(added));
      var affected = new LinkedHashSet<>(added);
      affected.addAll(graph.downstream(changed));
      Graph.Order order = graph.order(affected);
      if (order instanceof Graph.Order.Cycle cycle) {
        return refused(faults, List.of(cycle(cycle)));
      }
      Results staging = contents.results().staging();
      var calculator = new Calculator(staging);
      keep(kept, affected, calculator, staging);
      List<Node> sorted = ((Graph.Order.Sorted) order).nodes();
      List<Diagnostic> errors = workOut(sorted, calculator, staging, pace.apply(sorted.size()));
      evaluations = calculator.evaluations();
      if (!faults.isEmpty() || !errors.isEmpty()) {
        return refused(faults, errors);
      }
      Doubts doubts = Doubts.in(graph, staging);
      done = true;
      return () -> settled(affected, staging, doubts, notices);
    } catch (Interruption interruption) {
      return this::interrupted;
    } finally {
      if (!done) {
        graph.remove(content.nodes());
        graph.add(leaving);
      }
    }
  }

  private boolean isHere(Node node) {
    return node.place().cell().equals(cell);
  }

  private static Set<Node> identical(Collection<Node> nodes) {
    Set<Node> set = Collections.newSetFromMap(new IdentityHashMap<>());
    set.addAll(nodes);
    return set;
  }

  private static Set<String> names(Collection<Node> nodes) {
    return nodes.stream()
        .flatMap(node -> node.defines().stream())
        .collect(Collectors.toCollection(LinkedHashSet::new));
  }

  private Diagnostic cycle(Graph.Order.Cycle cycle) {
    return SheetMessages.cycle(
        cycle.nodes(),
        this::isHere,
        id -> {
          CellContent other = contents.cell(id);
          return other == null ? "this cell" : other.label();
        });
  }

  /** New statements that say what one that leaves said, each with that one. */
  private Map<Node, Node> kept() {
    var said = new HashMap<Node.Said, Queue<Node>>();
    for (Node node : leaving) {
      // Messages of a broken statement point into the old text.
      if (!(contents.results().of(node).orElse(null) instanceof Result.Broken)) {
        said.computeIfAbsent(node.said(), key -> new ArrayDeque<>()).add(node);
      }
    }
    var kept = new LinkedHashMap<Node, Node>();
    for (Node node : content.nodes()) {
      Node was = said.getOrDefault(node.said(), new ArrayDeque<>()).poll();
      if (was != null) {
        kept.put(node, was);
      }
    }
    return kept;
  }

  /** Stages what the statements that were kept came to before. */
  private void keep(
      Map<Node, Node> kept, Set<Node> affected, Calculator calculator, Results staging) {
    Results before = contents.results();
    kept.forEach((node, was) -> staging.stage(node, before.of(was).orElseThrow()));
    kept.forEach(
        (node, was) -> {
          if (!affected.contains(node) && !node.statement().equals(was.statement())) {
            staging.stage(node, calculator.moved(node, before.of(was).orElseThrow()));
          }
        });
  }

  private List<Diagnostic> workOut(
      List<Node> order, Calculator calculator, Results staging, Pace pace) {
    var errors = new ArrayList<Diagnostic>();
    int done = 0;
    for (Node node : order) {
      at = node;
      Interruption.poll();
      Result result = calculator.result(node);
      if (result instanceof Result.Broken broken) {
        if (isHere(node)) {
          errors.add(broken.diagnostic());
        }
        result = new Result.Broken(broken.diagnostic(), lastGood(node));
      }
      staging.stage(node, result);
      pace.done(++done);
    }
    return errors;
  }

  private @Nullable Quantity lastGood(Node node) {
    Result last = contents.results().of(node).orElse(null);
    if (last instanceof Result.Valued valued) {
      return Quantities.of(node, valued);
    }
    return last instanceof Result.Broken broken ? broken.last() : null;
  }

  private Supplier<CellOutcome> refused(List<Diagnostic> faults, List<Diagnostic> errors) {
    List<Diagnostic> first =
        Stream.concat(faults.stream(), errors.stream())
            .sorted(Comparator.comparingInt(error -> error.span().start()))
            .limit(MOST_ERRORS)
            .toList();
    return () -> CellOutcome.refused(content.source(), first, before(), attempted);
  }

  private CellOutcome interrupted() {
    Optional<Node> node = Optional.ofNullable(at);
    Diagnostic message =
        node.isEmpty()
            ? SheetMessages.interrupted()
            : isHere(node.get())
                ? SheetMessages.interrupted(node.get())
                : SheetMessages.interrupted(node.get(), contents.cellOf(node.get()).label());
    return CellOutcome.interrupted(content.source(), message, before(), attempted);
  }

  /** The steps of the cell as they stand without the change. */
  private List<Step> before() {
    CellContent before = cell == null ? null : contents.cell(cell);
    return before == null ? List.of() : contents.steps(before);
  }

  private CellOutcome settled(
      Set<Node> affected, Results staging, Doubts doubts, List<Diagnostic> notices) {
    Results before = contents.results();
    var elsewhere = affected.stream().filter(node -> !isHere(node)).toList();
    var changes = new ArrayList<CellOutcome.Change>();
    var turned = new ArrayList<CellOutcome.Turn>();
    var stopped = new ArrayList<String>();
    for (Node node : elsewhere) {
      Change.between(node, before.of(node), staging.of(node)).ifPresent(changes::add);
      Change.turn(node, before.of(node), staging.of(node)).ifPresent(turned::add);
      Change.stop(node, before.of(node), staging.of(node)).ifPresent(stopped::add);
    }
    staging.settle(leaving);
    Set<CellId> robbed = rob();
    if (cell != null) {
      contents.put(cell, content);
    }
    var refreshed = new LinkedHashSet<>(robbed);
    Stream.concat(elsewhere.stream(), doubts.differingFrom(contents.doubts()))
        .map(node -> node.place().cell())
        .filter(id -> !id.equals(cell))
        .forEach(refreshed::add);
    contents.settle(doubts);
    var all = new ArrayList<>(notices);
    all.addAll(noticed());
    return new CellOutcome(
        content.source(),
        List.of(),
        false,
        all,
        contents.steps(content),
        changes,
        turned,
        stopped,
        refreshed,
        attempted);
  }

  /** Takes the statements that left other cells out of these. */
  private Set<CellId> rob() {
    Set<Node> gone = identical(leaving);
    Set<CellId> robbed =
        leaving.stream()
            .map(node -> node.place().cell())
            .filter(id -> !id.equals(cell))
            .collect(Collectors.toCollection(LinkedHashSet::new));
    for (CellId id : robbed) {
      CellContent other = contents.cell(id);
      if (other != null) {
        contents.put(id, other.without(gone));
      }
    }
    return robbed;
  }

  private List<Diagnostic> noticed() {
    var notices = new ArrayList<Diagnostic>();
    for (Node node : content.nodes()) {
      node.defines()
          .filter(Vocabulary::isFunction)
          .map(name -> SheetMessages.hides(node.statement(), name))
          .ifPresent(notices::add);
      notices.addAll(contents.results().of(node).map(Result::remarks).orElse(List.of()));
    }
    return notices;
  }
}
