package whorl.sheet;

import java.util.Optional;
import java.util.Set;
import whorl.check.FreeNames;
import whorl.diagnostic.Source;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/** A statement in its place: a node of the dependency graph, equal only to itself. */
final class Node {
  private final Place place;
  private final Source source;
  private final Statement statement;
  private final Set<String> uses;
  private final String text;

  Node(Place place, Source source, Statement statement) {
    this.place = place;
    this.source = source;
    this.statement = statement;
    this.uses = Set.copyOf(FreeNames.in(statement));
    this.text = Printer.statement(statement);
  }

  Place place() {
    return place;
  }

  /** The text of its cell. */
  Source source() {
    return source;
  }

  Statement statement() {
    return statement;
  }

  /** The names of the sheet that it uses. */
  Set<String> uses() {
    return uses;
  }

  /** The name that it defines, if any. */
  Optional<String> defines() {
    if (statement instanceof Statement.Definition definition) {
      return Optional.of(definition.name().name());
    } else if (statement instanceof Statement.Function function) {
      return Optional.of(function.name().name());
    }
    return Optional.empty();
  }

  /** Whether another node says the same, so that its result can be kept. */
  boolean saysTheSame(Node other) {
    return text.equals(other.text);
  }
}
