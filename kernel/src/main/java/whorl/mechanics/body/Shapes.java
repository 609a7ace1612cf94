package whorl.mechanics.body;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Supplier;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.exception.MaxCountExceededException;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.InertiaTensor;

/**
 * The homogeneous solids of the trade. Lengths are in m; formulas are about the centre of mass.
 * Each shape stands with its centre of mass at the origin and its axis along z. {@link Shape#datum}
 * tells where its natural origin is from there: the middle of the base of a cone, a frustum and a
 * cap, the origin of the coordinates of an outline or a profile, otherwise the centre itself.
 *
 * <p>All throw {@link Refusal} for a length that is not positive.
 */
public final class Shapes {
  private static final double ACCURACY = 1e-12;

  private Shapes() {}

  /**
   * A solid cylinder: {@code V = π R² h}; about its axis {@code m R²/2}, about a diameter {@code m
   * (3 R² + h²)/12}.
   *
   * @param diameter 2 R
   * @param length h
   */
  public static Shape solidCylinder(double diameter, double length) {
    return cylinder("solid cylinder", Lengths.positive("diameter", diameter), 0, length);
  }

  /**
   * A cylinder with a bore of the same axis: {@code V = π (R² − r²) h}; about its axis {@code m (R²
   * + r²)/2}, about a diameter {@code m (3 (R² + r²) + h²)/12}.
   *
   * @param diameter 2 R
   * @param bore 2 r
   * @param length h
   * @throws Refusal where the bore is not smaller than the diameter
   */
  public static Shape hollowCylinder(double diameter, double bore, double length) {
    Lengths.demandWall(bore, diameter);
    return cylinder("hollow cylinder", diameter, bore, length);
  }

  private static Shape cylinder(String name, double diameter, double bore, double length) {
    double h = Lengths.positive("length", length);
    double outer = diameter / 2;
    double inner = bore / 2;
    double sum = outer * outer + inner * inner;
    // As a product of sum and difference, so that a thin wall keeps its digits.
    double volume = Math.PI * (outer - inner) * (outer + inner) * h;
    return symmetric(
        name,
        sum / 2,
        sum / 4 + h * h / 12,
        volume,
        0,
        () -> Facets.revolved(Profiles.rectangle(inner, outer, -h / 2, h / 2), bore > 0));
  }

  /**
   * A solid sphere: {@code V = 4/3 π R³}; about any diameter {@code 2/5 m R²}.
   *
   * @param diameter 2 R
   */
  public static Shape solidSphere(double diameter) {
    return sphere("solid sphere", Lengths.positive("diameter", diameter), 0);
  }

  /**
   * A sphere with a concentric hollow: {@code V = 4/3 π (R³ − r³)}; about any diameter {@code 2/5 m
   * (R⁵ − r⁵)/(R³ − r³)}.
   *
   * @param diameter 2 R
   * @param bore 2 r, the inner diameter
   * @throws Refusal where the inner diameter is not smaller than the outer
   */
  public static Shape hollowSphere(double diameter, double bore) {
    Lengths.demandWall(bore, diameter);
    return sphere("hollow sphere", diameter, bore);
  }

  private static Shape sphere(String name, double diameter, double bore) {
    double a = diameter / 2;
    double b = bore / 2;
    // Both differences of powers divided by R − r, so that a thin wall keeps its digits.
    double cubes = a * a + a * b + b * b;
    double fifths = a * a * a * a + a * b * (a * a + a * b + b * b) + b * b * b * b;
    double about = 0.4 * fifths / cubes;
    return new Shape(
        name,
        InertiaTensor.diagonal(about, about, about),
        OptionalDouble.of(4 / 3.0 * Math.PI * (a - b) * cubes),
        Vector3D.ZERO,
        () -> b == 0 ? ball(a) : ball(a).without(ball(b)));
  }

  private static Outline ball(double radius) {
    return Outline.solid(Facets.revolved(Profiles.halfCircle(radius), false));
  }

  /**
   * A solid cap, cut off a sphere by a plane: {@code V = π h² (3 R − h)/3}; the centre of mass
   * {@code h (4 R − h)/(4 (3 R − h))} above the base; about its axis {@code m h (20 R² − 15 R h + 3
   * h²)/(10 (3 R − h))}; about an axis across half of that and {@code m h² (40 R² − 24 R h + 3
   * h²)/(80 (3 R − h)²)}.
   *
   * @param diameter 2 R, of the sphere
   * @param height h, at most 2 R
   */
  public static Shape sphericalCap(double diameter, double height) {
    Lengths.demandWithin(height, diameter);
    double r = diameter / 2;
    double h = height;
    double three = 3 * r - h;
    double axial = h * (20 * r * r - 15 * r * h + 3 * h * h) / (10 * three);
    double along = h * h * (40 * r * r - 24 * r * h + 3 * h * h) / (80 * three * three);
    double centre = h * (4 * r - h) / (4 * three);
    return symmetric(
        "spherical cap",
        axial,
        axial / 2 + along,
        Math.PI * h * h * three / 3,
        centre,
        () -> Facets.revolved(Profiles.cap(r, h, true), false));
  }

  /**
   * A solid right circular cone: {@code V = π R² h/3}; the centre of mass {@code h/4} above the
   * base; about its axis {@code 3/10 m R²}, across {@code 3/80 m (4 R² + h²)}. The apex points
   * along z.
   *
   * @param diameter 2 R, of the base
   * @param height h
   */
  public static Shape cone(double diameter, double height) {
    return taper("cone", Lengths.positive("diameter", diameter), 0, height);
  }

  /**
   * A solid cone whose tip is cut off, R at the base and r at the top: {@code V = π h S/3} with
   * {@code S = R² + R r + r²}; the centre of mass {@code h (R² + 2 R r + 3 r²)/(4 S)} above the
   * base; about its axis {@code 3/10 m (R⁵ − r⁵)/(R³ − r³)}; across half of that and {@code 3/80 m
   * h² (R⁴ + 4 R³ r + 10 R² r² + 4 R r³ + r⁴)/S²}.
   *
   * @param diameter 2 R, of the base
   * @param top 2 r, of the top
   * @param height h
   */
  public static Shape frustum(double diameter, double top, double height) {
    return taper(
        "frustum", Lengths.positive("diameter", diameter), Lengths.positive("top", top), height);
  }

  private static Shape taper(String name, double diameter, double top, double height) {
    double h = Lengths.positive("height", height);
    double a = diameter / 2;
    double b = top / 2;
    double s = a * a + a * b + b * b;
    double fourth = a * a * a * a + b * b * b * b;
    double axial = 0.3 * (fourth + a * b * s) / s;
    double across = fourth + a * b * (4 * a * a + 10 * a * b + 4 * b * b);
    double along = 3 * h * h * across / (80 * s * s);
    double centre = h * (a * a + 2 * a * b + 3 * b * b) / (4 * s);
    List<Vector2D> profile =
        List.of(Profiles.at(0, 0), Profiles.at(a, 0), Profiles.at(b, h), Profiles.at(0, h));
    return symmetric(
        name,
        axial,
        axial / 2 + along,
        Math.PI * h * s / 3,
        centre,
        () -> Facets.revolved(b == 0 ? profile.subList(0, 3) : profile, false));
  }

  /**
   * A rectangular block: about x {@code m (b² + c²)/12} with b and c the lengths along the other
   * axes.
   *
   * @param x length along x
   * @param y length along y
   * @param z length along z
   */
  public static Shape box(double x, double y, double z) {
    double a = Lengths.positive("x", x);
    double b = Lengths.positive("y", y);
    double c = Lengths.positive("z", z);
    return new Shape(
        "box",
        InertiaTensor.diagonal((b * b + c * c) / 12, (c * c + a * a) / 12, (a * a + b * b) / 12),
        OptionalDouble.of(a * b * c),
        Vector3D.ZERO,
        () ->
            Outline.solid(
                Facets.prism(Profiles.rectangle(-a / 2, a / 2, -b / 2, b / 2), -c / 2, c / 2)));
  }

  /**
   * A solid ellipsoid: {@code V = 4/3 π a b c}; about x {@code m (b² + c²)/5}.
   *
   * @param a half the length along x
   * @param b half the length along y
   * @param c half the length along z
   */
  public static Shape ellipsoid(double a, double b, double c) {
    Lengths.positive("a", a);
    Lengths.positive("b", b);
    Lengths.positive("c", c);
    return new Shape(
        "ellipsoid",
        InertiaTensor.diagonal((b * b + c * c) / 5, (c * c + a * a) / 5, (a * a + b * b) / 5),
        OptionalDouble.of(4 / 3.0 * Math.PI * a * b * c),
        Vector3D.ZERO,
        () -> ball(1).mapped(v -> new Vector3D(a * v.getX(), b * v.getY(), c * v.getZ()), false));
  }

  /**
   * A solid torus of circular section: {@code V = 2 π² R a²}; about its axis {@code m (R² + 3/4
   * a²)}, about a diameter {@code m (R²/2 + 5/8 a²)}.
   *
   * @param diameter 2 R, of the circle through the middle of the section
   * @param section 2 a, of the section; at most 2 R
   */
  public static Shape torus(double diameter, double section) {
    Lengths.demandHole(section, diameter);
    double r = diameter / 2;
    double a = section / 2;
    return symmetric(
        "torus",
        r * r + 0.75 * a * a,
        r * r / 2 + 0.625 * a * a,
        2 * Math.PI * Math.PI * r * a * a,
        0,
        () -> Facets.revolved(Profiles.fullCircle(r, a), true));
  }

  /**
   * A right prism: an outline in the plane of x and y, drawn out along z. With A, the second
   * moments of the area about its centroid divided by A are exact for polygons and arcs.
   *
   * @param outline the outline; its origin is the {@link Shape#datum}, at half the length
   * @param length along z
   */
  public static Shape prism(Contour outline, double length) {
    double h = Lengths.positive("length", length);
    Section section = Section.of(outline);
    double sixth = h * h / 12;
    return new Shape(
        "prism",
        section.perMass().plus(InertiaTensor.diagonal(sixth, sixth, 0)),
        OptionalDouble.of(outline.area() * h),
        section.origin(),
        () -> Outline.solid(Facets.prism(section.centred(outline.polygon()), -h / 2, h / 2)));
  }

  /**
   * A solid of revolution: half a section, in the plane of radius (first coordinate) and z,
   * revolved about the z axis. {@code V = 2π ∫ r dA}; about the axis {@code ρ 2π ∫ r³ dA}; exact
   * for straight pieces and arcs.
   *
   * @param profile the half section; radii are not negative
   * @throws Refusal where the profile crosses the axis
   */
  public static Shape revolved(Contour profile) {
    List<Vector2D> corners = profile.polygon();
    for (Vector2D corner : corners) {
      if (corner.getX() < 0) {
        throw new Refusal(
            "profile",
            "The profile crosses the axis: it has the radius "
                + Given.text(corner.getX(), "m")
                + " at z = "
                + Given.text(corner.getY(), "m")
                + ".",
            "Draw half of the section, on one side of the axis.");
      }
    }
    double r0 = profile.reference().getX();
    double z0 = profile.reference().getY();
    double volume = profile.integral((x, z) -> square(r0 + x) / 2);
    double first = profile.integral((x, z) -> square(r0 + x) / 2 * z);
    double second = profile.integral((x, z) -> square(r0 + x) / 2 * z * z);
    double axial = profile.integral((x, z) -> square(square(r0 + x)) / 4) / volume;
    double mean = first / volume;
    double along = second / volume - mean * mean;
    double centre = z0 + mean;
    return symmetric(
        "body of revolution",
        axial,
        axial / 2 + along,
        2 * Math.PI * volume,
        centre,
        () -> Facets.revolved(corners, true));
  }

  /**
   * A solid of revolution whose radius is a function of z: {@code V = π ∫ r² dz}; about the axis
   * {@code ρ π/2 ∫ r⁴ dz}; by adaptive quadrature to a share of 10⁻¹².
   *
   * @param radius r(z), in m; not negative and smooth
   * @param from the lower z
   * @param to the upper z
   */
  public static Shape revolved(DoubleUnaryOperator radius, double from, double to) {
    Given.finite("lower end", from, "m");
    if (!(Given.finite("upper end", to, "m") > from)) {
      throw new Refusal(
          "upper end",
          "The body ends at z = "
              + Given.text(to, "m")
              + ", which is not above its beginning, "
              + Given.text(from, "m")
              + ".",
          "Give the lower end first.");
    }
    double middle = (from + to) / 2;
    double half = (to - from) / 2;
    UnivariateFunction area =
        z -> square(Given.notNegative("radius", radius.applyAsDouble(middle + z), "m"));
    double volume = integral(area, half, Double.MIN_NORMAL);
    if (!(volume > 0)) {
      throw new Refusal("radius", "The radius is zero throughout, so there is no body.", "");
    }
    double mean = integral(z -> area.value(z) * z, half, volume * half) / volume;
    double along =
        integral(z -> area.value(z) * square(z - mean), half, volume * square(half)) / volume;
    double axial = integral(z -> square(area.value(z)), half, Double.MIN_NORMAL) / volume / 2;
    return symmetric(
        "body of revolution",
        axial,
        axial / 2 + along,
        Math.PI * volume,
        middle + mean,
        () -> Facets.revolved(Profiles.sampled(radius, from, to), false));
  }

  private static double integral(UnivariateFunction f, double half, double size) {
    try {
      return new IterativeLegendreGaussIntegrator(16, ACCURACY, ACCURACY * size, 1, 24)
          .integrate(1_000_000, f, -half, half);
    } catch (MaxCountExceededException notSettled) {
      throw new Refusal(
          "radius",
          "The radius does not run smoothly enough along z to be integrated.",
          "Make one body for each smooth part, and join them in an assembly.");
    }
  }

  private static double square(double value) {
    return value * value;
  }

  /** A solid of revolution about z whose centre of mass is at a height above its datum. */
  private static Shape symmetric(
      String name,
      double axial,
      double across,
      double volume,
      double centre,
      Supplier<Facets> drawn) {
    Vector3D datum = new Vector3D(0, 0, -centre);
    return new Shape(
        name,
        InertiaTensor.diagonal(across, across, axial),
        OptionalDouble.of(volume),
        datum,
        () -> Outline.solid(drawn.get()).mapped(v -> v.add(datum), false));
  }
}
