package whorl.sheet;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.check.InputForm;
import whorl.diagnostic.Diagnostic;
import whorl.syntax.Printer;
import whorl.syntax.Statement;

/**
 * A name with its definition as it stands.
 *
 * @param name the name
 * @param statement the statement that defines it
 * @param cell the cell in which that stands
 * @param label how messages call the cell
 * @param kind the kind of quantity in words, for a function that of its result; empty where it is
 *     not known
 * @param quantity what it comes to; null for a function and where it comes to nothing
 * @param state how it stands
 */
public record Definition(
    String name,
    Statement statement,
    CellId cell,
    String label,
    String kind,
    @Nullable Quantity quantity,
    State state) {

  /** What sort of thing a name stands for. */
  public enum Sort {
    /** A quantity written out as a number or vector. */
    INPUT,
    /** A quantity worked out. */
    DERIVED,
    /** A function of the sheet. */
    FUNCTION,
    /** A function from Java. */
    PUBLISHED
  }

  /** How a definition stands. */
  public sealed interface State {
    /** It came to a value, or is a function that can be called. */
    record Sound() implements State {}

    /** It waits for names that have no definition, or none that stands. */
    record Waiting(List<String> names) implements State {
      /** Copies the names. */
      public Waiting {
        names = List.copyOf(names);
      }
    }

    /**
     * A change elsewhere broke it.
     *
     * @param last its last good result, now stale, or null
     */
    record Broken(Diagnostic diagnostic, @Nullable Quantity last) implements State {}
  }

  /** What sort of thing it is. */
  public Sort sort() {
    if (statement instanceof Statement.Function) {
      return Sort.FUNCTION;
    } else if (statement instanceof Statement.Published) {
      return Sort.PUBLISHED;
    }
    return statement instanceof Statement.Definition definition
            && InputForm.isInput(definition.value())
        ? Sort.INPUT
        : Sort.DERIVED;
  }

  /** Its canonical text, without the remark. */
  public String text() {
    return Printer.unremarked(statement);
  }

  /** The remark behind it, or empty. */
  public String remark() {
    return statement.remark();
  }
}
