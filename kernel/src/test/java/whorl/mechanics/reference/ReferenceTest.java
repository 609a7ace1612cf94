package whorl.mechanics.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.mechanics.Near.assertNear;
import static whorl.mechanics.Near.assertRefused;

import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ReferenceTest {
  private static final double TINY = 1e-12;

  static Stream<SplittableRandom> draws() {
    return new SplittableRandom(4).ints(100).mapToObj(SplittableRandom::new);
  }

  private static Vector3D vector(SplittableRandom random) {
    return new Vector3D(
        random.nextDouble(-1, 1), random.nextDouble(-1, 1), random.nextDouble(-1, 1));
  }

  private static Frame frame(SplittableRandom random, Frame parent) {
    return Frame.in(
        parent,
        vector(random),
        Turn.about(vector(random), random.nextDouble(-4, 4)),
        vector(random),
        vector(random));
  }

  @ParameterizedTest
  @MethodSource("draws")
  void aPointOfANestedFrameMovesAsItsPlacesInTimeSay(SplittableRandom random) {
    Frame ship = frame(random, Frame.WORLD);
    Frame wheel = frame(random, ship);
    Vector3D local = vector(random);
    double h = 1e-5;
    Vector3D before = wheel.at(-h).point(local).position();
    Vector3D after = wheel.at(h).point(local).position();
    assertNear(after.subtract(before).scalarMultiply(0.5 / h), wheel.point(local).velocity(), 1e-8);
  }

  @ParameterizedTest
  @MethodSource("draws")
  void coordinatesInAFrameLeadBackToThePoint(SplittableRandom random) {
    Frame frame = frame(random, frame(random, Frame.WORLD));
    Vector3D local = vector(random);
    assertNear(local, frame.coordinates(frame.point(local)), TINY);
    assertNear(local, frame.fromWorld(frame.toWorld(local)), TINY);
  }

  @Test
  void angularVelocitiesOfNestedFramesAddUpAlongTheAxesOfTheWorld() {
    Frame ship =
        Frame.in(
            Frame.WORLD,
            Vector3D.ZERO,
            Turn.about(Vector3D.PLUS_I, Math.PI / 2),
            new Vector3D(0, 0, 2),
            Vector3D.ZERO);
    Frame wheel =
        Frame.in(ship, Vector3D.ZERO, Rotation.IDENTITY, new Vector3D(0, 0, 30), Vector3D.ZERO);
    assertNear(new Vector3D(0, -30, 2), wheel.angularVelocity(), TINY);
    assertFalse(wheel.isFixed());
  }

  @Test
  void theZAxisIsTurnedTheShortestWay() {
    for (Vector3D to :
        new Vector3D[] {
          Vector3D.PLUS_K, Vector3D.MINUS_K, Vector3D.PLUS_I, new Vector3D(1e-200, 0, 3e-200)
        }) {
      assertNear(to.scalarMultiply(1e100).normalize(), Turn.zTo(to).applyTo(Vector3D.PLUS_K), TINY);
    }
    assertNear(Vector3D.PLUS_J, Turn.zTo(Vector3D.PLUS_I).applyTo(Vector3D.PLUS_J), TINY);
  }

  @Test
  void whatSpansNoFrameIsRefused() {
    assertRefused("direction", "length zero", () -> Turn.about(Vector3D.ZERO, 1));
    assertRefused(
        "y axis", "singular", () -> Frame.axes(Vector3D.PLUS_I, Vector3D.PLUS_I, Vector3D.PLUS_K));
    assertRefused(
        "y axis",
        "45 deg",
        () -> Frame.axes(Vector3D.PLUS_I, new Vector3D(1, 1, 0), Vector3D.PLUS_K));
    assertRefused(
        "z axis",
        "left-handed",
        () -> Frame.axes(Vector3D.PLUS_I, Vector3D.PLUS_J, Vector3D.MINUS_K));
    assertRefused(
        "frame",
        "singular",
        () -> Frame.in(Frame.WORLD, Vector3D.ZERO, new Rotation(1, 1, 0, 0, false)));
  }

  @Test
  void threeDirectionsGiveTheRotationThatTakesTheAxesThere() {
    Rotation turned = Frame.axes(Vector3D.PLUS_J, Vector3D.PLUS_K, Vector3D.PLUS_I);
    assertNear(Vector3D.PLUS_J, turned.applyTo(Vector3D.PLUS_I), TINY);
    assertNear(Vector3D.PLUS_I, turned.applyTo(Vector3D.PLUS_K), TINY);
  }

  @Test
  void anAxisOfNoDirectionIsRefused() {
    assertRefused("direction", "length zero", () -> new Axis(Point.ORIGIN, Vector3D.ZERO));
    assertRefused(
        "axis", "Both points", () -> Axis.through(Point.fixed(1, 2, 3), Point.fixed(1, 2, 3)));
  }

  @Test
  void anAxisKnowsItsDistances() {
    Axis axis = new Axis(Point.fixed(0, 0, 5), new Vector3D(0, 0, -2));
    assertEquals(5, axis.distance(Point.fixed(3, 4, -7)), TINY);
    assertNear(new Vector3D(0, 0, -7), axis.nearest(Point.fixed(3, 4, -7)).position(), TINY);
    assertTrue(axis.coincidesWith(new Axis(Point.ORIGIN, Vector3D.PLUS_K)));
    assertFalse(axis.coincidesWith(new Axis(Point.fixed(1, 0, 0), Vector3D.PLUS_K)));
  }

  @Test
  void theMomentOfAForceIsTakenWithItsArm() {
    BoundForce weight = new BoundForce(new Vector3D(0, 0, -100), Point.fixed(2, 0, 0));
    Moment about = weight.moment(Point.ORIGIN);
    assertNear(new Vector3D(0, 200, 0), about.value(), TINY);
    assertEquals(200, weight.moment(new Axis(Point.ORIGIN, Vector3D.PLUS_J)), TINY);
    assertNear(Vector3D.ZERO, about.moved(weight.at(), weight.force()).value(), TINY);
  }

  @Test
  void momentsAboutDifferentPointsAreNotAdded() {
    Moment a = new Moment(Vector3D.PLUS_I, Point.ORIGIN);
    Moment b = new Moment(Vector3D.PLUS_I, Point.fixed(0, 0, 1));
    assertRefused("moment", "takes the force", () -> a.plus(b));
    assertNear(new Vector3D(2, 0, 0), a.plus(b.moved(Point.ORIGIN, Vector3D.ZERO)).value(), TINY);
    assertRefused("axis", "misses", () -> b.about(new Axis(Point.ORIGIN, Vector3D.PLUS_I)));
  }

  @Test
  void angularMomentumIsMovedWithTheMomentum() {
    AngularMomentum spin = new AngularMomentum(new Vector3D(0, 0, 7), Point.fixed(3, 0, 0));
    Vector3D momentum = new Vector3D(0, 2, 0);
    assertNear(new Vector3D(0, 0, 13), spin.moved(Point.ORIGIN, momentum).value(), TINY);
    assertRefused(
        "angular momentum",
        "takes the momentum",
        () -> spin.plus(spin.moved(Point.ORIGIN, momentum)));
  }

  @Test
  void aRateAboutAPointThatMovesIsNoMoment() {
    Point moving = new Point(Vector3D.PLUS_I, Vector3D.PLUS_J);
    assertRefused(
        "point",
        "not the centre of mass",
        () -> Moment.fromRate(Vector3D.PLUS_K, moving, Point.ORIGIN));
    assertEquals(Vector3D.PLUS_K, Moment.fromRate(Vector3D.PLUS_K, moving, moving).value());
    assertEquals(Vector3D.PLUS_K, Moment.fromRate(Vector3D.PLUS_K, Point.ORIGIN, moving).value());
  }
}
