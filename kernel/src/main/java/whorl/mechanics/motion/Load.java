package whorl.mechanics.motion;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;

/** What acts on a rigid body while it moves. */
public sealed interface Load {
  /** Standard acceleration of free fall, in m/s²: exact by definition (3rd CGPM, 1901). */
  double STANDARD_GRAVITY = 9.80665;

  /**
   * The body's own weight, along −z of the world at its centre of mass.
   *
   * @param gravity acceleration of free fall, in m/s²
   */
  record Weight(double gravity) implements Load {
    /** Refuses what is no number. */
    public Weight {
      Given.finite("acceleration of free fall", gravity, "m/s²");
    }
  }

  /**
   * A force at a point of the body.
   *
   * @param force in N; along the axes of the world, or along the body's own
   * @param at from the centre of mass, along the body's own axes, in m; goes with the body
   * @param inBody whether the force turns with the body
   */
  record Force(Vector3D force, Vector3D at, boolean inBody) implements Load {
    /** Refuses what is no number. */
    public Force {
      Given.finite("force", force);
      Given.finite("point", at);
    }
  }

  /**
   * A moment with no force.
   *
   * @param moment in N·m; along the axes of the world, or along the body's own
   * @param inBody whether it turns with the body
   */
  record Couple(Vector3D moment, boolean inBody) implements Load {
    /** Refuses what is no number. */
    public Couple {
      Given.finite("moment", moment);
    }
  }

  /** A force and a moment that depend on the time and on how the body moves. */
  record Varying(Action action) implements Load {}

  /**
   * A force with its moment, both along the axes of the world.
   *
   * @param force in N
   * @param moment about the pivot or the centre of mass, in N·m
   */
  record Wrench(Vector3D force, Vector3D moment) {
    /** The sum of two. */
    Wrench plus(Vector3D otherForce, Vector3D otherMoment) {
      return new Wrench(force.add(otherForce), moment.add(otherMoment));
    }
  }

  /** What a {@link Varying} load does. */
  @FunctionalInterface
  interface Action {
    /**
     * The force and its moment.
     *
     * @param state as {@link RigidMotion} reads it
     */
    Wrench at(double time, double[] state);
  }
}
