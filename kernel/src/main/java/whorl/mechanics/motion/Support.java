package whorl.mechanics.motion;

import whorl.mechanics.Refusal;
import whorl.mechanics.reference.Point;

/**
 * How a rigid body is held. Angular momentum and moments are taken about the pivot, or about the
 * centre of mass.
 */
public sealed interface Support {
  /**
   * On a point that stays where it is; the body turns about it freely.
   *
   * @param pivot a point at rest
   */
  record Pivot(Point pivot) implements Support {
    /** Refuses a pivot that moves. */
    public Pivot {
      if (!pivot.isFixed()) {
        throw new Refusal(
            "pivot",
            "The pivot moves, and about a moving point the moment is not the rate of angular"
                + " momentum.",
            "Take a point that is fixed in the world, or the centre of mass.");
      }
    }
  }

  /** At its centre of mass, which stays where it is: forces turn the body but do not move it. */
  record AtCentre() implements Support {}

  /** Not at all: its centre of mass moves as the forces drive it. */
  record Free() implements Support {}
}
