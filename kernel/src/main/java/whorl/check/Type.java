package whorl.check;

import org.jspecify.annotations.Nullable;
import whorl.laws.ThingSort;
import whorl.units.kind.Readings;

/** What is known of an expression before any number is worked out. */
public sealed interface Type {
  /**
   * A number with what its kind may be.
   *
   * @param reference what it is taken about; null for a plain number
   */
  record Real(Readings readings, @Nullable Reference reference) implements Type {
    /** Keeps a reference only where a quantity of the kind can have one. */
    public Real {
      reference = Reference.kept(reference, readings);
    }

    /** A number that is not taken about anything. */
    public Real(Readings readings) {
      this(readings, null);
    }
  }

  /**
   * A vector, whose parts all have these readings.
   *
   * @param reference what it is taken about; null for a plain vector
   * @param frame the frame that it is seen from; null for the world
   */
  record Vector(Readings readings, @Nullable Reference reference, @Nullable Anchor frame)
      implements Type {
    /** Keeps a reference only where a quantity of the kind can have one. */
    public Vector {
      reference = Reference.kept(reference, readings);
    }

    /** A vector seen from the world that is not taken about anything. */
    public Vector(Readings readings) {
      this(readings, null, null);
    }
  }

  /** A condition. */
  record Truth() implements Type {}

  /**
   * A thing in space, other than an inertia tensor.
   *
   * @param identity what the sheet calls it; null for one without a name
   */
  record Thing(ThingSort sort, @Nullable Anchor identity) implements Type {
    /** A thing without a name. */
    public Thing(ThingSort sort) {
      this(sort, null);
    }
  }

  /**
   * An inertia tensor.
   *
   * @param reference what it is taken about; null where that is not known
   * @param frame the frame that it is seen from; null for the world
   */
  record Tensor(@Nullable Reference reference, @Nullable Anchor frame) implements Type {}

  /**
   * A quantity that has a value for every instant of a motion.
   *
   * @param sample type of one value
   * @param over the motion
   */
  record Course(Type sample, String over) implements Type {}

  /** What a value of this type takes in a frame. */
  default FrameSize slots() {
    if (this instanceof Thing || this instanceof Tensor || this instanceof Course) {
      return new FrameSize(0, 1);
    }
    return new FrameSize(this instanceof Vector ? 3 : 1, 0);
  }

  /** What the quantity is taken about, or null. */
  default @Nullable Reference about() {
    if (this instanceof Real real) {
      return real.reference();
    } else if (this instanceof Vector vector) {
      return vector.reference();
    }
    return this instanceof Tensor tensor ? tensor.reference() : null;
  }
}
