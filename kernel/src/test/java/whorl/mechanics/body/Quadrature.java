package whorl.mechanics.body;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import whorl.mechanics.reference.InertiaTensor;

/**
 * Measure, centre and inertia by plain numerical integration over a shape that is swept out by up
 * to three parameters from 0 to 1. It knows no formula of any shape: the element of volume, area or
 * length comes from differences of the position.
 */
record Quadrature(double measure, Vector3D centre, InertiaTensor perMass) {
  private static final double[] NODES = new double[28];
  private static final double[] WEIGHTS = new double[28];
  private static final double STEP = 2e-3;

  static {
    GaussIntegrator rule = new GaussIntegratorFactory().legendre(NODES.length, 0, 1);
    for (int i = 0; i < NODES.length; i++) {
      NODES[i] = rule.getPoint(i);
      WEIGHTS[i] = rule.getWeight(i);
    }
  }

  /** A position for three parameters. */
  interface Swept {
    Vector3D at(double u, double v, double w);
  }

  static Quadrature solid(Swept... parts) {
    return over(3, parts);
  }

  static Quadrature surface(Swept... parts) {
    return over(2, parts);
  }

  static Quadrature line(Swept... parts) {
    return over(1, parts);
  }

  private static Quadrature over(int dimensions, Swept... parts) {
    double[] sums = new double[10];
    for (Swept part : parts) {
      for (int i = 0; i < NODES.length; i++) {
        for (int j = 0; j < (dimensions > 1 ? NODES.length : 1); j++) {
          for (int k = 0; k < (dimensions > 2 ? NODES.length : 1); k++) {
            double weight =
                WEIGHTS[i] * (dimensions > 1 ? WEIGHTS[j] : 1) * (dimensions > 2 ? WEIGHTS[k] : 1);
            add(sums, part, dimensions, weight, NODES[i], NODES[j], NODES[k]);
          }
        }
      }
    }
    double m = sums[0];
    Vector3D c = new Vector3D(sums[1] / m, sums[2] / m, sums[3] / m);
    InertiaTensor about =
        InertiaTensor.fromProducts(
            (sums[5] + sums[6]) / m,
            (sums[4] + sums[6]) / m,
            (sums[4] + sums[5]) / m,
            sums[7] / m,
            sums[8] / m,
            sums[9] / m);
    return new Quadrature(m, c, about.minus(InertiaTensor.ofPoint(1, c)));
  }

  private static void add(
      double[] sums, Swept part, int dimensions, double weight, double u, double v, double w) {
    Vector3D p = part.at(u, v, w);
    double element = weight * element(part, dimensions, u, v, w);
    double x = p.getX();
    double y = p.getY();
    double z = p.getZ();
    double[] terms = {1, x, y, z, x * x, y * y, z * z, x * y, y * z, z * x};
    for (int i = 0; i < terms.length; i++) {
      sums[i] += element * terms[i];
    }
  }

  private static double element(Swept part, int dimensions, double u, double v, double w) {
    List<Vector3D> d =
        List.of(
            slope(s -> part.at(u + s, v, w)),
            slope(s -> part.at(u, v + s, w)),
            slope(s -> part.at(u, v, w + s)));
    return switch (dimensions) {
      case 1 -> d.get(0).getNorm();
      case 2 -> d.get(0).crossProduct(d.get(1)).getNorm();
      default -> Math.abs(d.get(0).crossProduct(d.get(1)).dotProduct(d.get(2)));
    };
  }

  private interface Path {
    Vector3D at(double s);
  }

  /** The derivative at zero by central differences of the sixth order. */
  private static Vector3D slope(Path path) {
    return difference(path, STEP)
        .scalarMultiply(45)
        .subtract(difference(path, 2 * STEP).scalarMultiply(9))
        .add(difference(path, 3 * STEP))
        .scalarMultiply(1 / (60 * STEP));
  }

  private static Vector3D difference(Path path, double s) {
    return path.at(s).subtract(path.at(-s));
  }
}
