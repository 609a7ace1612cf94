package whorl.mechanics.gyro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.mechanics.CheckCases;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.MassProperties;
import whorl.mechanics.motion.Load;
import whorl.mechanics.motion.MotionRun;
import whorl.mechanics.motion.RigidMotion;
import whorl.mechanics.motion.StateFunction;
import whorl.mechanics.motion.Support;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

/** Gyroscopes against published cases, closed forms and full motions. */
class GyroTest {
  private static final Vector3D X = Vector3D.PLUS_I;
  private static final Vector3D Y = Vector3D.PLUS_J;
  private static final Vector3D Z = Vector3D.PLUS_K;

  private static SymmetricTop top(CheckCases.Case known) {
    double pivot = known.given().containsKey("A_pivot") ? known.given("A_pivot") : 0;
    double axial = known.given(known.given().containsKey("C_axial") ? "C_axial" : "C");
    double gravity = known.given().containsKey("g") ? known.given("g") : Load.STANDARD_GRAVITY;
    return new SymmetricTop(axial, pivot, known.given("m") * gravity * known.given("l"));
  }

  @Test
  void aDiscThatPrecessesLoadsItsBearingsUpAndDown() {
    var known = CheckCases.named("Y01");
    double radius = known.given("d") / 2;
    double inertia = known.given("m") * radius * radius / 2;
    // Shaft along y from A to B, the disc midway; it precesses about the vertical.
    Vector3D spin = new Vector3D(0, inertia * known.given("n"), 0);
    Vector3D turning = new Vector3D(0, 0, known.given("n_precession"));
    var couple = new GyroscopicCouple(spin, turning);
    var span = new Vector3D(0, known.given("span"), 0);
    GyroscopicCouple.Bearings bearings = couple.bearings(Point.ORIGIN, Point.fixed(span));
    double half = known.given("m") * known.given("g") / 2;
    double onA = bearings.onA().force().getZ() - half;
    double onB = bearings.onB().force().getZ() - half;
    // The shaft presses A down and lifts B, so the bearings push up at A and down at B.
    known.holds("R_A", -onA);
    known.holds("R_B", onB);
    Vector3D together =
        bearings
            .onA()
            .moment(Point.ORIGIN)
            .value()
            .add(bearings.onB().moment(Point.ORIGIN).value());
    assertEquals(0, together.distance(couple.onBearings()), 1e-12);
  }

  @Test
  void anEngineInATurnAndAShipsRotorHaveTheirCouples() {
    var plane = CheckCases.named("Y02");
    double inertia = plane.given("m") * Math.pow(plane.given("k"), 2);
    var inTurn =
        new GyroscopicCouple(
            new Vector3D(inertia * plane.given("n"), 0, 0),
            new Vector3D(0, 0, plane.given("v") / plane.given("R_turn")));
    plane.holds("C", inTurn.onBody().getNorm());
    // Spin ahead along x, turning to port about z up: the couple on the airframe pitches the nose.
    assertTrue(inTurn.onBody().getY() > 0);
    assertTrue(inTurn.onBearings().getY() < 0);

    var ship = CheckCases.named("Y03");
    double rotor = ship.given("m") * Math.pow(ship.given("k"), 2) * ship.given("n");
    var steer =
        new GyroscopicCouple(
            new Vector3D(rotor, 0, 0), new Vector3D(0, 0, ship.given("v") / ship.given("R")));
    ship.holds("C_steer", steer.onBody().getNorm());
    double pitching = ship.given("pitch_total") / 2 * 2 * Math.PI / ship.given("t_p");
    var pitch = new GyroscopicCouple(new Vector3D(rotor, 0, 0), new Vector3D(0, pitching, 0));
    ship.holds("C_pitch", pitch.onBody().getNorm());

    var other = CheckCases.named("Y04");
    double momentum = other.given("m") * Math.pow(other.given("k"), 2) * other.given("n");
    double rate = 2 * Math.PI / other.given("t_p");
    var largest =
        new GyroscopicCouple(
            new Vector3D(momentum, 0, 0), new Vector3D(0, other.given("phi") * rate, 0));
    other.holds("C_max", largest.onBody().getNorm());
  }

  @Test
  void aMomentumWheelIsSlewedByTheCrossProduct() {
    var known = CheckCases.named("Y14");
    double angle = known.given("angle_between");
    Vector3D momentum = new Vector3D(known.given("h"), 0, 0);
    Vector3D turning =
        new Vector3D(Math.cos(angle), Math.sin(angle), 0).scalarMultiply(known.given("rate"));
    known.holds("M", new GyroscopicCouple(momentum, turning).onBody().getNorm());
  }

  @Test
  void bearingsCarryNoCoupleAlongTheirLine() {
    var couple = new GyroscopicCouple(X, Y);
    assertThrows(Refusal.class, () -> couple.bearings(Point.ORIGIN, Point.fixed(0, 0, 1)));
    assertThrows(Refusal.class, () -> couple.bearings(Point.ORIGIN, Point.ORIGIN));
  }

  @Test
  void aMomentTurnsTheAxisTowardsItself() {
    Vector3D turning = GyroscopicCouple.turningUnder(new Vector3D(0, 0, 5), new Vector3D(2, 0, 0));
    assertEquals(0, turning.distance(new Vector3D(0, 0.4, 0)), 1e-15);
    Vector3D back = new GyroscopicCouple(new Vector3D(0, 0, 5), turning).onBody();
    assertEquals(0, back.distance(new Vector3D(2, 0, 0)), 1e-15);
    assertThrows(Refusal.class, () -> GyroscopicCouple.turningUnder(Vector3D.ZERO, X));
    assertThrows(Refusal.class, () -> GyroscopicCouple.rateAbout(Z, X, Z));
  }

  @Test
  void theSunTurnsTheEarthsAxisAtItsShareOfThePrecession() {
    var known = CheckCases.named("T07");
    double flattening = 3273795e-9;
    double orbit = 2 * Math.PI / (365.25636 * 86_400);
    double tilt = known.given("eps");
    // Per unit of the polar moment of inertia; the mean moment of the Sun over a year is along −x.
    Vector3D momentum =
        new Vector3D(0, -Math.sin(tilt), Math.cos(tilt)).scalarMultiply(7.292115e-5);
    double mean = 1.5 * orbit * orbit * flattening * Math.sin(tilt) * Math.cos(tilt);
    double rate = GyroscopicCouple.rateAbout(momentum, new Vector3D(-mean, 0, 0), Z);
    assertTrue(rate < 0, "the axis goes round against the orbit");
    known.holds("rate", -rate);
    var whole = CheckCases.named("T06");
    whole.holds("period", 2 * Math.PI / whole.expected("rate"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"Y09"})
  void aLevelTopHasOneSteadyPrecession(String id) {
    var known = CheckCases.named(id);
    SymmetricTop.SteadyPrecession steady =
        top(known).steadyPrecession(known.given("omega3"), known.given("theta"));
    known.holds("Omega", steady.slow());
    assertTrue(Double.isInfinite(steady.fast()));
  }

  @Test
  void theSpinMayBeGivenRelativeToThePrecessingFrame() {
    var known = CheckCases.named("Y08");
    double lean = known.given("theta");
    SymmetricTop top = top(known);
    SymmetricTop.SteadyPrecession steady =
        top.steadyPrecessionOfRelative(known.given("psi_dot"), lean);
    known.holds("Omega_slow", steady.slow());
    known.holds("Omega_fast", steady.fast());
    double spin = SymmetricTop.spinOfRelative(known.given("psi_dot"), steady.slow(), lean);
    assertEquals(steady.slow(), top.steadyPrecession(spin, lean).slow(), 1e-12);
  }

  @Test
  void aTopStandsUprightAboveItsThreshold() {
    var known = CheckCases.named("Y10");
    SymmetricTop top = top(known);
    known.holds("omega3_sleep", top.uprightSpin());
    known.holds("n_sleep", top.uprightSpin());
    known.holds("omega3_min_theta", top.leastSpin(known.given("theta")));
    assertEquals(0, top.leastSpin(2));
    // A full motion, nudged: above the threshold it stays up, below it falls.
    assertTrue(tipsOver(top, 0.98 * top.uprightSpin()));
    assertTrue(!tipsOver(top, 1.02 * top.uprightSpin()));
  }

  private static boolean tipsOver(SymmetricTop top, double spin) {
    RigidMotion motion = motion(top, 1e-4, spin, 0, 5);
    return motion.run().peak((t, y) -> Vector3D.angle(motion.axis(y), Z)).value() > 0.1;
  }

  /** The full motion of a top of a mass of 1 kg, its axis leaning about x and going round. */
  private static RigidMotion motion(
      SymmetricTop top, double lean, double spin, double precession, double limit) {
    double arm = top.weightMoment() / Load.STANDARD_GRAVITY;
    double across = top.atPivot() - arm * arm;
    Body body =
        Body.of(
                new MassProperties(
                    1,
                    new Vector3D(0, 0, arm),
                    InertiaTensor.diagonal(across, across, top.axial())))
            .turned(new Axis(Point.ORIGIN, X), lean);
    Vector3D axis = new Vector3D(0, -Math.sin(lean), Math.cos(lean));
    Vector3D relative = axis.scalarMultiply(spin - precession * Math.cos(lean));
    return RigidMotion.of(
        body,
        new Support.Pivot(Point.ORIGIN),
        relative.add(precession, Z),
        List.of(new Load.Weight(Load.STANDARD_GRAVITY)),
        limit);
  }

  @Test
  void bothSteadyPrecessionsAreSteadyInAFullMotion() {
    var top = new SymmetricTop(8e-4, 2.5e-3, 0.06 * Load.STANDARD_GRAVITY * 0.5);
    for (double lean : new double[] {0.5, 1.2, 2.3}) {
      SymmetricTop.SteadyPrecession steady = top.steadyPrecession(150, lean);
      for (double rate : new double[] {steady.slow(), steady.fast()}) {
        RigidMotion motion = motion(top, lean, 150, rate, 1);
        MotionRun run = motion.run();
        StateFunction angle = (t, y) -> Vector3D.angle(motion.axis(y), Z);
        assertEquals(lean, run.peak(angle).value(), 1e-8);
        assertEquals(lean, run.least(angle).value(), 1e-8);
      }
    }
  }

  @Test
  void aTopThatIsTooSlowForSteadyPrecessionIsRefusedWithTheLeastSpin() {
    var known = CheckCases.named("Z23");
    var top =
        new SymmetricTop(
            known.given("C"),
            known.given("A_pivot"),
            known.given("m") * Load.STANDARD_GRAVITY * known.given("l"));
    var refusal =
        assertThrows(
            Refusal.class, () -> top.steadyPrecession(known.given("omega3"), known.given("theta")));
    assertEquals("spin", refusal.subject());
    assertEquals(
        "At 60 rad/s the top does not precess steadily with a lean of 25 deg; that takes at least"
            + " 64.5459 rad/s.",
        refusal.reason());
    assertThrows(Refusal.class, () -> top.steadyPrecession(0, 1));
    assertThrows(Refusal.class, () -> top.steadyPrecession(100, 4));
    assertThrows(Refusal.class, () -> top.fastTopPrecession(0));
    assertThrows(Refusal.class, () -> new SymmetricTop(0, 1, 1));
    known.holds("wrong", top.fastTopPrecession(known.given("omega3")));
  }

  @Test
  void theFastTopFormulaErrsByItsSlowness() {
    var top = new SymmetricTop(8e-4, 2.5e-3, 0.3);
    for (double lean : new double[] {0.3, 1, 2}) {
      for (double spin : new double[] {300, 1000}) {
        double slowness = top.slowness(spin);
        double error = top.fastTopError(spin, lean);
        assertEquals(-slowness * Math.cos(lean), error, 3 * slowness * slowness);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"Y11", "Y12"})
  void aTopReleasedFromRestNutatesBetweenTheRootsOfItsCubic(String id) {
    var known = CheckCases.named(id);
    Nutation nutation = top(known).nutation(known.given("omega3"), known.given("theta0"));
    assertEquals(known.given("theta0"), nutation.highest(), 1e-12);
    known.holds("theta_max", nutation.lowest());
    known.holds("T_nutation", nutation.period());
    if (id.equals("Y11")) {
      known.holds("phi_per_nutation", nutation.precessionPerPeriod());
      known.holds("Omega_mean", nutation.meanPrecession());
    }
  }

  @Test
  void nutationsInGeneralAreThoseOfAFullMotion() {
    var random = new SplittableRandom(11);
    var top = new SymmetricTop(8e-4, 2.5e-3, 0.3);
    for (int n = 0; n < 20; n++) {
      double lean = 0.2 + 2.5 * random.nextDouble();
      double spin = 40 + 100 * random.nextDouble();
      double precession = 10 * random.nextDouble() - 3;
      Nutation nutation = top.nutation(spin, lean, 0, precession);
      RigidMotion motion = motion(top, lean, spin, precession, 2 * nutation.period());
      MotionRun run = motion.run();
      StateFunction angle = (t, y) -> Vector3D.angle(motion.axis(y), Z);
      assertEquals(nutation.lowest(), run.peak(angle).value(), 1e-8);
      assertEquals(nutation.highest(), run.least(angle).value(), 1e-8);
      Vector3D start = motion.axis(run.state(0));
      Vector3D after = motion.axis(run.state(nutation.period()));
      assertEquals(start.getZ(), after.getZ(), 1e-8);
      double round =
          Math.atan2(after.getY(), after.getX()) - Math.atan2(start.getY(), start.getX());
      assertEquals(0, Math.sin((round - nutation.precessionPerPeriod()) / 2), 1e-7, "lean " + lean);
    }
  }

  @Test
  void aSmallNutationAboutSteadyPrecessionHasTheRateOfTheLinearEquations() {
    var top = new SymmetricTop(8e-4, 2.5e-3, 0.3);
    for (double lean : new double[] {0.4, 1.5, 2.4}) {
      double steady = top.steadyPrecession(150, lean).slow();
      Nutation small = top.nutation(150, lean, 1e-4, steady);
      assertEquals(2 * Math.PI / small.period(), top.nutationRate(steady, lean), 1e-6);
    }
    // The camera boom's stabiliser, worked out apart from this program.
    var wheel = new SymmetricTop(0.2424324, 0.7362938, 33.43289);
    double lean = Math.toRadians(120);
    double precession = wheel.steadyPrecession(20 * Math.PI, lean).slow();
    assertEquals(2.089339, precession, 1e-6);
    assertEquals(22.84914, wheel.nutationRate(precession, lean), 1e-5);
  }

  @Test
  void aGimballedWheelYieldsALittleAndTurnsAcrossTheMoment() {
    double inertia = 0.02;
    var wheel = new GimballedWheel(2, inertia, inertia);
    // The same as a full motion: a symmetric wheel about its centre under a moment about x.
    Body body =
        Body.of(
            new MassProperties(1, Vector3D.ZERO, InertiaTensor.diagonal(inertia, inertia, 0.03)));
    RigidMotion motion =
        RigidMotion.of(
            body,
            new Support.AtCentre(),
            new Vector3D(0, 0, 2 / 0.03),
            List.of(new Load.Couple(new Vector3D(0.05, 0, 0), false)),
            0.5);
    MotionRun run = motion.run();
    for (double t : new double[] {0.01, 0.03, 0.2, 0.5}) {
      Vector3D axis = motion.axis(run.state(t));
      assertEquals(-wheel.yielding(0.05, t), axis.getY(), 2e-6);
      assertEquals(wheel.turned(0.05, t), axis.getX(), 2e-6);
    }
    assertEquals(100, wheel.nutationRate(), 1e-12);
    assertEquals(0.025, wheel.precession(0.05), 1e-15);
  }

  @Test
  void armsDrawnInSpeedUpAndTakeWork() {
    var arms = CheckCases.named("V01");
    var drawn = new ChangingInertia(arms.given("I1"), arms.given("I2"), arms.given("n1"));
    arms.holds("n2", drawn.speedOfSameMatter());
    arms.holds("W", drawn.workOnSameMatter());
    var telescope = CheckCases.named("V03");
    var retracted =
        new ChangingInertia(telescope.given("I1"), telescope.given("I2"), telescope.given("n1"));
    telescope.holds("n2", retracted.speedOfSameMatter());
    telescope.holds("W", retracted.workOnSameMatter());
    var table = CheckCases.named("V07");
    double gain = 0.2 * 0.36 * 10;
    var dropped = new ChangingInertia(3, 3 + gain, 15);
    table.holds("omega", dropped.speedOfSameMatter());
    table.holds("E_lost", -dropped.workOnSameMatter());
    CheckCases.named("Z42").holds("right", drawn.speedOfSameMatter());
  }

  @Test
  void matterThatLeavesTakesItsMomentumAlong() {
    var spool = new ChangingInertia(5, 3, 10);
    assertEquals(20, spool.momentumTakenAlong());
    assertEquals(100, spool.energyTakenAlong());
    // What is left has kept its speed.
    assertEquals(5 * 10 - 20, 3 * 10.0);
    assertThrows(Refusal.class, () -> new ChangingInertia(0, 1, 1));
  }

  @Test
  void weightsOnCordsSlowABodyDown() {
    var known = CheckCases.named("V05");
    var despin =
        new YoYoDespin(
            known.given("I"), known.given("m_total"), known.given("a"), known.given("omega0"));
    known.holds("omega_at_l", despin.speedAt(known.given("l")));
    known.holds("l_full_despin", despin.lengthToRest());
    known.holds("t_unwind_1.2m", despin.timeTo(known.given("l")));
    assertEquals(0, despin.speedAt(despin.lengthToRest()), 1e-12);
  }
}
