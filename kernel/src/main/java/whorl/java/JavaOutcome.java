package whorl.java;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;
import whorl.sheet.PublishedFunction;
import whorl.sheet.Quantity;

/** How running a cell in Java ended. */
public sealed interface JavaOutcome {
  /**
   * Without error.
   *
   * @param functions what the cell publishes to the sheet
   * @param reads the names that it read in the sheet, each with what it saw
   */
  record Done(List<PublishedFunction> functions, Map<String, Optional<Quantity>> reads)
      implements JavaOutcome {
    /** Copies the collections. */
    public Done {
      functions = List.copyOf(functions);
      reads = copy(reads);
    }
  }

  /**
   * With an error; what the cell did before it stays done, but it publishes nothing.
   *
   * @param name what the sort of error is called, as {@code ArithmeticException}
   * @param source the text of the cell, into which the errors point
   * @param errors what is wrong, in the order in which it stands
   * @param reads as when it ended without error
   */
  record Failed(
      String name, Source source, List<Diagnostic> errors, Map<String, Optional<Quantity>> reads)
      implements JavaOutcome {
    /** Copies the collections. */
    public Failed {
      errors = List.copyOf(errors);
      reads = copy(reads);
    }

    /** The first error in one line. */
    public String summary() {
      return errors.get(0).problem();
    }

    /** All errors in full, line by line. */
    public List<String> lines() {
      var lines = new ArrayList<String>();
      for (Diagnostic error : errors) {
        if (!lines.isEmpty()) {
          lines.add("");
        }
        DiagnosticText.render(error, source).lines().forEach(lines::add);
      }
      return List.copyOf(lines);
    }
  }

  /**
   * By an interrupt.
   *
   * @param restarted whether the declarations of all cells in Java are gone
   * @param notice what the user should know besides; empty if the code simply ended
   */
  record Interrupted(boolean restarted, String notice) implements JavaOutcome {}

  private static Map<String, Optional<Quantity>> copy(Map<String, Optional<Quantity>> reads) {
    return Collections.unmodifiableMap(new LinkedHashMap<>(reads));
  }
}
