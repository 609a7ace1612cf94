package whorl.sheet;

import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.check.FreeNames;
import whorl.check.Routine;
import whorl.diagnostic.Source;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/** A statement in its place: a node of the dependency graph, equal only to itself. */
final class Node {
  private final Place place;
  private final Source source;
  private final Statement statement;
  private final @Nullable Routine routine;
  private final Set<String> uses;
  private final String text;

  Node(Place place, Source source, Statement statement) {
    this(place, source, statement, null);
  }

  /**
   * A statement in its place.
   *
   * @param routine what works out a published function; null for any other statement
   */
  Node(Place place, Source source, Statement statement, @Nullable Routine routine) {
    this.place = place;
    this.source = source;
    this.statement = statement;
    this.routine = routine;
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

  /** What works out a published function; null for any other statement. */
  @Nullable Routine routine() {
    return routine;
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
    } else if (statement instanceof Statement.Published published) {
      return Optional.of(published.name().name());
    }
    return Optional.empty();
  }

  /** Whether another node says the same, so that its result can be kept. */
  boolean saysTheSame(Node other) {
    return text.equals(other.text) && routine == other.routine;
  }
}
