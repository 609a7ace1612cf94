package whorl.laws;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Moment;
import whorl.mechanics.reference.Point;

/** Inertia, angular momentum and energy of bodies, and the moments that change them. */
final class MomentumLaws {
  private static final double STANDARD_FREE_FALL = 9.80665;
  private static final String DYNAMICS = "dynamics of the rigid body";
  private static final String WHEEL =
      "wheel = solid_cylinder(diameter = 400 mm, length = 60 mm, mass = 12 kg)";
  private static final String BY_HAND = "worked by hand";

  /** A velocity that turning about a point gives is no other than zero within this share. */
  private static final double ROUNDING = 1e-9;

  private MomentumLaws() {}

  static List<Law> all() {
    return List.of(
        inertiaAboutAxis(),
        inertiaAboutPoint(),
        inertiaTensor(),
        radiusOfGyration(),
        flywheelEffect(),
        angularMomentum(),
        kineticEnergy(),
        weight(),
        drivingMoment(),
        momentFromRate());
  }

  private static LawBuilder law(String name, String title) {
    return new LawBuilder(Room.MOMENTUM, name, title);
  }

  private static Law inertiaAboutAxis() {
    var law = law("inertia", "moment of inertia of a body about an axis");
    var body = law.body("body", "", "the body, with its mass m and centre C");
    var about = law.axis("about", "a", "the axis along the unit vector u, at a distance d from C");
    return law.formula("I_a = u · I_C u + m d²")
        .source(DYNAMICS)
        .about("about")
        .of("body")
        .example(
            "inertia(wheel, about = shaft)",
            "0.24 kg·m²",
            "1e-9",
            "m D²/8",
            WHEEL,
            "shaft = axis(through = wheel.centre, along = (0, 0, 1))")
        .gives("rotational_inertia", g -> body.in(g).inertia(about.in(g)).value());
  }

  private static Law inertiaAboutPoint() {
    var law = law("inertia", "inertia tensor of a body about a point");
    var body = law.body("body", "", "the body, with its mass m and centre C");
    var about = law.point("about", "A", "the point, at d from C");
    return law.formula("I_A = I_C + m (d² 1 − d dᵀ)")
        .source(DYNAMICS)
        .about("about")
        .of("body")
        .example(
            "inertia(wheel, about = A).xx",
            "0.6036 kg·m²",
            "1e-9",
            "m (3 R² + h²)/12 + m d²",
            WHEEL,
            "A = point(0, 0, 200 mm)")
        .gives(ThingSort.INERTIA, g -> body.in(g).inertia(about.in(g)));
  }

  private static Law inertiaTensor() {
    var law = law("inertia_tensor", "inertia tensor from its elements");
    String kind = "rotational_inertia";
    var xx = law.number("xx", "I_xx", kind, "∫ (y² + z²) dm");
    var yy = law.number("yy", "I_yy", kind, "∫ (z² + x²) dm");
    var zz = law.number("zz", "I_zz", kind, "∫ (x² + y²) dm");
    var xy = product(law, "xy", "x y");
    var yz = product(law, "yz", "y z");
    var zx = product(law, "zx", "z x");
    var frame = law.frame("the frame along whose axes the elements are taken");
    law.point("about", "A", "the point that it is about", new Need.Optional("any point"));
    return law.formula(
            "I = ((I_xx, I_xy, I_zx), (I_xy, I_yy, I_yz), (I_zx, I_yz, I_zz)), with I_xy = −∫ x y dm"
                + " = −p_xy")
        .source("tensor elements as in dynamics; many handbooks list the products p, of other sign")
        .about("about")
        .example(
            "inertia_tensor(xx = 2 kg·m², yy = 3 kg·m², zz = 4 kg·m², p_xy = 0.5 kg·m²)"
                + ".greatest",
            "4 kg·m²",
            "1e-9",
            BY_HAND)
        .gives(
            ThingSort.INERTIA,
            g ->
                new InertiaTensor(xx.in(g), yy.in(g), zz.in(g), xy.in(g), yz.in(g), zx.in(g))
                    .demandPhysical()
                    .turned(frame.in(g).attitude()));
  }

  /** An element off the diagonal, given itself or as the product of inertia, or zero. */
  private static LawBuilder.NumberOf product(LawBuilder law, String word, String integrand) {
    String symbol = "I_" + word;
    var element =
        law.number(word, symbol, "rotational_inertia", "−∫ " + integrand + " dm", Double.NaN, "0");
    var product =
        law.number(
            "p_" + word,
            "p_" + word,
            "rotational_inertia",
            "+∫ " + integrand + " dm, in place of " + word,
            Double.NaN,
            "0");
    return g -> {
      double tensor = element.in(g);
      double handbook = product.in(g);
      if (!Double.isNaN(tensor) && !Double.isNaN(handbook)) {
        throw new Refusal(
            "p_" + word,
            "Both " + word + " and p_" + word + " are given, and they are one quantity.",
            "Keep "
                + word
                + " for the tensor element −∫ "
                + integrand
                + " dm, or p_"
                + word
                + " for the product +∫ "
                + integrand
                + " dm.");
      }
      return !Double.isNaN(tensor) ? tensor : !Double.isNaN(handbook) ? -handbook : 0;
    };
  }

  private static Law radiusOfGyration() {
    var law = law("radius_of_gyration", "radius of gyration about an axis");
    var body = law.body("body", "", "the body, with its mass m");
    var about = law.axis("about", "a", "the axis");
    return law.formula("k = √(I_a/m)")
        .source("definition")
        .example(
            "radius_of_gyration(wheel, about = shaft)",
            "141.42135623730951 mm",
            "1e-9",
            "R/√2",
            WHEEL,
            "shaft = axis(through = wheel.centre, along = (0, 0, 1))")
        .gives("radius", g -> body.in(g).radiusOfGyration(about.in(g)));
  }

  private static Law flywheelEffect() {
    var law = law("flywheel_effect", "flywheel effect GD² about an axis");
    var body = law.body("body", "", "the body");
    var about = law.axis("about", "a", "the axis");
    return law.formula("GD² = 4 I_a; the American WR² or WK² is I_a itself")
        .source("practice of the trade: D is twice the radius of gyration")
        .example(
            "flywheel_effect(wheel, about = shaft)",
            "0.96 kg·m²",
            "1e-9",
            "m D²/2",
            WHEEL,
            "shaft = axis(through = wheel.centre, along = (0, 0, 1))")
        .gives("flywheel_effect", g -> body.in(g).flywheelEffect(about.in(g)));
  }

  private static Law angularMomentum() {
    var law = law("angular_momentum", "angular momentum of a rigid body about a point");
    var body = law.body("body", "", "the body, with its mass m and centre C");
    var spin =
        law.vector("spin", "ω", "angular_velocity", "its angular velocity, seen from the world");
    var about = law.point("about", "A", "the point");
    var velocity =
        law.vector(
            "velocity",
            "v",
            "velocity",
            "velocity of the centre of mass",
            new Need.Optional("that of the place of the body"));
    return law.formula("L_A = I_C ω + (C − A) × m v")
        .source(DYNAMICS)
        .about("about")
        .of("body")
        .example(
            "angular_momentum(wheel, spin = (0, 0, 50) rad/s, about = A).z",
            "12 N·m·s",
            "1e-9",
            "I ω",
            WHEEL,
            "A = point(0, 0, 0)")
        .givesVector(
            "angular_momentum",
            g -> {
              Body of = body.in(g);
              Vector3D ofCentre =
                  velocityOfCentre(of, spin.in(g), Optional.of(about.in(g)), velocity.in(g));
              return of.angularMomentum(spin.in(g), ofCentre, about.in(g)).value();
            });
  }

  private static Law kineticEnergy() {
    var law = law("kinetic_energy", "kinetic energy of a rigid body");
    var body = law.body("body", "", "the body, with its mass m and centre C");
    var spin =
        law.vector("spin", "ω", "angular_velocity", "its angular velocity, seen from the world");
    var about =
        law.point(
            "about",
            "A",
            "a fixed point that it turns about",
            new Need.Optional("its centre of mass"));
    var velocity =
        law.vector(
            "velocity",
            "v",
            "velocity",
            "velocity of the centre of mass",
            new Need.Optional("that of the place of the body, or ω × (C − A)"));
    return law.formula("E = (m v² + ω · I_C ω)/2")
        .source("König's theorem")
        .example("kinetic_energy(wheel, spin = (0, 0, 50) rad/s)", "300 J", "1e-9", "I ω²/2", WHEEL)
        .gives(
            "energy",
            g -> {
              Body of = body.in(g);
              Vector3D carried =
                  about
                      .in(g)
                      .map(a -> spin.in(g).crossProduct(of.centre().minus(a)))
                      .orElse(of.centre().velocity());
              return of.kineticEnergy(spin.in(g), velocity.in(g).orElse(carried));
            });
  }

  /**
   * The velocity of the centre of mass where it is given or beyond doubt: a body that turns about a
   * point beside its centre may carry the centre round or turn about a journal of its own.
   */
  private static Vector3D velocityOfCentre(
      Body body, Vector3D spin, Optional<Point> about, Optional<Vector3D> given) {
    Vector3D own = body.centre().velocity();
    Vector3D round =
        about.map(a -> spin.crossProduct(body.centre().minus(a))).orElse(Vector3D.ZERO);
    double size = spin.getNorm() * about.map(a -> body.centre().minus(a).getNorm()).orElse(0.0);
    if (given.isEmpty() && own.getNorm() == 0 && round.getNorm() > ROUNDING * size) {
      throw new Refusal(
          "velocity",
          "The spin is not along the line from the point to the centre of mass, so it is not clear"
              + " whether the centre goes round the point.",
          "Say how the centre of mass moves: velocity = (0, 0, 0) m/s where it stays, or velocity ="
              + " cross(ω, C - A) where the body turns about the point A.");
    }
    return given.orElse(own);
  }

  private static Law weight() {
    var law = law("weight", "weight of a body, acting at its centre of mass");
    var body = law.body("body", "", "the body, with its mass m and centre C");
    var gravity =
        law.number(
            "g", "g", "acceleration", "acceleration of free fall", STANDARD_FREE_FALL, "g_n");
    return law.formula("F = −m g e_z, at C")
        .source("g_n = 9.80665 m/s², 3rd CGPM, 1901")
        .example(
            "moment(weight(wheel), about = A).y",
            "117.6798 N·m",
            "1e-9",
            "m g l",
            WHEEL,
            "A = point(-1 m, 0, 0)")
        .gives(
            ThingSort.FORCE,
            g ->
                new BoundForce(
                    new Vector3D(0, 0, -body.in(g).mass() * gravity.in(g)), body.in(g).centre()));
  }

  private static Law drivingMoment() {
    var law = law("driving_moment", "moment that a turning rigid body needs");
    var body = law.body("body", "", "the body, with its centre C");
    var spin =
        law.vector("spin", "ω", "angular_velocity", "its angular velocity, seen from the world");
    var acceleration =
        law.vector("acceleration", "α", "angular_acceleration", "the rate of its angular velocity");
    var about =
        law.point(
            "about", "A", "the centre of mass, or a point of the body that is fixed in the world");
    return law.formula("M_A = I_A α + ω × I_A ω")
        .source("Euler's equations of the rigid body")
        .about("about")
        .example(
            "driving_moment(wheel, spin = (0, 2, 50) rad/s, acceleration = (0, 0, 0) rad/s²,"
                + " about = wheel.centre).x",
            "11.64 N·m",
            "1e-9",
            "ω_y ω_z (I_z − I_y)",
            WHEEL)
        .givesVector(
            "torque",
            g -> {
              InertiaTensor inertia = body.in(g).inertia(about.in(g));
              Vector3D rate =
                  inertia
                      .times(acceleration.in(g))
                      .add(spin.in(g).crossProduct(inertia.times(spin.in(g))));
              return fromRate(rate, about.in(g), body.in(g));
            });
  }

  private static Law momentFromRate() {
    var law = law("moment_from_rate", "moment from the rate of an angular momentum");
    var rate = law.vector("rate", "dL/dt", "torque", "rate of the angular momentum about A");
    var about = law.point("about", "A", "the centre of mass, or a point fixed in the world");
    var body = law.body("body", "", "the body whose angular momentum it is, with its centre C");
    return law.formula("M_A = dL_A/dt")
        .source("balance of angular momentum")
        .about("about")
        .example(
            "moment_from_rate(rate, about = wheel.centre, body = wheel).y",
            "4 N·m",
            "1e-9",
            BY_HAND,
            WHEEL,
            "rate = (0, 4, 0) N·m")
        .givesVector("torque", g -> fromRate(rate.in(g), about.in(g), body.in(g)));
  }

  private static Vector3D fromRate(Vector3D rate, Point about, Body body) {
    try {
      return Moment.fromRate(rate, about, body.centre()).value();
    } catch (Refusal refusal) {
      throw new Refusal("about", refusal.reason(), refusal.fix());
    }
  }
}
