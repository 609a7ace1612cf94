package whorl.mechanics.motion;

import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds when a condition turns on a stretch of a run: from holding to not, or the other way. Looks
 * at the eight points of the stretch, and between them where its margin comes near 0.
 */
final class Turn {
  private final Piece piece;
  private final Condition condition;
  private final boolean held;

  private Turn(Piece piece, Condition condition, boolean held) {
    this.piece = piece;
    this.condition = condition;
    this.held = held;
  }

  /**
   * The first time at which a condition no longer is what it was at the start of a stretch. There
   * it certainly has turned: the time before, one spacing of doubles earlier, is not yet it.
   */
  static OptionalDouble on(Piece piece, Condition condition, boolean held) {
    return new Turn(piece, condition, held).first();
  }

  private OptionalDouble first() {
    double[] away = new double[Piece.POINTS];
    for (int i = 0; i < Piece.POINTS; i++) {
      away[i] = away(piece.time(i), piece.state(i));
    }
    for (int i = 1; i < Piece.POINTS; i++) {
      if (condition.holds(piece.time(i), piece.state(i)) != held) {
        return OptionalDouble.of(bisected(piece.time(i - 1), piece.time(i)));
      }
      if (i < Piece.POINTS - 1
          && piece.time(i - 1) < piece.time(i + 1)
          && mayTouch(away[i - 1], away[i], away[i + 1])) {
        double nearest = nearest(piece.time(i - 1), piece.time(i + 1));
        if (hasTurned(nearest)) {
          return OptionalDouble.of(bisected(piece.time(i - 1), nearest));
        }
      }
    }
    return OptionalDouble.empty();
  }

  /** How far the margin is from the side that it would turn to. */
  private double away(double time, double[] state) {
    double margin = condition.margin(time, state);
    return held ? margin : -margin;
  }

  /** Whether a curve through three points, lowest in the middle, may dip to 0 between them. */
  private static boolean mayTouch(double before, double here, double behind) {
    return here <= before && here <= behind && here <= Math.max(before, behind) - here;
  }

  private double nearest(double from, double to) {
    UnivariateFunction away = time -> away(time, piece.state(time));
    return new BrentOptimizer(1e-12, 1e-9 * (to - from))
        .optimize(
            new MaxEval(200),
            new UnivariateObjectiveFunction(away),
            GoalType.MINIMIZE,
            new SearchInterval(from, to))
        .getPoint();
  }

  private boolean hasTurned(double time) {
    return condition.holds(time, piece.state(time)) != held;
  }

  /** Halves to neighbouring doubles: some fifty cheap looks, and no margin can mislead it. */
  private double bisected(double before, double behind) {
    double low = before;
    double high = behind;
    while (true) {
      double middle = low + (high - low) / 2;
      if (middle <= low || middle >= high) {
        return high;
      }
      if (hasTurned(middle)) {
        high = middle;
      } else {
        low = middle;
      }
    }
  }
}
