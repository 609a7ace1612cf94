package whorl.mechanics.motion;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.mechanics.CheckCases;

/** Closed forms of run-up, coast-down and changing inertia, and what a run is asked. */
class MotionTest {
  /** An integrator's own bound; the closed forms are good to 1e-9 and better. */
  private static final double INTEGRATED = 1e-9;

  private static final StateFunction FIRST = StateFunction.ofState(0);
  private static final StateFunction SECOND = StateFunction.ofState(1);

  private static Condition reaches(double value) {
    return Condition.atLeastZero((t, y) -> y[0] - value);
  }

  private static Condition falls(double value) {
    return Condition.atLeastZero((t, y) -> value - y[0]);
  }

  private static Motion oscillation(double limit) {
    Rates rates =
        (t, y, rate) -> {
          rate[0] = y[1];
          rate[1] = -y[0];
        };
    return Motion.of(rates, new double[] {1, 0}, limit);
  }

  @Test
  void runUpAgainstAConstantLoadTakesTheTimeOfItsClosedForm() {
    var known = CheckCases.named("R02");
    double inertia = known.given("J");
    double torque = known.given("T0");
    double idle = known.given("n0");
    double load = known.given("T_load");
    Rates rates = (t, y, rate) -> rate[0] = (torque * (1 - y[0] / idle) - load) / inertia;
    MotionRun run =
        Motion.of(rates, new double[] {0}, 300).stopWhen(reaches(1800 * Math.PI / 30)).run();
    assertSame(Ending.STOPPED, run.ending());
    known.holds("t_to_1800rpm", run.duration(), INTEGRATED);
    known.holds("n_final", Motion.of(rates, new double[] {0}, 400).run().last(FIRST), INTEGRATED);
  }

  @Test
  void runUpOfAFanFollowsTheHyperbolicTangent() {
    var known = CheckCases.named("R03");
    double inertia = known.given("J");
    double torque = known.given("T_motor");
    Rates rates = (t, y, rate) -> rate[0] = (torque - 0.02 * y[0] * y[0]) / inertia;
    MotionRun run = Motion.of(rates, new double[] {0}, 200).run();
    assertSame(Ending.TIME_OVER, run.ending());
    assertEquals(200, run.duration());
    known.holds("w_at_10s", run.value(FIRST, 10), INTEGRATED);
    known.holds(
        "t_to_90pct",
        run.firstTime(FIRST, 0.9 * known.expected("n_inf")).orElseThrow(),
        INTEGRATED);
    known.holds("n_inf", run.last(FIRST), INTEGRATED);
  }

  @Test
  void coastDownStopsAtRestAfterTheRevolutionsOfItsClosedForm() {
    var known = CheckCases.named("R04");
    double inertia = known.given("J");
    Rates rates =
        (t, y, rate) -> {
          rate[0] = -(1.2 + 0.008 * y[0]) / inertia;
          rate[1] = y[0];
        };
    MotionRun run =
        Motion.of(rates, new double[] {known.given("n"), 0}, 1000).stopWhen(falls(0)).run();
    known.holds("t_stop", run.duration(), INTEGRATED);
    known.holds("revs", run.last(SECOND), INTEGRATED);
    assertTrue(run.last(FIRST) <= 0, "the last state satisfies the condition to stop");
    assertEquals(0, run.last(FIRST), 1e-11);
  }

  @Test
  void aClutchSlipsUntilTheSpeedsAreEqual() {
    var known = CheckCases.named("R15");
    double first = known.given("J1");
    double second = known.given("J2");
    double torque = known.given("T_clutch");
    Rates rates =
        (t, y, rate) -> {
          rate[0] = -torque / first;
          rate[1] = torque / second;
          rate[2] = torque * (y[0] - y[1]);
        };
    Condition equal = Condition.atLeastZero((t, y) -> y[1] - y[0]);
    MotionRun run =
        Motion.of(rates, new double[] {known.given("n1"), 0, 0}, 60).stopWhen(equal).run();
    known.holds("n", run.last(FIRST), INTEGRATED);
    known.holds("t", run.duration(), INTEGRATED);
    known.holds("Q", run.last(StateFunction.ofState(2)), INTEGRATED);
  }

  @Test
  void growingInertiaKeepsTheMomentumOfTheSameMatter() {
    var known = CheckCases.named("V08");
    double torque = known.given("torque");
    // The state is the angular momentum; the speed follows from it.
    StateFunction speed = (t, y) -> y[0] / (2 + 0.5 * t);
    Rates rates =
        (t, y, rate) -> {
          rate[0] = torque;
          rate[1] = torque * speed.at(t, y);
          rate[2] = -0.5 * 0.5 * Math.pow(speed.at(t, y), 2);
        };
    MotionRun run = Motion.of(rates, new double[] {20, 0, 0}, known.given("t")).run();
    known.holds("omega", run.last(speed), INTEGRATED);
    known.holds("W_shaft", run.last(SECOND), INTEGRATED);
    known.holds("W_internal", run.last(StateFunction.ofState(2)), INTEGRATED);
  }

  @Test
  void aSpoolThatIsPulledOffAtConstantSpeedTurnsAndPullsAsInClosedForm() {
    var known = CheckCases.named("V06");
    double width = known.given("width");
    double density = known.given("rho");
    double thickness = known.given("thickness");
    double core = known.given("r_core");
    double speed = known.given("v");
    // The wound area falls by thickness times length, so the radius follows from one state.
    Rates rates = (t, y, rate) -> rate[0] = -thickness * speed / (2 * Math.PI * y[0]);
    MotionRun run = Motion.of(rates, new double[] {known.given("r0")}, known.given("t")).run();
    double radius = run.last(FIRST);
    known.holds("r", radius, INTEGRATED);
    known.holds("omega", speed / radius, INTEGRATED);
    double inertia =
        known.given("J_core")
            + Math.PI / 2 * density * width * (Math.pow(radius, 4) - Math.pow(core, 4));
    known.holds("I", inertia, INTEGRATED);
    double[] rate = new double[1];
    rates.at(0, new double[] {radius}, rate);
    double acceleration = -speed / (radius * radius) * rate[0];
    known.holds("alpha", acceleration, INTEGRATED);
    known.holds("F", inertia * acceleration / radius, INTEGRATED);
  }

  @Test
  void matterThatFallsOntoATableBringsNoMomentumAlong() {
    var known = CheckCases.named("V07");
    double gain = known.given("mdot") * Math.pow(known.given("R"), 2);
    double inertia = known.given("I0");
    Rates rates = (t, y, rate) -> rate[0] = -gain * y[0] / (inertia + gain * t);
    MotionRun run = Motion.of(rates, new double[] {known.given("omega0")}, known.given("t")).run();
    known.holds("omega", run.last(FIRST), INTEGRATED);
    double end = inertia + gain * known.given("t");
    double lost = 0.5 * (inertia * 15 * 15 - end * run.last(FIRST) * run.last(FIRST));
    known.holds("E_lost", lost, INTEGRATED);
  }

  @Test
  void extremesLieBetweenTheSteps() {
    MotionRun run = oscillation(10).run();
    Extreme least = run.least(FIRST);
    assertEquals(-1, least.value(), 1e-11);
    assertEquals(Math.PI, least.time() % (2 * Math.PI), 1e-5);
    assertEquals(1, run.peak(SECOND).value(), 1e-11);
    Extreme square = run.peak((t, y) -> y[0] * y[1]);
    assertEquals(0.5, square.value(), 1e-11);
    assertEquals(new Extreme(0, 1), run.peak((t, y) -> 1 - 0.01 * t));
    assertEquals(10, run.least((t, y) -> 1 - 0.01 * t).time());
  }

  @Test
  void meanAndRootMeanSquareAreThoseOfTheIntegral() {
    double period = 2 * Math.PI;
    MotionRun run = oscillation(period).run();
    assertEquals(0, run.mean(FIRST), 1e-11);
    assertEquals(Math.sqrt(0.5), run.rms(FIRST), 1e-11);
    assertEquals(period / 2, run.integral((t, y) -> y[0] * y[0]), 1e-10);
  }

  @Test
  void theFirstTimeIsTheFirstOfSeveralAndMayBeATouch() {
    MotionRun run = oscillation(20).run();
    assertEquals(Math.PI / 3, run.firstTime(FIRST, 0.5).orElseThrow(), 1e-11);
    assertEquals(0, run.firstTime(FIRST, 1).orElseThrow());
    assertEquals(Math.PI, run.firstTime(FIRST, -1 + 1e-10).orElseThrow(), 2e-5);
    assertTrue(run.firstTime(FIRST, 1.5).isEmpty());
  }

  @Test
  void aStopThatHoldsForAPartOfAStepOnlyIsFound() {
    double lead = 1e-7;
    MotionRun run = oscillation(100).stopWhen(falls(-1 + lead)).run();
    assertEquals(Math.PI - Math.sqrt(2 * lead), run.duration(), 1e-6);
  }

  @Test
  void aRunWhoseStopHoldsAtOnceLastsNoTime() {
    MotionRun run = oscillation(100).stopWhen(reaches(1)).run();
    assertSame(Ending.STOPPED, run.ending());
    assertEquals(0, run.duration());
    assertArrayEquals(new double[] {1, 0}, run.state(0));
    assertEquals(1, run.peak(FIRST).value());
    assertEquals(1, run.mean(FIRST));
    assertEquals(0, run.firstTime(FIRST, 1).orElseThrow());
    assertTrue(run.firstTime(FIRST, 2).isEmpty());
  }

  @Test
  void aShortPulseIsMetWhereItsEdgesAreKnown() {
    Rates pulse = (t, y, rate) -> rate[0] = t >= 5 && t < 5.001 ? 1000 : 0;
    List<Condition> edges =
        List.of(Condition.atLeastZero((t, y) -> t - 5), Condition.atLeastZero((t, y) -> t - 5.001));
    MotionRun run = Motion.of(pulse, new double[] {0}, 1000).jumpingAt(edges).run();
    assertEquals(1, run.last(FIRST), 1e-9);
    assertEquals(0, run.value(FIRST, 4.9999), 1e-12);
  }

  @Test
  void theSystemMayBeSmallOrLarge() {
    double[] scales = {1e-12, 1e-3, 1, 1e9};
    for (double scale : scales) {
      Rates decay =
          (t, y, rate) -> {
            rate[0] = -y[0];
            rate[1] = 0;
          };
      MotionRun run = Motion.of(decay, new double[] {scale, 0}, 5).run();
      assertEquals(scale * Math.exp(-5), run.last(FIRST), scale * 1e-12);
    }
  }

  @Test
  void aRateThatGrowsWithoutBoundIsRefusedWithTimeAndState() {
    Rates square = (t, y, rate) -> rate[0] = y[0] * y[0];
    var failure =
        assertThrows(MotionFailure.class, () -> Motion.of(square, new double[] {1}, 3).run());
    assertEquals(1, failure.time(), 1e-9);
    assertSame(MotionFailure.Reason.RUNAWAY, failure.reason());
    assertEquals(0, failure.index());
  }

  @Test
  void aRateThatIsNoNumberIsRefusedWhereItBegins() {
    Rates root =
        (t, y, rate) -> {
          rate[0] = 1;
          rate[1] = Math.sqrt(2 - y[0]);
        };
    var failure =
        assertThrows(MotionFailure.class, () -> Motion.of(root, new double[] {0, 0}, 5).run());
    assertSame(MotionFailure.Reason.NO_RATE, failure.reason());
    assertEquals(2, failure.time(), 1e-9);
    assertEquals(1, failure.index());
  }

  @Test
  void aStateWithoutRatesBehindTheStopDoesNoHarm() {
    Rates root =
        (t, y, rate) -> {
          rate[0] = 1;
          rate[1] = Math.sqrt(2.001 - y[0]);
        };
    MotionRun run = Motion.of(root, new double[] {0, 0}, 500).stopWhen(reaches(2)).run();
    assertEquals(2, run.duration(), 1e-12);
    double exact = 2 / 3.0 * (Math.pow(2.001, 1.5) - Math.pow(0.001, 1.5));
    assertEquals(exact, run.last(SECOND), 1e-9);
  }

  @Test
  void stepsAreBounded() {
    var failure = assertThrows(MotionFailure.class, () -> oscillation(1000).inSteps(50).run());
    assertSame(MotionFailure.Reason.TOO_MANY_STEPS, failure.reason());
    assertTrue(failure.time() > 0);
  }

  @Test
  void anActionBeforeAStepMayEndTheRun() {
    Runnable interrupt =
        () -> {
          throw new IllegalStateException("interrupted");
        };
    assertThrows(IllegalStateException.class, oscillation(10).polling(interrupt)::run);
  }

  @Test
  void whatShouldNotChangeIsWatched() {
    StateFunction energy = (t, y) -> 0.5 * (y[0] * y[0] + y[1] * y[1]);
    Kept kept =
        oscillation(2000 * Math.PI)
            .keeping(new Motion.Conserved("energy", energy))
            .run()
            .kept()
            .get(0);
    assertEquals(0.5, kept.start());
    assertTrue(kept.relative() > 0 && kept.relative() < 1e-9, kept.toString());
  }

  @Test
  void aWrongStartOrLimitIsRefused() {
    Rates none = (t, y, rate) -> rate[0] = 0;
    assertThrows(IllegalArgumentException.class, () -> Motion.of(none, new double[0], 1));
    assertThrows(
        IllegalArgumentException.class, () -> Motion.of(none, new double[] {Double.NaN}, 1));
    assertThrows(IllegalArgumentException.class, () -> Motion.of(none, new double[] {1}, 0));
    assertThrows(
        IllegalArgumentException.class, () -> Motion.of(none, new double[] {1}, 1).run().state(2));
  }
}
