package whorl.laws;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.MassProperties;
import whorl.mechanics.body.ThinShapes;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;
import whorl.mechanics.reference.Turn;

/** Bodies that are given by their mass, and how bodies are placed and put together. */
final class BodyLaws {
  private static final String BY_HAND = "worked by hand";
  private static final String DEFINITION = "definition";
  private static final String WHEEL =
      "wheel = solid_cylinder(diameter = 400 mm, length = 60 mm, mass = 12 kg)";
  private static final String O = "O = point(0, 0, 0)";

  private BodyLaws() {}

  static List<Law> all() {
    return List.of(
        pointMass(), rigidBody(), placed(), turned(), mirrored(), scaled(), assembly(), without());
  }

  private static LawBuilder law(String name, String title) {
    return new LawBuilder(Room.BODIES, name, title);
  }

  private static Law pointMass() {
    var law = law("point_mass", "mass at a point");
    var mass = law.number("mass", "m", "mass", "its mass");
    var at = law.point("at", "P", "where it is", new Need.Optional("the origin of the world"));
    return law.formula("no inertia about itself")
        .source(DEFINITION)
        .example(
            "inertia(point_mass(mass = 3 kg, at = P), about = O).zz",
            "0.75 kg·m²",
            "1e-9",
            BY_HAND,
            O,
            "P = point(300 mm, 400 mm, 0)")
        .gives(
            ThingSort.BODY,
            g -> at(ThinShapes.point().ofMass(mass.in(g)), at.in(g).orElse(Point.ORIGIN)));
  }

  private static Body at(Body body, Point at) {
    return body.placed(
        ReferenceLaws.in(
            Frame.WORLD, at, body.frame().attitude(), Optional.empty(), Optional.empty()));
  }

  private static Law rigidBody() {
    var law = law("rigid_body", "measured or catalogue body by mass, centre and inertia tensor");
    var mass = law.number("mass", "m", "mass", "its mass");
    var centre = law.point("centre", "C", "its centre of mass");
    var inertia = law.tensor("inertia", "I", "its inertia tensor, about A");
    var about =
        law.point(
            "about",
            "A",
            "the point that the tensor is about",
            new Need.Known("inertia", Need.Supply.PLACE, false));
    return law.formula("I_C = I_A − m (d² 1 − d dᵀ), with d = C − A")
        .source("parallel-axis theorem for tensors")
        .example(
            "rotor.inertia.xx",
            "0.36 kg·m²",
            "1e-9",
            BY_HAND,
            O,
            "C = point(0, 0, 200 mm)",
            "J_O = inertia_tensor(xx = 0.84 kg·m², yy = 0.84 kg·m², zz = 0.5 kg·m², about = O)",
            "rotor = rigid_body(mass = 12 kg, centre = C, inertia = J_O)")
        .gives(
            ThingSort.BODY,
            g -> {
              Point of = centre.in(g);
              InertiaTensor atCentre =
                  inertia.in(g).moved(mass.in(g), of, about.in(g).orElse(of), of);
              return at(Body.of(new MassProperties(mass.in(g), of.position(), atCentre)), of);
            });
  }

  private static Law placed() {
    var law = law("placed", "body put somewhere");
    var body = law.body("body", "", "the body");
    var at = law.point("at", "P", "where its centre of mass comes to be");
    var along =
        law.direction(
            "along",
            "u",
            "direction of its own z axis",
            new Need.Optional("its axes along those of the frame, or as they are"));
    int framed = law.count();
    var frame = law.frame("the frame that it goes with, and in which a direction is stated");
    return law.formula("C = P, e_z = u/|u|")
        .source(DEFINITION)
        .example(
            "inertia(placed(wheel, at = P, along = (1, 0, 0)), about = O).xx",
            "1.32 kg·m²",
            "1e-9",
            "m D²/8 + m d²",
            WHEEL,
            O,
            "P = point(0, 300 mm, 0)")
        .gives(
            ThingSort.BODY,
            g -> {
              Frame parent = frame.in(g);
              Rotation kept = g.has(framed) ? Rotation.IDENTITY : body.in(g).frame().attitude();
              Rotation turn = along.in(g).map(u -> Turn.zTo(parent.fromWorld(u))).orElse(kept);
              return body.in(g)
                  .placed(
                      ReferenceLaws.in(parent, at.in(g), turn, Optional.empty(), Optional.empty()));
            });
  }

  private static Law turned() {
    var law = law("turned", "body turned about an axis");
    var body = law.body("body", "", "the body");
    var by = law.number("by", "φ", "angle", "angle, right-handed about the axis");
    var about = law.axis("about", "a", "the axis");
    return law.formula("I' = R I Rᵀ")
        .source("Euler's rotation theorem")
        .example(
            "turned(wheel, by = 90 deg, about = x_axis).inertia.yy",
            "0.24 kg·m²",
            "1e-9",
            BY_HAND,
            WHEEL,
            "x_axis = axis(through = wheel.centre, along = (1, 0, 0))")
        .gives(ThingSort.BODY, g -> body.in(g).turned(about.in(g), by.in(g)));
  }

  private static Law mirrored() {
    var law = law("mirrored", "body mirrored in a plane");
    var body = law.body("body", "", "the body");
    var through = law.point("through", "P", "a point of the plane");
    var normal = law.direction("normal", "n", "a direction at a right angle to the plane");
    return law.formula("r' = r − 2 ((r − P) · n) n")
        .source(DEFINITION)
        .example(
            "mirrored(weight_, through = O, normal = (1, 0, 0)).centre.x",
            "-250 mm",
            "1e-9",
            BY_HAND,
            O,
            "weight_ = point_mass(mass = 1 kg, at = point(250 mm, 0, 0))")
        .gives(ThingSort.BODY, g -> body.in(g).mirrored(through.in(g), normal.in(g)));
  }

  private static Law scaled() {
    var law = law("scaled", "body with all lengths changed alike, of the same material");
    var body = law.body("body", "", "the body");
    var by = law.number("by", "λ", "number", "factor of all lengths");
    return law.formula("m' = λ³ m; I' = λ⁵ I")
        .source("similarity")
        .example("scaled(wheel, by = 2).mass", "96 kg", "1e-9", BY_HAND, WHEEL)
        .gives(ThingSort.BODY, g -> body.in(g).scaled(by.in(g)));
  }

  private static Law assembly() {
    var law = law("assembly", "bodies joined rigidly");
    var bodies = law.bodies("bodies", "the parts");
    return law.formula("m = Σ m_i; C = Σ m_i C_i/m; I_A = Σ I_A,i")
        .source("sum over the parts, each moved to the common centre by the parallel-axis theorem")
        .example(
            "assembly(a, b).inertia.zz",
            "0.24 kg·m²",
            "1e-9",
            "m_1 m_2/(m_1 + m_2) d², two masses of 3 kg",
            "a = point_mass(mass = 3 kg, at = point(0, 0, 0))",
            "b = point_mass(mass = 3 kg, at = point(400 mm, 0, 0))")
        .gives(ThingSort.BODY, g -> Body.assembly(bodies.in(g)));
  }

  private static Law without() {
    var law = law("without", "body with others taken out of it, as a bore or a keyway");
    var body = law.body("body", "", "the body");
    var removed = law.bodies("removed", "what is taken out, of the same material");
    return law.formula("m = m_0 − Σ m_i; I_A = I_A,0 − Σ I_A,i")
        .source("difference over the parts, each moved to the common centre")
        .example(
            "without(full, bore).inertia.zz",
            "0.85 kg·m²",
            "1e-9",
            "hollow cylinder, m (D² + d²)/8 of 20 kg",
            "full = solid_cylinder(diameter = 500 mm, length = 100 mm, mass = 31.25 kg)",
            "bore = solid_cylinder(diameter = 300 mm, length = 100 mm, mass = 11.25 kg)")
        .gives(ThingSort.BODY, g -> body.in(g).without(removed.in(g).toArray(Body[]::new)));
  }
}
