package whorl.mechanics.motion;

import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.reference.InertiaTensor;

/**
 * The principal moments of inertia of a body, the two nearest to each other first, with the axes
 * that they are about. A symmetric body so has its axis third.
 *
 * @param first I₁, in kg·m²
 * @param second I₂, in kg·m²
 * @param third I₃, in kg·m²
 * @param inBody takes vectors along the principal axes to the body's own
 */
record Principal(double first, double second, double third, Quaternion inBody) {
  /** Moments that differ by less than this share are those of a symmetric body. */
  private static final double SAME = 1e-12;

  static Principal of(InertiaTensor tensor) {
    if (tensor.xy() == 0 && tensor.yz() == 0 && tensor.zx() == 0) {
      return ordered(
          new double[] {tensor.xx(), tensor.yy(), tensor.zz()},
          new Vector3D[] {Vector3D.PLUS_I, Vector3D.PLUS_J, Vector3D.PLUS_K});
    }
    return ordered(tensor.principalMoments(), tensor.principalAxes().toArray(Vector3D[]::new));
  }

  /** Takes the moments round in a circle, which leaves the axes right-handed. */
  private static Principal ordered(double[] moments, Vector3D[] axes) {
    int last = 2;
    for (int k = 0; k < 2; k++) {
      if (apart(moments, k) < apart(moments, last)) {
        last = k;
      }
    }
    int first = (last + 1) % 3;
    int second = (last + 2) % 3;
    var turned = new Rotation(Vector3D.PLUS_I, Vector3D.PLUS_K, axes[first], axes[last]);
    return new Principal(moments[first], moments[second], moments[last], Quaternion.of(turned));
  }

  /** How far the two moments apart from one are from each other. */
  private static double apart(double[] moments, int one) {
    return Math.abs(moments[(one + 1) % 3] - moments[(one + 2) % 3]);
  }

  /** Whether the first two moments are the same, so that the third axis is one of symmetry. */
  boolean isSymmetric() {
    return Math.abs(first - second) <= SAME * Math.max(first, second);
  }

  /** Whether the body is a thin rod, with no moment of inertia about its axis of symmetry. */
  boolean isThin() {
    return isSymmetric() && third <= SAME * first;
  }

  /** Whether every axis has a moment of inertia, but for that of a thin rod. */
  boolean isDetermined() {
    double largest = Math.max(first, Math.max(second, third));
    return Math.min(first, second) > SAME * largest && (isThin() || third > SAME * largest);
  }

  /** 1/I₃; 0 for a thin rod, which so never turns about its own axis. */
  double perThird() {
    return isThin() ? 0 : 1 / third;
  }

  /** The least moment of inertia that the body can turn with. */
  double least() {
    double least = Math.min(first, second);
    return isThin() ? least : Math.min(least, third);
  }

  /** The angular velocity with an angular momentum, both along the principal axes. */
  Vector3D rate(Vector3D momentum) {
    return new Vector3D(
        momentum.getX() / first, momentum.getY() / second, momentum.getZ() * perThird());
  }

  /** The angular momentum with an angular velocity, both along the principal axes. */
  Vector3D momentum(Vector3D rate) {
    return new Vector3D(rate.getX() * first, rate.getY() * second, rate.getZ() * third);
  }
}
