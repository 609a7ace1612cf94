package whorl.mechanics.reference;

import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.RotationConvention;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;

/** Rotations from what an engineer states, all of them vector operators. */
public final class Turn {
  private static final Vector3D Z = Vector3D.PLUS_K;

  private Turn() {}

  /**
   * The rotation by an angle in rad about a direction, right-handed.
   *
   * @throws whorl.mechanics.Refusal where the direction has length zero
   */
  public static Rotation about(Vector3D direction, double angle) {
    Given.finite("angle", angle, "rad");
    return new Rotation(
        Given.direction("direction", direction), angle, RotationConvention.VECTOR_OPERATOR);
  }

  /**
   * The rotation that has turned after {@code time} seconds at an angular velocity in rad/s; none
   * where the angular velocity is zero.
   */
  public static Rotation at(Vector3D angularVelocity, double time) {
    double rate = angularVelocity.getNorm();
    return rate == 0 ? Rotation.IDENTITY : about(angularVelocity, rate * time);
  }

  /** The rotation that turns one way and then another. */
  public static Rotation after(Rotation first, Rotation then) {
    return then.compose(first, RotationConvention.VECTOR_OPERATOR);
  }

  /**
   * The shortest rotation that takes the z axis to a direction. Of the many that take it to minus
   * z, the half turn about x.
   *
   * @throws whorl.mechanics.Refusal where the direction has length zero
   */
  public static Rotation zTo(Vector3D direction) {
    Vector3D d = Given.direction("direction", direction);
    Vector3D across = Z.crossProduct(d);
    double sine = across.getNorm();
    double angle = Math.atan2(sine, d.getZ());
    return sine == 0 ? about(Vector3D.PLUS_I, angle) : about(across, angle);
  }
}
