package whorl.mechanics.motion;

import java.util.Arrays;

/**
 * A stretch of a run, on which every state is a polynomial of degree 7 in time, held by its values
 * at eight Chebyshev points, both ends among them. Between the points it is worked out by the
 * barycentric formula, which keeps the last digits.
 *
 * <p>Source: J.-P. Berrut and L. N. Trefethen, Barycentric Lagrange interpolation, SIAM Review 46
 * (2004) 501, equations 4.2 and 5.4 (from memory).
 */
final class Piece {
  /** Points of a piece, and so one more than the degree. */
  static final int POINTS = 8;

  /** The points on a stretch from 0 to 1. */
  private static final double[] PLACES = places();

  private final double start;
  private final double end;
  private final double[][] states;

  private Piece(double start, double end, double[][] states) {
    this.start = start;
    this.end = end;
    this.states = states;
  }

  /** Gives the states at a time. */
  @FunctionalInterface
  interface States {
    double[] at(double time);
  }

  /**
   * The piece from one time to another whose states at the points are given; keeps none of them.
   */
  static Piece of(double start, double end, States given) {
    double[][] states = new double[POINTS][];
    for (int i = 0; i < POINTS; i++) {
      states[i] = given.at(time(start, end, i)).clone();
    }
    return new Piece(start, end, states);
  }

  private static double[] places() {
    double[] places = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      places[i] = (1 - Math.cos(Math.PI * i / (POINTS - 1))) / 2;
    }
    places[POINTS - 1] = 1;
    return places;
  }

  private static double time(double start, double end, int point) {
    return point == POINTS - 1 ? end : start + PLACES[point] * (end - start);
  }

  double start() {
    return start;
  }

  double end() {
    return end;
  }

  /** The time of a point. */
  double time(int point) {
    return time(start, end, point);
  }

  /** The states at a point; not to be written to. */
  double[] state(int point) {
    return states[point];
  }

  /** The states at a time, which should lie on the stretch. */
  double[] state(double time) {
    if (end == start) {
      return states[0].clone();
    }
    double place = (time - start) / (end - start);
    double[] sum = new double[states[0].length];
    double weights = 0;
    for (int i = 0; i < POINTS; i++) {
      double apart = place - PLACES[i];
      if (apart == 0) {
        return states[i].clone();
      }
      double weight = (i == 0 || i == POINTS - 1 ? 0.5 : 1) / (i % 2 == 0 ? apart : -apart);
      weights += weight;
      double[] state = states[i];
      for (int k = 0; k < sum.length; k++) {
        sum[k] += weight * state[k];
      }
    }
    for (int k = 0; k < sum.length; k++) {
      sum[k] /= weights;
    }
    return sum;
  }

  /** The part of it up to a time. */
  Piece until(double time) {
    return of(start, time, this::state);
  }

  @Override
  public String toString() {
    return start + " to " + end + " s: " + Arrays.toString(states[0]);
  }
}
