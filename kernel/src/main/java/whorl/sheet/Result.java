package whorl.sheet;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.check.Checked;
import whorl.diagnostic.Diagnostic;
import whorl.eval.Value;

/** What a statement came to. */
sealed interface Result {
  /** What looks odd in the statement, though it is sound. */
  default List<Diagnostic> remarks() {
    return List.of();
  }

  /** A result of a statement that passed the check. */
  sealed interface Sound extends Result {
    /** The checked statement. */
    Checked checked();

    @Override
    default List<Diagnostic> remarks() {
      return checked().basis().remarks();
    }
  }

  /** A definition or shown expression with its value. */
  record Valued(Checked.Value checked, Value value) implements Sound {}

  /** A function, ready to be called. */
  record Callable(Checked.Function checked) implements Sound {}

  /** A condition that was judged. */
  record Judged(Checked.Condition checked, Verdict verdict) implements Sound {}

  /**
   * A hand-worked value compared.
   *
   * @param deviation (computed − stated)/stated
   * @param within the largest deviation allowed, a fraction
   */
  record Compared(
      Checked.Reproduction checked, Value computed, Value stated, double deviation, double within)
      implements Sound {
    boolean holds() {
      return Math.abs(deviation) <= within;
    }
  }

  /** Names that have no definition, or none that stands. */
  record Waiting(List<String> names) implements Result {}

  /** A mistake. */
  record Broken(Diagnostic diagnostic, @Nullable Quantity last) implements Result {}
}
