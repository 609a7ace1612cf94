package whorl.eval;

import whorl.check.FrameSize;

/** A frame that is being filled in the order of its slots. */
final class Slots {
  private final double[] numbers;
  private final Object[] things;
  private int number;
  private int thing;

  Slots(FrameSize size) {
    this.numbers = new double[size.numbers()];
    this.things = new Object[size.things()];
  }

  void add(double value) {
    numbers[number++] = value;
  }

  void add(Object value) {
    things[thing++] = value;
  }

  double[] numbers() {
    return numbers;
  }

  Object[] things() {
    return things;
  }
}
