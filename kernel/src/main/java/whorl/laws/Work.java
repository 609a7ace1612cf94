package whorl.laws;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/** What a rule does with what it is given. */
public sealed interface Work {
  /** Gives a number. */
  @FunctionalInterface
  non-sealed interface Real extends Work {
    double of(Given given);
  }

  /** Gives a vector by its parts in the world. */
  @FunctionalInterface
  non-sealed interface Vector extends Work {
    Vector3D of(Given given);
  }

  /** Gives a thing in space. */
  @FunctionalInterface
  non-sealed interface Thing extends Work {
    Object of(Given given);
  }
}
