package whorl.eval;

/**
 * A checked tree made ready to run: one small object per operation, without a boxed number on the
 * way. Throws {@link NoValue} where an operation has no value.
 */
sealed interface Code {
  /** The value. */
  Value valueIn(Activation activation);

  /** Puts the value into a frame and gives the slot behind it. */
  int store(Activation activation, double[] frame, int slot);

  /** Gives a number. */
  non-sealed interface Real extends Code {
    double in(Activation activation);

    @Override
    default Value valueIn(Activation activation) {
      return new Value.Real(in(activation));
    }

    @Override
    default int store(Activation activation, double[] frame, int slot) {
      frame[slot] = in(activation);
      return slot + 1;
    }
  }

  /** Gives a vector. */
  non-sealed interface Vector extends Code {
    Value.Vector in(Activation activation);

    @Override
    default Value valueIn(Activation activation) {
      return in(activation);
    }

    @Override
    default int store(Activation activation, double[] frame, int slot) {
      Value.Vector vector = in(activation);
      frame[slot] = vector.x();
      frame[slot + 1] = vector.y();
      frame[slot + 2] = vector.z();
      return slot + 3;
    }
  }

  /** Gives a truth value. */
  non-sealed interface Truth extends Code {
    boolean in(Activation activation);

    @Override
    default Value valueIn(Activation activation) {
      return new Value.Truth(in(activation));
    }

    @Override
    default int store(Activation activation, double[] frame, int slot) {
      frame[slot] = in(activation) ? 1 : 0;
      return slot + 1;
    }
  }
}
