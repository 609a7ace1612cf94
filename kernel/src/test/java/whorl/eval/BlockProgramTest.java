package whorl.eval;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Operation;
import whorl.check.Operation.Body;
import whorl.check.Operation.Choice;
import whorl.check.Operation.Real;
import whorl.check.Operation.RoutineCall;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.eval.NumericFailure.Reason;

class BlockProgramTest {
  private record Failure(int row, int formula, NumericFailure failure) {}

  /** Columns of results, and failures, of some rows. Lists compare doubles bit by bit. */
  private record Rows(List<List<Double>> results, List<Failure> failures) {
    static Rows of(double[][] results, List<Failure> failures) {
      return new Rows(Arrays.stream(results).map(Rows::list).toList(), failures);
    }

    private static List<Double> list(double[] column) {
      return Arrays.stream(column).boxed().toList();
    }
  }

  @ParameterizedTest
  @MethodSource
  void everyRowIsTheSameToTheBitAsWorkedOutByItself(long seed) throws InterruptedException {
    RandomTrees trees = new RandomTrees(seed);
    SplittableRandom random = new SplittableRandom(seed);
    List<Operation> formulas = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      formulas.add(trees.any(1 + random.nextInt(6)));
    }
    BitSet varying = new BitSet();
    IntStream.range(0, RandomTrees.FRAME_SIZE)
        .filter(slot -> random.nextInt(4) != 0)
        .forEach(varying::set);
    double[] frame = frame(trees, random);
    double[][] columns = new double[varying.cardinality()][40];
    for (int row = 0; row < 40; row++) {
      double[] rowFrame = frame(trees, random);
      int column = 0;
      for (int slot = varying.nextSetBit(0); slot >= 0; slot = varying.nextSetBit(slot + 1)) {
        columns[column++][row] = rowFrame[slot];
      }
    }
    BlockProgram program = BlockProgram.compile(formulas, RandomTrees.FRAME_SIZE, varying);

    Rows byBlock = run(program, frame, columns, 40);

    assertEquals(byRow(program, formulas, varying, frame, columns, 40), byBlock);
  }

  static LongStream everyRowIsTheSameToTheBitAsWorkedOutByItself() {
    return LongStream.range(0, 200);
  }

  private static double[] frame(RandomTrees trees, SplittableRandom random) {
    double[] frame = new double[RandomTrees.FRAME_SIZE];
    Arrays.setAll(frame, slot -> trees.number());
    frame[RandomTrees.TRUTH_SLOT] = random.nextInt(2);
    return frame;
  }

  private static Rows run(BlockProgram program, double[] frame, double[][] columns, int rows)
      throws InterruptedException {
    double[][] results = new double[program.resultColumns()][rows];
    List<Failure> failures = new ArrayList<>();
    program.run(
        frame,
        columns,
        0,
        rows,
        results,
        (row, formula, failure) -> failures.add(new Failure(row, formula, failure)));
    return Rows.of(results, failures);
  }

  private static Rows byRow(
      BlockProgram program,
      List<Operation> formulas,
      BitSet varying,
      double[] fixed,
      double[][] columns,
      int rows) {
    double[][] results = new double[program.resultColumns()][rows];
    List<Failure> failures = new ArrayList<>();
    List<ScalarEvaluator> evaluators = formulas.stream().map(ScalarEvaluator::of).toList();
    double[] frame = fixed.clone();
    for (int row = 0; row < rows; row++) {
      int next = 0;
      for (int slot = varying.nextSetBit(0); slot >= 0; slot = varying.nextSetBit(slot + 1)) {
        frame[slot] = columns[next++][row];
      }
      for (int i = 0; i < formulas.size(); i++) {
        Outcome outcome = evaluators.get(i).evaluate(frame);
        double[] numbers = numbers(outcome, formulas.get(i) instanceof Operation.Vector ? 3 : 1);
        for (int part = 0; part < numbers.length; part++) {
          results[program.firstColumn(i) + part][row] = numbers[part];
        }
        if (outcome instanceof Outcome.Failed failed) {
          failures.add(new Failure(row, i, failed.failure()));
        }
      }
    }
    return Rows.of(results, failures);
  }

  private static double[] numbers(Outcome outcome, int count) {
    double[] numbers = new double[count];
    if (outcome instanceof Outcome.Done done) {
      if (done.value() instanceof Value.Real real) {
        numbers[0] = real.value();
      } else if (done.value() instanceof Value.Vector vector) {
        return new double[] {vector.x(), vector.y(), vector.z()};
      } else if (done.value() instanceof Value.Truth truth) {
        numbers[0] = truth.holds() ? 1 : 0;
      }
    } else {
      Arrays.fill(numbers, Double.NaN);
    }
    return numbers;
  }

  private static BitSet slots(int... slots) {
    BitSet set = new BitSet();
    Arrays.stream(slots).forEach(set::set);
    return set;
  }

  @Test
  void anInfiniteNumberOnTheWayIsNotHidden() throws InterruptedException {
    Real one = Written.constant(1);
    Real x = Written.input(0);
    Real reciprocal = Written.quotient(one, x);
    BlockProgram program =
        BlockProgram.compile(
            List.of(
                Written.quotient(one, reciprocal),
                Written.unary(UnaryFunction.ATAN, reciprocal),
                Written.binary(Operation.BinaryFunction.MIN, one, reciprocal),
                Written.less(one, reciprocal),
                Written.power(reciprocal, -2),
                Written.power(reciprocal, 0)),
            1,
            slots(0));

    Rows rows = run(program, new double[1], new double[][] {{2, 0}}, 2);

    assertEquals(
        IntStream.range(0, 6)
            .mapToObj(
                formula ->
                    new Failure(
                        1,
                        formula,
                        new NumericFailure(Reason.DIVISION_BY_ZERO, Written.ANYWHERE, "", 0)))
            .toList(),
        rows.failures());
    assertEquals(List.of(2.0, Double.NaN), rows.results().get(0));
  }

  @Test
  void rowsBeyondOneBlockAndPartsOfColumnsAreWorkedOut() throws InterruptedException {
    BlockProgram program =
        BlockProgram.compile(
            List.of(Written.product(Written.input(0), Written.input(1))), 2, slots(1));
    int rows = 3 * BlockRun.ROWS + 17;
    double[] column = IntStream.range(0, rows).asDoubleStream().toArray();
    double[][] results = new double[1][rows];

    program.run(
        new double[] {3, 0}, new double[][] {column}, 100, rows - 1, results, (r, f, n) -> {});

    double[] expected = new double[rows];
    for (int row = 100; row < rows - 1; row++) {
      expected[row] = 3.0 * row;
    }
    assertArrayEquals(expected, results[0]);
  }

  @Test
  void aFormulaTooLargeToBeWrittenOutIsWorkedOutRowByRow() throws InterruptedException {
    Body last = new Body("f", Written.sum(Written.input(0), Written.constant(1)), 1);
    for (int i = 0; i < 12; i++) {
      Real next = Written.sum(Written.input(0), Written.constant(i));
      last =
          new Body(
              "f", Written.sum(Written.call(last, next), Written.call(last, Written.input(0))), 1);
    }
    Operation large = Written.call(last, Written.input(0));
    List<Operation> formulas =
        List.of(large, Written.quotient(Written.constant(6), Written.input(0)));
    BlockProgram program = BlockProgram.compile(formulas, 1, slots(0));
    double[][] columns = {{1, 2, 0}};

    Rows rows = run(program, new double[1], columns, 3);

    assertEquals(byRow(program, formulas, slots(0), new double[1], columns, 3), rows);
  }

  @Test
  void aRoutineIsCalledForTheRowsThatNeedItAndGivesWhatItGivesAlone() throws InterruptedException {
    List<Double> seen = new ArrayList<>();
    Routine routine =
        arguments -> {
          seen.add(arguments[0]);
          if (arguments[0] == 3) {
            throw new RoutineFailure("three");
          }
          return arguments[0] == 4 ? Double.POSITIVE_INFINITY : 10 / arguments[0];
        };
    Real x = Written.input(0);
    Body body = new Body("f", new RoutineCall(Written.ANYWHERE, routine, List.of(x)), 1);
    List<Operation> formulas =
        List.of(
            new Choice(
                Written.ANYWHERE,
                Written.less(x, Written.constant(9)),
                Written.call(body, x),
                Written.constant(7)),
            Written.unary(UnaryFunction.SQRT, x));
    BlockProgram program = BlockProgram.compile(formulas, 1, slots(0));
    double[][] columns = {{1, 2, 3, 4, 9}};

    Rows rows = run(program, new double[1], columns, 5);

    assertEquals(List.of(1.0, 2.0, 3.0, 4.0), seen);
    assertEquals(List.of(10.0, 5.0, Double.NaN, Double.NaN, 7.0), rows.results().get(0));
    assertEquals(byRow(program, formulas, slots(0), new double[1], columns, 5), rows);
  }

  @Test
  void aRoutineThatIsInterruptedEndsTheRun() {
    Routine routine =
        arguments -> {
          throw RoutineFailure.ofInterrupt();
        };
    Operation call = new RoutineCall(Written.ANYWHERE, routine, List.of());
    BlockProgram program = BlockProgram.compile(List.of(call), 1, slots(0));
    assertThrows(
        InterruptedException.class, () -> run(program, new double[1], new double[1][2], 2));
  }

  @Test
  void callsThatRepeatCostNothing() throws InterruptedException {
    Body last = new Body("f", Written.sum(Written.input(0), Written.constant(1)), 1);
    for (int i = 0; i < 300; i++) {
      Real call = Written.call(last, Written.input(0));
      last =
          new Body("f", Written.difference(call, Written.product(call, Written.constant(0.5))), 1);
    }
    BlockProgram program =
        BlockProgram.compile(List.of(Written.call(last, Written.input(0))), 1, slots(0));

    Rows rows = run(program, new double[1], new double[][] {{1}}, 1);

    assertEquals(Math.scalb(2.0, -300), rows.results().get(0).get(0));
  }

  @Test
  void severalThreadsGiveTheSameRowsAndFailuresInOrder() throws InterruptedException {
    Real x = Written.input(0);
    BlockProgram program =
        BlockProgram.compile(
            List.of(
                Written.unary(UnaryFunction.SQRT, x),
                Written.quotient(Written.constant(1), Written.unary(UnaryFunction.FLOOR, x))),
            1,
            slots(0));
    int rows = 1_000_000;
    double[] column = new double[rows];
    Arrays.setAll(column, row -> row % 1000 - 1.5);
    double[][] results = new double[2][rows];
    List<Failure> failures = new ArrayList<>();

    program.runOnAllProcessors(
        new double[1],
        new double[][] {column},
        0,
        rows,
        results,
        (row, formula, failure) -> failures.add(new Failure(row, formula, failure)));

    Rows alone = run(program, new double[1], new double[][] {column}, rows);
    assertEquals(3000, failures.size());
    assertEquals(alone, Rows.of(results, failures));
  }

  @Test
  void oneProgramServesSeveralThreads() {
    BlockProgram program =
        BlockProgram.compile(
            List.of(
                Written.sum(Written.product(Written.input(0), Written.input(1)), Written.input(0))),
            2,
            slots(1));
    double[] column = IntStream.range(0, 2000).asDoubleStream().toArray();

    assertTrue(
        IntStream.range(0, 200)
            .parallel()
            .allMatch(
                factor -> {
                  try {
                    List<Double> result =
                        run(program, new double[] {factor, 0}, new double[][] {column}, 2000)
                            .results()
                            .get(0);
                    return IntStream.range(0, 2000)
                        .allMatch(row -> result.get(row) == factor * (row + 1.0));
                  } catch (InterruptedException e) {
                    return false;
                  }
                }));
  }

  @Test
  void anInterruptEndsALongRun() {
    BlockProgram program =
        BlockProgram.compile(
            List.of(Written.unary(UnaryFunction.SIN, Written.input(0))), 1, slots(0));
    double[][] columns = new double[1][1_000_000];
    double[][] results = new double[1][1_000_000];

    Thread.currentThread().interrupt();
    assertThrows(
        InterruptedException.class,
        () -> program.run(new double[1], columns, 0, 1_000_000, results, (r, f, n) -> {}));
    Thread.currentThread().interrupt();
    assertThrows(
        InterruptedException.class,
        () ->
            program.runOnAllProcessors(
                new double[1], columns, 0, 1_000_000, results, (r, f, n) -> {}));
  }

  @Test
  void aFrameOrColumnsThatDoNotFitAreRefused() {
    BlockProgram program = BlockProgram.compile(List.of(Written.input(0)), 2, slots(0));
    double[][] one = new double[1][1];

    assertThrows(
        IllegalArgumentException.class,
        () -> program.run(new double[1], one, 0, 1, one, (r, f, n) -> {}));
    assertThrows(
        IllegalArgumentException.class,
        () -> program.run(new double[2], new double[2][1], 0, 1, one, (r, f, n) -> {}));
    assertThrows(
        IllegalArgumentException.class,
        () -> program.run(new double[2], one, 0, 1, new double[2][1], (r, f, n) -> {}));
    assertThrows(
        IllegalArgumentException.class,
        () -> BlockProgram.compile(List.of(Written.input(0)), 2, slots(2)));
  }
}
