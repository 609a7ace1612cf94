package whorl.laws;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.laws.LawBuilder.NumberOf;
import whorl.laws.LawBuilder.Of;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Contour;
import whorl.mechanics.body.Shape;
import whorl.mechanics.body.Shapes;
import whorl.mechanics.body.ThinShapes;
import whorl.mechanics.body.mesh.Mesh;

/** Shapes of the trade, each made into a body by its mass or its density. */
final class ShapeLaws {
  private static final String INTEGRAL = "volume integral over the homogeneous body";
  private static final String THIN = "integral over mass spread evenly, thickness neglected";

  /**
   * Thickness over size up to which neglecting it changes no moment of inertia by more than 1 %.
   */
  private static final double THINNESS = 0.1;

  private ShapeLaws() {}

  static List<Law> all() {
    return List.of(
        solidCylinder(),
        hollowCylinder(),
        solidSphere(),
        hollowSphere(),
        sphericalCap(),
        cone(),
        frustum(),
        box(),
        ellipsoid(),
        torus(),
        mesh(),
        prism(),
        revolved(),
        disc(),
        ring(),
        rod(),
        plate(),
        polygonalPlate(),
        tube(),
        thinSphere(),
        thinCap(),
        thinCone(),
        thinFrustum(),
        thinTorus());
  }

  private static LawBuilder law(String name, String title) {
    return new LawBuilder(Room.BODIES, name, title);
  }

  /** A body of a shape that has a volume: by its mass or its density. */
  private static Law solid(LawBuilder law, String expression, String value, Of<Shape> shape) {
    var need = new Need.OneOf("mass");
    int mass = law.count();
    law.number("mass", "m", "mass", "its mass", need);
    int density = law.count();
    law.number("density", "ρ", "density", "density of its material, m = ρ V", need);
    return law.source(INTEGRAL)
        .example(expression, value, "1e-9", "the formula, by hand")
        .gives(
            ThingSort.BODY,
            g ->
                g.has(mass)
                    ? shape.in(g).ofMass(g.number(mass))
                    : shape.in(g).ofDensity(g.number(density)));
  }

  /** A body of a shape without a volume: by its mass. */
  private static Law thin(LawBuilder law, String expression, String value, Of<Shape> shape) {
    NumberOf mass = law.number("mass", "m", "mass", "its mass");
    return law.source(THIN)
        .example(expression, value, "1e-9", "the formula, by hand")
        .gives(ThingSort.BODY, g -> shape.in(g).ofMass(mass.in(g)));
  }

  /** A thickness that is only given to judge whether the body is thin. */
  private static void thickness(
      LawBuilder law, String word, String symbol, String of, NumberOf size) {
    int index = law.count();
    law.number(
        word,
        symbol,
        "length",
        "given to judge whether it is thin",
        new Need.Optional("taken as thin"));
    law.valid(
        symbol + " ≤ " + of + "/10",
        g -> !g.has(index) || g.number(index) <= THINNESS * size.in(g));
  }

  private static Law solidCylinder() {
    var law = law("solid_cylinder", "solid cylinder");
    var diameter = law.diameter("diameter", "radius", "D", "outer diameter");
    var length = law.number("length", "h", "length", "length along the axis");
    return solid(
        law.formula("V = π D² h/4; I_z = m D²/8; I_x = m (3/4 D² + h²)/12"),
        "solid_cylinder(diameter = 400 mm, length = 60 mm, mass = 12 kg).inertia.zz",
        "0.24 kg·m²",
        g -> Shapes.solidCylinder(diameter.in(g), length.in(g)));
  }

  private static Law hollowCylinder() {
    var law = law("hollow_cylinder", "cylinder with a bore along its axis");
    var diameter = law.diameter("diameter", "radius", "D", "outer diameter");
    var bore = law.number("bore", "d", "length", "diameter of the bore");
    var length = law.number("length", "h", "length", "length along the axis");
    return solid(
        law.formula("V = π (D² − d²) h/4; I_z = m (D² + d²)/8; I_x = m (3/4 (D² + d²) + h²)/12"),
        "hollow_cylinder(diameter = 500 mm, bore = 300 mm, length = 100 mm, mass = 20 kg).inertia.zz",
        "0.85 kg·m²",
        g -> Shapes.hollowCylinder(diameter.in(g), bore.in(g), length.in(g)));
  }

  private static Law solidSphere() {
    var law = law("solid_sphere", "solid sphere");
    var diameter = law.diameter("diameter", "radius", "D", "outer diameter");
    return solid(
        law.formula("V = π D³/6; I = m D²/10"),
        "solid_sphere(diameter = 200 mm, mass = 10 kg).inertia.xx",
        "0.04 kg·m²",
        g -> Shapes.solidSphere(diameter.in(g)));
  }

  private static Law hollowSphere() {
    var law = law("hollow_sphere", "sphere with a concentric hollow");
    var diameter = law.diameter("diameter", "radius", "D", "outer diameter");
    var bore = law.number("bore", "d", "length", "diameter of the hollow");
    return solid(
        law.formula("V = π (D³ − d³)/6; I = m (D⁵ − d⁵)/(10 (D³ − d³))"),
        "hollow_sphere(diameter = 200 mm, bore = 100 mm, mass = 7 kg).inertia.xx",
        "0.031 kg·m²",
        g -> Shapes.hollowSphere(diameter.in(g), bore.in(g)));
  }

  private static Law sphericalCap() {
    var law = law("spherical_cap", "solid cap of a sphere");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the sphere, 2 R");
    var height = law.number("height", "h", "length", "height along the axis");
    return solid(
        law.formula("V = π h² (3 R − h)/3; I_z = m h (20 R² − 15 R h + 3 h²)/(10 (3 R − h))"),
        "spherical_cap(diameter = 200 mm, height = 100 mm, mass = 10 kg).inertia.zz",
        "0.04 kg·m²",
        g -> Shapes.sphericalCap(diameter.in(g), height.in(g)));
  }

  private static Law cone() {
    var law = law("cone", "solid cone, its apex along z");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the base, 2 R");
    var height = law.number("height", "h", "length", "height along the axis");
    return solid(
        law.formula(
            "V = π R² h/3; I_z = 3/10 m R²; I_x = 3/80 m (4 R² + h²), centre h/4 above the base"),
        "cone(diameter = 200 mm, height = 300 mm, mass = 10 kg).inertia.zz",
        "0.03 kg·m²",
        g -> Shapes.cone(diameter.in(g), height.in(g)));
  }

  private static Law frustum() {
    var law = law("frustum", "solid cone with its tip cut off");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the base, 2 R");
    var top = law.number("top", "d", "length", "diameter of the top, 2 r");
    var height = law.number("height", "h", "length", "height along the axis");
    return solid(
        law.formula("V = π h (R² + R r + r²)/3; I_z = 3/10 m (R⁵ − r⁵)/(R³ − r³)"),
        "frustum(diameter = 400 mm, top = 200 mm, height = 100 mm, mass = 7 kg).inertia.zz",
        "0.093 kg·m²",
        g -> Shapes.frustum(diameter.in(g), top.in(g), height.in(g)));
  }

  private static Law box() {
    var law = law("box", "rectangular block");
    var x = law.number("x", "a", "length", "length along x");
    var y = law.number("y", "b", "length", "length along y");
    var z = law.number("z", "c", "length", "length along z");
    return solid(
        law.formula("V = a b c; I_z = m (a² + b²)/12"),
        "box(x = 0.3 m, y = 0.4 m, z = 0.1 m, mass = 12 kg).inertia.zz",
        "0.25 kg·m²",
        g -> Shapes.box(x.in(g), y.in(g), z.in(g)));
  }

  private static Law ellipsoid() {
    var law = law("ellipsoid", "solid ellipsoid");
    var a = law.number("a", "a", "length", "half the length along x");
    var b = law.number("b", "b", "length", "half the length along y");
    var c = law.number("c", "c", "length", "half the length along z");
    return solid(
        law.formula("V = 4/3 π a b c; I_z = m (a² + b²)/5"),
        "ellipsoid(a = 0.3 m, b = 0.4 m, c = 0.1 m, mass = 5 kg).inertia.zz",
        "0.25 kg·m²",
        g -> Shapes.ellipsoid(a.in(g), b.in(g), c.in(g)));
  }

  private static Law torus() {
    var law = law("torus", "solid torus of circular section");
    var diameter =
        law.diameter(
            "diameter",
            "radius",
            "D",
            "diameter of the circle through the middle of the section, 2 R");
    var section = law.number("section", "s", "length", "diameter of the section, 2 a");
    return solid(
        law.formula("V = 2 π² R a²; I_z = m (R² + 3/4 a²)"),
        "torus(diameter = 400 mm, section = 100 mm, mass = 8 kg).inertia.zz",
        "0.335 kg·m²",
        g -> Shapes.torus(diameter.in(g), section.in(g)));
  }

  private static Law mesh() {
    var law = law("mesh", "body inside a closed mesh of triangles, from an STL or OBJ file");
    var file = law.file("file", "the file, below the folder of the note");
    var unit =
        law.number(
            "unit", "u", "length", "the unit of length of its numbers, as 1 mm; files state none");
    return solid(
        law.formula("V = ∫ dV, I = ρ ∫ (r² 1 − r rᵀ) dV, by the divergence theorem"),
        "mesh(\"block.stl\", unit = 1 mm, density = 7850 kg/m³).inertia.zz",
        "0.0021352 kg·m²",
        g -> read(file.in(g), unit.in(g)));
  }

  private static Shape read(Path file, double unit) {
    try {
      return Mesh.read(file, unit).shape();
    } catch (NoSuchFileException gone) {
      throw new Refusal(
          "file",
          "There is no file “" + file.getFileName() + "” in its folder.",
          "Check the name; the folder of the note and those below it are looked at.");
    } catch (IOException unreadable) {
      throw new Refusal(
          "file",
          "The file “" + file.getFileName() + "” cannot be read.",
          "Check that it is a file and that it may be read.");
    }
  }

  private static Law prism() {
    var law = law("prism", "prism drawn out along z from an outline");
    var corners = law.corners("corners", "corners (x, y, 0) of the outline in order");
    var length = law.number("length", "h", "length", "length along the axis");
    return solid(
        law.formula(
            "V = A h; I_z = m (I_p/A), with the area A and its polar second moment I_p about the centroid"),
        "prism((0, 0, 0) m, (0.3, 0, 0) m, (0.3, 0.4, 0) m, (0, 0.4, 0) m, length = 0.1 m, mass = 12 kg).inertia.zz",
        "0.25 kg·m²",
        g -> Shapes.prism(contour("corners", corners.in(g), false), length.in(g)));
  }

  private static Law revolved() {
    var law = law("revolved", "body of revolution from half its section");
    var corners = law.corners("corners", "corners (r, 0, z) of the half section in order");
    return solid(
        law.formula("V = 2π ∫ r dA; I_z = 2π ρ ∫ r³ dA"),
        "revolved((0, 0, 0) m, (0.2, 0, 0) m, (0.2, 0, 0.06) m, (0, 0, 0.06) m, mass = 12 kg).inertia.zz",
        "0.24 kg·m²",
        g -> Shapes.revolved(contour("corners", corners.in(g), true)));
  }

  private static Law disc() {
    var law = law("disc", "thin disc");
    var diameter = law.diameter("diameter", "radius", "D", "outer diameter");
    thickness(law, "thickness", "t", "D", diameter);
    return thin(
        law.formula("I_z = m D²/8; I_x = m D²/16"),
        "disc(diameter = 400 mm, mass = 12 kg).inertia.zz",
        "0.24 kg·m²",
        g -> ThinShapes.disc(diameter.in(g)));
  }

  private static Law ring() {
    var law = law("ring", "thin ring");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of its middle line");
    thickness(law, "thickness", "t", "D", diameter);
    return thin(
        law.formula("I_z = m D²/4; I_x = m D²/8"),
        "ring(diameter = 400 mm, mass = 12 kg).inertia.zz",
        "0.48 kg·m²",
        g -> ThinShapes.ring(diameter.in(g)));
  }

  private static Law rod() {
    var law = law("rod", "thin straight rod along z");
    var length = law.number("length", "l", "length", "length along the axis");
    thickness(law, "thickness", "t", "l", length);
    return thin(
        law.formula("I_x = m l²/12; I_z = 0"),
        "rod(length = 1.2 m, mass = 2 kg).inertia.xx",
        "0.24 kg·m²",
        g -> ThinShapes.rod(length.in(g)));
  }

  private static Law plate() {
    var law = law("plate", "thin rectangular plate");
    var x = law.number("x", "a", "length", "length along x");
    var y = law.number("y", "b", "length", "length along y");
    thickness(law, "thickness", "t", "a", x);
    return thin(
        law.formula("I_z = m (a² + b²)/12; I_x = m b²/12"),
        "plate(x = 0.3 m, y = 0.4 m, mass = 12 kg).inertia.zz",
        "0.25 kg·m²",
        g -> ThinShapes.plate(x.in(g), y.in(g)));
  }

  private static Law polygonalPlate() {
    var law = law("plate", "thin plate of any straight-sided outline");
    var corners = law.corners("corners", "corners (x, y, 0) of the outline in order");
    return thin(
        law.formula(
            "I_z = m (I_p/A), with the area A and its polar second moment I_p about the centroid"),
        "plate((0, 0, 0) m, (0.3, 0, 0) m, (0.3, 0.4, 0) m, (0, 0.4, 0) m, mass = 12 kg).inertia.zz",
        "0.25 kg·m²",
        g -> ThinShapes.plate(contour("corners", corners.in(g), false)));
  }

  private static Law tube() {
    var law = law("thin_tube", "thin cylindrical shell, open at its ends");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the middle of its wall");
    var length = law.number("length", "h", "length", "length along the axis");
    thickness(law, "thickness", "t", "D", diameter);
    return thin(
        law.formula("I_z = m D²/4; I_x = m (D²/8 + h²/12)"),
        "thin_tube(diameter = 400 mm, length = 200 mm, mass = 12 kg).inertia.zz",
        "0.48 kg·m²",
        g -> ThinShapes.tube(diameter.in(g), length.in(g)));
  }

  private static Law thinSphere() {
    var law = law("thin_sphere", "thin spherical shell");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the middle of its wall");
    thickness(law, "thickness", "t", "D", diameter);
    return thin(
        law.formula("I = m D²/6"),
        "thin_sphere(diameter = 400 mm, mass = 12 kg).inertia.xx",
        "0.32 kg·m²",
        g -> ThinShapes.sphere(diameter.in(g)));
  }

  private static Law thinCap() {
    var law = law("thin_spherical_cap", "thin cap of a spherical shell");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the sphere, 2 R");
    var height = law.number("height", "h", "length", "height along the axis");
    return thin(
        law.formula("I_z = m h (R − h/3), centre h/2 above the base"),
        "thin_spherical_cap(diameter = 400 mm, height = 200 mm, mass = 12 kg).inertia.zz",
        "0.32 kg·m²",
        g -> ThinShapes.sphericalCap(diameter.in(g), height.in(g)));
  }

  private static Law thinCone() {
    var law = law("thin_cone", "thin conical shell without base");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the base, 2 R");
    var height = law.number("height", "h", "length", "height along the axis");
    return thin(
        law.formula("I_z = m R²/2; I_x = m (R²/4 + h²/18), centre h/3 above the base"),
        "thin_cone(diameter = 400 mm, height = 300 mm, mass = 12 kg).inertia.zz",
        "0.24 kg·m²",
        g -> ThinShapes.cone(diameter.in(g), height.in(g)));
  }

  private static Law thinFrustum() {
    var law = law("thin_frustum", "thin conical shell with its tip cut off");
    var diameter = law.diameter("diameter", "radius", "D", "diameter of the base, 2 R");
    var top = law.number("top", "d", "length", "diameter of the top, 2 r");
    var height = law.number("height", "h", "length", "height along the axis");
    return thin(
        law.formula("I_z = m (R² + r²)/2"),
        "thin_frustum(diameter = 400 mm, top = 200 mm, height = 300 mm, mass = 12 kg).inertia.zz",
        "0.3 kg·m²",
        g -> ThinShapes.frustum(diameter.in(g), top.in(g), height.in(g)));
  }

  private static Law thinTorus() {
    var law = law("thin_torus", "thin hollow torus");
    var diameter =
        law.diameter(
            "diameter",
            "radius",
            "D",
            "diameter of the circle through the middle of the section, 2 R");
    var section = law.number("section", "s", "length", "diameter of the section, 2 a");
    return thin(
        law.formula("I_z = m (R² + 3/2 a²)"),
        "thin_torus(diameter = 400 mm, section = 100 mm, mass = 12 kg).inertia.zz",
        "0.525 kg·m²",
        g -> ThinShapes.torus(diameter.in(g), section.in(g)));
  }

  /** Corners given as vectors that have no part out of their plane. */
  private static Contour contour(String word, List<Vector3D> corners, boolean profile) {
    for (Vector3D corner : corners) {
      double out = profile ? corner.getY() : corner.getZ();
      if (out != 0) {
        throw new Refusal(
            word,
            profile
                ? "A corner of the profile lies off the plane of x and z."
                : "A corner of the outline lies off the plane of x and y.",
            profile ? "Write each corner as (radius, 0, z)." : "Write each corner as (x, y, 0).");
      }
    }
    return Contour.polygon(
        corners.stream().map(c -> new Vector2D(c.getX(), profile ? c.getZ() : c.getY())).toList());
  }
}
