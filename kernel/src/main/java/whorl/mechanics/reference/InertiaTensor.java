package whorl.mechanics.reference;

import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * The six elements of an inertia tensor about a point, along given axes, in kg·m². Which point and
 * which axes, its holder says.
 *
 * <p><b>Sign.</b> The off-diagonal elements are those of the tensor, {@code xy = −∫ x y dm}: the
 * products of inertia with their sign reversed. Many handbooks and measuring machines state the
 * products {@code ∫ x y dm} themselves; see {@link #fromProducts}.
 *
 * @param xx {@code ∫ (y² + z²) dm}
 * @param yy {@code ∫ (z² + x²) dm}
 * @param zz {@code ∫ (x² + y²) dm}
 * @param xy {@code −∫ x y dm}
 * @param yz {@code −∫ y z dm}
 * @param zx {@code −∫ z x dm}
 */
public record InertiaTensor(double xx, double yy, double zz, double xy, double yz, double zx) {
  /** No inertia. */
  public static final InertiaTensor ZERO = new InertiaTensor(0, 0, 0, 0, 0, 0);

  /** Refuses what is no number. */
  public InertiaTensor {
    if (!Double.isFinite(xx + yy + zz + xy + yz + zx)) {
      throw new Refusal("inertia", "An element of the inertia tensor is no number.", "");
    }
  }

  /** The tensor about a point along principal axes. */
  public static InertiaTensor diagonal(double xx, double yy, double zz) {
    return new InertiaTensor(xx, yy, zz, 0, 0, 0);
  }

  /** The tensor from moments and products of inertia, the latter {@code p_xy = +∫ x y dm}. */
  public static InertiaTensor fromProducts(
      double xx, double yy, double zz, double productXy, double productYz, double productZx) {
    return new InertiaTensor(xx, yy, zz, -productXy, -productYz, -productZx);
  }

  /** The tensor of a point mass m at r from the point: {@code m (r² 1 − r rᵀ)}. */
  public static InertiaTensor ofPoint(double mass, Vector3D r) {
    double x = r.getX();
    double y = r.getY();
    double z = r.getZ();
    return new InertiaTensor(
        mass * (y * y + z * z),
        mass * (z * z + x * x),
        mass * (x * x + y * y),
        -mass * x * y,
        -mass * y * z,
        -mass * z * x);
  }

  /** The sum of two tensors about the same point along the same axes. */
  public InertiaTensor plus(InertiaTensor other) {
    return new InertiaTensor(
        xx + other.xx, yy + other.yy, zz + other.zz, xy + other.xy, yz + other.yz, zx + other.zx);
  }

  /** The difference of two tensors about the same point along the same axes. */
  public InertiaTensor minus(InertiaTensor other) {
    return plus(other.times(-1));
  }

  /** All elements times a factor. */
  public InertiaTensor times(double factor) {
    return new InertiaTensor(
        factor * xx, factor * yy, factor * zz, factor * xy, factor * yz, factor * zx);
  }

  /** The product with a vector, such as {@code L = I ω}. */
  public Vector3D times(Vector3D v) {
    double x = v.getX();
    double y = v.getY();
    double z = v.getZ();
    return new Vector3D(
        xx * x + xy * y + zx * z, xy * x + yy * y + yz * z, zx * x + yz * y + zz * z);
  }

  /**
   * The moment of inertia about the axis through the point along a direction: {@code u · I u}.
   *
   * @throws Refusal where the direction has length zero
   */
  public double about(Vector3D direction) {
    Vector3D u = Given.direction("direction", direction);
    return u.dotProduct(times(u));
  }

  /** The tensor of the turned body along the same axes: {@code R I Rᵀ}. */
  public InertiaTensor turned(Rotation rotation) {
    Vector3D i = rotation.applyInverseTo(Vector3D.PLUS_I);
    Vector3D j = rotation.applyInverseTo(Vector3D.PLUS_J);
    Vector3D k = rotation.applyInverseTo(Vector3D.PLUS_K);
    Vector3D alongI = times(i);
    Vector3D alongJ = times(j);
    return new InertiaTensor(
        i.dotProduct(alongI),
        j.dotProduct(alongJ),
        k.dotProduct(times(k)),
        j.dotProduct(alongI),
        k.dotProduct(alongJ),
        k.dotProduct(alongI));
  }

  /**
   * The tensor of the same body about another point: {@code I_B = I_A + m (b² 1 − b bᵀ) − m (a² 1 −
   * a aᵀ)} with a and b from the points to the centre of mass. Neither point has to be the centre.
   *
   * @param mass m, in kg
   * @param centre the centre of mass
   * @param from the point A that this tensor is about
   * @param to the point B
   */
  public InertiaTensor moved(double mass, Point centre, Point from, Point to) {
    Given.finite("mass", mass, "kg");
    return plus(ofPoint(mass, centre.minus(to))).minus(ofPoint(mass, centre.minus(from)));
  }

  /** The principal moments of inertia, smallest first, in kg·m². */
  public double[] principalMoments() {
    double[] moments = decomposed().getRealEigenvalues();
    Arrays.sort(moments);
    return moments;
  }

  /**
   * Unit vectors along the principal axes, in the order of {@link #principalMoments} and
   * right-handed. Where two moments are equal, their axes are any two at right angles.
   */
  public List<Vector3D> principalAxes() {
    EigenDecomposition parts = decomposed();
    double[] moments = parts.getRealEigenvalues();
    Integer[] order = {0, 1, 2};
    Arrays.sort(order, (a, b) -> Double.compare(moments[a], moments[b]));
    Vector3D first = new Vector3D(parts.getEigenvector(order[0]).toArray()).normalize();
    Vector3D second = new Vector3D(parts.getEigenvector(order[1]).toArray()).normalize();
    return List.of(first, second, first.crossProduct(second));
  }

  /**
   * Refuses a tensor that no body has: a negative principal moment, or one that is larger than the
   * sum of the other two, beyond rounding.
   *
   * @return this tensor
   */
  public InertiaTensor demandPhysical() {
    double[] moments = principalMoments();
    double slack = Point.SAME * Math.abs(moments[2]);
    if (moments[0] < -slack) {
      throw new Refusal(
          "inertia",
          "The tensor has a negative principal moment of inertia, "
              + Given.text(moments[0], "kg·m²")
              + "; no body has one.",
          "Check the products of inertia and the point that the tensor is about.");
    }
    if (moments[2] > moments[0] + moments[1] + slack) {
      throw new Refusal(
          "inertia",
          "The largest principal moment of inertia, "
              + Given.text(moments[2], "kg·m²")
              + ", is more than the sum of the other two, "
              + Given.text(moments[0], "kg·m²")
              + " and "
              + Given.text(moments[1], "kg·m²")
              + "; no body has such a tensor.",
          "Check for a diameter taken as a radius, for moments in different units, and for the"
              + " sign of the products of inertia, which here are tensor elements, minus ∫ x y dm.");
    }
    return this;
  }

  private EigenDecomposition decomposed() {
    return new EigenDecomposition(
        new Array2DRowRealMatrix(new double[][] {{xx, xy, zx}, {xy, yy, yz}, {zx, yz, zz}}));
  }
}
