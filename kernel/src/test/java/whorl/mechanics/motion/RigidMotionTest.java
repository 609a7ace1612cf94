package whorl.mechanics.motion;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.hipparchus.special.elliptic.jacobi.CopolarN;
import org.hipparchus.special.elliptic.jacobi.JacobiEllipticBuilder;
import org.hipparchus.special.elliptic.legendre.LegendreEllipticIntegral;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.mechanics.CheckCases;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.MassProperties;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/** Rigid bodies against exact solutions and their invariants. */
class RigidMotionTest {
  private static final Vector3D X = Vector3D.PLUS_I;
  private static final Vector3D Z = Vector3D.PLUS_K;
  private static final Load WEIGHT = new Load.Weight(Load.STANDARD_GRAVITY);

  private static Body body(double mass, double first, double second, double third) {
    return Body.of(
        new MassProperties(mass, Vector3D.ZERO, InertiaTensor.diagonal(first, second, third)));
  }

  private static RigidMotion torqueFree(Body body, Vector3D rate, double limit) {
    return RigidMotion.of(body, new Support.AtCentre(), rate, List.of(), limit);
  }

  private static StateFunction bodyRate(RigidMotion motion, Vector3D axis) {
    return (t, y) -> motion.attitude(y).applyInverseTo(motion.rate(y)).dotProduct(axis);
  }

  /** A top of symmetric inertia on a pivot at the origin, leaning over by an angle about x. */
  private static Body top(double mass, double arm, double axial, double atPivot, double lean) {
    double atCentre = atPivot - mass * arm * arm;
    return Body.of(
            new MassProperties(
                mass, new Vector3D(0, 0, arm), InertiaTensor.diagonal(atCentre, atCentre, axial)))
        .turned(new Axis(Point.ORIGIN, X), lean);
  }

  private static RigidMotion onPivot(Body body, Vector3D rate, double limit) {
    return RigidMotion.of(body, new Support.Pivot(Point.ORIGIN), rate, List.of(WEIGHT), limit);
  }

  @ParameterizedTest
  @ValueSource(strings = {"T08", "T09"})
  void anAsymmetricBodyFollowsTheEllipticFunctions(String id) {
    var known = CheckCases.named(id);
    Body body = body(1, known.given("I1"), known.given("I2"), known.given("I3"));
    Vector3D rate = new Vector3D(known.given("w1_0"), known.given("w2_0"), known.given("w3_0"));
    RigidMotion motion = torqueFree(body, rate, 10);
    MotionRun run = motion.run();
    known.holds("L", motion.momentum(run.state(0)).getNorm());
    known.holds("T", motion.kineticEnergy(run.state(0)));
    for (String time : List.of("0.5", "1", "2.3", "5")) {
      double t = Double.parseDouble(time);
      known.holds("w1_at_" + time + "s", run.value(bodyRate(motion, X), t));
      known.holds("w2_at_" + time + "s", run.value(bodyRate(motion, Vector3D.PLUS_J), t));
      known.holds("w3_at_" + time + "s", run.value(bodyRate(motion, Z), t));
    }
    StateFunction across = bodyRate(motion, Vector3D.PLUS_J);
    double half = run.firstTime((t, y) -> t < 0.1 ? 1 : across.at(t, y), 0).orElseThrow();
    known.holds("period", 2 * half, 1e-9);
  }

  /**
   * The closed form in L. D. Landau and E. M. Lifshitz, Mechanics, section 37 (from memory), with
   * the elliptic functions of Hipparchus 4.0; random bodies about their axis of largest inertia.
   */
  @Test
  void randomAsymmetricBodiesFollowTheEllipticFunctionsOfAnotherLibrary() {
    var random = new SplittableRandom(7);
    for (int n = 0; n < 20; n++) {
      double i1 = 1 + random.nextDouble();
      double i2 = i1 * (1.05 + 0.3 * random.nextDouble());
      double i3 = i2 + (i1 - (i2 - i1)) * (0.05 + 0.6 * random.nextDouble()) * 0.5;
      double w1 = random.nextDouble();
      double w3 = w1 * Math.sqrt(i1 * (i2 - i1) / (i3 * (i3 - i2))) * (1.1 + random.nextDouble());
      double square = i1 * i1 * w1 * w1 + i3 * i3 * w3 * w3;
      double twice = i1 * w1 * w1 + i3 * w3 * w3;
      double tau = Math.sqrt((i3 - i2) * (square - twice * i1) / (i1 * i2 * i3));
      double m = (i2 - i1) * (twice * i3 - square) / ((i3 - i2) * (square - twice * i1));
      RigidMotion motion = torqueFree(body(1, i1, i2, i3), new Vector3D(w1, 0, w3), 30);
      MotionRun run = motion.run();
      double w2 = Math.sqrt((twice * i3 - square) / (i2 * (i3 - i2)));
      for (double t : new double[] {0.7, 5, 17.3, 30}) {
        CopolarN exact = JacobiEllipticBuilder.build(m).valuesN(tau * t);
        assertEquals(w1 * exact.cn(), run.value(bodyRate(motion, X), t), 1e-9);
        assertEquals(w2 * exact.sn(), run.value(bodyRate(motion, Vector3D.PLUS_J), t), 1e-9);
        assertEquals(w3 * exact.dn(), run.value(bodyRate(motion, Z), t), 1e-9);
      }
    }
  }

  @Test
  void theSeparatrixIsFollowedForAShortTime() {
    var known = CheckCases.named("T11");
    Body body = body(1, known.given("I1"), known.given("I2"), known.given("I3"));
    Vector3D rate = new Vector3D(known.given("w1_0"), known.given("w2_0"), known.given("w3_0"));
    RigidMotion motion = torqueFree(body, rate, 1);
    MotionRun run = motion.run();
    known.holds("w1_at_0.3s", run.value(bodyRate(motion, X), 0.3));
    known.holds("w2_at_0.3s", run.value(bodyRate(motion, Vector3D.PLUS_J), 0.3));
    known.holds("w3_at_0.3s", run.value(bodyRate(motion, Z), 0.3));
  }

  @Test
  void turningAboutTheIntermediateAxisTipsOverAndAboutTheOthersDoesNot() {
    Body body = body(1, 2, 3, 4);
    double speed = 10;
    Vector3D nudge = new Vector3D(1e-4, 1e-4, 1e-4);
    for (int axis = 0; axis < 3; axis++) {
      Vector3D along = List.of(X, Vector3D.PLUS_J, Z).get(axis);
      RigidMotion motion = torqueFree(body, along.scalarMultiply(speed).add(nudge), 30);
      double least = motion.run().least(bodyRate(motion, along)).value();
      if (axis == 1) {
        assertEquals(-speed, least, 0.01);
      } else {
        assertEquals(speed, least, 0.01);
      }
    }
  }

  @Test
  void aSmallWobbleHasTheFrequencyOfTheLinearEquations() {
    var known = CheckCases.named("T12");
    double speed = known.given("omega");
    Body body = body(1, known.given("I1"), known.given("I2"), known.given("I3"));
    double about3 = quarterPeriod(torqueFree(body, new Vector3D(1e-4, 0, speed), 1), X);
    known.holds("about_I3", Math.PI / 2 / about3, 1e-8);
    double about1 =
        quarterPeriod(torqueFree(body, new Vector3D(speed, 1e-4, 0), 1), Vector3D.PLUS_J);
    known.holds("about_I1", Math.PI / 2 / about1, 1e-8);
  }

  private static double quarterPeriod(RigidMotion motion, Vector3D along) {
    return motion.run().firstTime(bodyRate(motion, along), 0).orElseThrow();
  }

  @Test
  void aSymmetricBodyWobblesAndPrecessesSteadily() {
    var known = CheckCases.named("T02");
    Body body = body(1, known.given("A"), known.given("A"), known.given("C"));
    double across = known.given("omega_t");
    RigidMotion motion = torqueFree(body, new Vector3D(across, 0, known.given("omega3")), 2);
    MotionRun run = motion.run();
    double quarter = run.firstTime(bodyRate(motion, X), 0).orElseThrow();
    known.holds("abs_Omega_body", Math.PI / 2 / quarter, 1e-9);
    // For C < A the sense in the body is against the spin.
    assertTrue(run.value(bodyRate(motion, Vector3D.PLUS_J), quarter) < 0);
    Vector3D momentum = motion.momentum(run.state(0));
    known.holds("theta_LtoAxis", Vector3D.angle(momentum, motion.axis(run.state(1.3))), 1e-9);
    Vector3D before = motion.axis(run.state(0)).crossProduct(momentum);
    Vector3D behind = motion.axis(run.state(0.1)).crossProduct(momentum);
    known.holds("phi_dot", Vector3D.angle(before, behind) / 0.1, 1e-9);
  }

  @Test
  void theEarthAsARigidBodyWobblesInThreeHundredAndFourDays() {
    var known = CheckCases.named("T04");
    double flattening = 3273795e-9;
    double turn = 7.292115e-5;
    Body earth = body(1, 1 - flattening, 1 - flattening, 1);
    RigidMotion motion = torqueFree(earth, new Vector3D(1e-6 * turn, 0, turn), 80 * 86_400.0);
    double quarter = quarterPeriod(motion, X);
    known.holds("period_days", 4 * quarter, 1e-8);
    known.holds("period_rot", 4 * quarter * turn / (2 * Math.PI), 1e-8);
  }

  @Test
  void theSpinningStationPrecessesBackwards() {
    var known = CheckCases.named("T13");
    Body station = body(1, 32 / 3.0, 32 / 3.0, 56 / 3.0);
    // The sense is that of the spin relative to the precessing frame.
    double angle = Math.toRadians(20);
    double precession = 2 * Math.PI / known.expected("T_precession_20deg");
    Vector3D rate =
        new Vector3D(precession * Math.sin(angle), 0, precession * Math.cos(angle) - Math.PI / 2);
    RigidMotion motion = torqueFree(station, rate, 3);
    MotionRun run = motion.run();
    Vector3D momentum = motion.momentum(run.state(0));
    assertEquals(angle, Vector3D.angle(momentum, Z), 1e-9);
    Vector3D start = motion.axis(run.state(0));
    Vector3D back = motion.axis(run.state(known.expected("T_precession_20deg")));
    assertEquals(0, Vector3D.angle(start, back), 1e-8);
  }

  @ParameterizedTest
  @ValueSource(strings = {"Y11", "Y12"})
  void aTopReleasedFromRestOfItsAxisNutatesAsTheCubicSays(String id) {
    var known = CheckCases.named(id);
    double lean = known.given("theta0");
    Body top =
        top(
            known.given("m"),
            known.given("l"),
            known.given("C_axial"),
            known.given("A_pivot"),
            lean);
    Vector3D axis = new Vector3D(0, -Math.sin(lean), Math.cos(lean));
    RigidMotion motion = onPivot(top, axis.scalarMultiply(known.given("omega3")), 2);
    MotionRun run = motion.run();
    StateFunction angle = (t, y) -> Vector3D.angle(motion.axis(y), Z);
    assertEquals(lean, run.least(angle).value(), 1e-10);
    Extreme lowest = run.peak(angle);
    known.holds("theta_max", lowest.value(), 1e-9);
    known.holds("T_nutation", period(run, motion), 1e-8);
  }

  /** The time from rest of the axis to its next rest: the axis stands still at its highest. */
  private static double period(MotionRun run, RigidMotion motion) {
    StateFunction sinking = (t, y) -> motion.axis(y).dotProduct(Z);
    double low = run.firstTime(sinking, run.least(sinking).value() + 1e-9).orElseThrow();
    double quarter = run.firstTime((t, y) -> t < low ? 1 : rise(motion, y), 0).orElseThrow();
    return 2 * quarter;
  }

  /** How fast the axis sinks. */
  private static double rise(RigidMotion motion, double[] state) {
    return -motion.rate(state).crossProduct(motion.axis(state)).dotProduct(Z);
  }

  @Test
  void theBoomsStabiliserDipsAndPrecessesAsItsSymmetricTopEquations() {
    // Independent integration of the symmetric-top equations, relative tolerance 1e-12.
    double mass = 7850 * Math.PI * 0.16 * 0.16 * 0.03;
    double axial = mass * 0.16 * 0.16 / 2;
    double across = mass * (3 * 0.16 * 0.16 + 0.03 * 0.03) / 12 + mass * 0.18 * 0.18;
    double lean = Math.toRadians(120);
    Vector3D axis = new Vector3D(0, -Math.sin(lean), Math.cos(lean));
    RigidMotion motion =
        onPivot(top(mass, 0.18, axial, across, lean), axis.scalarMultiply(62.83), 6);
    MotionRun run = motion.run();
    StateFunction angle = (t, y) -> Vector3D.angle(motion.axis(y), Z);
    assertEquals(Math.toRadians(128.9324), run.peak(angle).value(), 1e-6);
    assertEquals(0.2713287, period(run, motion), 1e-7);
    StateFunction azimuthRate =
        (t, y) -> {
          Vector3D now = motion.axis(y);
          Vector3D change = motion.rate(y).crossProduct(now);
          return (now.getX() * change.getY() - now.getY() * change.getX())
              / (now.getX() * now.getX() + now.getY() * now.getY());
        };
    assertEquals(12.33087, run.integral(azimuthRate), 1e-5);
  }

  @Test
  void energyAndAngularMomentumHoldOverAThousandTurns() {
    double turns = 1000;
    double speed = 30;
    double limit = turns * 2 * Math.PI / speed;
    var random = new SplittableRandom(3);
    for (int n = 0; n < 3; n++) {
      Body body = body(2, 0.8 + 0.1 * random.nextDouble(), 1.5, 2.1);
      Vector3D rate = new Vector3D(speed, 0.3 * speed, 0.5 * speed);
      assertKept(torqueFree(body, rate, limit));
      Body leaning = top(0.5, 0.06, 8e-4, 2.5e-3, 0.4 + n);
      assertKept(onPivot(leaning, new Vector3D(0, 1, 4 * speed), limit));
      Body heavy =
          Body.of(
              new MassProperties(
                  0.5,
                  new Vector3D(0.02, 0.01, 0.05),
                  new InertiaTensor(2e-3, 1.5e-3, 8e-4, 1e-4, -2e-4, 1e-4)));
      assertKept(onPivot(heavy, new Vector3D(0, 1, speed), limit));
    }
  }

  private static void assertKept(RigidMotion motion) {
    List<Kept> kept = motion.run().kept();
    assertTrue(kept.size() >= 2, kept.toString());
    for (Kept quantity : kept) {
      assertTrue(quantity.relative() < 1e-9, quantity.toString());
    }
  }

  @Test
  void theTwoSchemesAgreeOnATopThatIsNotSymmetric() {
    Body heavy =
        Body.of(
            new MassProperties(
                0.5,
                new Vector3D(0.02, 0.01, 0.05),
                new InertiaTensor(2e-3, 1.5e-3, 8e-4, 1e-4, -2e-4, 1e-4)));
    Vector3D rate = new Vector3D(1, 2, 20);
    RigidMotion split = onPivot(heavy, rate, 3);
    // A couple of nothing is no potential, so this one goes to the adaptive scheme.
    RigidMotion adaptive =
        RigidMotion.of(
            heavy,
            new Support.Pivot(Point.ORIGIN),
            rate,
            List.of(WEIGHT, new Load.Couple(Vector3D.ZERO, true)),
            3);
    assertTrue(split.isConservative());
    assertTrue(!adaptive.isConservative());
    MotionRun one = split.run();
    MotionRun other = adaptive.run();
    for (double t = 0; t <= 3; t += 0.37) {
      double apart = split.axis(one.state(t)).distance(adaptive.axis(other.state(t)));
      assertEquals(0, apart, 1e-8, "t = " + t);
    }
  }

  @Test
  void aFreeBodyFallsOnAParabolaAndTurnsAsIfAtRest() {
    Body body = body(2, 0.8, 1.5, 2.1);
    Vector3D rate = new Vector3D(1, 0, 2);
    RigidMotion motion =
        RigidMotion.of(body, new Support.Free(), rate, List.of(WEIGHT), 2)
            .moving(new Vector3D(3, 0, 4));
    MotionRun run = motion.run();
    Vector3D end = motion.centre(run.state(2));
    assertEquals(6, end.getX(), 1e-12);
    assertEquals(8 - Load.STANDARD_GRAVITY * 2, end.getZ(), 1e-11);
    assertEquals(
        CheckCases.named("T08").expected("w2_at_1s"),
        run.value(bodyRate(motion, Vector3D.PLUS_J), 1),
        1e-9);
    assertEquals(2, run.kept().size(), run.kept().toString());
    assertTrue(
        run.kept().stream().allMatch(kept -> kept.relative() < 1e-12), run.kept().toString());
  }

  @Test
  void loadsFixedInTheBodyTurnWithItAndThoseFixedInSpaceDoNot() {
    Body body = body(1, 2, 2, 2);
    var inBody = new Load.Couple(new Vector3D(0, 0, 3), true);
    RigidMotion about =
        RigidMotion.of(body, new Support.AtCentre(), Vector3D.ZERO, List.of(inBody), 4);
    assertEquals(6, about.rate(about.run().state(4)).getZ(), 1e-10);
    // A thrust along the body's own x: turning at 1 rad/s it drives the centre round a circle.
    var thrust = new Load.Force(new Vector3D(1, 0, 0), Vector3D.ZERO, true);
    RigidMotion round =
        RigidMotion.of(body, new Support.Free(), Z, List.of(thrust), 2 * Math.PI)
            .moving(new Vector3D(0, -1, 0));
    MotionRun run = round.run();
    assertEquals(0, round.centre(run.state(2 * Math.PI)).getNorm(), 1e-10);
    // The same fixed in space: a steady acceleration along x.
    var push = new Load.Force(new Vector3D(1, 0, 0), Vector3D.ZERO, false);
    RigidMotion straight = RigidMotion.of(body, new Support.Free(), Z, List.of(push), 2);
    assertEquals(2, straight.centre(straight.run().state(2)).getX(), 1e-11);
    var varying =
        new Load.Varying((t, y) -> new Load.Wrench(Vector3D.ZERO, new Vector3D(0, 0, 3 * t)));
    RigidMotion driven =
        RigidMotion.of(body, new Support.AtCentre(), Vector3D.ZERO, List.of(varying), 2);
    assertEquals(3, driven.rate(driven.run().state(2)).getZ(), 1e-10);
  }

  @Test
  void aStopIsFoundByBothSchemes() {
    Body pendulum = top(1, 1, 1e-3, 1.001, 1);
    RigidMotion falling = onPivot(pendulum, Vector3D.ZERO, 10);
    Condition lowest = Condition.atLeastZero((t, y) -> -falling.axis(y).getZ() - 0.9);
    MotionRun run = falling.stopWhen(lowest).run();
    assertEquals(Ending.STOPPED, run.ending());
    assertEquals(-0.9, falling.axis(run.state(run.duration())).getZ(), 1e-12);
  }

  /** The time of a pendulum at large swing: 4 √(I/(m g l)) K(sin²(α/2)) by the other library. */
  @Test
  void aThinRodSwingsAsAPendulum() {
    Body rod =
        Body.of(
                new MassProperties(
                    2, new Vector3D(0, 0, -0.5), InertiaTensor.diagonal(1 / 6.0, 1 / 6.0, 0)))
            .turned(new Axis(Point.ORIGIN, X), 2);
    RigidMotion motion = onPivot(rod, Vector3D.ZERO, 3);
    MotionRun run = motion.run();
    double quarter = run.firstTime((t, y) -> motion.centre(y).getY(), 0).orElseThrow();
    double exact =
        Math.sqrt(2 / 3.0 / (2 * Load.STANDARD_GRAVITY * 0.5))
            * LegendreEllipticIntegral.bigK(Math.pow(Math.sin(1), 2));
    assertEquals(exact, quarter, 1e-9);
  }

  @Test
  void aBodyWithoutInertiaAboutAnAxisAndAPivotThatMovesAreRefused() {
    Body rod = body(1, 1, 1, 0);
    assertThrows(Refusal.class, () -> torqueFree(rod, Z, 1));
    assertThrows(Refusal.class, () -> torqueFree(body(1, 0, 0, 0), X, 1));
    assertThrows(Refusal.class, () -> new Support.Pivot(new Point(Vector3D.ZERO, X)));
  }
}
