package whorl.mechanics.body;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.InertiaTensor;

/**
 * Idealised shapes without thickness: points, lines and surfaces of evenly spread mass. They have
 * no volume, so they take a mass and no density. Lengths are in m; formulas are about the centre of
 * mass, which is the origin; the axis is along z. Round shells are open at their ends.
 *
 * <p>All throw {@link Refusal} for a length that is not positive.
 */
public final class ThinShapes {
  private ThinShapes() {}

  /** A point mass, of no inertia about itself. */
  public static Shape point() {
    return thin(
        "point mass", InertiaTensor.ZERO, 0, () -> Outline.wire(List.of(Vector3D.ZERO), false));
  }

  /**
   * A thin straight rod along z: across it {@code m l²/12}, about itself none.
   *
   * @param length l
   */
  public static Shape rod(double length) {
    double l = Lengths.positive("length", length);
    Vector3D end = new Vector3D(0, 0, l / 2);
    return round(
        "thin rod", 0, l * l / 12, 0, () -> Outline.wire(List.of(end.negate(), end), false));
  }

  /**
   * A thin ring: about its axis {@code m R²}, about a diameter {@code m R²/2}.
   *
   * @param diameter 2 R
   */
  public static Shape ring(double diameter) {
    double r = Lengths.positive("diameter", diameter) / 2;
    return round("thin ring", r * r, r * r / 2, 0, () -> Outline.wire(Profiles.circle(r), true));
  }

  /**
   * A thin disc: about its axis {@code m R²/2}, about a diameter {@code m R²/4}.
   *
   * @param diameter 2 R
   */
  public static Shape disc(double diameter) {
    double r = Lengths.positive("diameter", diameter) / 2;
    return round(
        "thin disc",
        r * r / 2,
        r * r / 4,
        0,
        () -> Outline.sheet(Facets.revolved(List.of(Profiles.at(r, 0), Profiles.at(0, 0)), false)));
  }

  /**
   * A thin rectangular plate: about its normal {@code m (a² + b²)/12}, about x {@code m b²/12}.
   *
   * @param x a, the length along x
   * @param y b, the length along y
   */
  public static Shape plate(double x, double y) {
    double a = Lengths.positive("x", x);
    double b = Lengths.positive("y", y);
    return thin(
        "thin plate",
        InertiaTensor.diagonal(b * b / 12, a * a / 12, (a * a + b * b) / 12),
        0,
        () -> Outline.sheet(Facets.flat(Profiles.rectangle(-a / 2, a / 2, -b / 2, b / 2))));
  }

  /**
   * A thin plate of any outline.
   *
   * @param outline in the plane of x and y; its origin is the {@link Shape#datum}
   */
  public static Shape plate(Contour outline) {
    Section section = Section.of(outline);
    return new Shape(
        "thin plate",
        section.perMass(),
        OptionalDouble.empty(),
        section.origin(),
        () -> Outline.sheet(Facets.flat(section.centred(outline.polygon()))));
  }

  /**
   * A thin cylindrical shell: about its axis {@code m R²}, about a diameter {@code m (R²/2 +
   * h²/12)}.
   *
   * @param diameter 2 R
   * @param length h
   */
  public static Shape tube(double diameter, double length) {
    double r = Lengths.positive("diameter", diameter) / 2;
    double h = Lengths.positive("length", length);
    return round(
        "thin tube",
        r * r,
        r * r / 2 + h * h / 12,
        0,
        () ->
            Outline.sheet(
                Facets.revolved(List.of(Profiles.at(r, -h / 2), Profiles.at(r, h / 2)), false)));
  }

  /**
   * A thin conical shell without base: the centre of mass {@code h/3} above the base; about its
   * axis {@code m R²/2}, across {@code m (R²/4 + h²/18)}.
   *
   * @param diameter 2 R, of the base
   * @param height h
   */
  public static Shape cone(double diameter, double height) {
    double r = Lengths.positive("diameter", diameter) / 2;
    return shell("thin cone", r, 0, Lengths.positive("height", height));
  }

  /**
   * A thin conical shell whose tip is cut off, R at the base and r at the top: the centre of mass
   * {@code h (R + 2 r)/(3 (R + r))} above the base; about its axis {@code m (R² + r²)/2}, across
   * half of that and {@code m h² (R² + 4 R r + r²)/(18 (R + r)²)}.
   *
   * @param diameter 2 R, of the base
   * @param top 2 r, of the top
   * @param height h
   */
  public static Shape frustum(double diameter, double top, double height) {
    return shell(
        "thin frustum",
        Lengths.positive("diameter", diameter) / 2,
        Lengths.positive("top", top) / 2,
        Lengths.positive("height", height));
  }

  private static Shape shell(String name, double a, double b, double h) {
    double sum = a + b;
    double axial = (a * a + b * b) / 2;
    double along = h * h * (a * a + 4 * a * b + b * b) / (18 * sum * sum);
    return round(
        name,
        axial,
        axial / 2 + along,
        h * (a + 2 * b) / (3 * sum),
        () -> Outline.sheet(Facets.revolved(List.of(Profiles.at(a, 0), Profiles.at(b, h)), false)));
  }

  /**
   * A thin spherical shell: about any diameter {@code 2/3 m R²}.
   *
   * @param diameter 2 R
   */
  public static Shape sphere(double diameter) {
    double r = Lengths.positive("diameter", diameter) / 2;
    double about = 2 * r * r / 3;
    return round(
        "thin sphere",
        about,
        about,
        0,
        () -> Outline.sheet(Facets.revolved(Profiles.halfCircle(r), false)));
  }

  /**
   * A thin cap, cut off a spherical shell by a plane: the centre of mass {@code h/2} above the
   * base; about its axis {@code m h (R − h/3)}, across {@code m h (R/2 − h/12)}.
   *
   * @param diameter 2 R, of the sphere
   * @param height h, at most 2 R
   */
  public static Shape sphericalCap(double diameter, double height) {
    Lengths.demandWithin(height, diameter);
    double r = diameter / 2;
    double h = height;
    return round(
        "thin spherical cap",
        h * (r - h / 3),
        h * (r / 2 - h / 12),
        h / 2,
        () -> Outline.sheet(Facets.revolved(Profiles.cap(r, h, false), false)));
  }

  /**
   * A thin torus, hollow: about its axis {@code m (R² + 3/2 a²)}, about a diameter {@code m (R²/2 +
   * 5/4 a²)}.
   *
   * @param diameter 2 R, of the circle through the middle of the section
   * @param section 2 a, of the section; at most 2 R
   */
  public static Shape torus(double diameter, double section) {
    Lengths.demandHole(section, diameter);
    double r = diameter / 2;
    double a = section / 2;
    return round(
        "thin torus",
        r * r + 1.5 * a * a,
        r * r / 2 + 1.25 * a * a,
        0,
        () -> Outline.sheet(Facets.revolved(Profiles.fullCircle(r, a), true)));
  }

  private static Shape round(
      String name, double axial, double across, double centre, Supplier<Outline> drawn) {
    return thin(name, InertiaTensor.diagonal(across, across, axial), centre, drawn);
  }

  private static Shape thin(
      String name, InertiaTensor perMass, double centre, Supplier<Outline> drawn) {
    Vector3D datum = new Vector3D(0, 0, -centre);
    return new Shape(
        name,
        perMass,
        OptionalDouble.empty(),
        datum,
        () -> drawn.get().mapped(v -> v.add(datum), false));
  }
}
