package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.mechanics.motion.Ending;
import whorl.mechanics.motion.Kept;

/** Rigid bodies in motions of the language. */
class RigidMotionStatementTest {
  private static final String WHEEL =
      """
      C = point(0, 0, 0.2 m)
      A = point(0, 0, 0)
      wheel = placed(solid_cylinder(diameter = 0.4 m, length = 0.1 m, mass = 10 kg), at = C, along = (0, 0, 1))
      """;

  private static WorkedSheet worked(String text) {
    WorkedSheet sheet = WorkedSheet.of(WHEEL + text);
    sheet.assertWhole();
    return sheet;
  }

  private static Followed followed(WorkedSheet sheet) {
    return sheet.outcome().steps().stream()
        .filter(Step.Ran.class::isInstance)
        .map(step -> ((Step.Ran) step).followed())
        .findFirst()
        .orElseThrow();
  }

  @Test
  void aTopKeepsEnergyAndMomentaAndTheStepSaysHowWell() {
    WorkedSheet sheet =
        worked(
            """
            motion topple
                body wheel about A
                wheel starts spin (0, 0, 300) rad/s @ wheel, turned 60 deg about (1, 0, 0)
                load weight(wheel)
                within 5 s
            θ = angle(topple.wheel.axis, (0, 0, 1))
            θ_h = least(θ)
            s_0 = first(topple.wheel.spin)
            s_e = last(topple.wheel.spin)
            z_0 = first(topple.wheel.at.z)
            L_z = last(topple.wheel.L.z)
            """);
    sheet.assertGives(
        """
        θ_h = 60 deg to 1e-10
        s_0 = 300 rad/s to 1e-12
        s_e = 300 rad/s to 1e-11
        z_0 = 0.1 m to 1e-12
        L_z = 30 kg*m^2/s to 1e-10
        """);
    List<Kept> kept = followed(sheet).kept();
    assertEquals(
        List.of("energy", "angular momentum about the vertical", "spin about the axis of symmetry"),
        kept.stream().map(Kept::name).toList());
    assertTrue(kept.stream().allMatch(one -> one.relative() < 1e-9), kept.toString());
  }

  @Test
  void aFreeBodyFliesOnAParabola() {
    worked(
            """
            motion fly
                body wheel about wheel.centre
                wheel starts spin (0, 3, 0) rad/s
                load weight(wheel)
                within 2 s
            z_e = last(fly.wheel.at.z)
            w_y = last(fly.wheel.rate.y)
            """)
        .assertGives(
            """
            z_e = -19.4133 m to 1e-12
            w_y = 3 rad/s to 1e-12
            """);
  }

  @Test
  void loadsAreFixedInSpaceOrTurnWithTheBodyAsTheyAreWritten() {
    worked(
            """
            M_s = (0, 0, 2) N·m
            motion in_space
                body wheel about wheel.centre
                load M_s
                within 3 s
            w_s = last(in_space.wheel.rate.z)
            motion in_body
                body wheel about wheel.centre
                wheel starts turned 90 deg about (1, 0, 0)
                load (0, 0, 2) N·m @ wheel
                within 3 s
            w_b = last(in_body.wheel.rate.y)
            motion thrust
                body wheel about A
                load force((0, 1, 0) N @ wheel, at = wheel.centre)
                within 3 s
            w_t = last(thrust.wheel.rate.x)
            """)
        .assertGives(
            """
            w_s = 30 rad/s to 1e-11
            w_b = -30 rad/s to 1e-11
            w_t = -1.1803278688524592 rad/s to 1e-10
            """);
  }

  @Test
  void aLoadMayDependOnHowTheBodyMoves() {
    worked(
            """
            c_d [N·m·s/rad] = 0.05
            motion slow
                body wheel about wheel.centre
                wheel starts spin (0, 0, 40) rad/s
                load -c_d * wheel.rate
                stop when wheel.spin <= 20 rad/s
                within 1 min
            t_h = slow.duration
            """)
        .assertGives("t_h = 2.772588722239781 s to 1e-9");
  }

  @Test
  void aStopMayAskForTheBodysAttitude() {
    WorkedSheet sheet =
        worked(
            """
            motion fall
                body wheel about A
                wheel starts turned 1 deg about (1, 0, 0)
                load weight(wheel)
                stop when angle(wheel.axis, (0, 0, 1)) >= 90 deg
                within 10 s
            v_e = last(|fall.wheel.rate|)
            """);
    // Energy: I ω²/2 = m g l cos 1°, I = m (3 r² + h²)/12 + m l² = 0.50833… kg·m²
    sheet.assertGives("v_e = 8.783810622210748 rad/s to 1e-9");
    assertEquals(Ending.STOPPED, followed(sheet).ending());
  }

  @Test
  void statesMayGoWithABody() {
    worked(
            """
            motion drive
                body wheel about wheel.centre
                M_d [N·m] starts 0
                M_d' = 1 N·m/s
                load (0, 0, 1) * M_d
                within 2 s
            w_e = last(drive.wheel.spin)
            """)
        .assertGives("w_e = 10 rad/s to 1e-10");
  }

  @Test
  void theMotionDoesNotMoveTheBodyOfTheSheet() {
    worked(
            """
            motion topple
                body wheel about A
                wheel starts turned 60 deg about (1, 0, 0)
                load weight(wheel)
                within 1 s
            z = (wheel.centre - A).z
            """)
        .assertGives("z = 0.2 m to 1e-12");
  }
}
