package whorl.mechanics.body;

import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/**
 * All that the motion of a rigid body depends on.
 *
 * @param mass in kg; positive
 * @param centre the centre of mass, in m
 * @param atCentre the inertia tensor about the centre of mass, along the axes in which the centre
 *     is given
 */
public record MassProperties(double mass, Vector3D centre, InertiaTensor atCentre) {
  /** Refuses a mass that is not positive, and a tensor that no body has. */
  public MassProperties {
    Given.positive("mass", mass, "kg");
    Given.finite("centre of mass", centre);
    atCentre.demandPhysical();
  }

  /** The inertia tensor about a point in m, {@code I_P = I_C + m (d² 1 − d dᵀ)}. */
  public InertiaTensor about(Vector3D point) {
    return atCentre.plus(InertiaTensor.ofPoint(mass, centre.subtract(point)));
  }

  /** The moment of inertia about an axis, {@code u · I_C u + m d²}, in kg·m². */
  public double about(Axis axis) {
    double distance = axis.distance(Point.fixed(centre));
    return atCentre.about(axis.along()) + mass * distance * distance;
  }

  /** The same body turned about the origin and then displaced by a vector in m. */
  public MassProperties moved(Rotation turned, Vector3D displacement) {
    return new MassProperties(
        mass, turned.applyTo(centre).add(displacement), atCentre.turned(turned));
  }

  /** Two bodies as one. */
  public MassProperties plus(MassProperties other) {
    return joined(other, 1);
  }

  /**
   * What is left of the body when another is taken out of it.
   *
   * @throws Refusal where the other has no less mass, or where what is left would be no body
   */
  public MassProperties minus(MassProperties other) {
    if (other.mass >= mass) {
      throw new Refusal(
          "mass",
          "What is taken out has "
              + Given.text(other.mass, "kg")
              + ", which is not less than the "
              + Given.text(mass, "kg")
              + " of the body.",
          "Check dimensions and densities.");
    }
    return joined(other, -1);
  }

  private MassProperties joined(MassProperties other, double sign) {
    double added = sign * other.mass;
    double total = mass + added;
    Vector3D apart = other.centre.subtract(centre);
    // Relative to the own centre, so that a far origin costs no digits.
    Vector3D shift = apart.scalarMultiply(added / total);
    InertiaTensor joint =
        atCentre
            .plus(other.atCentre.times(sign))
            .plus(InertiaTensor.ofPoint(mass * (added / total), apart));
    return new MassProperties(total, centre.add(shift), joint);
  }
}
