package whorl.sheet;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.LongSupplier;
import java.util.function.Predicate;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import whorl.check.Availability;
import whorl.check.DefinedNames;
import whorl.check.Scope;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.syntax.CatalogueWords;
import whorl.syntax.GreekNames;
import whorl.syntax.Parsed;
import whorl.syntax.Parser;
import whorl.syntax.Statement;

/**
 * A set of definitions, each name with one, written in cells that may run in any order. Running a
 * cell replaces what it defined before and recalculates what depends on it and nothing else; it
 * takes effect whole or not at all.
 *
 * <p>A sheet is used by one thread at a time. If that thread is interrupted while a cell runs, the
 * run ends soon, nothing is changed, and the outcome says so; the interrupt is then answered and
 * the thread's interrupt status cleared.
 */
public final class Sheet {
  private final Contents contents;
  private final Facts facts;
  private final LongSupplier clock;
  private Progress progress = Progress.UNWATCHED;
  private long evaluations;

  /** An empty sheet that reads files below the folder in which the program runs. */
  public Sheet() {
    this(Path.of(""));
  }

  /**
   * An empty sheet.
   *
   * @param folder below which it reads files: that of its note
   */
  public Sheet(Path folder) {
    this(folder, System::nanoTime);
  }

  /**
   * An empty sheet.
   *
   * @param clock gives nanoseconds
   */
  Sheet(LongSupplier clock) {
    this(Path.of(""), clock);
  }

  private Sheet(Path folder, LongSupplier clock) {
    this.contents = new Contents(folder);
    this.facts = new Facts(contents);
    this.clock = clock;
  }

  /** Names who is told how far a long recalculation has come, from now on. */
  public void onProgress(Progress listener) {
    progress = listener;
  }

  /**
   * Runs a cell.
   *
   * @param cell its id
   * @param label how messages call it, as {@code cell [2]}
   * @param text its text
   */
  public CellOutcome run(CellId cell, String label, String text) {
    Source source = source(text);
    return answering(source, cell, () -> take(read(cell, source), cell, label, source, false));
  }

  /**
   * Runs what was typed in a console, which has no cells. A name that has its definition elsewhere
   * is taken over. Definitions, checks and assumptions stay, a check until it is typed again;
   * whoever defines one of the names next takes it over in turn. A value is shown once, unless it
   * waits for a name; then it is shown when it can be.
   *
   * @param fresh an id of its own
   * @param label how messages call it, as {@code [7]}
   * @param text what was typed
   */
  public CellOutcome runFromConsole(CellId fresh, String label, String text) {
    Source source = source(text);
    return answering(
        source,
        fresh,
        () -> {
          CellOutcome outcome = take(read(fresh, source), fresh, label, source, true);
          if (outcome.tookEffect()) {
            contents.forget(fresh, this::isShownForGood);
          }
          return outcome;
        });
  }

  /** What a console shows stays as it is, but what waits is still to be shown. */
  private boolean isShownForGood(Node node) {
    return node.statement() instanceof Statement.Show
        && !(contents.results().of(node).orElse(null) instanceof Result.Waiting);
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
    return publish(cell, label, functions, false);
  }

  /**
   * The same for functions from what was typed in a console: a name that has its definition
   * elsewhere is taken over.
   *
   * @param fresh an id of its own
   * @param label how messages call it, as {@code [7]}
   */
  public CellOutcome publishFromConsole(
      CellId fresh, String label, List<PublishedFunction> functions) {
    return publish(fresh, label, functions, true);
  }

  private CellOutcome publish(
      CellId cell, String label, List<PublishedFunction> functions, boolean typed) {
    if (functions.isEmpty()) {
      return withdraw(cell);
    }
    Source source =
        source(
            functions.stream()
                .map(function -> function.head().strip().replaceAll("\\R", " "))
                .collect(Collectors.joining("\n")));
    return answering(
        source,
        cell,
        () -> {
          Parsed parsed = Parser.heads(source, isDefinedOutside(cell), CatalogueWords.STANDARD);
          var nodes = new ArrayList<Node>();
          for (Statement statement : parsed.statements()) {
            int line = source.line(statement.span().start());
            var place = new Place(cell, nodes.size(), line);
            nodes.add(new Node(place, source, statement, functions.get(line - 1).routine()));
          }
          return take(new Read(parsed, nodes), cell, label, source, typed);
        });
  }

  /** Withdraws what a cell defined. */
  public CellOutcome withdraw(CellId cell) {
    var source = new Source("");
    var edit = new Edit(contents, cell, CellContent.nothing(source), List.of());
    return answering(source, cell, () -> done(edit, List.of(), List.of()));
  }

  /** Withdraws a name; the other statements of its cell stay. */
  public CellOutcome withdraw(String name) {
    String folded = GreekNames.fold(name.strip());
    var source = new Source(folded);
    Optional<Node> node = contents.graph().definition(folded);
    if (node.isEmpty()) {
      List<String> near = near(folded);
      Diagnostic error = SheetMessages.notDefined(folded, new Span(0, source.length()), near);
      return CellOutcome.refused(source, List.of(error), List.of(), Set.of());
    }
    Diagnostic notice =
        SheetMessages.withdrawn(folded, node.get(), contents.cellOf(node.get()).label());
    return answering(
        source,
        null,
        () ->
            done(
                new Edit(contents, null, CellContent.nothing(source), List.of(node.get())),
                List.of(),
                List.of(notice)));
  }

  /** The steps of a cell as they stand now; none for a cell that never took effect. */
  public List<Step> steps(CellId cell) {
    CellContent content = contents.cell(cell);
    return content == null ? List.of() : contents.steps(content);
  }

  /** The cells that took effect, in the order in which they first did. */
  public List<CellId> cells() {
    return List.copyOf(contents.cells().keySet());
  }

  /** The names that a formula could use, with what is known of them. */
  public Scope scope() {
    return contents.results();
  }

  /** What a name stands for, or empty if it has no value. */
  public Optional<Quantity> quantity(String name) {
    return contents.results().quantity(GreekNames.fold(name));
  }

  /** Names that are spelled like one that has no definition, the nearest first. */
  public List<String> near(String name) {
    return new SimilarNames(contents.graph().names()).to(GreekNames.fold(name));
  }

  /** All definitions, by cell in the order in which the cells first took effect. */
  public List<Definition> definitions() {
    return facts.definitions();
  }

  /** All that is known of a name; empty where it has no definition. */
  public Optional<NameCard> card(String name) {
    return facts.card(GreekNames.fold(name));
  }

  /** How messages call a cell that took effect. */
  public Optional<String> label(CellId cell) {
    return Optional.ofNullable(contents.cell(cell)).map(CellContent::label);
  }

  /** The text of a cell that took effect. */
  public Optional<Source> source(CellId cell) {
    return Optional.ofNullable(contents.cell(cell)).map(CellContent::source);
  }

  /** How many statements were worked out since the sheet was made. */
  public long evaluations() {
    return evaluations;
  }

  /**
   * The text of a cell. Of one so long that it will be refused the start is enough, which takes no
   * more memory than the longest that is read.
   */
  private static Source source(String text) {
    int surelyTooLong = 2 * Parser.LONGEST_TEXT + 1;
    return new Source(text.length() < surelyTooLong ? text : text.substring(0, surelyTooLong));
  }

  /** Does something to a cell that ends early if the thread is interrupted. */
  private CellOutcome answering(Source source, @Nullable CellId cell, Supplier<CellOutcome> work) {
    CellOutcome outcome;
    try {
      Interruption.poll();
      outcome = work.get();
    } catch (Interruption interruption) {
      List<Step> standing = cell == null ? List.of() : steps(cell);
      outcome = CellOutcome.interrupted(source, SheetMessages.interrupted(), standing, Set.of());
    }
    if (outcome.interrupted()) {
      Thread.interrupted();
    }
    return outcome;
  }

  /** What was read from a text, with the statements in their places. */
  private record Read(Parsed parsed, List<Node> nodes) {}

  private Read read(CellId cell, Source source) {
    Parsed parsed = Parser.parse(source, isDefinedOutside(cell), CatalogueWords.STANDARD);
    var nodes = new ArrayList<Node>();
    for (Statement statement : parsed.statements()) {
      Interruption.poll();
      int line = source.line(statement.span().start());
      nodes.add(new Node(new Place(cell, nodes.size(), line), source, statement));
    }
    return new Read(parsed, nodes);
  }

  private Predicate<String> isDefinedOutside(CellId cell) {
    return name ->
        contents
            .graph()
            .definition(name)
            .filter(node -> !node.place().cell().equals(cell))
            .isPresent();
  }

  /** Makes statements the content of a cell, unless one is at fault. */
  private CellOutcome take(Read read, CellId cell, String label, Source source, boolean typed) {
    Graph graph = contents.graph();
    var rules = new NameRules(contents, cell, read.nodes(), typed);
    Set<String> here =
        read.nodes().stream().flatMap(node -> node.defines().stream()).collect(Collectors.toSet());
    var errors = new ArrayList<>(read.parsed().errors());
    var notices = new ArrayList<Diagnostic>();
    var sound = new ArrayList<Node>();
    var taken = new LinkedHashSet<Node>();
    for (Node node : read.nodes()) {
      var faults = new ArrayList<>(rules.broken(node));
      faults.addAll(
          Availability.gaps(
              node.statement(), name -> here.contains(name) || graph.definition(name).isPresent()));
      errors.addAll(faults);
      if (faults.isEmpty()) {
        sound.add(node);
        rules
            .takenOver(node)
            .ifPresent(
                other -> {
                  taken.add(other);
                  if (!other.text().equals(node.text())) {
                    notices.add(
                        SheetMessages.takesOver(node, other, contents.cellOf(other).label()));
                  }
                });
      }
    }
    if (typed) {
      taken.addAll(typedBefore(sound));
    }
    // The sound statements of a cell in error are worked out too, so that all its mistakes are
    // reported at once.
    var content = new CellContent(label, source, sound, read.parsed().unitWords(), typed);
    var edit = new Edit(contents, cell, content, taken).attempting(attempted(read.nodes()));
    return done(edit, errors, notices);
  }

  /** Checks and assumptions of the console that are typed once more. */
  private List<Node> typedBefore(List<Node> nodes) {
    Set<String> again =
        nodes.stream().filter(Node::judges).map(Node::text).collect(Collectors.toSet());
    if (again.isEmpty()) {
      return List.of();
    }
    return contents.cells().values().stream()
        .filter(CellContent::typed)
        .flatMap(other -> other.nodes().stream())
        .filter(node -> node.judges() && again.contains(node.text()))
        .toList();
  }

  private static Set<String> attempted(List<Node> nodes) {
    return nodes.stream()
        .flatMap(node -> DefinedNames.in(node.statement()).stream())
        .collect(Collectors.toCollection(LinkedHashSet::new));
  }

  private CellOutcome done(Edit edit, List<Diagnostic> faults, List<Diagnostic> notices) {
    CellOutcome outcome = edit.done(faults, notices, total -> new Pace(progress, clock, total));
    evaluations += edit.evaluations();
    return outcome;
  }
}
