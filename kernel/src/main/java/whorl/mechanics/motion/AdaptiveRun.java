package whorl.mechanics.motion;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;
import org.jspecify.annotations.Nullable;

/**
 * One run of a motion, in stretches of steps. A stretch ends where the run does, where the rates
 * jump, or where a step that was tried came to a state without rates; the next one starts there.
 */
final class AdaptiveRun {
  /** Longest step as a part of the time limit, so that few things can hide within a step. */
  private static final double LONGEST_STEP = 1 / 50.0;

  /** First step as a part of the longest; it grows tenfold from step to step. */
  private static final double FIRST_STEP = 1e-4;

  /** What a step is shortened to, of the way to a state without rates. */
  private static final double RETREAT = 0.2;

  /** Steps of a stretch kept short on account of such a state. */
  private static final int SHORT_STEPS = 20;

  /** A second jump this many shortest steps behind another is none. */
  private static final int CROSSING = 1000;

  /** A jump is quick that comes within this part of the longest step behind another. */
  private static final double QUICK = 1e-6;

  private static final int MOST_QUICK_JUMPS = 50;

  private final Motion motion;
  private final Stepper stepper;
  private final double longest;
  private final boolean[] sides;
  private final List<Piece> pieces = new ArrayList<>();
  private double time;
  private double[] state;
  private double first;
  private double retreat = Double.POSITIVE_INFINITY;
  private int quickJumps;
  private boolean atJump;
  private double crossed = Double.NEGATIVE_INFINITY;

  AdaptiveRun(Motion motion) {
    this.motion = motion;
    this.state = motion.start();
    this.stepper = new Stepper(state, motion.groups(), motion.limit());
    this.longest = motion.limit() * LONGEST_STEP;
    this.first = longest * FIRST_STEP;
    this.sides = new boolean[motion.jumps().size()];
    stepper.addStepHandler(new Steps());
  }

  MotionRun run() {
    return new MotionRun(follow(), pieces, motion.conserved());
  }

  private Ending follow() {
    if (stopsAtOnce()) {
      pieces.add(Piece.of(0, 0, at -> state));
      return Ending.STOPPED;
    }
    while (!isAtLimit()) {
      try {
        if (atJump) {
          crossJump();
        }
        stretch();
        return Ending.TIME_OVER;
      } catch (EndOfStretch end) {
        if (end.stopped) {
          return Ending.STOPPED;
        }
      } catch (NoRateAhead ahead) {
        retreat = (ahead.time - time) * RETREAT;
        if (retreat <= stepper.shortest(time)) {
          throw ahead.failure(time, state);
        }
      } catch (Stepper.TooShort tooShort) {
        atJump = true;
      }
    }
    return Ending.TIME_OVER;
  }

  private boolean stopsAtOnce() {
    Condition stop = motion.stop();
    try {
      return stop != null && stop.holds(0, state);
    } catch (NoRate none) {
      throw new NoRateAhead(0, none).failure(0, state);
    }
  }

  /** The integrator asks for stretches of more than a thousand spacings of doubles. */
  private boolean isAtLimit() {
    return motion.limit() - time <= 2000 * Math.ulp(motion.limit());
  }

  /**
   * Takes one step of a few spacings of doubles whatever its error, which costs no digit where the
   * rates jump. Where that does not help, they grow without bound.
   */
  private void crossJump() {
    atJump = false;
    if (time - crossed <= CROSSING * stepper.shortest(time)) {
      throw new MotionFailure(MotionFailure.Reason.RUNAWAY, time, state, steepest(), null);
    }
    crossed = time;
    double step = 2 * stepper.shortest(time);
    double[] rates = new double[state.length];
    new Equations().computeDerivatives(time + step, state, rates);
    double from = time;
    double[] before = state;
    take(Piece.of(from, from + step, at -> moved(before, rates, at - from)));
    first = longest * FIRST_STEP * FIRST_STEP;
  }

  private static double[] moved(double[] state, double[] rates, double step) {
    double[] moved = state.clone();
    for (int i = 0; i < moved.length; i++) {
      moved[i] += step * rates[i];
    }
    return moved;
  }

  /** Which state changes most against its size. */
  private int steepest() {
    double[] rates = new double[state.length];
    new Equations().computeDerivatives(time, state, rates);
    int steepest = 0;
    for (int i = 1; i < rates.length; i++) {
      steepest = stepper.isSteeper(rates, i, steepest) ? i : steepest;
    }
    return steepest;
  }

  private void take(Piece piece) {
    if (pieces.size() >= motion.mostSteps()) {
      throw new MotionFailure(MotionFailure.Reason.TOO_MANY_STEPS, time, state, -1, null);
    }
    pieces.add(piece);
    time = piece.end();
    state = piece.state(Piece.POINTS - 1);
    for (int i = 0; i < Piece.POINTS; i++) {
      stepper.reached(piece.state(i));
    }
  }

  private void stretch() {
    for (int i = 0; i < sides.length; i++) {
      sides[i] = holds(motion.jumps().get(i));
    }
    stepper.bound(Math.min(longest, retreat), first);
    stepper.integrate(new Equations(), time, state.clone(), motion.limit(), state.clone());
  }

  private boolean holds(Condition condition) {
    try {
      return condition.holds(time, state);
    } catch (NoRate none) {
      throw new NoRateAhead(time, none);
    }
  }

  /** Ends a stretch from within a step: the integrator has no gentler way. */
  private static final class EndOfStretch extends RuntimeException {
    private static final long serialVersionUID = 1;
    final boolean stopped;

    EndOfStretch(boolean stopped) {
      super("end of stretch", null, false, false);
      this.stopped = stopped;
    }
  }

  /** A state that was tried has no rates, or a condition has no value there. */
  private static final class NoRateAhead extends RuntimeException {
    private static final long serialVersionUID = 1;
    final double time;
    private final NoRate none;
    private final boolean isInfinite;

    NoRateAhead(double time, NoRate none, boolean isInfinite) {
      super("no rate ahead", none, false, false);
      this.time = time;
      this.none = none;
      this.isInfinite = isInfinite;
    }

    NoRateAhead(double time, NoRate none) {
      this(time, none, false);
    }

    MotionFailure failure(double reached, double[] state) {
      return new MotionFailure(
          isInfinite ? MotionFailure.Reason.RUNAWAY : MotionFailure.Reason.NO_RATE,
          reached,
          state,
          none.index(),
          causeOf(none));
    }

    private static @Nullable RuntimeException causeOf(NoRate none) {
      return none.getCause() instanceof RuntimeException cause ? cause : null;
    }
  }

  /** The rates as the integrator asks for them. */
  private final class Equations implements FirstOrderDifferentialEquations {
    @Override
    public int getDimension() {
      return state.length;
    }

    @Override
    public void computeDerivatives(double at, double[] tried, double[] rates) {
      try {
        motion.rates().at(at, tried, rates);
      } catch (NoRate none) {
        throw new NoRateAhead(at, none);
      }
      for (int i = 0; i < rates.length; i++) {
        if (!Double.isFinite(rates[i])) {
          throw new NoRateAhead(at, new NoRate(i, null), Double.isInfinite(rates[i]));
        }
      }
    }
  }

  /** What happens at every step that was accepted. */
  private final class Steps implements StepHandler {
    private int stepsOfStretch;

    @Override
    public void init(double from, double[] start, double limit) {
      stepsOfStretch = 0;
    }

    @Override
    public void handleStep(StepInterpolator step, boolean isLast) {
      motion.poll().run();
      Piece piece = Piece.of(step.getPreviousTime(), step.getCurrentTime(), at -> states(step, at));
      OptionalDouble stop = stopOn(piece);
      Piece until = stop.isPresent() ? piece.until(stop.getAsDouble()) : piece;
      OptionalDouble jump = jumpOn(until);
      if (jump.isPresent() && jump.getAsDouble() < until.end()) {
        take(until.until(jump.getAsDouble()));
        countJump(piece.start());
        first = Math.max(first * FIRST_STEP, (piece.end() - piece.start()) * FIRST_STEP);
        throw new EndOfStretch(false);
      }
      take(until);
      if (stop.isPresent()) {
        throw new EndOfStretch(true);
      }
      first = piece.end() - piece.start();
      stepsOfStretch++;
      if (retreat < longest && stepsOfStretch >= SHORT_STEPS && !isLast) {
        retreat = Double.POSITIVE_INFINITY;
        throw new EndOfStretch(false);
      }
    }

    /** Many jumps one right behind another are a motion that is held between them. */
    private void countJump(double before) {
      quickJumps = time - before < QUICK * longest ? quickJumps + 1 : 0;
      if (quickJumps > MOST_QUICK_JUMPS) {
        throw new MotionFailure(MotionFailure.Reason.TO_AND_FRO, time, state, -1, null);
      }
    }

    private double[] states(StepInterpolator step, double at) {
      step.setInterpolatedTime(at);
      return step.getInterpolatedState();
    }

    private OptionalDouble stopOn(Piece piece) {
      Condition stop = motion.stop();
      return stop == null ? OptionalDouble.empty() : turn(piece, stop, false);
    }

    private OptionalDouble jumpOn(Piece piece) {
      OptionalDouble earliest = OptionalDouble.empty();
      for (int i = 0; i < sides.length; i++) {
        OptionalDouble turn = turn(piece, motion.jumps().get(i), sides[i]);
        if (turn.isPresent() && turn.getAsDouble() < earliest.orElse(Double.POSITIVE_INFINITY)) {
          earliest = turn;
        }
      }
      return earliest;
    }

    private OptionalDouble turn(Piece piece, Condition condition, boolean held) {
      try {
        return Turn.on(piece, condition, held);
      } catch (NoRate none) {
        throw new NoRateAhead(piece.end(), none);
      }
    }
  }
}
