package whorl.sheet;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.check.Checked;
import whorl.diagnostic.Diagnostic;
import whorl.eval.Run;
import whorl.eval.Value;

/** What a statement came to. */
sealed interface Result {
  /** What looks odd in the statement, though it is sound. */
  default List<Diagnostic> remarks() {
    return List.of();
  }

  /** Laws that the statement uses where they do not hold. */
  default List<Lapse> lapses() {
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

  /**
   * A definition or shown expression with its value.
   *
   * @param value along the axes of the world, as other statements read it
   * @param seen the same along the axes of the frame that it is seen from
   */
  record Valued(Checked.Value checked, Value value, Value seen, List<Lapse> lapses)
      implements Sound {
    /** Copies the list. */
    public Valued {
      lapses = List.copyOf(lapses);
    }
  }

  /** A function, ready to be called. */
  record Callable(Checked.Function checked) implements Sound {}

  /** A motion that was followed. */
  record Ran(Checked.Motion checked, Run run, List<Lapse> lapses) implements Sound {
    /** Copies the list. */
    public Ran {
      lapses = List.copyOf(lapses);
    }
  }

  /** A condition that was judged. */
  record Judged(Checked.Condition checked, Verdict verdict, List<Lapse> lapses) implements Sound {
    /** Copies the list. */
    public Judged {
      lapses = List.copyOf(lapses);
    }
  }

  /**
   * A hand-worked value compared.
   *
   * @param deviation (computed − stated)/stated
   * @param within the largest deviation allowed, a fraction
   */
  record Compared(
      Checked.Reproduction checked,
      Value computed,
      Value stated,
      double deviation,
      double within,
      List<Lapse> lapses)
      implements Sound {
    /** Copies the list. */
    public Compared {
      lapses = List.copyOf(lapses);
    }

    boolean holds() {
      return Math.abs(deviation) <= within;
    }
  }

  /**
   * Things to be drawn, worked out.
   *
   * @param values of the things in order, along the axes of the world
   * @param at for each the point or axis that it is about; empty for one that is about none
   */
  record Sketched(
      Checked.Sketch checked,
      List<Value> values,
      List<Optional<Value.Thing>> at,
      List<Lapse> lapses)
      implements Sound {
    /** Copies the lists. */
    public Sketched {
      values = List.copyOf(values);
      at = List.copyOf(at);
      lapses = List.copyOf(lapses);
    }
  }

  /** Names that have no definition, or none that stands. */
  record Waiting(List<String> names) implements Result {}

  /** A mistake. */
  record Broken(Diagnostic diagnostic, @Nullable Quantity last) implements Result {}
}
