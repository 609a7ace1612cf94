package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import whorl.eval.Value;

/** Things in space on a sheet: what goes with them from statement to statement. */
class SpaceTest {
  private static final String WHEEL =
      "wheel = solid_cylinder(diameter = 400 mm, length = 60 mm, mass = 12 kg)\n";
  private static final String AXES =
      """
            a = axis(through = point(0, 0, 0), along = (0, 0, 1))
            b = axis(through = point(1 m, 0, 0), along = (0, 0, 1))
            """;

  private final Sheet sheet = new Sheet();

  private CellOutcome run(String cell, String text) {
    CellOutcome outcome = sheet.run(new CellId(cell), "cell [" + cell + "]", text);
    assertEquals(List.of(), outcome.errors(), text);
    return outcome;
  }

  private double number(String name) {
    return ((Value.Real) sheet.quantity(name).orElseThrow().value()).value();
  }

  private void assertVector(String name, double x, double y, double z) {
    var vector = (Value.Vector) sheet.quantity(name).orElseThrow().value();
    assertEquals(x, vector.x(), 1e-12, name);
    assertEquals(y, vector.y(), 1e-12, name);
    assertEquals(z, vector.z(), 1e-12, name);
  }

  private Setting setting(String name) {
    return sheet.quantity(name).orElseThrow().setting();
  }

  @Test
  void anotherNameForAPointIsThatPoint() {
    run(
        "1",
        """
            A = point(0, 0, 0)
            B = A
            F = force((0, 5, 0) N, at = point(1 m, 0, 0))
            M = moment(F, about = A) + moment(F, about = B)""");
    assertVector("M", 0, 0, 10);
    assertEquals("A", setting("M").about());
  }

  @Test
  void aPlainFormulaGoesWithAnyReference() {
    run("1", AXES + WHEEL + "I = inertia(wheel, about = a) + 1/2 * 3 kg * (0.1 m)^2");
    assertEquals(0.255, number("I"), 1e-12);
    assertEquals("a", setting("I").about());
  }

  @Test
  void productsKeepWhatCanBeAboutSomething() {
    run(
        "1",
        AXES
            + WHEEL
            + """
            I = inertia(wheel, about = a)
            ω = 50 rad/s
            L = I * ω
            E = 1/2 * I * ω^2
            T = L / (2 s)
            k = sqrt(I / wheel.mass)
            q = I / inertia(wheel, about = b)""");
    assertEquals("a", setting("L").about());
    assertEquals("a", setting("T").about());
    assertEquals(Setting.NONE, setting("k"));
    assertEquals(Setting.NONE, setting("q"));
    run("2", "E_k [J] = E");
    assertEquals(Setting.NONE, setting("E_k"));
  }

  @Test
  void aTensorTimesAVectorIsAboutThePointOfTheTensor() {
    run(
        "1",
        WHEEL
            + """
            P = point(0, 0, 1 m)
            J = inertia(wheel, about = P)
            L = J * (2, 0, 3) rad/s
            J_2 = 2*J - J/2
            x = J_2.xx""");
    assertEquals("P", setting("L").about());
    assertVector("L", 2 * (0.1236 + 12), 0, 3 * 0.24);
    assertEquals("P", setting("J_2").about());
    assertEquals(1.5 * (0.1236 + 12), number("x"), 1e-12);
  }

  @Test
  void aTransferFindsBodyAndAxisWhereTheSheetSaysThem() {
    run("1", AXES + WHEEL + "I_a = inertia(wheel, about = a)\nI_b [kg·m²] = moved(I_a, to = b)");
    assertEquals(12.24, number("I_b"), 1e-12);
    assertEquals("b", setting("I_b").about());
    run("2", "I_c = moved(I_b, to = a)");
    assertEquals(0.24, number("I_c"), 1e-12);
  }

  @Test
  void aTransferIsWorkedOutAnewWhenTheAxisOrTheBodyChanges() {
    run("1", AXES);
    run("2", WHEEL);
    run("3", "I_a = inertia(wheel, about = a)");
    run("4", "I_b = moved(I_a, to = b)");
    run("1", AXES.replace("1 m", "2 m"));
    assertEquals(48.24, number("I_b"), 1e-12);
    run("1", AXES.replace("point(0, 0, 0)", "point(0, 3 m, 0)"));
    assertEquals(12.24, number("I_b"), 1e-12);
    run("2", WHEEL.replace("12 kg", "24 kg"));
    assertEquals(24.48, number("I_b"), 1e-12);
  }

  @Test
  void aVectorWrittenOutIsStatedInItsFrameAndANamedOneSeenFromIt() {
    run(
        "1",
        """
            O = point(0, 0, 0)
            ship = frame(origin = O, turned = 90 deg, about = (0, 0, 1))
            stated = (1, 0, 0) m/s @ ship
            v = (1, 0, 0) m/s
            seen = v @ ship
            x = seen.x
            y = seen.y
            sum = v + stated
            same = stated + v
            side = v · stated
            n = (0, 0, 5)
            L = (0, 0, n.z) @ ship""");
    assertVector("stated", 1, 0, 0);
    assertEquals(new Setting("", "ship"), setting("stated"));
    assertVector("seen", 0, -1, 0);
    assertEquals(0, number("x"), 1e-12);
    assertEquals(-1, number("y"), 1e-12);
    assertVector("sum", 1, 1, 0);
    assertEquals(Setting.NONE, setting("sum"));
    assertVector("same", 1, -1, 0);
    assertEquals("ship", setting("same").frame());
    assertEquals(0, number("side"), 1e-12);
    assertVector("L", 0, 0, 5);
  }

  @Test
  void framesNestAndPointsInThemMove() {
    run(
        "1",
        """
            O = point(0, 0, 0)
            ship = frame(origin = O, turning = (0, 0, 2) rad/s, moving = (3, 0, 0) m/s)
            crane = frame(origin = point(1 m, 0, 0, frame = ship), turned = 90 deg, about = (0, 0, 1), frame = ship, turning = (0, 0, 1) rad/s)
            P = point(0, 1 m, 0, frame = crane)
            r = P.position
            v = P.velocity
            w = crane.turning""");
    // P is at the origin of the ship: its arm in the crane is −1 m along the ship's x.
    assertVector("r", 0, 0, 0);
    assertVector("w", 0, 0, 3);
    assertVector("v", 3, 2 - 3, 0);
  }

  @Test
  void aBodyServesAsItsFrame() {
    run(
        "1",
        """
            C = point(0, 0, 1 m)
            rotor = placed(rod(length = 1 m, mass = 2 kg), at = C, along = (1, 0, 0))
            z = (0, 0, 1) @ rotor
            e = rotor.frame.z
            x = e.x
            p = rotor.inertia @ rotor
            I = p.xx
            J = rotor.inertia.zz""");
    assertEquals("rotor", setting("z").frame());
    assertEquals(1, number("x"), 1e-12);
    assertEquals(2 / 12.0, number("I"), 1e-12);
    assertEquals(2 / 12.0, number("J"), 1e-12);
    assertEquals("rotor.centre", setting("p").about());
  }

  @Test
  void functionsGiveThingsAndReadThem() {
    run(
        "1",
        """
            A = point(0, 0, 0)
            P(x [mm]) = A + (x, 0 mm, 0 mm)
            M(x [mm]) [N·m] = moment(force((0, 5, 0) N, at = P(x)), about = A).z
            T = M(200 mm)
            Q = if T > 0 N·m then P(1 m) else A
            q = Q.x""");
    assertEquals(1, number("T"), 1e-12);
    assertEquals(1, number("q"), 1e-12);
  }

  @Test
  void aReferenceThatDiffersFromCallToCallIsDropped() {
    run(
        "1",
        """
            F = force((0, 5, 0) N, at = point(1 m, 0, 0))
            M(x [m]) = moment(F, about = point(x, 0 m, 0 m))
            T = M(0 m) + M(0.5 m)""");
    assertVector("T", 0, 0, 7.5);
    assertEquals(Setting.NONE, setting("T"));
  }

  @Test
  void aLawOutsideItsValidityIsSaidAndMarksWhatRestsOnIt() {
    CellOutcome outcome =
        run(
            "1",
            """
            r = ring(diameter = 100 mm, thickness = 20 mm, mass = 2 kg)
            I = r.inertia.zz
            thin = ring(diameter = 100 mm, thickness = 5 mm, mass = 2 kg)
            k = thin.mass""");
    List<Standing> standing = outcome.steps().stream().map(Step::standing).toList();
    assertEquals(List.of(new Lapse("ring", "t ≤ D/10", "")), standing.get(0).lapses());
    assertEquals(List.of("ring: t ≤ D/10, in r"), standing.get(1).doubts());
    assertTrue(standing.get(2).isFirm());
    assertTrue(standing.get(3).isFirm());
    run("2", "m_2 = 2 * I");
    run("1", "r = ring(diameter = 100 mm, thickness = 8 mm, mass = 2 kg)\nI = r.inertia.zz");
    assertTrue(sheet.steps(new CellId("2")).get(0).standing().isFirm());
  }

  @Test
  void aLawThatAFunctionUsesIsJudgedWhereTheFunctionIsCalled() {
    CellOutcome outcome =
        run(
            "1",
            """
            I(t [mm]) = ring(diameter = 100 mm, thickness = t, mass = 2 kg).inertia.zz
            a = I(20 mm)
            b = I(2 mm)""");
    assertEquals(
        List.of(new Lapse("ring", "t ≤ D/10", "I")), outcome.steps().get(1).standing().lapses());
    assertTrue(outcome.steps().get(2).standing().isFirm());
  }

  @Test
  void aDefinitionHidesALawWithANotice() {
    CellOutcome outcome = run("1", "ring = 3 kg\nm = 2 * ring");
    assertTrue(
        outcome.notices().stream().anyMatch(notice -> notice.code().equals("hides")),
        outcome.notices().toString());
    assertEquals(6, number("m"), 1e-12);
  }

  @Test
  void theAngularMomentumOfATurningBodyAsksHowItsCentreMoves() {
    run(
        "1",
        """
            O = point(0, 0, 0)
            ω = (0, 0, 50) rad/s
            w = placed(solid_cylinder(diameter = 400 mm, length = 60 mm, mass = 12 kg), at = point(1 m, 0, 0))
            L = angular_momentum(w, spin = ω, about = O, velocity = cross(ω, w.centre - O))
            L_own = angular_momentum(w, spin = ω, about = O, velocity = (0, 0, 0) m/s)
            E = kinetic_energy(w, spin = ω, about = O)
            E_own = kinetic_energy(w, spin = ω)""");
    assertVector("L", 0, 0, 12.24 * 50);
    assertVector("L_own", 0, 0, 0.24 * 50);
    assertEquals(12.24 * 50 * 50 / 2, number("E"), 1e-9);
    assertEquals(0.24 * 50 * 50 / 2, number("E_own"), 1e-9);
  }
}
