package whorl.eval;

import whorl.laws.Given;
import whorl.laws.ThingSort;

/**
 * A checked tree made ready to run: one small object per operation, without a boxed number on the
 * way. Throws {@link NoValue} where an operation has no value.
 */
sealed interface Code {
  /** The value. */
  Value valueIn(Activation activation);

  /** Puts the value into the next slots of a frame. */
  void store(Activation activation, Slots frame);

  /** Gives the value to a parameter of a rule. */
  void give(Activation activation, Given given, int parameter);

  /** Gives a number. */
  non-sealed interface Real extends Code {
    double in(Activation activation);

    @Override
    default Value valueIn(Activation activation) {
      return new Value.Real(in(activation));
    }

    @Override
    default void store(Activation activation, Slots frame) {
      frame.add(in(activation));
    }

    @Override
    default void give(Activation activation, Given given, int parameter) {
      given.put(parameter, in(activation));
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
    default void store(Activation activation, Slots frame) {
      Value.Vector vector = in(activation);
      frame.add(vector.x());
      frame.add(vector.y());
      frame.add(vector.z());
    }

    @Override
    default void give(Activation activation, Given given, int parameter) {
      Value.Vector vector = in(activation);
      given.put(parameter, vector.x(), vector.y(), vector.z());
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
    default void store(Activation activation, Slots frame) {
      frame.add(in(activation) ? 1 : 0);
    }

    @Override
    default void give(Activation activation, Given given, int parameter) {
      given.put(parameter, in(activation) ? 1 : 0);
    }
  }

  /** Gives a thing in space. */
  non-sealed interface Thing extends Code {
    Object in(Activation activation);

    /** What sort of thing it gives. */
    ThingSort sort();

    @Override
    default Value valueIn(Activation activation) {
      return new Value.Thing(sort(), in(activation));
    }

    @Override
    default void store(Activation activation, Slots frame) {
      frame.add(in(activation));
    }

    @Override
    default void give(Activation activation, Given given, int parameter) {
      given.put(parameter, in(activation));
    }
  }
}
