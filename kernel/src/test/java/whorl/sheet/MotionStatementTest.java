package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.mechanics.motion.Ending;

/** Motions of the language against closed forms, and how they stand in the sheet. */
class MotionStatementTest {
  private static WorkedSheet worked(String text) {
    WorkedSheet sheet = WorkedSheet.of(text);
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

  /** R02 of the published cases: first-order linear equation, closed form. */
  @Test
  void aMotorOfFallingTorqueRunsUpInTheTimeOfTheClosedForm() {
    WorkedSheet sheet =
        worked(
            """
            I_m [kg·m²] = 4
            T_m(w [rpm]) [N·m] = 90 N·m * (1 - w/(3000 rpm))
            T_l [N·m] = 30
            motion run_up
                ω [rpm] starts 0
                T_n [N·m] = T_m(ω) - T_l
                ω' = T_n / I_m
                stop when ω >= 1800 rpm
                within 5 min
            t_r = run_up.duration
            T_0 = first(run_up.T_n)
            T_e = last(run_up.T_n)
            n_h = at(run_up.ω, 13.962634015954636 s)
            t_h = when(run_up.ω, 900 rpm)
            """);
    sheet.assertGives(
        """
        t_r = 32.150152944068736 s to 1e-9
        T_0 = 60 N*m to 1e-12
        T_e = 6 N*m to 1e-9
        n_h = 1264.2411176571154 rpm to 1e-9
        t_h = 8.347379242746722 s to 1e-9
        """);
    assertEquals(Ending.STOPPED, followed(sheet).ending());
  }

  /** V08 of the published cases: momentum of the same matter under a moment. */
  @Test
  void theSameMatterKeepsItsMomentumWhateverItsInertia() {
    worked(
            """
            T_a [N·m] = 4
            I_g(t [s]) [kg·m²] = 2 kg·m² + 0.5 kg·m²/s * t
            motion grow
                t [s] starts 0
                ω [rad/s] starts 10
                W [J] starts 0
                t' = 1
                (I_g(t)*ω)' = T_a
                W' = T_a * ω
                within 6 s
            w = last(grow.ω)
            W_s = last(grow.W)
            """)
        .assertGives(
            """
            w = 8.8 rad/s to 1e-9
            W_s = 221.32130341997296 J to 1e-9
            """);
  }

  /** The skater: arms drawn in at a steady rate, with no moment; and matter that leaves instead. */
  @Test
  void theTwoWaysOfWritingAChangingInertiaDiffer() {
    String text =
        """
        I_b(x [m]) [kg·m²] = 1.2 kg·m² + 8 kg * x^2
        motion turn
            x [m] starts 0.7
            ω [rpm] starts 60
            x' = -0.2 m/s
            %s = 0 N·m
            within 2 s
        n_2 = last(turn.ω)
        """;
    WorkedSheet same = worked(String.format(text, "(I_b(x)*ω)'"));
    same.assertGives("n_2 = 160 rpm to 1e-9");
    assertTrue(followed(same).balances().get(0).sameMatter());
    WorkedSheet leaving = worked(String.format(text, "I_b(x) * ω'"));
    leaving.assertGives("n_2 = 60 rpm to 1e-12");
    assertFalse(followed(leaving).balances().get(0).sameMatter());
  }

  @Test
  void aConstantInertiaNeedsNoSuchChoice() {
    WorkedSheet sheet =
        worked(
            """
            I_c [kg·m²] = 2
            motion a
                ω [rad/s] starts 0
                ω' = 6 N·m / I_c
                within 2 s
            motion b
                ω [rad/s] starts 0
                I_c * ω' = 6 N·m
                within 2 s
            motion c
                ω [rad/s] starts 0
                (I_c*ω)' = 6 N·m
                within 2 s
            w_a = last(a.ω)
            w_b = last(b.ω)
            w_c = last(c.ω)
            """);
    sheet.assertGives(
        """
        w_a = 6 rad/s to 1e-12
        w_b = 6 rad/s to 1e-12
        w_c = 6 rad/s to 1e-12
        """);
    assertEquals(List.of(), followed(sheet).balances());
  }

  @Test
  void vectorsAreStatesToo() {
    worked(
            """
            motion throw
                r [m] starts (0, 0, 0)
                v [m/s] starts (3, 0, 4)
                r' = v
                v' = (0, 0, -9.8 m/s^2)
                stop when v.z < 0 m/s and r.z <= 0 m
                within 1 min
            s_t = last(throw.r.x)
            h_t = peak(throw.r.z)
            v_t = peak(|throw.v|)
            v_l = least(|throw.v|)
            v_e = last(throw.v)
            """)
        .assertGives(
            """
            s_t = 2.4489795918367347 m to 1e-10
            h_t = 0.816326530612245 m to 1e-10
            v_t = 5 m/s to 1e-10
            v_l = 3 m/s to 1e-10
            v_e.z = -4 m/s to 1e-10
            """);
  }

  @Test
  void aCourseMayHaveANameAndGoIntoOthers() {
    worked(
            """
            k_f = 2
            motion swing
                x [rad] starts 1
                w [rad/s] starts 0
                x' = w
                w' = -4 s^-2 * x
                within 6.283185307179586 s
            q = swing.x^2 + (swing.w / 2 rad/s)^2 * 1 rad^2
            r = k_f * q
            m_q = mean(q)
            p_r = peak(r)
            e_x = rms(swing.x)
            z_x = mean(swing.x)
            d_x = peak(|swing.x - at(swing.x, 1 s)|)
            """)
        .assertGives(
            """
            m_q = 1 rad^2 to 1e-10
            p_r = 2 rad^2 to 1e-10
            e_x = 0.7071067811865476 rad to 1e-10
            d_x = 1.4161468365471424 rad to 1e-9
            """);
  }

  @Test
  void stepsOfTheLoadAreMetExactly() {
    worked(
            """
            motion pulse
                t [s] starts 0
                ω [rad/s] starts 0
                t' = 1
                ω' = if t >= 5 s and t < 5.01 s then 100 rad/s^2 else 0 rad/s^2
                within 20 min
            w = last(pulse.ω)
            w_m = at(pulse.ω, 5.005 s)
            """)
        .assertGives(
            """
            w = 1 rad/s to 1e-9
            w_m = 0.5 rad/s to 1e-8
            """);
  }

  @Test
  void aRunThatIsNotStoppedSaysSo() {
    WorkedSheet sheet =
        worked(
            """
            motion spin_up
                ω [rpm] starts 0
                ω' = 1 rad/s^2
                stop when ω >= 500 rpm
                within 4 s
            """);
    assertEquals(Ending.TIME_OVER, followed(sheet).ending());
  }

  @Test
  void namesOfTheMotionHideThoseOfTheSheetAndTheStepSaysSo() {
    WorkedSheet sheet =
        worked(
            """
            ω [rpm] = 900
            n [rpm] = 30
            motion spin_up
                ω [rpm] starts n
                ω' = 1 rad/s^2
                within 4 s
            a = first(spin_up.ω)
            b = ω
            """);
    sheet.assertGives(
        """
        a = 30 rpm to 1e-12
        b = 900 rpm to 1e-12
        """);
    assertEquals(List.of("ω"), followed(sheet).hidden());
  }

  @Test
  void aChangedInputFollowsTheMotionAgain() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell [1]", "a_m [rad/s²] = 1");
    sheet.run(
        new CellId("2"),
        "cell [2]",
        """
        motion spin_up
            ω [rpm] starts 0
            ω' = a_m
            within 4 s
        w [rad/s] = last(spin_up.ω)
        """);
    CellOutcome outcome = sheet.run(new CellId("1"), "cell [1]", "a_m [rad/s²] = 3");
    assertEquals(List.of("w"), outcome.changes().stream().map(CellOutcome.Change::name).toList());
    ExpectedValue.read("w = 12 rad/s to 1e-12").forEach(value -> value.assertIn(sheet));
  }

  @Test
  void aChangeElsewhereThatBreaksAMotionLeavesItsText() {
    var sheet = new Sheet();
    sheet.run(new CellId("1"), "cell [1]", "I_m [kg·m²] = 2");
    sheet.run(
        new CellId("2"),
        "cell [2]",
        """
        motion spin_up
            ω [rpm] starts 0
            ω' = 3 N·m / I_m
            within 4 s
        """);
    CellOutcome outcome = sheet.run(new CellId("1"), "cell [1]", "I_m [kg·m²] = 0");
    assertTrue(outcome.tookEffect());
    assertEquals(List.of("spin_up"), outcome.stopped());
  }

  @Test
  void aSampleOfACourseMayNeedAParameterOfAFunction() {
    worked(
            """
            motion spin_up
                ω [rad/s] starts 0
                ω' = 1 rad/s^2
                within 4 s
            f(k [1], t [s]) [rad/s] = at(k * spin_up.ω, t)
            w = f(3, 2 s)
            """)
        .assertGives("w = 6 rad/s to 1e-12");
  }
}
