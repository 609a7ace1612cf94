package whorl.mechanics.body;

import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.InertiaTensor;

/**
 * A homogeneous shape of no mass yet, its centre of mass at the origin of its own axes.
 *
 * @param name what it is called in a message, such as {@code thin ring}
 * @param perMass inertia tensor about the centre of mass divided by the mass, in m²
 * @param volume in m³; none for what is thin
 * @param datum the origin of the coordinates that the shape is described in, such as the middle of
 *     the base of a cone, as seen from the centre of mass, in m
 * @param drawn makes what it looks like; only asked when that is wanted, for it takes longer than
 *     all the rest
 */
public record Shape(
    String name,
    InertiaTensor perMass,
    OptionalDouble volume,
    Vector3D datum,
    Supplier<Outline> drawn) {

  /**
   * The body of this shape with a mass in kg.
   *
   * @throws Refusal where the mass is not positive
   */
  public Body ofMass(double mass) {
    return new Body(this, Given.positive("mass", mass, "kg"));
  }

  /**
   * The body of this shape with a density in kg/m³.
   *
   * @throws Refusal where the density is not positive, or where the shape has no volume
   */
  public Body ofDensity(double density) {
    Given.positive("density", density, "kg/m³");
    if (volume.isEmpty()) {
      throw new Refusal(
          "density",
          "The " + name + " has no volume, so a density gives it no mass.",
          "Give its mass, or take a shape that has a thickness.");
    }
    return ofMass(density * volume.getAsDouble());
  }

  /** The shape with all lengths times a factor. */
  Shape scaled(double factor) {
    double cube = factor * factor * factor;
    return new Shape(
        name,
        perMass.times(factor * factor),
        volume.isPresent() ? OptionalDouble.of(cube * volume.getAsDouble()) : volume,
        datum.scalarMultiply(factor),
        () -> drawn.get().mapped(v -> v.scalarMultiply(factor), false));
  }

  /** The shape mirrored in its own plane x = 0. */
  Shape mirrored() {
    return new Shape(
        name,
        new InertiaTensor(
            perMass.xx(), perMass.yy(), perMass.zz(), -perMass.xy(), perMass.yz(), -perMass.zx()),
        volume,
        inX(datum),
        () -> drawn.get().mapped(Shape::inX, true));
  }

  private static Vector3D inX(Vector3D v) {
    return new Vector3D(-v.getX(), v.getY(), v.getZ());
  }
}
