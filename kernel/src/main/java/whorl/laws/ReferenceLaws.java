package whorl.laws;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Refusal;
import whorl.mechanics.reference.AngularMomentum;
import whorl.mechanics.reference.AxialInertia;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.Moment;
import whorl.mechanics.reference.Point;
import whorl.mechanics.reference.Turn;

/** Points, axes, frames and bound forces, and how what is taken about one is moved to another. */
final class ReferenceLaws {
  private static final String DEFINITION = "definition";
  private static final String BY_HAND = "worked by hand";
  private static final Need LEFT_OUT = new Need.Optional("");

  private ReferenceLaws() {}

  static List<Law> all() {
    return List.of(
        point(),
        pointAt(),
        axis(),
        axisThrough(),
        frame(),
        frameAlong(),
        force(),
        momentAboutPoint(),
        momentAboutAxis(),
        movedMoment(),
        movedAngularMomentum(),
        movedInertia(),
        movedTensor());
  }

  private static LawBuilder law(String name, String title) {
    return new LawBuilder(Room.REFERENCE, name, title);
  }

  private static Law point() {
    var law = law("point", "point by its coordinates");
    var x = law.number("x", "x", "length", "coordinate along x");
    var y = law.number("y", "y", "length", "coordinate along y");
    var z = law.number("z", "z", "length", "coordinate along z");
    var frame = law.frame("the frame that the coordinates are in, with which the point moves");
    var velocity =
        law.vector("velocity", "v", "velocity", "its own velocity besides, in the world", LEFT_OUT);
    return law.formula("P = (x, y, z)")
        .source(DEFINITION)
        .example(
            "(A - B).z",
            "200 mm",
            "1e-9",
            BY_HAND,
            "A = point(0, 0, 320 mm)",
            "B = point(10 mm, 0, 120 mm)")
        .gives(
            ThingSort.POINT,
            g ->
                moving(frame.in(g).point(new Vector3D(x.in(g), y.in(g), z.in(g))), velocity.in(g)));
  }

  private static Law pointAt() {
    var law = law("point", "point by its position vector");
    var position =
        law.vector("position", "r", "length", "from the origin of the world or the frame");
    var frame = law.frame("the frame whose origin the position is taken from, with which it moves");
    var velocity =
        law.vector("velocity", "v", "velocity", "its own velocity besides, in the world", LEFT_OUT);
    return law.formula("P = r")
        .source(DEFINITION)
        .example("point((0, 0, 320) mm).z", "320 mm", "1e-9", BY_HAND)
        .gives(
            ThingSort.POINT,
            g -> {
              Frame in = frame.in(g);
              return moving(in.point(in.fromWorld(position.in(g))), velocity.in(g));
            });
  }

  private static Point moving(Point point, Optional<Vector3D> velocity) {
    return velocity
        .map(own -> new Point(point.position(), point.velocity().add(own)))
        .orElse(point);
  }

  private static Law axis() {
    var law = law("axis", "axis through a point along a direction");
    var through = law.point("through", "P", "a point on it");
    var along = law.direction("along", "u", "the direction, whose size does not count");
    return law.formula("P + s u/|u|")
        .source(DEFINITION)
        .example(
            "shaft.along.x",
            "0.6",
            "1e-9",
            BY_HAND,
            "shaft = axis(through = point(0, 0, 0), along = (3, 4, 0))")
        .gives(ThingSort.AXIS, g -> new Axis(through.in(g), along.in(g)));
  }

  private static Law axisThrough() {
    var law = law("axis", "axis from one point to another");
    var from = law.point("from", "A", "a point on it");
    var to = law.point("to", "B", "another, towards which it points");
    return law.formula("A + s (B − A)/|B − A|")
        .source(DEFINITION)
        .example(
            "axis(from = A, to = B).along.z",
            "0.8",
            "1e-9",
            BY_HAND,
            "A = point(0, 0, 0)",
            "B = point(0, 30 mm, 40 mm)")
        .gives(ThingSort.AXIS, g -> Axis.through(from.in(g), to.in(g)));
  }

  private static Law frame() {
    var law = law("frame", "frame at a point, turned by an angle about a direction");
    var origin = law.point("origin", "O", "its origin");
    var turned = law.number("turned", "φ", "angle", "angle by which it is turned", 0, "0");
    var about = law.direction("about", "u", "direction about which it is turned", LEFT_OUT);
    var frame = law.frame("the frame in which it stands and moves");
    var turning =
        law.vector(
            "turning", "ω", "angular_velocity", "its angular velocity in that frame", LEFT_OUT);
    var moving =
        law.vector("moving", "v", "velocity", "velocity of its origin in that frame", LEFT_OUT);
    return law.formula("axes turned by φ about u, right-handed")
        .source("Euler's rotation theorem")
        .example(
            "(v @ ship).y",
            "2 m/s",
            "1e-9",
            BY_HAND,
            "ship = frame(origin = point(0, 0, 0), turned = 90 deg, about = (1, 0, 0))",
            "v = (0, 0, 2) m/s")
        .gives(
            ThingSort.FRAME,
            g -> {
              Frame parent = frame.in(g);
              if (about.in(g).isEmpty() && turned.in(g) != 0) {
                throw new Refusal(
                    "turned",
                    "The frame is turned by an angle, but about no direction.",
                    "Give the direction too, such as about = (1, 0, 0).");
              }
              Rotation turn =
                  about
                      .in(g)
                      .map(u -> Turn.about(parent.fromWorld(u), turned.in(g)))
                      .orElse(Rotation.IDENTITY);
              return in(parent, origin.in(g), turn, turning.in(g), moving.in(g));
            });
  }

  private static Law frameAlong() {
    var law = law("frame", "frame at a point with given axes");
    var origin = law.point("origin", "O", "its origin");
    var x = law.direction("x", "e_x", "direction of its x axis");
    var y = law.direction("y", "e_y", "direction of its y axis, at a right angle");
    var z = law.direction("z", "e_z", "direction of its z axis, by the right-hand rule");
    var frame = law.frame("the frame in which it stands and moves");
    var turning =
        law.vector(
            "turning", "ω", "angular_velocity", "its angular velocity in that frame", LEFT_OUT);
    var moving =
        law.vector("moving", "v", "velocity", "velocity of its origin in that frame", LEFT_OUT);
    return law.formula("axes along e_x, e_y, e_z")
        .source(DEFINITION)
        .example(
            "(v @ crane).y",
            "-3 m/s",
            "1e-9",
            BY_HAND,
            "O = point(0, 0, 0)",
            "crane = frame(origin = O, x = (4, 3, 0), y = (-3, 4, 0), z = (0, 0, 1))",
            "v = (5, 0, 0) m/s")
        .gives(
            ThingSort.FRAME,
            g -> {
              Frame parent = frame.in(g);
              Rotation turn =
                  Frame.axes(
                      parent.fromWorld(x.in(g)),
                      parent.fromWorld(y.in(g)),
                      parent.fromWorld(z.in(g)));
              return in(parent, origin.in(g), turn, turning.in(g), moving.in(g));
            });
  }

  /** A frame whose origin keeps the motion that the point has, unless another is given. */
  static Frame in(
      Frame parent,
      Point origin,
      Rotation turn,
      Optional<Vector3D> turning,
      Optional<Vector3D> moving) {
    Vector3D shift = parent.coordinates(origin);
    Vector3D own = origin.velocity().subtract(parent.point(shift).velocity());
    return Frame.in(
        parent,
        shift,
        turn,
        parent.fromWorld(turning.orElse(Vector3D.ZERO)),
        parent.fromWorld(moving.orElse(own)));
  }

  private static Law force() {
    var law = law("force", "force with the point where it acts");
    var force = law.vector("force", "F", "force", "the force");
    var at = law.point("at", "P", "where it acts");
    return law.formula("(F, P)")
        .source(DEFINITION)
        .example(
            "moment(force((0, 0, -80) N, at = P), about = point(0, 0, 0)).y",
            "20 N·m",
            "1e-9",
            BY_HAND,
            "P = point(250 mm, 0, 0)")
        .gives(ThingSort.FORCE, g -> new BoundForce(force.in(g), at.in(g)));
  }

  private static Law momentAboutPoint() {
    var law = law("moment", "moment of a force about a point");
    var force = law.force("force", "F", "the bound force, acting at P");
    var about = law.point("about", "A", "the point");
    return law.formula("M_A = (P − A) × F")
        .source("statics, moment of a bound vector")
        .about("about")
        .of("force")
        .example(
            "moment(W, about = A).x",
            "-12 N·m",
            "1e-9",
            BY_HAND,
            "A = point(0, 0, 0)",
            "W = force((0, 0, -40) N, at = point(0, 300 mm, 0))")
        .givesVector("torque", g -> force.in(g).moment(about.in(g)).value());
  }

  private static Law momentAboutAxis() {
    var law = law("moment", "torque of a force about an axis");
    var force = law.force("force", "F", "the bound force, acting at P");
    var about = law.axis("about", "a", "the axis, through Q along the unit vector u");
    return law.formula("T_a = u · ((P − Q) × F)")
        .source("statics, moment of a bound vector")
        .about("about")
        .of("force")
        .example(
            "moment(F, about = shaft)",
            "6 N·m",
            "1e-9",
            BY_HAND,
            "shaft = axis(through = point(0, 0, 0), along = (0, 0, 1))",
            "F = force((0, 30, 7) N, at = point(200 mm, 0, 50 mm))")
        .gives("torque", g -> force.in(g).moment(about.in(g)));
  }

  private static Law movedMoment() {
    var law = law("moved", "moment about another point");
    var moment = law.vector("moment", "M_A", "torque", "the moment");
    var to = law.point("to", "B", "the point to move it to");
    var from =
        law.point(
            "from", "A", "the point that it is about", new Need.Known("moment", Need.Supply.PLACE));
    var force =
        law.vector(
            "force",
            "F",
            "force",
            "sum of the forces; zero for a pure couple",
            new Need.Known("moment", Need.Supply.FORCE));
    return law.formula("M_B = M_A + (A − B) × F")
        .source("statics, change of the reference point of a moment")
        .about("to")
        .of("moment")
        .example(
            "moved(M_A, to = B).x",
            "-8 N·m",
            "1e-9",
            BY_HAND,
            "A = point(0, 0, 0)",
            "B = point(0, 100 mm, 0)",
            "M_A = moment(force((0, 0, -40) N, at = point(0, 300 mm, 0)), about = A)")
        .givesVector(
            "torque",
            g ->
                new Moment(moment.in(g), from.in(g).orElseThrow())
                    .moved(to.in(g), force.in(g).orElseThrow())
                    .value());
  }

  private static Law movedAngularMomentum() {
    var law = law("moved", "angular momentum about another point");
    var momentum =
        law.vector("angular_momentum", "L_A", "angular_momentum", "the angular momentum");
    var to = law.point("to", "B", "the point to move it to");
    var from =
        law.point(
            "from",
            "A",
            "the point that it is about",
            new Need.Known("angular_momentum", Need.Supply.PLACE));
    var linear =
        law.vector(
            "momentum",
            "p",
            "momentum",
            "mass times velocity of the centre of mass",
            new Need.Known("angular_momentum", Need.Supply.MOMENTUM));
    return law.formula("L_B = L_A + (A − B) × p")
        .source("mechanics of systems, change of the reference point")
        .about("to")
        .of("angular_momentum")
        .example(
            "moved(L_A, from = A, to = B, momentum = (0, 6, 0) N·s).z",
            "0.6 N·m·s",
            "1e-9",
            BY_HAND,
            "A = point(0, 0, 0)",
            "B = point(0.2 m, 0, 0)",
            "L_A = (0, 0, 1.8) N·m·s")
        .givesVector(
            "angular_momentum",
            g ->
                new AngularMomentum(momentum.in(g), from.in(g).orElseThrow())
                    .moved(to.in(g), linear.in(g).orElseThrow())
                    .value());
  }

  private static Law movedInertia() {
    var law = law("moved", "moment of inertia about a parallel axis");
    var inertia = law.number("inertia", "I_a", "rotational_inertia", "the moment of inertia");
    var to = law.axis("to", "b", "the axis to move it to");
    var from =
        law.axis(
            "from",
            "a",
            "the axis that it is about, parallel to the other",
            new Need.Known("inertia", Need.Supply.PLACE));
    var mass =
        law.number(
            "mass", "m", "mass", "mass of the body", new Need.Known("inertia", Need.Supply.MASS));
    var centre =
        law.point(
            "centre",
            "C",
            "centre of mass of the body",
            new Need.Known("inertia", Need.Supply.CENTRE));
    return law.formula("I_b = I_a + m (d_b² − d_a²), with d the distance of C from each axis")
        .source("parallel-axis theorem (Steiner, Huygens)")
        .about("to")
        .of("inertia")
        .example(
            "moved(I_end, from = end, to = middle, mass = 2 kg, centre = C)",
            "0.24 kg·m²",
            "1e-9",
            "rod of 2 kg and 1.2 m, m l²/3 and m l²/12",
            "C = point(0.6 m, 0, 0)",
            "end = axis(through = point(0, 0, 0), along = (0, 0, 1))",
            "middle = axis(through = C, along = (0, 0, 1))",
            "I_end [kg·m²] = 0.96")
        .gives(
            "rotational_inertia",
            g ->
                new AxialInertia(inertia.in(g), from.in(g).orElseThrow())
                    .moved(to.in(g), mass.in(g), centre.in(g).orElseThrow())
                    .value());
  }

  private static Law movedTensor() {
    var law = law("moved", "inertia tensor about another point");
    var inertia = law.tensor("inertia", "I_A", "the inertia tensor");
    var to = law.point("to", "B", "the point to move it to");
    var from =
        law.point(
            "from",
            "A",
            "the point that it is about",
            new Need.Known("inertia", Need.Supply.PLACE));
    var mass =
        law.number(
            "mass", "m", "mass", "mass of the body", new Need.Known("inertia", Need.Supply.MASS));
    var centre =
        law.point(
            "centre",
            "C",
            "centre of mass of the body",
            new Need.Known("inertia", Need.Supply.CENTRE));
    return law.formula("I_B = I_A + m (b² 1 − b bᵀ) − m (a² 1 − a aᵀ), with a = C − A, b = C − B")
        .source("parallel-axis theorem for tensors")
        .about("to")
        .of("inertia")
        .example(
            "moved(J_C, to = O).xy",
            "0.12 kg·m²",
            "1e-9",
            "law I_O = I_C + m(|d|² 1 − d dᵀ), block of 4 kg",
            "O = point(0, 0, 0)",
            "block = placed(box(x = 0.2 m, y = 0.1 m, z = 0.06 m, mass = 4 kg),"
                + " at = point(0.3 m, -0.1 m, 0.15 m))",
            "J_C = block.inertia")
        .gives(
            ThingSort.INERTIA,
            g ->
                inertia
                    .in(g)
                    .moved(
                        mass.in(g),
                        centre.in(g).orElseThrow(),
                        from.in(g).orElseThrow(),
                        to.in(g)));
  }
}
