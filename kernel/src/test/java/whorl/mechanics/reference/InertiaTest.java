package whorl.mechanics.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static whorl.mechanics.Near.assertNear;
import static whorl.mechanics.Near.assertRefused;

import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class InertiaTest {
  private static final double TINY = 1e-12;
  private static final Axis Z = new Axis(Point.ORIGIN, Vector3D.PLUS_K);

  static Stream<SplittableRandom> draws() {
    return ReferenceTest.draws();
  }

  /** Some point masses: every tensor of theirs is that of a body. */
  private static List<Vector3D> cloud(SplittableRandom random) {
    return Stream.generate(
            () ->
                new Vector3D(
                    random.nextDouble(-1, 1), random.nextDouble(-1, 1), random.nextDouble(-1, 1)))
        .limit(6)
        .toList();
  }

  private static InertiaTensor tensor(List<Vector3D> cloud, Vector3D about) {
    return cloud.stream()
        .map(r -> InertiaTensor.ofPoint(1, r.subtract(about)))
        .reduce(InertiaTensor.ZERO, InertiaTensor::plus);
  }

  @ParameterizedTest
  @MethodSource("draws")
  void principalMomentsAndAxesRebuildTheTensor(SplittableRandom random) {
    InertiaTensor tensor = tensor(cloud(random), Vector3D.ZERO);
    double[] moments = tensor.principalMoments();
    List<Vector3D> axes = tensor.principalAxes();
    Rotation turned = Frame.axes(axes.get(0), axes.get(1), axes.get(2));
    assertNear(
        tensor, InertiaTensor.diagonal(moments[0], moments[1], moments[2]).turned(turned), TINY);
  }

  @ParameterizedTest
  @MethodSource("draws")
  void aTensorMovesBetweenPointsThatAreNotTheCentre(SplittableRandom random) {
    List<Vector3D> cloud = cloud(random);
    Vector3D centre =
        cloud.stream().reduce(Vector3D.ZERO, Vector3D::add).scalarMultiply(1.0 / cloud.size());
    Vector3D a = cloud.get(0);
    Vector3D b = cloud.get(1);
    assertNear(
        tensor(cloud, b),
        tensor(cloud, a).moved(cloud.size(), Point.fixed(centre), Point.fixed(a), Point.fixed(b)),
        TINY);
  }

  @ParameterizedTest
  @MethodSource("draws")
  void turningTheBodyTurnsItsTensor(SplittableRandom random) {
    List<Vector3D> cloud = cloud(random);
    Rotation turn = Turn.about(cloud.get(0), 2);
    assertNear(
        tensor(cloud.stream().map(turn::applyTo).toList(), Vector3D.ZERO),
        tensor(cloud, Vector3D.ZERO).turned(turn),
        TINY);
  }

  @Test
  void productsOfInertiaTurnIntoElementsOfTheOppositeSign() {
    InertiaTensor tensor = InertiaTensor.ofPoint(2, new Vector3D(1, 2, 3));
    assertEquals(tensor, InertiaTensor.fromProducts(26, 20, 10, 4, 12, 6));
    assertEquals(-4, tensor.xy());
  }

  @Test
  void aTensorThatNoBodyHasIsRefused() {
    assertRefused(
        "inertia",
        "more than the sum of the other two",
        () -> InertiaTensor.diagonal(1, 1, 2.1).demandPhysical());
    assertRefused(
        "inertia",
        "negative principal moment",
        () -> new InertiaTensor(1, 1, 1, 2, 0, 0).demandPhysical());
    assertRefused("inertia", "no number", () -> InertiaTensor.diagonal(1, Double.NaN, 1));
    assertEquals(2, InertiaTensor.diagonal(1, 1, 2).demandPhysical().zz());
    assertEquals(InertiaTensor.ZERO, InertiaTensor.ZERO.demandPhysical());
  }

  @Test
  void anInertiaMovesBetweenParallelAxesNeitherOfThemThroughTheCentre() {
    // A rod of 3 kg and 2 m, from one end to a quarter point; common practice.
    Axis end = new Axis(Point.fixed(1, 0, 0), Vector3D.PLUS_K);
    Axis quarter = new Axis(Point.fixed(-0.5, 0, 4), Vector3D.MINUS_K);
    AxialInertia atEnd = new AxialInertia(4, end);
    assertEquals(1.75, atEnd.moved(quarter, 3, Point.ORIGIN).value(), TINY);
  }

  @Test
  void anInertiaThatTheMassAlreadyExceedsIsRefused() {
    AxialInertia tooSmall = new AxialInertia(1, Z);
    assertRefused(
        "moment of inertia", "at least 2", () -> tooSmall.moved(Z, 2, Point.fixed(1, 0, 0)));
    assertRefused(
        "axis",
        "not parallel",
        () -> tooSmall.moved(new Axis(Point.ORIGIN, Vector3D.PLUS_I), 2, Point.ORIGIN));
    assertRefused("mass", "positive", () -> tooSmall.moved(Z, 0, Point.ORIGIN));
    assertRefused("moment of inertia", "negative", () -> new AxialInertia(-1, Z));
  }

  @Test
  void inertiasAboutDifferentAxesAreNotAdded() {
    AxialInertia here = new AxialInertia(1, Z);
    AxialInertia there = new AxialInertia(1, new Axis(Point.fixed(0.5, 0, 0), Vector3D.PLUS_K));
    assertRefused("moment of inertia", "different axes", () -> here.plus(there));
    assertEquals(2, here.plus(here).value());
  }

  // Slips of the trade, each by the named law at chosen inputs: what a careless sum gives, and what
  // is right.

  @Test
  void inertiasAreJoinedAboutOneAxisOnly() {
    // A disc of 0.045 kg·m² about itself, 10 kg, 0.3 m off a shaft of 0.002 kg·m²: 0.947, not
    // 0.047.
    Axis own = new Axis(Point.fixed(0.3, 0, 0), Vector3D.PLUS_K);
    AxialInertia disc = new AxialInertia(0.045, own);
    AxialInertia shaft = new AxialInertia(0.002, Z);
    assertRefused("moment of inertia", "different axes", () -> disc.plus(shaft));
    assertEquals(0.947, disc.moved(Z, 10, own.through()).plus(shaft).value(), 1e-12);
  }

  @Test
  void goingToTheCentreTakesOffWhatLeavingItAdds() {
    // A rod of 2 kg and 1.2 m with 0.96 kg·m² about its end: 0.24 about its centre, not 1.68.
    Axis end = new Axis(Point.fixed(0.6, 0, 0), Vector3D.PLUS_K);
    assertEquals(0.24, new AxialInertia(0.96, end).moved(Z, 2, Point.ORIGIN).value(), 1e-12);
  }

  @Test
  void theSignOfAProductOfInertiaTurnsThePrincipalAxes() {
    // Moments 2 and 3 kg·m², product +0.5 kg·m²: the first axis at 22.5 deg from x, not at −22.5 or
    // 67.5.
    InertiaTensor tensor = InertiaTensor.fromProducts(2, 3, 4, 0.5, 0, 0);
    Vector3D first = tensor.principalAxes().get(0);
    double angle = Math.toDegrees(Math.atan(first.getY() / first.getX()));
    assertEquals(22.5, angle, 1e-9);
  }
}
