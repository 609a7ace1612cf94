package whorl.mechanics.motion;

import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;

/** A motion that was followed to its end: its states at every instant, and what they came to. */
public final class MotionRun {
  /** Exact for polynomials of degree 15, so for the square of a state. */
  private static final GaussIntegratorFactory QUADRATURE = new GaussIntegratorFactory();

  private static final int QUADRATURE_POINTS = 8;

  private final Ending ending;
  private final List<Piece> pieces;
  private final List<Kept> kept;

  MotionRun(Ending ending, List<Piece> pieces, List<Motion.Conserved> conserved) {
    this.ending = ending;
    this.pieces = List.copyOf(pieces);
    this.kept = conserved.stream().map(this::kept).toList();
  }

  /** Why it ended. */
  public Ending ending() {
    return ending;
  }

  /** How long it lasted, in s. */
  public double duration() {
    return pieces.get(pieces.size() - 1).end();
  }

  /** Number of steps that it took. */
  public int steps() {
    return pieces.size();
  }

  /** How well each of the things that should not change was kept. */
  public List<Kept> kept() {
    return kept;
  }

  /**
   * The states at a time.
   *
   * @param time from 0 to the duration, in s
   */
  public double[] state(double time) {
    if (!(time >= 0 && time <= duration())) {
      throw new IllegalArgumentException(
          "the run lasts from 0 to " + duration() + " s, so there is no state at " + time + " s");
    }
    return pieces.get(indexAt(time)).state(time);
  }

  private int indexAt(double time) {
    int low = 0;
    int high = pieces.size() - 1;
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (pieces.get(middle).end() < time) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /** Looks at the states of a run. */
  @FunctionalInterface
  public interface Visitor {
    /** Looks at the states at a time, which must be left as they are. */
    void visit(double time, double[] state);
  }

  /** Shows the states at all points from which those between are worked out, in order of time. */
  public void visit(Visitor visitor) {
    for (Piece piece : pieces) {
      for (int i = 0; i < Piece.POINTS; i++) {
        visitor.visit(piece.time(i), piece.state(i));
      }
    }
  }

  /** A function of the states at a time from 0 to the duration, in s. */
  public double value(StateFunction function, double time) {
    return function.at(time, state(time));
  }

  /** Its value at the start. */
  public double first(StateFunction function) {
    return function.at(0, pieces.get(0).state(0));
  }

  /** Its value at the end. */
  public double last(StateFunction function) {
    return function.at(duration(), pieces.get(pieces.size() - 1).state(Piece.POINTS - 1));
  }

  /** Its largest value, between the steps too. */
  public Extreme peak(StateFunction function) {
    return new Samples(function).peak();
  }

  /** Its least value, between the steps too. */
  public Extreme least(StateFunction function) {
    Extreme peak = peak((time, state) -> -function.at(time, state));
    return new Extreme(peak.time(), -peak.value());
  }

  /** The first time at which it has a value, or empty where it never does. */
  public OptionalDouble firstTime(StateFunction function, double value) {
    double start = first(function);
    if (start == value) {
      return OptionalDouble.of(0);
    }
    Condition reached =
        start < value
            ? Condition.atLeastZero((time, state) -> function.at(time, state) - value)
            : Condition.atLeastZero((time, state) -> value - function.at(time, state));
    for (Piece piece : pieces) {
      OptionalDouble turn = Turn.on(piece, reached, false);
      if (turn.isPresent()) {
        return turn;
      }
    }
    return OptionalDouble.empty();
  }

  /** Its mean over time. */
  public double mean(StateFunction function) {
    return duration() == 0 ? first(function) : integral(function) / duration();
  }

  /** The root of the mean of its square over time. */
  public double rms(StateFunction function) {
    StateFunction square =
        (time, state) -> {
          double value = function.at(time, state);
          return value * value;
        };
    return Math.sqrt(mean(square));
  }

  /** Its integral over time. */
  public double integral(StateFunction function) {
    double sum = 0;
    for (Piece piece : pieces) {
      if (piece.end() > piece.start()) {
        GaussIntegrator rule = QUADRATURE.legendre(QUADRATURE_POINTS, piece.start(), piece.end());
        sum += rule.integrate(time -> function.at(time, piece.state(time)));
      }
    }
    return sum;
  }

  private Kept kept(Motion.Conserved conserved) {
    double start = first(conserved.value());
    double change = 0;
    double scale = 0;
    for (Piece piece : pieces) {
      for (int i = 0; i < Piece.POINTS; i++) {
        double value = conserved.value().at(piece.time(i), piece.state(i));
        change = Math.max(change, Math.abs(value - start));
        scale = Math.max(scale, conserved.scale().at(piece.time(i), piece.state(i)));
      }
    }
    return new Kept(conserved.name(), start, change, scale);
  }

  /** A function at all points of all pieces, those that two pieces share once. */
  private final class Samples {
    private final StateFunction function;
    private final double[] times;
    private final double[] values;

    Samples(StateFunction function) {
      this.function = function;
      int apart = Piece.POINTS - 1;
      this.times = new double[pieces.size() * apart + 1];
      this.values = new double[times.length];
      for (int k = 0; k < times.length; k++) {
        Piece piece = pieces.get(Math.min(k / apart, pieces.size() - 1));
        int point = k - apart * Math.min(k / apart, pieces.size() - 1);
        times[k] = piece.time(point);
        values[k] = function.at(times[k], piece.state(point));
      }
    }

    Extreme peak() {
      int best = 0;
      for (int k = 1; k < values.length; k++) {
        best = values[k] > values[best] ? k : best;
      }
      var peak = new Extreme(times[best], values[best]);
      for (int k = 0; k < values.length; k++) {
        if (mayExceed(k, peak.value())) {
          Extreme refined = refined(k);
          peak = refined.value() > peak.value() ? refined : peak;
        }
      }
      return peak;
    }

    /** Whether a smooth curve with a top near a sample may rise above a value there. */
    private boolean mayExceed(int k, double value) {
      double before = values[Math.max(k - 1, 0)];
      double behind = values[Math.min(k + 1, values.length - 1)];
      double here = values[k];
      return here >= before && here >= behind && here + (here - Math.min(before, behind)) > value;
    }

    private Extreme refined(int k) {
      double from = times[Math.max(k - 1, 0)];
      double to = times[Math.min(k + 1, times.length - 1)];
      if (from == to) {
        return new Extreme(times[k], values[k]);
      }
      UnivariateFunction inTime = time -> value(function, time);
      UnivariatePointValuePair top =
          new BrentOptimizer(1e-12, 1e-9 * (to - from))
              .optimize(
                  new MaxEval(200),
                  new UnivariateObjectiveFunction(inTime),
                  GoalType.MAXIMIZE,
                  new SearchInterval(
                      from, to, times[k] > from && times[k] < to ? times[k] : (from + to) / 2));
      return new Extreme(top.getPoint(), top.getValue());
    }
  }
}
