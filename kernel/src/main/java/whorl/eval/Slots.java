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

  /** Puts a value into its slot, whatever was filled before. */
  void put(int slot, Value value) {
    if (value instanceof Value.Thing thing) {
      things[slot] = thing.content();
    } else if (value instanceof Value.Vector vector) {
      numbers[slot] = vector.x();
      numbers[slot + 1] = vector.y();
      numbers[slot + 2] = vector.z();
    } else if (value instanceof Value.Truth truth) {
      numbers[slot] = truth.holds() ? 1 : 0;
    } else {
      numbers[slot] = ((Value.Real) value).value();
    }
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
