package whorl.assist;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import whorl.check.Availability;
import whorl.check.Checked;
import whorl.check.Checker;
import whorl.check.FreeNames;
import whorl.check.Meaning;
import whorl.check.Scope;
import whorl.check.Type;
import whorl.check.Vocabulary;
import whorl.diagnostic.Source;
import whorl.syntax.CatalogueWords;
import whorl.syntax.LogicalLine;
import whorl.syntax.Parsed;
import whorl.syntax.Parser;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.kind.Readings;

/**
 * The names of a sheet as they would be with a cell as it stands in the editor: what its lines
 * define hides what the sheet has. Lines are checked only when their names are asked for; nothing
 * is worked out and the sheet is not touched.
 */
final class DraftSheet implements Scope {
  /**
   * So many lines are read for one question, which must be answered while one types; for what is
   * further away the sheet as it ran has to do.
   */
  private static final int MOST_LINES = 100;

  private final Scope sheet;
  private final Set<String> sheetNames;
  private final Source source;
  private final Map<String, LogicalLine> own = new LinkedHashMap<>();
  private final Map<String, Meaning> checked = new HashMap<>();
  private final Map<String, Meaning> standIns = new HashMap<>();
  private final Set<String> settled = new HashSet<>();
  private boolean settling;
  private int linesRead;

  /**
   * A draft.
   *
   * @param source the text of the cell
   * @param lines the lines of the cell that count
   */
  DraftSheet(Scope sheet, Source source, List<LogicalLine> lines) {
    this.sheet = sheet;
    this.sheetNames = new HashSet<>(sheet.names());
    this.source = source;
    for (LogicalLine line : lines) {
      if (!line.isIndented()) {
        line.defines().ifPresent(name -> own.putIfAbsent(name.name(), line));
      }
    }
  }

  /** The lines of the cell that define a name, by the name, in order. */
  Map<String, LogicalLine> own() {
    return own;
  }

  /** The text of a line of the cell, without its remark. */
  String text(LogicalLine line) {
    return source.slice(line.span());
  }

  /** The line of the cell that defines a name. */
  Optional<LogicalLine> line(String name) {
    return Optional.ofNullable(own.get(name));
  }

  /** A line of the cell in canonical form; as written where it cannot be read. */
  String canonical(LogicalLine line) {
    String text = text(line);
    return statement(text).map(Printer::unremarked).orElse(text);
  }

  /** Whether the sheet or the cell defines a name. */
  boolean defines(String name) {
    return own.containsKey(name) || sheetNames.contains(name);
  }

  /** A name for a value of some kind that nobody has written yet, such as an argument to come. */
  String standIn(Readings readings, Unit unit) {
    int number = 1;
    while (defines("stand_in_" + number) || standIns.containsKey("stand_in_" + number)) {
      number++;
    }
    standIns.put("stand_in_" + number, new Meaning.Quantity(new Type.Real(readings), unit, true));
    return "stand_in_" + number;
  }

  /** What a name stands for by the cell alone. */
  Optional<Meaning> ownMeaning(String name) {
    return own.containsKey(name) ? meaning(name) : Optional.empty();
  }

  @Override
  public Optional<Meaning> meaning(String name) {
    if (!settling) {
      settling = true;
      settle(name);
      settling = false;
    }
    return Optional.ofNullable(checked.get(name))
        .or(() -> Optional.ofNullable(standIns.get(name)))
        .or(() -> sheet.meaning(name));
  }

  @Override
  public Path folder() {
    return sheet.folder();
  }

  /** Messages are not worded here, so no names are needed to suggest. */
  @Override
  public List<String> names() {
    return List.of();
  }

  /** A statement if it can be read, uses only names that are known, and is sound. */
  Optional<Checked> sound(String text) {
    return known(text).flatMap(new Checker(this)::sound);
  }

  /** A statement if it can be read and uses only names that are known. */
  Optional<Statement> known(String text) {
    return statement(text).filter(this::isKnown);
  }

  /** The one statement of a text, if it can be read and worked out. */
  Optional<Statement> statement(String text) {
    Parsed parsed = Parser.parse(new Source(text), this::defines, CatalogueWords.STANDARD);
    return parsed.errors().isEmpty() && parsed.statements().size() == 1
        ? Optional.of(parsed.statements().get(0))
            .filter(statement -> Availability.gaps(statement, this::defines).isEmpty())
        : Optional.empty();
  }

  private boolean isKnown(Statement statement) {
    return FreeNames.in(statement).stream()
        .allMatch(name -> meaning(name).isPresent() || isAtHand(name));
  }

  private boolean isAtHand(String name) {
    return Vocabulary.isFunction(name) && !defines(name);
  }

  /**
   * Checks the line that defines a name, behind those that it depends on. A list of what is open
   * keeps long chains of definitions from growing the stack of the program.
   */
  private void settle(String name) {
    var statements = new HashMap<String, Optional<Statement>>();
    var open = new ArrayDeque<String>(List.of(name));
    while (!open.isEmpty()) {
      String next = open.getLast();
      LogicalLine line = own.get(next);
      if (line == null || settled.contains(next)) {
        open.removeLast();
      } else if (statements.containsKey(next)) {
        open.removeLast();
        settle(next, statements.getOrDefault(next, Optional.empty()));
      } else if (linesRead >= MOST_LINES) {
        settled.add(next);
      } else {
        linesRead++;
        Optional<Statement> statement = statement(text(line));
        statements.put(next, statement);
        statement.map(FreeNames::in).orElse(Set.of()).stream()
            .filter(needed -> !statements.containsKey(needed))
            .forEach(open::add);
      }
    }
  }

  private void settle(String name, Optional<Statement> statement) {
    statement
        .filter(this::isKnown)
        .flatMap(new Checker(this)::sound)
        .flatMap(DraftSheet::meaning)
        .ifPresent(meaning -> checked.put(name, meaning));
    settled.add(name);
  }

  private static Optional<Meaning> meaning(Checked checked) {
    if (checked instanceof Checked.Value value) {
      var formula = value.formula();
      return Optional.of(new Meaning.Quantity(formula.type(), formula.unit(), formula.chosen()));
    }
    return checked instanceof Checked.Function function
        ? Optional.of(function.meaning())
        : Optional.empty();
  }
}
