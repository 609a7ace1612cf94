package whorl.mechanics.body;

import static org.junit.jupiter.api.Assertions.assertEquals;
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
import whorl.mechanics.reference.Turn;

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
    Body far = Shapes.solidCylinder(0.1, 0.1).ofMass(5);
    Body outside =
        far.placed(Frame.in(Frame.WORLD, new Vector3D(3, 0, 0), Turn.zTo(Vector3D.PLUS_K)));
    assertRefused("inertia", "no body has", () -> DISC.without(outside));
  }
}
