package whorl.mechanics.body;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.mechanics.Near.assertNear;
import static whorl.mechanics.Near.assertRefused;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;

class BodyTest {
  private static final double TINY = 1e-12;
  private static final Body DISC = Shapes.solidCylinder(0.4, 0.1).ofMass(10);

  @Test
  void aPlacedBodyTurnsItsTensorIntoTheWorld() {
    Body placed = DISC.placed(Frame.WORLD, new Vector3D(1, 2, 3), Vector3D.PLUS_I);
    InertiaTensor own = DISC.ownInertia();
    assertNear(
        InertiaTensor.diagonal(own.zz(), own.xx(), own.xx()),
        placed.massProperties().atCentre(),
        TINY);
    assertEquals(new Vector3D(1, 2, 3), placed.centre().position());
    assertNear(Vector3D.PLUS_I, placed.frame().toWorld(Vector3D.PLUS_K), TINY);
  }

  @Test
  void aBodyTurnedAboutAnAxisGoesRoundIt() {
    Body out = DISC.placed(Frame.WORLD, new Vector3D(2, 0, 0), Vector3D.PLUS_I);
    Body turned = out.turned(new Axis(Point.fixed(1, 0, 0), Vector3D.PLUS_K), Math.PI / 2);
    assertNear(new Vector3D(1, 1, 0), turned.centre().position(), TINY);
    assertNear(Vector3D.PLUS_J, turned.frame().toWorld(Vector3D.PLUS_K), TINY);
  }

  @Test
  void aBodyInAMovingFrameIsNotTurnedInTheWorld() {
    Frame turning =
        Frame.in(Frame.WORLD, Vector3D.ZERO, Rotation.IDENTITY, Vector3D.PLUS_K, Vector3D.ZERO);
    Body riding = DISC.placed(turning, Vector3D.PLUS_I, Vector3D.PLUS_K);
    assertNear(Vector3D.PLUS_J, riding.centre().velocity(), TINY);
    assertRefused(
        "body",
        "moves with its frame",
        () -> riding.turned(new Axis(Point.ORIGIN, Vector3D.PLUS_K), 1));
    assertRefused("assembly", "move differently", () -> Body.assembly(List.of(riding, DISC)));
  }

  @Test
  void aBoredCylinderIsTheCylinderLessItsBore() {
    double density = 7850;
    Body solid = Shapes.solidCylinder(0.4, 0.1).ofDensity(density);
    Body bore = Shapes.solidCylinder(0.15, 0.1).ofDensity(density);
    Body hollow = Shapes.hollowCylinder(0.4, 0.15, 0.1).ofDensity(density);
    Body bored = solid.without(bore);
    assertEquals(hollow.mass(), bored.mass(), TINY * solid.mass());
    assertEquals(hollow.volume().getAsDouble(), bored.volume().getAsDouble(), TINY);
    assertNear(hollow.massProperties().atCentre(), bored.massProperties().atCentre(), TINY);
  }

  @Test
  void anAssemblyHasTheTensorOfItsPartsAboutAnyPoint() {
    Body left = DISC.placed(Frame.WORLD, new Vector3D(-1, 0, 0.5), new Vector3D(1, 1, 1));
    Body right = Shapes.hollowCylinder(0.2, 0.1, 1).ofMass(3);
    Body both = Body.assembly(List.of(left, right));
    Point about = Point.fixed(3, -2, 1);
    assertEquals(13, both.mass(), TINY);
    assertNear(left.inertia(about).plus(right.inertia(about)), both.inertia(about), TINY);
    assertNear(new Vector3D(1, 1, 1).normalize(), both.frame().toWorld(Vector3D.PLUS_K), TINY);
    assertRefused("assembly", "no parts", () -> Body.assembly(List.of()));
  }

  @Test
  void theInertiaAboutAnAxisComesWithItsOtherForms() {
    Axis off = new Axis(Point.fixed(0.3, 0, 7), Vector3D.MINUS_K);
    double inertia = 10 * (0.2 * 0.2 / 2 + 0.3 * 0.3);
    assertEquals(inertia, DISC.inertia(off).value(), TINY);
    assertEquals(Math.sqrt(inertia / 10), DISC.radiusOfGyration(off), TINY);
    assertEquals(4 * inertia, DISC.flywheelEffect(off), TINY);
  }

  @Test
  void angularMomentumHasASpinAndAnOrbitalPart() {
    Body placed = DISC.placed(Frame.WORLD, new Vector3D(2, 0, 0), Vector3D.PLUS_K);
    Vector3D spin = new Vector3D(0, 0, 50);
    Vector3D velocity = new Vector3D(0, 3, 0);
    assertNear(new Vector3D(0, 0, 10), placed.spinAngularMomentum(spin), TINY);
    assertNear(new Vector3D(0, 0, 60), placed.orbitalAngularMomentum(velocity, Point.ORIGIN), TINY);
    assertNear(
        new Vector3D(0, 0, 70), placed.angularMomentum(spin, velocity, Point.ORIGIN).value(), TINY);
    assertEquals(10 * 9 / 2.0 + 0.2 * 2500 / 2, placed.kineticEnergy(spin, velocity), TINY * 1e3);
  }

  @Test
  void aMeasuredBodyStandsWhereItsDataSay() {
    InertiaTensor tensor = new InertiaTensor(3, 4, 5, 0.1, -0.2, 0.3);
    Body body = Body.of(new MassProperties(7, new Vector3D(1, 0, 0), tensor));
    assertNear(tensor, body.massProperties().atCentre(), TINY);
    assertEquals(Point.ORIGIN, body.datum());
    assertTrue(body.volume().isEmpty());
    assertRefused(
        "inertia",
        "sum of the other two",
        () -> new MassProperties(7, Vector3D.ZERO, InertiaTensor.diagonal(1, 1, 3)));
  }

  @Test
  void degenerateDimensionsAreRefused() {
    assertRefused("diameter", "-0.1 m", () -> Shapes.solidCylinder(-0.1, 1));
    assertRefused("length", "0 m", () -> Shapes.solidCylinder(0.1, 0));
    assertRefused("bore", "not smaller than the diameter", () -> Shapes.hollowCylinder(1, 1.2, 1));
    assertRefused("bore", "no material", () -> Shapes.hollowCylinder(1, 1, 1));
    assertRefused("mass", "positive", () -> Shapes.solidCylinder(1, 1).ofMass(0));
    assertRefused("density", "positive", () -> Shapes.solidCylinder(1, 1).ofDensity(-1));
    assertRefused("diameter", "no number", () -> Shapes.solidCylinder(Double.NaN, 1));
  }

  @Test
  void takingOutMoreThanThereIsIsRefused() {
    assertRefused("mass", "not less than", () -> DISC.without(DISC));
    Body bore = Shapes.solidCylinder(0.1, 0.1).ofMass(0.5);
    Body outside = bore.placed(Frame.WORLD, new Vector3D(0.3, 0, 0), Vector3D.PLUS_K);
    assertRefused("removed body", "reaches outside", () -> DISC.without(outside));
    Body tooLong = Shapes.solidCylinder(0.1, 0.12).ofMass(0.5);
    assertRefused("removed body", "reaches outside", () -> DISC.without(tooLong));
    assertEquals(9.5, DISC.without(bore).mass());
    Body catalogue = Body.of(DISC.massProperties());
    Body heavy = Shapes.solidCylinder(0.1, 0.1).ofMass(5);
    Body far = heavy.placed(Frame.WORLD, new Vector3D(3, 0, 0), Vector3D.PLUS_K);
    assertRefused("inertia", "no body has", () -> catalogue.without(far));
  }

  @Test
  void whatIsTakenOutMayTouchTheSurface() {
    double density = 7850;
    Body solid = Shapes.solidCylinder(0.4, 0.1).ofDensity(density);
    Body rim = Shapes.hollowCylinder(0.4, 0.36, 0.1).ofDensity(density);
    Body turned = rim.turned(new Axis(Point.ORIGIN, Vector3D.PLUS_K), 0.02);
    Body core = Shapes.solidCylinder(0.36, 0.1).ofDensity(density);
    assertEquals(core.mass(), solid.without(turned).mass(), TINY * solid.mass());
    Body ball = Shapes.hollowSphere(0.4, 0.2).ofDensity(density);
    Body inHollow = Shapes.solidSphere(0.1).ofDensity(density);
    assertRefused("removed body", "reaches outside", () -> ball.without(inHollow));
  }

  @Test
  void materialIsNotTakenOutTwice() {
    Body block = Shapes.box(0.2, 0.2, 0.2).ofDensity(1000);
    Body bore = Shapes.solidCylinder(0.05, 0.2).ofDensity(1000);
    Body counterbore =
        Shapes.solidCylinder(0.08, 0.05)
            .ofDensity(1000)
            .placed(Frame.WORLD, new Vector3D(0, 0, 0.075), Vector3D.PLUS_K);
    Body across = bore.placed(Frame.WORLD, Vector3D.ZERO, Vector3D.PLUS_I);
    assertRefused("removed body", "taken out already", () -> block.without(bore, counterbore));
    assertRefused("removed body", "taken out already", () -> block.without(bore).without(across));
    Body step =
        Shapes.hollowCylinder(0.08, 0.05, 0.05)
            .ofDensity(1000)
            .placed(Frame.WORLD, new Vector3D(0, 0, 0.075), Vector3D.PLUS_K);
    double left = 8 - 1000 * Math.PI / 4 * (0.05 * 0.05 * 0.15 + 0.08 * 0.08 * 0.05);
    assertEquals(left, block.without(bore, step).mass(), TINY);
  }

  @Test
  void equalBodiesAreEqual() {
    Body same = Shapes.solidCylinder(0.4, 0.1).ofMass(10);
    assertEquals(DISC, same);
    assertEquals(DISC.hashCode(), same.hashCode());
    assertNotEquals(DISC, Shapes.solidCylinder(0.4, 0.1).ofMass(11));
    assertNotEquals(DISC, same.placed(Frame.WORLD, Vector3D.PLUS_I, Vector3D.PLUS_K));
  }

  @Test
  void aMirroredBodyHasTheMirroredTensor() {
    InertiaTensor tensor = new InertiaTensor(3, 4, 5, 0.1, -0.2, 0.3);
    Body body = Body.of(new MassProperties(7, new Vector3D(1, 2, 3), tensor));
    Body mirrored = body.mirrored(Point.fixed(0, 5, 0), Vector3D.PLUS_J);
    assertNear(new Vector3D(1, 8, 3), mirrored.centre().position(), TINY);
    assertNear(
        new InertiaTensor(3, 4, 5, -0.1, 0.2, 0.3), mirrored.massProperties().atCentre(), TINY);
    Body askew = mirrored.mirrored(Point.fixed(1, 1, 1), new Vector3D(1, 2, 3));
    Body back = askew.mirrored(Point.fixed(1, 1, 1), new Vector3D(1, 2, 3));
    assertNear(mirrored.massProperties().atCentre(), back.massProperties().atCentre(), TINY);
    assertNear(mirrored.centre().position(), back.centre().position(), TINY);
  }

  @Test
  void aScaledBodyKeepsItsMaterial() {
    Body cone = Shapes.cone(0.2, 0.3).ofDensity(2700);
    Body twice = cone.scaled(2);
    Body made = Shapes.cone(0.4, 0.6).ofDensity(2700);
    assertEquals(made.mass(), twice.mass(), TINY * made.mass());
    assertNear(made.ownInertia(), twice.ownInertia(), TINY);
    assertNear(made.datum().position(), twice.datum().position(), TINY);
    assertRefused("body", "has no volume", () -> ThinShapes.ring(1).ofMass(2).scaled(2));
    assertRefused("factor", "positive", () -> cone.scaled(0));
  }

  @Test
  void theOutlineOfAnAssemblyStandsWhereItsPartsAre() {
    Body left = DISC.placed(Frame.WORLD, new Vector3D(-1, 0, 0.5), Vector3D.PLUS_I);
    Body both = Body.assembly(List.of(left, DISC));
    Body moved = both.placed(Frame.in(Frame.WORLD, Vector3D.ZERO, Rotation.IDENTITY));
    assertEquals(2, moved.outline().solids().size());
    Vector3D before = left.outline().solids().get(0).skin().vertex(5);
    Vector3D after = both.outline().solids().get(0).skin().vertex(5);
    assertNear(before, after, TINY);
  }
}
