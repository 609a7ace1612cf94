package whorl.page;

import java.util.List;

/** How running a cell ended. */
public sealed interface CellAnswer {
  /** What an interrupted cell is said to have failed with. */
  String INTERRUPTED = "Interrupted";

  /** What an expression that gives nothing is said to have failed with. */
  String NO_VALUE = "NoValue";

  /** Without error. */
  record Done() implements CellAnswer {}

  /**
   * With an error, or interrupted.
   *
   * @param name what the sort of error is called
   * @param summary the first error in one line
   * @param lines all of it
   */
  record Failed(String name, String summary, List<String> lines) implements CellAnswer {
    /** Copies the lines. */
    public Failed {
      lines = List.copyOf(lines);
    }
  }
}
