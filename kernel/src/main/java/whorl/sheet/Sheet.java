package whorl.sheet;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import whorl.check.Availability;
import whorl.check.DefinedNames;
import whorl.check.Vocabulary;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.syntax.CatalogueWords;
import whorl.syntax.Parsed;
import whorl.syntax.Parser;
import whorl.syntax.Statement;

/**
 * A set of definitions, each name with one, written in cells that may run in any order. Running a
 * cell replaces what it defined before and recalculates what depends on it and nothing else; it
 * takes effect whole or not at all.
 *
 * <p>A sheet is used by one thread at a time.
 */
public final class Sheet {
  private static final int MOST_ERRORS = 10;

  private final Map<CellId, CellContent> cells = new LinkedHashMap<>();
  private final Graph graph = new Graph();
  private final Results results = Results.of(graph);
  private long evaluations;

  /**
   * Runs a cell.
   *
   * @param cell its id
   * @param label how messages call it, as {@code cell [2]}
   * @param text its text
   */
  public CellOutcome run(CellId cell, String label, String text) {
    var source = new Source(text);
    Parsed parsed = Parser.parse(source, isDefinedOutside(cell), CatalogueWords.STANDARD);
    return take(cell, label, source, parsed, nodes(cell, source, parsed.statements()));
  }

  /**
   * Makes functions from Java the content of a cell, in place of what it defined before.
   *
   * @param cell its id
   * @param label how messages call it, as {@code cell [2]}
   * @param functions their heads are the text that messages point into, one a line; none withdraws
   *     what the cell defined
   */
  public CellOutcome publish(CellId cell, String label, List<PublishedFunction> functions) {
    var source =
        new Source(
            functions.stream()
                .map(function -> function.head().strip().replaceAll("\\R", " "))
                .collect(Collectors.joining("\n")));
    if (functions.isEmpty()) {
      return withdraw(cell);
    }
    Parsed parsed = Parser.heads(source, isDefinedOutside(cell), CatalogueWords.STANDARD);
    var nodes = new ArrayList<Node>();
    for (Statement statement : parsed.statements()) {
      int line = source.line(statement.span().start());
      var place = new Place(cell, nodes.size(), line);
      nodes.add(new Node(place, source, statement, functions.get(line - 1).routine()));
    }
    return take(cell, label, source, parsed, nodes);
  }

  private Predicate<String> isDefinedOutside(CellId cell) {
    return name -> graph.definition(name).filter(in(cell).negate()).isPresent();
  }

  private CellOutcome take(
      CellId cell, String label, Source source, Parsed parsed, List<Node> nodes) {
    var rules = new NameRules(cells, graph, cell, nodes);
    Set<String> here = names(nodes);
    var errors = new ArrayList<Diagnostic>(parsed.errors());
    var sound = new ArrayList<Node>();
    for (Node node : nodes) {
      var faults = new ArrayList<>(rules.broken(node));
      faults.addAll(
          Availability.gaps(
              node.statement(), name -> here.contains(name) || graph.definition(name).isPresent()));
      errors.addAll(faults);
      if (faults.isEmpty()) {
        sound.add(node);
      }
    }
    // The sound statements of a cell in error are worked out too, so that all its mistakes are
    // reported at once.
    return replace(
        cell, new CellContent(label, source, sound, parsed.unitWords()), errors, attempted(nodes));
  }

  /** Withdraws what a cell defined. */
  public CellOutcome withdraw(CellId cell) {
    var nothing = new CellContent("", new Source(""), List.of(), List.of());
    CellOutcome outcome = replace(cell, nothing, List.of(), Set.of());
    cells.remove(cell);
    return outcome;
  }

  /** The steps of a cell as they stand now; none for a cell that never took effect. */
  public List<Step> steps(CellId cell) {
    CellContent content = cells.get(cell);
    return content == null ? List.of() : steps(content, Doubts.in(cells.values(), graph, results));
  }

  /** The cells that took effect, in the order in which they first did. */
  public List<CellId> cells() {
    return List.copyOf(cells.keySet());
  }

  /** What a name stands for, or empty if it has no value. */
  public Optional<Quantity> quantity(String name) {
    return results.quantity(name);
  }

  /** The text of a cell that took effect. */
  public Optional<Source> source(CellId cell) {
    return Optional.ofNullable(cells.get(cell)).map(CellContent::source);
  }

  /** How many statements were worked out since the sheet was made. */
  public long evaluations() {
    return evaluations;
  }

  private static Predicate<Node> in(CellId cell) {
    return node -> node.place().cell().equals(cell);
  }

  private static List<Node> nodes(CellId cell, Source source, List<Statement> statements) {
    var nodes = new ArrayList<Node>();
    for (Statement statement : statements) {
      int line = source.line(statement.span().start());
      nodes.add(new Node(new Place(cell, nodes.size(), line), source, statement));
    }
    return nodes;
  }

  private static Set<String> names(Collection<Node> nodes) {
    return nodes.stream()
        .flatMap(node -> node.defines().stream())
        .collect(Collectors.toCollection(LinkedHashSet::new));
  }

  private static Set<String> attempted(List<Node> nodes) {
    return nodes.stream()
        .flatMap(node -> DefinedNames.in(node.statement()).stream())
        .collect(Collectors.toCollection(LinkedHashSet::new));
  }

  private CellOutcome refused(
      CellId cell, Source source, List<Diagnostic> errors, Set<String> attempted) {
    List<Diagnostic> first =
        errors.stream()
            .sorted(Comparator.comparingInt(error -> error.span().start()))
            .limit(MOST_ERRORS)
            .toList();
    return new CellOutcome(
        source, first, List.of(), steps(cell), List.of(), List.of(), Set.of(), attempted);
  }

  private CellOutcome replace(
      CellId cell, CellContent content, List<Diagnostic> faults, Set<String> attempted) {
    List<Node> old = cells.containsKey(cell) ? cells.get(cell).nodes() : List.of();
    Map<Node, Node> kept = kept(old, content.nodes());
    List<Node> removed = old.stream().filter(node -> !kept.containsValue(node)).toList();
    List<Node> added = content.nodes().stream().filter(node -> !kept.containsKey(node)).toList();
    Doubts before = Doubts.in(cells.values(), graph, results);

    graph.remove(old);
    graph.add(content.nodes());
    boolean done = false;
    try {
      var changed = new LinkedHashSet<>(names(removed));
      changed.addAll(names(added));
      var affected = new LinkedHashSet<>(added);
      affected.addAll(graph.downstream(changed));
      Graph.Order order = graph.order(affected);
      if (order instanceof Graph.Order.Cycle cycle) {
        var errors = new ArrayList<>(faults);
        errors.add(SheetMessages.cycle(cycle.nodes(), in(cell), this::label));
        return refused(cell, content.source(), errors, attempted);
      }
      Results staging = results.staging();
      var calculator = new Calculator(staging);
      keep(kept, affected, calculator, staging);
      var errors = new ArrayList<>(faults);
      errors.addAll(workOut(((Graph.Order.Sorted) order).nodes(), calculator, staging, cell));
      evaluations += calculator.evaluations();
      if (!errors.isEmpty()) {
        return refused(cell, content.source(), errors, attempted);
      }
      done = true;
      return settle(cell, content, old, affected, staging, before, attempted);
    } finally {
      if (!done) {
        graph.remove(content.nodes());
        graph.add(old);
      }
    }
  }

  /** New statements that say what an old one of the cell said, each with the old one. */
  private Map<Node, Node> kept(List<Node> old, List<Node> nodes) {
    var left = new ArrayList<>(old);
    var kept = new LinkedHashMap<Node, Node>();
    for (Node node : nodes) {
      left.stream()
          .filter(node::saysTheSame)
          .findFirst()
          // Messages of a broken statement point into the old text.
          .filter(was -> results.of(was).filter(Result.Broken.class::isInstance).isEmpty())
          .ifPresent(
              was -> {
                left.remove(was);
                kept.put(node, was);
              });
    }
    return kept;
  }

  /** Stages what the statements that were kept came to before. */
  private void keep(
      Map<Node, Node> kept, Set<Node> affected, Calculator calculator, Results staging) {
    kept.forEach((node, was) -> staging.stage(node, results.of(was).orElseThrow()));
    kept.forEach(
        (node, was) -> {
          if (!affected.contains(node) && !node.statement().equals(was.statement())) {
            staging.stage(node, calculator.moved(node, results.of(was).orElseThrow()));
          }
        });
  }

  private List<Diagnostic> workOut(
      List<Node> order, Calculator calculator, Results staging, CellId cell) {
    var errors = new ArrayList<Diagnostic>();
    for (Node node : order) {
      Result result = calculator.result(node);
      if (result instanceof Result.Broken broken) {
        if (in(cell).test(node)) {
          errors.add(broken.diagnostic());
        }
        result = new Result.Broken(broken.diagnostic(), lastGood(node));
      }
      staging.stage(node, result);
    }
    return errors;
  }

  private @Nullable Quantity lastGood(Node node) {
    Result last = results.of(node).orElse(null);
    if (last instanceof Result.Valued valued) {
      return Quantities.of(node, valued);
    }
    return last instanceof Result.Broken broken ? broken.last() : null;
  }

  private CellOutcome settle(
      CellId cell,
      CellContent content,
      List<Node> old,
      Set<Node> affected,
      Results staging,
      Doubts before,
      Set<String> attempted) {
    var elsewhere = affected.stream().filter(in(cell).negate()).toList();
    var changes = new ArrayList<CellOutcome.Change>();
    var turned = new ArrayList<CellOutcome.Turn>();
    for (Node node : elsewhere) {
      Change.between(node, results.of(node), staging.of(node)).ifPresent(changes::add);
      Change.turn(node, results.of(node), staging.of(node)).ifPresent(turned::add);
    }
    staging.settle(old);
    if (content.nodes().isEmpty()) {
      cells.remove(cell);
    } else {
      cells.put(cell, content);
    }
    Doubts now = Doubts.in(cells.values(), graph, results);
    Set<CellId> refreshed =
        Stream.concat(elsewhere.stream(), now.differingFrom(before))
            .map(node -> node.place().cell())
            .filter(id -> !id.equals(cell))
            .collect(Collectors.toCollection(LinkedHashSet::new));
    return new CellOutcome(
        content.source(),
        List.of(),
        notices(content),
        steps(content, now),
        changes,
        turned,
        refreshed,
        attempted);
  }

  private List<Diagnostic> notices(CellContent content) {
    var notices = new ArrayList<Diagnostic>();
    for (Node node : content.nodes()) {
      node.defines()
          .filter(Vocabulary::isFunction)
          .map(name -> SheetMessages.hides(node.statement(), name))
          .ifPresent(notices::add);
      notices.addAll(results.of(node).map(Result::remarks).orElse(List.of()));
    }
    return notices;
  }

  private List<Step> steps(CellContent content, Doubts doubts) {
    var maker = new StepMaker(results, content.label());
    var near = new SimilarNames(graph.names());
    return content.nodes().stream()
        .map(node -> maker.step(node, results.of(node).orElseThrow(), doubts.on(node), near))
        .toList();
  }

  private String label(CellId cell) {
    CellContent content = cells.get(cell);
    return content == null ? "this cell" : content.label();
  }
}
