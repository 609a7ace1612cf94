package whorl.page;

import java.util.List;

/** What an expression came to. */
public sealed interface ExpressionAnswer {
  /** A value. */
  record Value(Bundle bundle) implements ExpressionAnswer {}

  /** An error, as in {@link CellAnswer.Failed}. */
  record Failed(String name, String summary, List<String> lines) implements ExpressionAnswer {
    /** Copies the lines. */
    public Failed {
      lines = List.copyOf(lines);
    }
  }
}
