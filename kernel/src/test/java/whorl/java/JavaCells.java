package whorl.java;

import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.Optional;
import java.util.concurrent.CompletableFuture;

/** Java cells as a test runs them. */
final class JavaCells implements AutoCloseable {
  private final JavaSide side;

  JavaCells(SheetReading sheet) {
    side = new JavaSide(sheet);
  }

  JavaCells() {
    this(name -> Optional.empty());
  }

  JavaSide side() {
    return side;
  }

  /** Runs a cell that must end without error. */
  Collected run(String code) {
    return run(code, new Collected());
  }

  Collected run(String code, Collected output) {
    done(code, output);
    return output;
  }

  /** What a cell that must end without error came to. */
  JavaOutcome.Done done(String code, Collected output) {
    JavaOutcome outcome = side.run("cell [1]", code, output);
    if (outcome instanceof JavaOutcome.Failed failed) {
      throw new AssertionError(String.join("\n", failed.lines()));
    }
    return assertInstanceOf(JavaOutcome.Done.class, outcome);
  }

  /** What is said of a cell that must fail. */
  String failure(String code) {
    return failure("cell [1]", code);
  }

  String failure(String label, String code) {
    return String.join("\n", failed(label, code).lines());
  }

  JavaOutcome.Failed failed(String label, String code) {
    return assertInstanceOf(JavaOutcome.Failed.class, side.run(label, code, new Collected()));
  }

  /** Runs a cell, interrupts it when it has printed something, and waits for its end. */
  JavaOutcome interrupted(String code) throws Exception {
    var output = new Collected();
    var outcome = CompletableFuture.supplyAsync(() -> side.run("cell [1]", code, output));
    CompletableFuture<Void> ended =
        outcome.thenRun(() -> output.print(JavaOutput.Stream.ERR, "ended"));
    output.awaitPrint();
    side.interrupt();
    ended.get();
    return outcome.get();
  }

  @Override
  public void close() {
    side.close();
  }
}
