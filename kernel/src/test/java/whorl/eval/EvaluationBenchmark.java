package whorl.eval;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * A block program against a loop written by hand: five formulas, a million rows. Run it with {@code
 * kernel/bench/evaluation.sh}.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 10, time = 1)
@Fork(3)
public class EvaluationBenchmark {
  private final BlockProgram program = FlywheelFormulas.program();
  private final double[][] columns = FlywheelFormulas.columns();
  private final double[][] results = new double[FlywheelFormulas.RESULTS][FlywheelFormulas.ROWS];

  /** The hand loop, one thread. */
  @Benchmark
  public double[][] loopByHand() {
    FlywheelFormulas.byHand(columns, FlywheelFormulas.FRAME[6], 0, FlywheelFormulas.ROWS, results);
    return results;
  }

  /** The block program, one thread. */
  @Benchmark
  public double[][] blocksOneThread() throws InterruptedException {
    program.run(
        FlywheelFormulas.FRAME,
        columns,
        0,
        FlywheelFormulas.ROWS,
        results,
        EvaluationBenchmark::failed);
    return results;
  }

  /** The block program on every processor. */
  @Benchmark
  public double[][] blocksAllProcessors() throws InterruptedException {
    program.runOnAllProcessors(
        FlywheelFormulas.FRAME,
        columns,
        0,
        FlywheelFormulas.ROWS,
        results,
        EvaluationBenchmark::failed);
    return results;
  }

  private static void failed(int row, int formula, NumericFailure failure) {
    throw new IllegalStateException("row " + row + ", formula " + formula + ": " + failure);
  }
}
