package whorl.mechanics.body;

import java.util.OptionalDouble;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.InertiaTensor;

/**
 * The homogeneous shapes of the trade. Lengths are in m. Each stands with its centre of mass at the
 * origin and its axis along z; {@link Shape#datum} tells where its natural origin is from there.
 */
public final class Shapes {
  private Shapes() {}

  /**
   * A solid cylinder: {@code V = π R² h}; about its axis {@code m R²/2}, about a diameter through
   * the centre {@code m (3 R² + h²)/12}.
   *
   * @param diameter 2 R
   * @param length h
   */
  public static Shape solidCylinder(double diameter, double length) {
    return cylinder(
        "solid cylinder", positive("diameter", diameter), 0, positive("length", length));
  }

  /**
   * A cylinder with a bore of the same axis: {@code V = π (R² − r²) h}; about its axis {@code m (R²
   * + r²)/2}, about a diameter through the centre {@code m (3 (R² + r²) + h²)/12}.
   *
   * @param diameter 2 R
   * @param bore 2 r
   * @param length h
   * @throws Refusal where the bore is not smaller than the diameter
   */
  public static Shape hollowCylinder(double diameter, double bore, double length) {
    positive("diameter", diameter);
    demandSmaller("bore", positive("bore", bore), "diameter", diameter);
    return cylinder("hollow cylinder", diameter, bore, positive("length", length));
  }

  private static Shape cylinder(String name, double diameter, double bore, double length) {
    double outer = diameter / 2;
    double inner = bore / 2;
    double sum = outer * outer + inner * inner;
    double across = (3 * sum + length * length) / 12;
    // As a product of sum and difference, so that a thin wall keeps its digits.
    double volume = Math.PI * (outer - inner) * (outer + inner) * length;
    return centred(name, InertiaTensor.diagonal(across, across, sum / 2), volume);
  }

  private static Shape centred(String name, InertiaTensor perMass, double volume) {
    return new Shape(name, perMass, OptionalDouble.of(volume), Vector3D.ZERO);
  }

  private static double positive(String subject, double value) {
    return Given.positive(subject, value, "m");
  }

  private static void demandSmaller(String inner, double bore, String outer, double diameter) {
    if (!(bore < diameter)) {
      throw new Refusal(
          inner,
          "The "
              + inner
              + ", "
              + Given.text(bore, "m")
              + ", is not smaller than the "
              + outer
              + ", "
              + Given.text(diameter, "m")
              + "; no material is left.",
          "Check which is which, and whether one is a radius.");
    }
  }
}
