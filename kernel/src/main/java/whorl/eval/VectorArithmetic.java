package whorl.eval;

import whorl.eval.NumericFailure.Reason;

/** Operations on vectors of finite parts; results are finite, or the part at fault is named. */
final class VectorArithmetic {
  private VectorArithmetic() {}

  static Value.Vector finite(double x, double y, double z, Site whole, double operand) {
    if (Double.isFinite(x) && Double.isFinite(y) && Double.isFinite(z)) {
      return new Value.Vector(x, y, z);
    }
    throw whole.noValue(Reason.OVERFLOW, operand);
  }

  private static double finite(double value, Site whole, double operand) {
    if (Double.isFinite(value)) {
      return value;
    }
    throw whole.noValue(Reason.OVERFLOW, operand);
  }

  static double magnitude(Value.Vector v, Site whole) {
    return finite(Arithmetic.magnitude(v.x(), v.y(), v.z()), whole, largestPart(v));
  }

  /** The part of largest size: the number that a message about the whole vector may show. */
  static double largestPart(Value.Vector v) {
    double largest = Math.abs(v.x()) >= Math.abs(v.y()) ? v.x() : v.y();
    return Math.abs(largest) >= Math.abs(v.z()) ? largest : v.z();
  }

  static double dot(Value.Vector a, Value.Vector b, Site whole) {
    return finite(a.x() * b.x() + a.y() * b.y() + a.z() * b.z(), whole, largestPart(b));
  }

  static Value.Vector cross(Value.Vector a, Value.Vector b, Site whole) {
    return finite(
        a.y() * b.z() - a.z() * b.y(),
        a.z() * b.x() - a.x() * b.z(),
        a.x() * b.y() - a.y() * b.x(),
        whole,
        largestPart(b));
  }

  /** The unit vector along a vector. */
  static Value.Vector direction(Value.Vector v, Site whole, Site vectorSite) {
    double magnitude = magnitude(v, whole);
    if (magnitude == 0) {
      throw vectorSite.noValue(Reason.DIRECTION_OF_ZERO, magnitude);
    }
    return new Value.Vector(v.x() / magnitude, v.y() / magnitude, v.z() / magnitude);
  }

  /**
   * The angle between two unit vectors, in radians: twice the angle in the right triangle of half
   * their difference and half their sum. Unlike the arc cosine of the dot product it keeps its
   * digits for vectors that are nearly along one line.
   */
  static double angle(Value.Vector u, Value.Vector v) {
    double apart = Arithmetic.magnitude(u.x() - v.x(), u.y() - v.y(), u.z() - v.z());
    double along = Arithmetic.magnitude(u.x() + v.x(), u.y() + v.y(), u.z() + v.z());
    return 2 * Arithmetic.angleOfPoint(apart, along);
  }
}
