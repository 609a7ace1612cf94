package whorl.eval;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.SplittableRandom;
import whorl.check.Operation;
import whorl.check.Operation.Real;

/**
 * Five formulas for a disc flywheel on a shaft, over a million rows, and the same five as a loop
 * written by hand. The six quantities that vary are, by slot: mass m in kg, diameter D in m,
 * angular velocity ω in rad/s, torque T in N·m, density ρ in kg/m³, torsional stiffness k in
 * N·m/rad. Poisson's ratio ν, in the slot behind them, is fixed.
 */
final class FlywheelFormulas {
  static final int ROWS = 1_000_000;
  static final int RESULTS = 5;
  static final BitSet VARYING = new BitSet();
  static final double[] FRAME = {0, 0, 0, 0, 0, 0, 0.3};

  private static final int COLUMNS = 6;
  private static final double[] LEAST = {300, 0.6, 300, 200, 7700, 1e4};
  private static final double[] MOST = {500, 1.1, 800, 400, 7900, 4e4};

  static {
    VARYING.set(0, COLUMNS);
  }

  private FlywheelFormulas() {}

  /** The five formulas as the checker hands them on. */
  static BlockProgram program() {
    Real mass = Written.input(0);
    Real radius = Written.quotient(Written.input(1), Written.constant(2));
    Real omega = Written.input(2);
    Real half = Written.constant(0.5);
    // I = 1/2 m (D/2)^2
    Real inertia = Written.product(half, mass, Written.power(radius, 2));
    // E = 1/2 I ω^2
    Real energy = Written.product(half, inertia, Written.power(omega, 2));
    // t = I ω / T
    Real momentum = Written.product(inertia, omega);
    Real stopping = Written.quotient(momentum, Written.input(3));
    // σ = (3 + ν)/8 ρ ω^2 (D/2)^2, both stresses at the centre of a thin solid disc
    Real stress =
        Written.product(
            Written.quotient(
                Written.sum(Written.constant(3), Written.input(6)), Written.constant(8)),
            Written.input(4),
            Written.power(omega, 2),
            Written.power(radius, 2));
    // ω_t = sqrt(k / I), torsional angular frequency
    Real torsional =
        Written.unary(Operation.UnaryFunction.SQRT, Written.quotient(Written.input(5), inertia));
    return BlockProgram.compile(
        List.of(momentum, energy, stopping, stress, torsional), FRAME.length, VARYING);
  }

  /** Columns of plausible numbers. */
  static double[][] columns() {
    SplittableRandom random = new SplittableRandom(7031);
    double[][] columns = new double[COLUMNS][ROWS];
    for (int i = 0; i < COLUMNS; i++) {
      double least = LEAST[i];
      double most = MOST[i];
      Arrays.setAll(columns[i], row -> random.nextDouble(least, most));
    }
    return columns;
  }

  /** The same five results by hand, for the rows from a first to one behind the last. */
  static void byHand(double[][] columns, double ratio, int from, int to, double[][] results) {
    double[] m = columns[0];
    double[] d = columns[1];
    double[] omega = columns[2];
    double[] torque = columns[3];
    double[] rho = columns[4];
    double[] k = columns[5];
    double[] momentum = results[0];
    double[] energy = results[1];
    double[] stopping = results[2];
    double[] stress = results[3];
    double[] torsional = results[4];
    double factor = (3 + ratio) / 8;
    for (int i = from; i < to; i++) {
      double r = d[i] / 2;
      double rr = r * r;
      double ww = omega[i] * omega[i];
      double inertia = 0.5 * m[i] * rr;
      momentum[i] = inertia * omega[i];
      energy[i] = 0.5 * inertia * ww;
      stopping[i] = inertia * omega[i] / torque[i];
      stress[i] = factor * rho[i] * ww * rr;
      torsional[i] = Math.sqrt(k[i] / inertia);
    }
  }
}
