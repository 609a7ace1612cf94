package whorl.mechanics.motion;

import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * A unit quaternion that takes vectors along a body's axes to the world's, {@code v' = q v q*},
 * turned on in place: a run does so some million times.
 */
final class Quaternion {
  double w;
  double x;
  double y;
  double z;

  Quaternion(double w, double x, double y, double z) {
    this.w = w;
    this.x = x;
    this.y = y;
    this.z = z;
  }

  /** The same rotation; the library's quaternions are conjugate to these. */
  static Quaternion of(Rotation rotation) {
    return new Quaternion(
        rotation.getQ0(), -rotation.getQ1(), -rotation.getQ2(), -rotation.getQ3());
  }

  /** The product, which turns by the other first. */
  Quaternion times(Quaternion other) {
    return new Quaternion(
        w * other.w - x * other.x - y * other.y - z * other.z,
        w * other.x + x * other.w + y * other.z - z * other.y,
        w * other.y - x * other.z + y * other.w + z * other.x,
        w * other.z + x * other.y - y * other.x + z * other.w);
  }

  /** The rotation back. */
  Quaternion conjugate() {
    return new Quaternion(w, -x, -y, -z);
  }

  /** Turns on by a rotation vector along the axes of the world, in rad. */
  void turnInSpace(double a, double b, double c) {
    double angle = Math.sqrt(a * a + b * b + c * c);
    double sine = angle == 0 ? 0.5 : Math.sin(angle / 2) / angle;
    double cosine = Math.cos(angle / 2);
    set(
        cosine * w - sine * (a * x + b * y + c * z),
        cosine * x + sine * (a * w + b * z - c * y),
        cosine * y + sine * (b * w + c * x - a * z),
        cosine * z + sine * (c * w + a * y - b * x));
  }

  /** Turns on about the body's own third axis, by an angle in rad. */
  void turnAboutThird(double angle) {
    double sine = Math.sin(angle / 2);
    double cosine = Math.cos(angle / 2);
    set(w * cosine - z * sine, x * cosine + y * sine, y * cosine - x * sine, z * cosine + w * sine);
  }

  /** Turns on about the body's own second axis, by an angle in rad. */
  void turnAboutSecond(double angle) {
    double sine = Math.sin(angle / 2);
    double cosine = Math.cos(angle / 2);
    set(w * cosine - y * sine, x * cosine - z * sine, y * cosine + w * sine, z * cosine + x * sine);
  }

  /** Takes it from four places of a state. */
  void set(double[] state, int first) {
    set(state[first], state[first + 1], state[first + 2], state[first + 3]);
  }

  private void set(double newW, double newX, double newY, double newZ) {
    w = newW;
    x = newX;
    y = newY;
    z = newZ;
  }

  /** Takes away the rounding of many turns. */
  void normalize() {
    double size = Math.sqrt(w * w + x * x + y * y + z * z);
    set(w / size, x / size, y / size, z / size);
  }

  /** The part along the second axis of the body of a vector along those of the world. */
  double second(double a, double b, double c) {
    return 2 * (x * y - w * z) * a + (w * w - x * x + y * y - z * z) * b + 2 * (y * z + w * x) * c;
  }

  /** The part along the third axis of the body of a vector along those of the world. */
  double third(double a, double b, double c) {
    return 2 * (x * z + w * y) * a + 2 * (y * z - w * x) * b + (w * w - x * x - y * y + z * z) * c;
  }

  /**
   * Adds to an angular momentum what a force gives it in a time.
   *
   * @param state begins with the angular momentum
   * @param forces along the axes of the world
   * @param arms where they act, along the axes of the body
   * @param i first place of the force and its arm
   */
  void pushMomentum(double[] state, double[] forces, double[] arms, int i, double time) {
    double a = arms[i];
    double b = arms[i + 1];
    double c = arms[i + 2];
    double ww = w * w;
    double xx = x * x;
    double yy = y * y;
    double zz = z * z;
    double rx = (ww + xx - yy - zz) * a + 2 * (x * y - w * z) * b + 2 * (x * z + w * y) * c;
    double ry = 2 * (x * y + w * z) * a + (ww - xx + yy - zz) * b + 2 * (y * z - w * x) * c;
    double rz = 2 * (x * z - w * y) * a + 2 * (y * z + w * x) * b + (ww - xx - yy + zz) * c;
    state[0] += time * (ry * forces[i + 2] - rz * forces[i + 1]);
    state[1] += time * (rz * forces[i] - rx * forces[i + 2]);
    state[2] += time * (rx * forces[i + 1] - ry * forces[i]);
  }

  /** A vector along the axes of the world that is given along those of the body. */
  Vector3D toWorld(Vector3D v) {
    double a = v.getX();
    double b = v.getY();
    double c = v.getZ();
    double ww = w * w;
    double xx = x * x;
    double yy = y * y;
    double zz = z * z;
    return new Vector3D(
        (ww + xx - yy - zz) * a + 2 * (x * y - w * z) * b + 2 * (x * z + w * y) * c,
        2 * (x * y + w * z) * a + (ww - xx + yy - zz) * b + 2 * (y * z - w * x) * c,
        2 * (x * z - w * y) * a + 2 * (y * z + w * x) * b + (ww - xx - yy + zz) * c);
  }

  /** A vector along the axes of the body that is given along those of the world. */
  Vector3D fromWorld(Vector3D v) {
    return conjugate().toWorld(v);
  }
}
