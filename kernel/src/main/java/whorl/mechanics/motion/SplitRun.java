package whorl.mechanics.motion;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Follows a rigid body under forces fixed in space by a scheme that keeps the structure of its
 * motion: the energy swings about its value and does not drift, the attitude is a rotation
 * throughout, and the angular momentum of a body that nothing turns does not change at all.
 *
 * <p>The energy is split in parts, each of which alone is followed exactly: a symmetric top that
 * nothing turns; a turning about one body axis, which makes up for the difference of the other two
 * moments of inertia; the forces. A symmetric sequence of these makes a step of order 2, and 17 of
 * those one of order 8.
 *
 * <p>Sources: the splitting, R. I. McLachlan, Explicit Lie-Poisson integration and the Euler
 * equations, Physical Review Letters 71 (1993) 3043; the 17 steps, W. Kahan and R.-C. Li,
 * Composition constants for raising the orders of unconventional schemes, Mathematics of
 * Computation 66 (1997) 1089 (both from memory; tests hold the order and the exact solutions).
 */
final class SplitRun {
  /** Lengths of the steps of order 2, the first half and the middle one. */
  private static final double[] LENGTHS = {
    0.13020248308889007,
    0.5611629817751084,
    -0.38947496264484727,
    0.1588419065551556,
    -0.39590389413323757,
    0.1845396409783157,
    0.25837438768632204,
    0.2950117236093103,
    -0.6055085338300346
  };

  /** The angle in rad by which the body turns in a piece. */
  private static final double ANGLE = 0.6;

  /** Pieces in the limit at least, so that few things can hide between two. */
  private static final int FEWEST = 50;

  private final RigidMotion motion;
  private final double[] forces;
  private final double[] arms;
  private final double mass;
  private final double throughout;
  private final double alongThird;
  private final double alongSecond;
  private final double[] state;
  private final Quaternion attitude = new Quaternion(1, 0, 0, 0);

  SplitRun(RigidMotion motion) {
    this.motion = motion;
    this.mass = motion.mass();
    List<RigidMotion.SpaceForce> given = motion.spaceForces();
    this.forces = new double[3 * given.size()];
    this.arms = new double[3 * given.size()];
    for (int i = 0; i < given.size(); i++) {
      RigidMotion.put(forces, 3 * i, given.get(i).force());
      RigidMotion.put(arms, 3 * i, given.get(i).at());
    }
    Principal principal = motion.principal();
    this.throughout = 1 / principal.first();
    this.alongThird = principal.perThird() - throughout;
    this.alongSecond = principal.isSymmetric() ? 0 : 1 / principal.second() - throughout;
    this.state = motion.start();
  }

  MotionRun run() {
    Condition stop = motion.stop();
    var pieces = new ArrayList<Piece>();
    if (stop != null && stop.holds(0, state)) {
      pieces.add(Piece.of(0, 0, at -> state));
      return new MotionRun(Ending.STOPPED, pieces, motion.conserved());
    }
    double longest = Math.min(motion.limit() / FEWEST, ANGLE / motion.fastest());
    double count = Math.ceil(motion.limit() / longest);
    if (count > Motion.USUAL_STEPS) {
      throw new MotionFailure(MotionFailure.Reason.TOO_MANY_STEPS, 0, state, -1, null);
    }
    for (int i = 0; i < count; i++) {
      motion.poll().run();
      double start = motion.limit() * (i / count);
      double end = motion.limit() * ((i + 1) / count);
      Piece piece = Piece.of(start, end, new Advance(start)::to);
      OptionalDouble turn = stop == null ? OptionalDouble.empty() : Turn.on(piece, stop, false);
      if (turn.isPresent()) {
        pieces.add(piece.until(turn.getAsDouble()));
        return new MotionRun(Ending.STOPPED, pieces, motion.conserved());
      }
      pieces.add(piece);
    }
    return new MotionRun(Ending.TIME_OVER, pieces, motion.conserved());
  }

  /** Takes the state on from time to time. */
  private final class Advance {
    private double time;

    Advance(double start) {
      this.time = start;
    }

    double[] to(double next) {
      if (next > time) {
        step(next - time);
        time = next;
      }
      return state;
    }
  }

  /** A step of order 8. */
  private void step(double length) {
    attitude.set(state, RigidMotion.ATTITUDE);
    int middle = LENGTHS.length - 1;
    for (int i = -middle; i <= middle; i++) {
      symmetricStep(LENGTHS[middle - Math.abs(i)] * length);
    }
    attitude.normalize();
    RigidMotion.put(state, attitude);
  }

  /** A step of order 2. */
  private void symmetricStep(double length) {
    push(length / 2);
    turnAboutSecond(length / 2);
    turnAsTop(length);
    turnAboutSecond(length / 2);
    push(length / 2);
  }

  /** The forces alone: the attitude stays, the momenta change. */
  private void push(double length) {
    for (int i = 0; i < forces.length; i += 3) {
      attitude.pushMomentum(state, forces, arms, i, length);
      if (motion.isFree()) {
        for (int k = 0; k < 3; k++) {
          state[RigidMotion.VELOCITY + k] += length * forces[i + k] / mass;
        }
      }
    }
  }

  private void turnAboutSecond(double length) {
    if (alongSecond != 0) {
      double momentum = attitude.second(state[0], state[1], state[2]);
      attitude.turnAboutSecond(length * alongSecond * momentum);
    }
  }

  /**
   * A symmetric top that nothing turns: it turns steadily about its angular momentum, and steadily
   * about its own axis.
   */
  private void turnAsTop(double length) {
    double third = attitude.third(state[0], state[1], state[2]);
    double turn = length * throughout;
    attitude.turnInSpace(turn * state[0], turn * state[1], turn * state[2]);
    attitude.turnAboutThird(length * alongThird * third);
    if (motion.isFree()) {
      for (int k = 0; k < 3; k++) {
        state[RigidMotion.CENTRE + k] += length * state[RigidMotion.VELOCITY + k];
      }
    }
  }
}
