package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;

/**
 * A force with the point at which it acts.
 *
 * @param force along the axes of the world, in N
 * @param at where it acts
 */
public record BoundForce(Vector3D force, Point at) {
  /** Refuses what is no number. */
  public BoundForce {
    Given.finite("force", force);
  }

  /** The moment about a point, {@code M = r × F} with r from the point to where the force acts. */
  public Moment moment(Point about) {
    return new Moment(at.minus(about).crossProduct(force), about);
  }

  /** The torque about an axis: the part along it of the moment about any of its points, in N·m. */
  public double moment(Axis about) {
    return moment(about.through()).along(about);
  }
}
