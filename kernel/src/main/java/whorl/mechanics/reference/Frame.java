package whorl.mechanics.reference;

import java.util.Objects;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.jspecify.annotations.Nullable;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A right-handed frame of reference that may move and turn steadily in the frame that it is given
 * in. Frames nest: a frame given in a ship goes with the ship.
 *
 * <p>Without a time, everything is meant at time zero; {@link #at} gives the frame at another time.
 */
public final class Frame {
  /** The world: at rest, z up, gravity along minus z. */
  public static final Frame WORLD =
      new Frame(null, Vector3D.ZERO, Rotation.IDENTITY, Vector3D.ZERO, Vector3D.ZERO);

  private final @Nullable Frame parent;
  private final Vector3D shift;
  private final Rotation turned;
  private final Vector3D turning;
  private final Vector3D moving;

  private final Point origin;
  private final Rotation attitude;
  private final Vector3D angularVelocity;

  private Frame(
      @Nullable Frame parent, Vector3D shift, Rotation turned, Vector3D turning, Vector3D moving) {
    this.parent = parent;
    this.shift = Given.finite("origin", shift);
    this.turned = turned;
    this.turning = Given.finite("angular velocity", turning);
    this.moving = Given.finite("velocity", moving);
    if (parent == null) {
      origin = new Point(shift, moving);
      attitude = turned;
      angularVelocity = turning;
    } else {
      Point carried = parent.point(shift);
      origin = new Point(carried.position(), carried.velocity().add(parent.toWorld(moving)));
      attitude = Turn.after(turned, parent.attitude);
      angularVelocity = parent.angularVelocity.add(parent.toWorld(turning));
    }
  }

  /**
   * A frame given in another. All vectors are given along the axes of the other frame and as seen
   * from it.
   *
   * @param parent the other frame
   * @param origin from the origin of the other frame, in m
   * @param turned the rotation that takes the axes of the other frame to those of this one
   * @param turning angular velocity, in rad/s
   * @param moving velocity of the origin, in m/s
   */
  public static Frame in(
      Frame parent, Vector3D origin, Rotation turned, Vector3D turning, Vector3D moving) {
    return new Frame(parent, origin, proper(turned), turning, moving);
  }

  /** A frame at rest in another. */
  public static Frame in(Frame parent, Vector3D origin, Rotation turned) {
    return in(parent, origin, turned, Vector3D.ZERO, Vector3D.ZERO);
  }

  /**
   * The rotation that takes the x, y and z axes to three directions at right angles.
   *
   * @throws Refusal where a direction has length zero, where two are not at right angles within
   *     10⁻⁹ rad, or where the three are left-handed
   */
  public static Rotation axes(Vector3D x, Vector3D y, Vector3D z) {
    Vector3D i = Given.direction("x axis", x);
    Vector3D j = Given.direction("y axis", y);
    Vector3D k = Given.direction("z axis", z);
    demandRightAngle("x axis", i, "y axis", j);
    demandRightAngle("y axis", j, "z axis", k);
    demandRightAngle("z axis", k, "x axis", i);
    if (i.crossProduct(j).dotProduct(k) < 0) {
      throw new Refusal(
          "z axis",
          "The three axes are left-handed: turning x to y does not drive a right-handed screw along"
              + " z.",
          "Reverse one axis, or exchange two.");
    }
    return new Rotation(Vector3D.PLUS_I, Vector3D.PLUS_J, i, j);
  }

  /** Where the frame's origin is, and its velocity. */
  public Point origin() {
    return origin;
  }

  /** The rotation that takes vectors along the frame's axes to the world's. */
  public Rotation attitude() {
    return attitude;
  }

  /** The angular velocity as seen from the world, along the axes of the world, in rad/s. */
  public Vector3D angularVelocity() {
    return angularVelocity;
  }

  /** Whether the frame neither moves nor turns. */
  public boolean isFixed() {
    return origin.isFixed() && angularVelocity.getNormSq() == 0;
  }

  /** A free vector given along the frame's axes, along those of the world. */
  public Vector3D toWorld(Vector3D v) {
    return attitude.applyTo(v);
  }

  /** A free vector given along the axes of the world, along those of the frame. */
  public Vector3D fromWorld(Vector3D v) {
    return attitude.applyInverseTo(v);
  }

  /** The point fixed in the frame at local coordinates in m. */
  public Point point(Vector3D local) {
    Vector3D arm = toWorld(Given.finite("point", local));
    return new Point(
        origin.position().add(arm), origin.velocity().add(angularVelocity.crossProduct(arm)));
  }

  /** The coordinates of a point in the frame, in m. */
  public Vector3D coordinates(Point point) {
    return fromWorld(point.minus(origin));
  }

  /** The frame after it and the frames that it is given in have moved and turned on. */
  public Frame at(double seconds) {
    Given.finite("time", seconds, "s");
    if (parent == null) {
      return this;
    }
    return new Frame(
        parent.at(seconds),
        shift.add(seconds, moving),
        Turn.after(turned, Turn.at(turning, seconds)),
        turning,
        moving);
  }

  private static Rotation proper(Rotation turned) {
    double q0 = turned.getQ0();
    double q1 = turned.getQ1();
    double q2 = turned.getQ2();
    double q3 = turned.getQ3();
    double size = q0 * q0 + q1 * q1 + q2 * q2 + q3 * q3;
    if (!(Math.abs(size - 1) < Point.SAME)) {
      throw new Refusal(
          "frame",
          "The frame is singular: its axes are not three directions at right angles.",
          "Give the angle turned and a direction that is not zero.");
    }
    return turned;
  }

  private static void demandRightAngle(String first, Vector3D a, String second, Vector3D b) {
    double cosine = a.dotProduct(b);
    if (Math.abs(cosine) <= Point.SAME) {
      return;
    }
    boolean flat = Math.abs(cosine) >= 1 - Point.SAME;
    throw new Refusal(
        second,
        flat
            ? "The frame is singular: its " + first + " and " + second + " are parallel."
            : "The angle between "
                + first
                + " and "
                + second
                + " is "
                + Given.text(Math.toDegrees(Math.acos(cosine)), "deg")
                + ", not 90 deg.",
        "Give axes at right angles.");
  }

  /** Whether another frame is given in the same way in an equal frame. */
  @Override
  public boolean equals(@Nullable Object other) {
    return other instanceof Frame frame
        && Objects.equals(parent, frame.parent)
        && shift.equals(frame.shift)
        && sameAs(frame.turned)
        && turning.equals(frame.turning)
        && moving.equals(frame.moving);
  }

  private boolean sameAs(Rotation other) {
    return turned.getQ0() == other.getQ0()
        && turned.getQ1() == other.getQ1()
        && turned.getQ2() == other.getQ2()
        && turned.getQ3() == other.getQ3();
  }

  @Override
  public int hashCode() {
    return origin.hashCode();
  }
}
