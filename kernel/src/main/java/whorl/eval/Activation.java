package whorl.eval;

/** One formula or function body at work. */
final class Activation {
  /**
   * Levels of operations and calls allowed. One level takes up to 180 bytes of stack (measured in
   * interpreted code, which takes the most), so that this many fit into a stack of 1 MiB with room
   * to spare; a thousand functions in a chain, each a short formula, stay below.
   */
  static final int MOST_LEVELS = 4_000;

  private final double[] frame;
  private final Object[] things;
  private final Procedure[] procedures;
  private final Meter meter;
  private final int level;

  private Activation(
      double[] frame, Object[] things, Procedure[] procedures, Meter meter, int level) {
    this.frame = frame;
    this.things = things;
    this.procedures = procedures;
    this.meter = meter;
    this.level = level;
  }

  /** A formula at work: the first of the procedures. */
  static Activation of(Procedure[] procedures, double[] frame, Object[] things, Meter meter) {
    return of(procedures, 0, frame, things, meter);
  }

  /** One of several formulas at work. */
  static Activation of(
      Procedure[] procedures, int formula, double[] frame, Object[] things, Meter meter) {
    return entered(procedures[formula], new Activation(frame, things, procedures, meter, 0));
  }

  /** Counts operations that are about to be worked out once more. */
  void count(int operations) {
    meter.count(operations);
  }

  /** The body of a function at work with its own frame, called from a level of this body. */
  Activation calling(Procedure callee, Slots calleeFrame, int fromLevel) {
    return entered(
        callee,
        new Activation(
            calleeFrame.numbers(), calleeFrame.things(), procedures, meter, level + fromLevel + 1));
  }

  private static Activation entered(Procedure body, Activation activation) {
    int deepest = activation.level + body.levels();
    if (deepest > MOST_LEVELS) {
      throw activation.meter.tooDeep(deepest);
    }
    activation.meter.count(body.operations());
    return activation;
  }

  /** The numbers it reads, by slot. */
  double[] frame() {
    return frame;
  }

  /** The things it reads, by slot. */
  Object[] things() {
    return things;
  }

  /** Notes that a law was used where it does not hold. */
  void breach(Breach breach) {
    meter.breach(breach);
  }

  /** The body of a function, by number. */
  Procedure procedure(int number) {
    return procedures[number];
  }
}
