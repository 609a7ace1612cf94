package whorl.sheet;

import java.util.Collections;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.check.FreeNames;
import whorl.check.Mentions;
import whorl.check.Routine;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
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
    this.uses = Collections.unmodifiableSet(FreeNames.in(statement));
    this.text = Printer.unremarked(statement);
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

  /** The names of the sheet that it uses, in order of first mention. */
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
    return statement instanceof Statement.Motion motion
        ? Optional.of(motion.name().name())
        : Optional.empty();
  }

  /**
   * What a statement says; of two that say the same, one can keep the result of the other.
   *
   * @param text its canonical text
   * @param routine what works out a published function
   * @param files different for each statement that reads a file, which may have changed; else null
   */
  record Said(String text, String remark, @Nullable Routine routine, @Nullable Object files) {}

  /** What it says. */
  Said said() {
    return new Said(text, statement.remark(), routine, Mentions.ofText(statement) ? this : null);
  }

  /** Whether it is a check or an assumption. */
  boolean judges() {
    return statement instanceof Statement.Check
        || statement instanceof Statement.Reproduction
        || statement instanceof Statement.Assumption;
  }

  /** Its canonical text, without its remark. */
  String text() {
    return text;
  }

  /** Whether it holds a place in the text of its cell. */
  boolean contains(Span place) {
    return statement.span().start() <= place.start() && place.end() <= statement.span().end();
  }
}
