package whorl.mechanics.gyro;

import java.util.Arrays;

/**
 * How the axis of a top nods between two angles while it goes round.
 *
 * <p>Between them the height {@code u = cos θ} obeys {@code u'² = (2 m g l/A) (u − u₁)(u₂ − u)(u₃ −
 * u)}, whose period is a complete elliptic integral.
 *
 * @param highest the least lean θ, in rad
 * @param lowest the largest lean θ, in rad
 * @param period time from the highest place to the next, in s
 * @param precessionPerPeriod angle that the axis goes round in that time, in rad
 */
public record Nutation(double highest, double lowest, double period, double precessionPerPeriod) {
  /** Points of the quadrature; it converges faster than any power of them. */
  private static final int POINTS = 400;

  /** The mean rate at which the axis goes round, in rad/s. */
  public double meanPrecession() {
    return precessionPerPeriod / period;
  }

  /**
   * The nutation with given integrals.
   *
   * @param axial angular momentum about the axis, {@code C ω₃}
   * @param vertical angular momentum about the vertical
   * @param kinetic kinetic energy less that of the spin, at the height
   * @param height cos θ at some time
   */
  static Nutation of(
      SymmetricTop top, double axial, double vertical, double kinetic, double height) {
    double inertia = top.atPivot();
    double weight = top.weightMoment();
    double[] heights = heights(top, axial, vertical, kinetic, height);
    double low = heights[0];
    double high = heights[1];
    double beyond = heights[2];
    double time = Math.sqrt(inertia / (2 * weight));
    double period =
        4 * time / Math.sqrt(beyond - low) * quarterPeriod((high - low) / (beyond - low));
    double round = 0;
    for (int i = 0; i < POINTS; i++) {
      double sine = Math.sin(Math.PI / 2 * (i + 0.5) / POINTS);
      double u = low + (high - low) * sine * sine;
      round += (vertical - axial * u) / (inertia * (1 - u * u)) * 2 * time / Math.sqrt(beyond - u);
    }
    return new Nutation(
        Math.acos(Math.min(1, high)),
        Math.acos(Math.max(-1, low)),
        period,
        2 * round * Math.PI / 2 / POINTS);
  }

  /**
   * The heights where the axis turns, and the third root. They are the roots of {@code (1 − u²)(2 T
   * + 2 m g l (h − u)) A − (p − L u)² = 0}, all of them real.
   */
  private static double[] heights(
      SymmetricTop top, double axial, double vertical, double kinetic, double height) {
    double scale = 2 * top.weightMoment() * top.atPivot();
    double energy = 2 * kinetic * top.atPivot() / scale + height;
    // u³ + b u² + c u + d with the leading coefficient taken out
    double b = -energy - axial * axial / scale;
    double c = 2 * vertical * axial / scale - 1;
    double d = energy - vertical * vertical / scale;
    double shift = b / 3;
    double p = Math.max(0, shift * shift - c / 3);
    double q = shift * shift * shift - shift * c / 2 + d / 2;
    double size = Math.sqrt(p);
    double cosine = size == 0 ? 0 : Math.max(-1, Math.min(1, -q / (p * size)));
    double angle = Math.acos(cosine) / 3;
    double[] roots = {
      polished(2 * size * Math.cos(angle + 2 * Math.PI / 3) - shift, b, c, d),
      polished(2 * size * Math.cos(angle - 2 * Math.PI / 3) - shift, b, c, d),
      2 * size * Math.cos(angle) - shift
    };
    Arrays.sort(roots);
    return roots;
  }

  /** Steps of Newton, which win back the digits lost where the third root is far away. */
  private static double polished(double root, double b, double c, double d) {
    double u = root;
    for (int i = 0; i < 3; i++) {
      double value = ((u + b) * u + c) * u + d;
      double slope = (3 * u + 2 * b) * u + c;
      double next = slope == 0 ? u : u - value / slope;
      // Near a double root the slope is rounding only.
      u = Math.abs(next - u) < 1e-6 ? next : u;
    }
    return u;
  }

  /** The complete elliptic integral K of the first kind, by the arithmetic-geometric mean. */
  private static double quarterPeriod(double parameter) {
    double a = 1;
    double g = Math.sqrt(1 - parameter);
    while (a - g > 1e-15 * a) {
      double mean = (a + g) / 2;
      g = Math.sqrt(a * g);
      a = mean;
    }
    return Math.PI / (2 * a);
  }
}
