package whorl.mechanics.motion;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.jspecify.annotations.Nullable;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;

/**
 * A rigid body with a state to start from, ready to be followed. Immutable.
 *
 * <p>The equations are {@code L' = M} and {@code q' = ω q/2} with the angular momentum L and the
 * moment M about the pivot or the centre of mass, along the axes of the world, and a unit
 * quaternion q for the attitude; a free body's centre of mass has {@code m v' = F}.
 *
 * <p>Where nothing but weights and forces fixed in space act, the body is followed by {@link
 * SplitRun a scheme that keeps the structure} of the motion, so that energy and angular momentum do
 * not drift; otherwise as any {@link Motion}.
 */
public final class RigidMotion {
  static final int MOMENTUM = 0;
  static final int ATTITUDE = 3;
  static final int CENTRE = 7;
  static final int VELOCITY = 10;

  private final Body body;
  private final Support support;
  private final Vector3D rate;
  private final Vector3D velocity;
  private final List<Load> loads;
  private final double limit;
  private final @Nullable Condition stop;
  private final Runnable poll;
  private final Principal principal;
  private final Vector3D arm;

  private RigidMotion(
      Body body,
      Support support,
      Vector3D rate,
      Vector3D velocity,
      List<Load> loads,
      double limit,
      @Nullable Condition stop,
      Runnable poll) {
    this.body = body;
    this.support = support;
    this.rate = Given.finite("angular velocity", rate);
    this.velocity = Given.finite("velocity", velocity);
    this.loads = List.copyOf(loads);
    this.limit = Given.positive("time limit", limit, "s");
    this.stop = stop;
    this.poll = poll;
    Vector3D fromPivot =
        support instanceof Support.Pivot pivot
            ? body.frame().fromWorld(body.centre().minus(pivot.pivot()))
            : Vector3D.ZERO;
    InertiaTensor tensor = body.ownInertia().plus(InertiaTensor.ofPoint(body.mass(), fromPivot));
    this.principal = Principal.of(tensor);
    demandInertia(principal, principal.inBody().fromWorld(body.frame().fromWorld(this.rate)));
    this.arm = principal.inBody().fromWorld(fromPivot);
  }

  /** About an axis without inertia no turning is determined: a thin rod must not spin. */
  private static void demandInertia(Principal principal, Vector3D rate) {
    boolean spins = principal.isThin() && Math.abs(rate.getZ()) > 1e-9 * rate.getNorm();
    if (spins || !principal.isDetermined()) {
      throw new Refusal(
          "body",
          "The body has no moment of inertia about "
              + (spins
                  ? "its own axis, about which it is to spin."
                  : "one of its axes, so its" + " turning about that axis is not determined."),
          "Give it a thickness.");
    }
  }

  /**
   * A body that starts from where it is placed, at time 0.
   *
   * @param body in its place and attitude at the start; that its frame may move does not count
   * @param rate angular velocity at the start, along the axes of the world, in rad/s
   * @param loads what acts on it
   * @param limit longest time to follow it, in s; positive
   */
  public static RigidMotion of(
      Body body, Support support, Vector3D rate, List<Load> loads, double limit) {
    return new RigidMotion(body, support, rate, Vector3D.ZERO, loads, limit, null, () -> {});
  }

  /** The same free body, whose centre of mass starts with a velocity, in m/s. */
  public RigidMotion moving(Vector3D start) {
    if (!(support instanceof Support.Free)) {
      throw new IllegalArgumentException(
          "the centre of mass of a held body starts at its own rate");
    }
    return new RigidMotion(body, support, rate, start, loads, limit, stop, poll);
  }

  /** The same, ended as soon as a condition holds; it reads the states through this motion. */
  public RigidMotion stopWhen(Condition condition) {
    return new RigidMotion(body, support, rate, velocity, loads, limit, condition, poll);
  }

  /** The same, with an action before every step; what it throws ends the run. */
  public RigidMotion polling(Runnable action) {
    return new RigidMotion(body, support, rate, velocity, loads, limit, stop, action);
  }

  /**
   * Follows the body to the end.
   *
   * @throws MotionFailure where that is not possible
   */
  public MotionRun run() {
    if (isConservative()) {
      return new SplitRun(this).run();
    }
    Motion motion = Motion.of(this::rates, start(), limit).polling(poll);
    motion = motion.inGroups(groups());
    for (Motion.Conserved quantity : conserved()) {
      motion = motion.keeping(quantity);
    }
    return (stop == null ? motion : motion.stopWhen(stop)).run();
  }

  /** Whether all loads have a potential. */
  public boolean isConservative() {
    return loads.stream().allMatch(load -> load instanceof Load.Weight || isFixedInSpace(load));
  }

  private static boolean isFixedInSpace(Load load) {
    return load instanceof Load.Force force && !force.inBody();
  }

  double limit() {
    return limit;
  }

  @Nullable Condition stop() {
    return stop;
  }

  Runnable poll() {
    return poll;
  }

  Principal principal() {
    return principal;
  }

  boolean isFree() {
    return support instanceof Support.Free;
  }

  double mass() {
    return body.mass();
  }

  /** Groups of states that are parts of one thing each, as {@link Motion#inGroups} takes them. */
  public int[] groups() {
    return isFree() ? new int[] {3, 4, 3, 3} : new int[] {3, 4};
  }

  /** The states at the start. */
  public double[] start() {
    double[] start = new double[isFree() ? 13 : 7];
    Quaternion attitude = Quaternion.of(body.frame().attitude()).times(principal.inBody());
    put(start, MOMENTUM, attitude.toWorld(principal.momentum(attitude.fromWorld(rate))));
    put(start, attitude);
    if (isFree()) {
      put(start, CENTRE, body.centre().position());
      put(start, VELOCITY, velocity);
    }
    return start;
  }

  static void put(double[] state, int at, Vector3D vector) {
    state[at] = vector.getX();
    state[at + 1] = vector.getY();
    state[at + 2] = vector.getZ();
  }

  static void put(double[] state, Quaternion attitude) {
    state[ATTITUDE] = attitude.w;
    state[ATTITUDE + 1] = attitude.x;
    state[ATTITUDE + 2] = attitude.y;
    state[ATTITUDE + 3] = attitude.z;
  }

  private static Vector3D vector(double[] state, int at) {
    return new Vector3D(state[at], state[at + 1], state[at + 2]);
  }

  /** The attitude of the principal axes. */
  private static Quaternion principalAttitude(double[] state) {
    var attitude =
        new Quaternion(
            state[ATTITUDE], state[ATTITUDE + 1], state[ATTITUDE + 2], state[ATTITUDE + 3]);
    attitude.normalize();
    return attitude;
  }

  private Vector3D toWorld(double[] state, Vector3D ofBody) {
    return principalAttitude(state).toWorld(principal.inBody().fromWorld(ofBody));
  }

  /** The rotation that takes vectors along the body's own axes to the world's. */
  public Rotation attitude(double[] state) {
    Quaternion q = principalAttitude(state).times(principal.inBody().conjugate());
    return new Rotation(q.w, -q.x, -q.y, -q.z, false);
  }

  /** The body where it is, in a frame that moves and turns as it does. */
  public Body body(double[] state) {
    Frame frame =
        Frame.in(Frame.WORLD, centre(state), attitude(state), rate(state), velocity(state));
    return body.placed(frame);
  }

  /** The direction of the body's own z axis, along the axes of the world. */
  public Vector3D axis(double[] state) {
    return toWorld(state, Vector3D.PLUS_K);
  }

  /** The angular velocity, along the axes of the world, in rad/s. */
  public Vector3D rate(double[] state) {
    Quaternion attitude = principalAttitude(state);
    return attitude.toWorld(principal.rate(attitude.fromWorld(momentum(state))));
  }

  /** The part of the angular velocity along the body's own z axis, in rad/s. */
  public double spin(double[] state) {
    return rate(state).dotProduct(axis(state));
  }

  /** The angular momentum about the pivot or the centre of mass, in N·m·s. */
  public Vector3D momentum(double[] state) {
    return vector(state, MOMENTUM);
  }

  /** The point that angular momentum and moments are taken about, in m. */
  public Vector3D point(double[] state) {
    return support instanceof Support.Pivot pivot ? pivot.pivot().position() : centre(state);
  }

  /** The centre of mass, in m. */
  public Vector3D centre(double[] state) {
    if (isFree()) {
      return vector(state, CENTRE);
    }
    return support instanceof Support.Pivot pivot
        ? pivot.pivot().position().add(principalAttitude(state).toWorld(arm))
        : body.centre().position();
  }

  /** The velocity of the centre of mass, in m/s. */
  public Vector3D velocity(double[] state) {
    return isFree()
        ? vector(state, VELOCITY)
        : rate(state).crossProduct(principalAttitude(state).toWorld(arm));
  }

  /** The kinetic energy, {@code ω·L/2}, and {@code m v²/2} for a free body, in J. */
  public double kineticEnergy(double[] state) {
    double turning = rate(state).dotProduct(momentum(state)) / 2;
    return isFree() ? turning + mass() * vector(state, VELOCITY).getNormSq() / 2 : turning;
  }

  /** The energy that loads with a potential could still give, from an arbitrary zero, in J. */
  double potentialEnergy(double[] state) {
    double energy = 0;
    for (SpaceForce force : spaceForces()) {
      Vector3D at = principalAttitude(state).toWorld(force.at());
      energy -= force.force().dotProduct(isFree() ? at.add(vector(state, CENTRE)) : at);
    }
    return energy;
  }

  /**
   * A force fixed in space.
   *
   * @param at from the pivot or the centre of mass, along the principal axes
   */
  record SpaceForce(Vector3D force, Vector3D at) {}

  List<SpaceForce> spaceForces() {
    var forces = new ArrayList<SpaceForce>();
    for (Load load : loads) {
      if (load instanceof Load.Weight weight) {
        forces.add(new SpaceForce(weight(weight), arm));
      } else if (load instanceof Load.Force force && !force.inBody()) {
        forces.add(new SpaceForce(force.force(), from(force)));
      }
    }
    return forces;
  }

  private Vector3D weight(Load.Weight weight) {
    return new Vector3D(0, 0, -mass() * weight.gravity());
  }

  /** Where a force acts, from the pivot or the centre of mass, along the principal axes. */
  private Vector3D from(Load.Force force) {
    return arm.add(principal.inBody().fromWorld(force.at()));
  }

  /** The rates of the states: {@code L' = M}, {@code q' = ω q/2}, {@code m v' = F}. */
  public void rates(double time, double[] state, double[] rates) {
    Quaternion attitude = principalAttitude(state);
    Vector3D turning = attitude.toWorld(principal.rate(attitude.fromWorld(momentum(state))));
    var sum = new Load.Wrench(Vector3D.ZERO, Vector3D.ZERO);
    for (Load load : loads) {
      if (load instanceof Load.Weight weight) {
        Vector3D force = weight(weight);
        sum = sum.plus(force, attitude.toWorld(arm).crossProduct(force));
      } else if (load instanceof Load.Force at) {
        Vector3D force = at.inBody() ? toWorld(state, at.force()) : at.force();
        sum = sum.plus(force, attitude.toWorld(from(at)).crossProduct(force));
      } else if (load instanceof Load.Couple couple) {
        Vector3D moment = couple.inBody() ? toWorld(state, couple.moment()) : couple.moment();
        sum = sum.plus(Vector3D.ZERO, moment);
      } else if (load instanceof Load.Varying varying) {
        Load.Wrench wrench = varying.action().at(time, state);
        sum = sum.plus(wrench.force(), wrench.moment());
      }
    }
    put(rates, MOMENTUM, sum.moment());
    putTurning(state, turning, rates);
    if (isFree()) {
      put(rates, CENTRE, vector(state, VELOCITY));
      put(rates, VELOCITY, sum.force().scalarMultiply(1 / mass()));
    }
  }

  /** {@code q' = ω q/2}, and a pull to unit length that is 0 there. */
  private static void putTurning(double[] state, Vector3D turning, double[] rates) {
    double w = state[ATTITUDE];
    double x = state[ATTITUDE + 1];
    double y = state[ATTITUDE + 2];
    double z = state[ATTITUDE + 3];
    double a = turning.getX() / 2;
    double b = turning.getY() / 2;
    double c = turning.getZ() / 2;
    double pull = turning.getNorm() * (1 - (w * w + x * x + y * y + z * z)) / 2;
    rates[ATTITUDE] = -(a * x + b * y + c * z) + pull * w;
    rates[ATTITUDE + 1] = a * w + b * z - c * y + pull * x;
    rates[ATTITUDE + 2] = b * w + c * x - a * z + pull * y;
    rates[ATTITUDE + 3] = c * w + a * y - b * x + pull * z;
  }

  /** What should not change under these loads. */
  List<Motion.Conserved> conserved() {
    var conserved = new ArrayList<Motion.Conserved>();
    StateFunction size = (time, state) -> momentum(state).getNorm();
    if (isConservative()) {
      conserved.add(
          new Motion.Conserved(
              "energy",
              (time, state) -> kineticEnergy(state) + potentialEnergy(state),
              (time, state) -> kineticEnergy(state)));
    }
    List<SpaceForce> turning =
        spaceForces().stream().filter(force -> force.at().getNorm() > 0).toList();
    boolean onlySpaceForces = isConservative();
    if (onlySpaceForces && turning.isEmpty()) {
      Vector3D start = momentum(start());
      conserved.add(
          new Motion.Conserved(
              "angular momentum",
              (time, state) -> momentum(state).subtract(start).getNorm(),
              size));
    } else if (onlySpaceForces && areParallel(turning)) {
      Vector3D along = turning.get(0).force().normalize();
      boolean isVertical = along.getX() == 0 && along.getY() == 0;
      conserved.add(
          new Motion.Conserved(
              isVertical
                  ? "angular momentum about the vertical"
                  : "angular momentum about the direction of the force",
              (time, state) ->
                  Math.signum(along.getZ()) < 0
                      ? -momentum(state).dotProduct(along)
                      : momentum(state).dotProduct(along),
              size));
    }
    if (onlySpaceForces && keepsSpin() && !principal.isThin()) {
      conserved.add(
          new Motion.Conserved(
              "spin about the axis of symmetry",
              (time, state) -> spinMomentum(state) * principal.perThird(),
              (time, state) -> rate(state).getNorm()));
    }
    return conserved;
  }

  private static boolean areParallel(List<SpaceForce> forces) {
    Vector3D first = forces.get(0).force();
    return forces.stream()
        .allMatch(
            force ->
                force.force().crossProduct(first).getNorm()
                    <= 1e-12 * force.force().getNorm() * first.getNorm());
  }

  /** Whether the body is symmetric and nothing turns it about its axis of symmetry. */
  boolean keepsSpin() {
    return principal.isSymmetric()
        && spaceForces().stream()
            .allMatch(
                force ->
                    force.at().crossProduct(Vector3D.PLUS_K).getNorm()
                        <= 1e-12 * force.at().getNorm());
  }

  private double spinMomentum(double[] state) {
    return principalAttitude(state).third(state[0], state[1], state[2]);
  }

  /** An upper bound of the angular velocity during the run, from the energy, in rad/s. */
  double fastest() {
    double[] start = start();
    double fall = 0;
    for (SpaceForce force : spaceForces()) {
      fall += 2 * force.force().getNorm() * force.at().getNorm();
    }
    double energy = rate(start).dotProduct(momentum(start)) / 2 + fall;
    if (keepsSpin()) {
      return Math.abs(spinMomentum(start)) * principal.perThird()
          + Math.sqrt(2 * energy / principal.first());
    }
    return Math.sqrt(2 * energy / principal.least());
  }
}
