package whorl.sheet;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * One input of a sheet changes, on which twenty definitions in as many cells depend: its cell of
 * ten lines is run again. Run it with {@code kernel/bench/sheet.sh}.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 10, time = 1)
@Fork(3)
public class SheetBenchmark {
  private static final int LINES = 10;
  private static final int DEPENDENTS = 20;

  /** Size of the sheet. */
  @Param({"1000", "10000"})
  public int definitions;

  private final Sheet sheet = new Sheet();
  private int value;

  /** Writes the sheet: each definition in a cell behind the first depends on an input of that. */
  @Setup
  public void write() {
    run(0, inputs());
    for (int cell = 1; cell < definitions / LINES; cell++) {
      var text = new StringBuilder();
      for (int line = 0; line < LINES; line++) {
        int input = line == 0 && cell <= DEPENDENTS ? 0 : 1 + (cell + line) % (LINES - 1);
        text.append("T_%d_%d [N·m] = 1/2 * m%d * (D/2)^2 * α\n".formatted(cell, line, input));
      }
      run(cell, text.toString());
    }
    run(-1, "D [mm] = 900\nα [rad/s²] = 2.5");
    if (sheet.definitions().size() != definitions + 2) {
      throw new IllegalStateException("definitions: " + sheet.definitions().size());
    }
  }

  private String inputs() {
    value++;
    var text = new StringBuilder("m0 [kg] = " + value + "\n");
    for (int line = 1; line < LINES; line++) {
      text.append("m").append(line).append(" [kg] = ").append(line).append("  # shop scale\n");
    }
    return text.toString();
  }

  private CellOutcome run(int cell, String text) {
    CellOutcome outcome = sheet.run(new CellId("c" + cell), "cell [" + cell + "]", text);
    if (!outcome.tookEffect()) {
      throw new IllegalStateException(outcome.errors().toString());
    }
    return outcome;
  }

  /** Reading, checking, working out, and what changed. */
  @Benchmark
  public CellOutcome changeOneInput() {
    CellOutcome outcome = run(0, inputs());
    if (outcome.changes().size() != DEPENDENTS) {
      throw new IllegalStateException("changes: " + outcome.changes().size());
    }
    return outcome;
  }

  /** The same with the steps of every cell that shows something else now. */
  @Benchmark
  public int changeOneInputAndShow() {
    return run(0, inputs()).refreshed().stream().mapToInt(id -> sheet.steps(id).size()).sum();
  }

  /** All definitions with their values. */
  @Benchmark
  public int list() {
    return sheet.definitions().size();
  }
}
