package whorl.java;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import whorl.check.Routine;
import whorl.sheet.PublishedFunction;
import whorl.sheet.Quantity;

/** A run of a cell: where it shows, and what passed between it and the sheet. */
final class CellRun {
  /** What is said to code that outlives its cell. */
  static final String OVER =
      "The sheet can be read and given functions only while a cell runs. Read a value in the cell,"
          + " and keep it in a variable; give a function what it needs as an argument.";

  private final JavaOutput output;
  private final SheetReading sheet;
  private final Function<SheetFunction, Routine> routines;
  private final Map<String, Optional<Quantity>> reads = new LinkedHashMap<>();
  private final List<PublishedFunction> functions = new ArrayList<>();
  private final Set<String> shown = ConcurrentHashMap.newKeySet();
  private boolean over;

  /**
   * A run.
   *
   * @param routines makes a routine of the sheet of a function in Java
   */
  CellRun(JavaOutput output, SheetReading sheet, Function<SheetFunction, Routine> routines) {
    this.output = output;
    this.sheet = sheet;
    this.routines = routines;
  }

  /** The run that the code of the current thread belongs to. */
  static Optional<CellRun> current() {
    return CellThread.current().flatMap(CellThread::run);
  }

  JavaOutput output() {
    return output;
  }

  /** Reads a name in the sheet, and notes that it was read. */
  synchronized Optional<Quantity> read(String name) {
    requireRunning();
    return reads.computeIfAbsent(name, sheet::quantity);
  }

  /** Names of the sheet that are spelled like one that has no value. */
  List<String> near(String name) {
    return sheet.near(name);
  }

  /** Takes a function for the sheet. */
  synchronized void publish(String head, SheetFunction function) {
    requireRunning();
    functions.add(new PublishedFunction(head, routines.apply(function)));
  }

  private void requireRunning() {
    if (over) {
      throw new IllegalStateException(OVER);
    }
  }

  /** Notes the id of an output. */
  void noteShown(String id) {
    shown.add(id);
  }

  /** Whether a value is the id of an output, which is a handle and nothing to look at. */
  boolean isShown(@Nullable Object value) {
    return value instanceof String id && shown.contains(id);
  }

  synchronized void end() {
    over = true;
  }

  synchronized List<PublishedFunction> functions() {
    return List.copyOf(functions);
  }

  synchronized Map<String, Optional<Quantity>> reads() {
    return new LinkedHashMap<>(reads);
  }
}
