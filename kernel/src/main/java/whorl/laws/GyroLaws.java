package whorl.laws;

import java.util.List;
import java.util.function.Function;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.gyro.GimballedWheel;
import whorl.mechanics.gyro.GyroscopicCouple;
import whorl.mechanics.gyro.Nutation;
import whorl.mechanics.gyro.SymmetricTop;

/** Spinning bodies whose axis turns: couples and bearings, tops on a pivot, wheels in gimbals. */
final class GyroLaws {
  /** Up to here the formulas for fast tops are good to a tenth. */
  private static final double FAST = 0.1;

  /** The linearised equations of a gimballed wheel hold up to here. */
  private static final double SMALL = Math.toRadians(10);

  private static final String TURNING_VECTOR = "rate of a vector that turns";
  private static final String TOP = "first integrals of Lagrange's top";
  private static final String LINEAR = "linearised equations of a gyroscope";

  /** The top of the examples: 0.5 kg with its centre of mass 60 mm from the pivot. */
  private static final String TOP_OF_EXAMPLES =
      "axial = 8e-4 kg·m², at_pivot = 2.5e-3 kg·m², weight_moment = T";

  private static final String ITS_WEIGHT = "T = 0.5 kg * g_n * 60 mm";

  private GyroLaws() {}

  static List<Law> all() {
    return List.of(
        gyroscopicCouple(),
        turningMoment(),
        bearingForce(),
        precession(),
        steadyPrecession(
            "slow_precession",
            "steady precession of a top on a pivot, the slower",
            "2.577058290645257 rad/s",
            SymmetricTop.SteadyPrecession::slow),
        steadyPrecession(
            "fast_precession",
            "steady precession of a top on a pivot, the faster",
            "50.38508181955435 rad/s",
            SymmetricTop.SteadyPrecession::fast),
        fastTopPrecession(),
        fastTopError(),
        leastSpin(),
        uprightSpin(),
        nutationRate(),
        nutation(
            "nutation_lowest",
            "largest lean of a top whose axis is released at rest",
            "angle",
            "31.778683530929037 deg",
            "the larger root of (1 − u²)(2 m g l/A)(cos θ − u) = ((C ω₃/A)(cos θ − u))², u = cos θ_max",
            Nutation::lowest),
        nutation(
            "nutation_period",
            "time of one nod of a top whose axis is released at rest",
            "time",
            "0.10337918852819758 s",
            "T = 4 √(A/(2 m g l)) K(κ)/√(u₃ − u₁), with K the complete elliptic integral",
            Nutation::period),
        nutation(
            "mean_precession",
            "mean rate at which a top goes round whose axis is released at rest",
            "angular_velocity",
            "1.8859987888190024 rad/s",
            "φ(T)/T, with φ' = (C ω₃/A)(cos θ₀ − cos θ)/sin² θ",
            Nutation::meanPrecession),
        gimbalNutationRate(),
        gimbalYielding(),
        gimbalTurning());
  }

  private static LawBuilder law(String name, String title) {
    return new LawBuilder(Room.GYROSCOPES, name, title);
  }

  private static LawBuilder.Of<Vector3D> momentum(LawBuilder law) {
    return law.vector("momentum", "L", "angular_momentum", "angular momentum of the spinning body");
  }

  private static LawBuilder.Of<Vector3D> turning(LawBuilder law) {
    return law.vector(
        "turning", "Ω", "angular_velocity", "angular velocity at which its axis turns");
  }

  private static Law gyroscopicCouple() {
    var law = law("gyroscopic_couple", "couple that a spinning body exerts on what turns its axis");
    var momentum = momentum(law);
    var turning = turning(law);
    return law.formula("M = L × Ω, on the bearings")
        .source(TURNING_VECTOR)
        .example(
            "|gyroscopic_couple((0, 50, 0) N·m·s, (0, sin(60 deg), cos(60 deg)) * 0.5 deg/s)|",
            "0.21816615649929118 N·m",
            "1e-9",
            "h Ω sin of the angle between them, 30 deg")
        .givesVector(
            "torque", g -> new GyroscopicCouple(momentum.in(g), turning.in(g)).onBearings());
  }

  private static Law turningMoment() {
    var law = law("turning_moment", "moment that a spinning body needs for its axis to turn");
    var momentum = momentum(law);
    var turning = turning(law);
    return law.formula("M = Ω × L, on the body")
        .source(TURNING_VECTOR)
        .example(
            "turning_moment((0, 0, 30) N·m·s, (0, 2, 0) rad/s).x",
            "60 N·m",
            "1e-9",
            "worked by hand")
        .givesVector("torque", g -> new GyroscopicCouple(momentum.in(g), turning.in(g)).onBody());
  }

  private static Law bearingForce() {
    var law = law("bearing_force", "force on one of two bearings while the axis turns");
    var momentum = momentum(law);
    var turning = turning(law);
    var on = law.point("on", "B", "the bearing that the force acts on");
    var other = law.point("other", "A", "the other bearing");
    return law.formula("F_B = d × (Ω × L)/d², d = B − A; on the bearing, weight not included")
        .source(TURNING_VECTOR)
        .example(
            "moment(bearing_force((30, 0, 0) N·m·s, (0, 0, 2) rad/s, on = B, other = A),"
                + " about = A).y",
            "-60 N·m",
            "1e-9",
            "the couple L × Ω, by hand",
            "A = point(0, 0, 0)",
            "B = point(300 mm, 0, 0)")
        .gives(
            ThingSort.FORCE,
            g ->
                new GyroscopicCouple(momentum.in(g), turning.in(g))
                    .bearings(other.in(g), on.in(g))
                    .onB());
  }

  private static Law precession() {
    var law = law("precession", "turning of the axis of a fast body under a moment");
    var momentum = momentum(law);
    var moment = law.vector("moment", "M", "torque", "moment on it, about its pivot or centre");
    return law.formula("Ω = L × M/L²")
        .source(TURNING_VECTOR + ", for spin fast against Ω")
        .example(
            "precession((0, 15, 0) N·m·s, (30, 0, 0) N·m).z",
            "-2 rad/s",
            "1e-9",
            "M/L, and the right-hand rule")
        .givesVector(
            "angular_velocity", g -> GyroscopicCouple.turningUnder(momentum.in(g), moment.in(g)));
  }

  /** The parameters of a top on a pivot. */
  private static LawBuilder.Of<SymmetricTop> top(LawBuilder law) {
    String inertia = "rotational_inertia";
    var axial = law.number("axial", "C", inertia, "moment of inertia about its axis");
    var atPivot =
        law.number(
            "at_pivot", "A", inertia, "moment of inertia about an axis across it at the pivot");
    var weight =
        law.number(
            "weight_moment",
            "m g l",
            "torque",
            "weight times distance from the pivot to the centre of mass");
    return g -> new SymmetricTop(axial.in(g), atPivot.in(g), weight.in(g));
  }

  private static LawBuilder.NumberOf spin(LawBuilder law) {
    return law.number(
        "spin",
        "ω₃",
        "angular_velocity",
        "angular velocity along the axis, not relative to the frame that precesses");
  }

  private static LawBuilder.NumberOf lean(LawBuilder law) {
    return law.number(
        "lean", "θ", "angle", "angle of the axis, from pivot to centre of mass, from straight up");
  }

  private static Law steadyPrecession(
      String name,
      String title,
      String value,
      Function<SymmetricTop.SteadyPrecession, Double> which) {
    var law = law(name, title);
    var top = top(law);
    var spin = spin(law);
    var lean = lean(law);
    return law.formula("A cos θ Ω² − C ω₃ Ω + m g l = 0")
        .source(TOP)
        .example(
            name + "(" + TOP_OF_EXAMPLES + ", spin = 150 rad/s, lean = 25 deg)",
            value,
            "1e-9",
            "the quadratic, by hand",
            ITS_WEIGHT)
        .gives(
            "angular_velocity",
            g -> which.apply(top.in(g).steadyPrecession(spin.in(g), lean.in(g))));
  }

  private static Law fastTopPrecession() {
    var law = law("fast_top_precession", "slow precession of a fast top, approximate");
    var top = top(law);
    var spin = spin(law);
    return law.formula("Ω ≈ m g l/(C ω₃)")
        .valid("A m g l/(C ω₃)² ≤ 0.1", g -> top.in(g).slowness(spin.in(g)) <= FAST)
        .source(TOP + ", for fast spin")
        .example(
            "fast_top_precession(" + TOP_OF_EXAMPLES + ", spin = 150 rad/s)",
            "2.4516625 rad/s",
            "1e-9",
            "m g l/(C ω₃), which with the axis level is exact",
            ITS_WEIGHT)
        .gives("angular_velocity", g -> top.in(g).fastTopPrecession(spin.in(g)));
  }

  private static Law fastTopError() {
    var law = law("fast_top_error", "error of the fast-top precession, as a part of the exact one");
    var top = top(law);
    var spin = spin(law);
    var lean = lean(law);
    return law.formula("Ω_fast top/Ω_slow − 1")
        .source(TOP)
        .example(
            "1 + fast_top_error(" + TOP_OF_EXAMPLES + ", spin = 150 rad/s, lean = 90 deg)",
            "1",
            "1e-9",
            "with the axis level both are the same",
            ITS_WEIGHT)
        .gives("number", g -> top.in(g).fastTopError(spin.in(g), lean.in(g)));
  }

  private static Law leastSpin() {
    var law = law("least_spin", "least spin for steady precession of a top");
    var top = top(law);
    var lean = lean(law);
    return law.formula("ω₃ = 2 √(A m g l cos θ)/C; 0 with the axis level or below")
        .source(TOP)
        .example(
            "least_spin(" + TOP_OF_EXAMPLES + ", lean = 40 deg)",
            "59.34142368312661 rad/s",
            "1e-9",
            "C² ω₃² = 4 A m g l cos θ",
            ITS_WEIGHT)
        .gives("angular_velocity", g -> top.in(g).leastSpin(lean.in(g)));
  }

  private static Law uprightSpin() {
    var law = law("upright_spin", "spin above which a top stands upright");
    var top = top(law);
    return law.formula("ω₃ = 2 √(A m g l)/C")
        .source(TOP)
        .example(
            "upright_spin(" + TOP_OF_EXAMPLES + ")",
            "67.80020049749115 rad/s",
            "1e-9",
            "C² ω₃² = 4 A m g l",
            ITS_WEIGHT)
        .gives("angular_velocity", g -> top.in(g).uprightSpin());
  }

  private static Law nutationRate() {
    var law = law("nutation_rate", "small nutation about slow steady precession");
    var top = top(law);
    var spin = spin(law);
    var lean = lean(law);
    return law.formula("Λ² = Ω² − 2 m g l cos θ/A + (m g l/(A Ω))²; near C ω₃/A for a fast top")
        .source(TOP + ", linearised about steady precession")
        .example(
            "nutation_rate(" + TOP_OF_EXAMPLES + ", spin = 150 rad/s, lean = 90 deg)",
            "48.062570145737176 rad/s",
            "1e-9",
            "√(Ω² + (C ω₃/A)²) with the axis level, by hand",
            ITS_WEIGHT)
        .gives(
            "angular_velocity",
            g -> {
              double slow = top.in(g).steadyPrecession(spin.in(g), lean.in(g)).slow();
              return top.in(g).nutationRate(slow, lean.in(g));
            });
  }

  private static Law nutation(
      String name,
      String title,
      String kind,
      String value,
      String formula,
      Function<Nutation, Double> what) {
    var law = law(name, title);
    var top = top(law);
    var spin = spin(law);
    var lean = lean(law);
    return law.formula(formula)
        .source(TOP)
        .example(
            name + "(" + TOP_OF_EXAMPLES + ", spin = 200 rad/s, lean = 30 deg)",
            value,
            "1e-9",
            "the first integrals, integrated apart at high precision",
            ITS_WEIGHT)
        .gives(kind, g -> what.apply(top.in(g).nutation(spin.in(g), lean.in(g))));
  }

  /** The parameters of a wheel in gimbals. */
  private static LawBuilder.Of<GimballedWheel> wheel(LawBuilder law) {
    String inertia = "rotational_inertia";
    var momentum = law.number("momentum", "h", "angular_momentum", "angular momentum of the wheel");
    var aboutMoment =
        law.number("about_moment", "I₁", inertia, "moment of inertia about the axis of the moment");
    var aboutOther =
        law.number("about_other", "I₂", inertia, "moment of inertia about the other gimbal's axis");
    return g -> new GimballedWheel(momentum.in(g), aboutMoment.in(g), aboutOther.in(g));
  }

  private static final String WHEEL_OF_EXAMPLES =
      "momentum = 2 N·m·s, about_moment = 0.02 kg·m², about_other = 0.005 kg·m²";

  private static Law gimbalNutationRate() {
    var law = law("gimbal_nutation_rate", "nod of a wheel in gimbals");
    var wheel = wheel(law);
    return law.formula("Λ = h/√(I₁ I₂)")
        .source(LINEAR)
        .example(
            "gimbal_nutation_rate(" + WHEEL_OF_EXAMPLES + ")",
            "200 rad/s",
            "1e-9",
            "worked by hand")
        .gives("angular_velocity", g -> wheel.in(g).nutationRate());
  }

  private static Law gimbalYielding() {
    var law = law("gimbal_yielding", "how far a wheel in gimbals gives way to a steady moment");
    var wheel = wheel(law);
    var moment = law.number("moment", "M", "torque", "steady moment, from rest");
    var time = law.number("time", "t", "time", "time since it began");
    return law.formula("α = (M I₂/h²)(1 − cos Λt), Λ = h/√(I₁ I₂)")
        .valid(
            "M t/h ≤ 10 deg", g -> Math.abs(wheel.in(g).turned(moment.in(g), time.in(g))) <= SMALL)
        .source(LINEAR)
        .example(
            "gimbal_yielding("
                + WHEEL_OF_EXAMPLES
                + ", moment = 0.1 N·m, time = 15.707963267948966 ms)",
            "0.00025 rad",
            "1e-9",
            "2 M I₂/h², half a nod on")
        .gives("angle", g -> wheel.in(g).yielding(moment.in(g), time.in(g)));
  }

  private static Law gimbalTurning() {
    var law = law("gimbal_turning", "how far the other gimbal turns under a steady moment");
    var wheel = wheel(law);
    var moment = law.number("moment", "M", "torque", "steady moment, from rest");
    var time = law.number("time", "t", "time", "time since it began");
    return law.formula("β = (M/h)(t − sin(Λt)/Λ), Λ = h/√(I₁ I₂)")
        .valid(
            "M t/h ≤ 10 deg", g -> Math.abs(wheel.in(g).turned(moment.in(g), time.in(g))) <= SMALL)
        .source(LINEAR)
        .example(
            "gimbal_turning("
                + WHEEL_OF_EXAMPLES
                + ", moment = 0.1 N·m, time = 31.415926535897932 ms)",
            "0.0015707963267948967 rad",
            "1e-9",
            "M t/h after a whole nod")
        .gives("angle", g -> wheel.in(g).turned(moment.in(g), time.in(g)));
  }
}
