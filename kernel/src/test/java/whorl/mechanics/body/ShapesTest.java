package whorl.mechanics.body;

import static java.lang.Math.PI;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.mechanics.Near.assertNear;
import static whorl.mechanics.Near.assertRefused;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.mechanics.body.Quadrature.Swept;

/** Every closed form against integration over the shape, in the coordinates of its datum. */
class ShapesTest {
  private static final double TOLERANCE = 1e-10;

  static Stream<Arguments> solids() {
    Contour ell =
        Contour.polygon(
            List.of(at(0, 0), at(0.6, 0), at(0.6, 0.2), at(0.2, 0.2), at(0.2, 0.5), at(0, 0.5)));
    Contour halfDisc = Contour.from(at(0.3, -0.2)).arcTo(at(0.5, 0), at(0.3, 0.2)).close();
    return Stream.of(
        solid(Shapes.solidCylinder(0.5, 0.3), round(0, 0.3, z -> 0, z -> 0.25, -0.15)),
        solid(Shapes.hollowCylinder(0.5, 0.4, 0.3), round(0, 0.3, z -> 0.2, z -> 0.25, -0.15)),
        solid(Shapes.solidSphere(0.5), ball(0, 0.25)),
        solid(Shapes.hollowSphere(0.5, 0.3), ball(0.15, 0.25)),
        solid(Shapes.sphericalCap(0.5, 0.1), cap(0.25, 0.1)),
        solid(Shapes.sphericalCap(0.5, 0.4), cap(0.25, 0.4)),
        solid(Shapes.sphericalCap(0.5, 0.5), cap(0.25, 0.5)),
        solid(Shapes.cone(0.5, 0.7), round(0, 0.7, z -> 0, z -> 0.25 * (1 - z / 0.7), 0)),
        solid(Shapes.frustum(0.6, 0.2, 0.5), round(0, 0.5, z -> 0, z -> 0.3 - 0.4 * z, 0)),
        solid(Shapes.frustum(0.2, 0.6, 0.5), round(0, 0.5, z -> 0, z -> 0.1 + 0.4 * z, 0)),
        solid(Shapes.box(0.2, 0.3, 0.4), block(-0.1, 0.1, -0.15, 0.15, -0.2, 0.2)),
        solid(
            Shapes.ellipsoid(0.2, 0.3, 0.4),
            (u, v, w) -> {
              Vector3D p = ball(0, 1).at(u, v, w);
              return new Vector3D(0.2 * p.getX(), 0.3 * p.getY(), 0.4 * p.getZ());
            }),
        solid(
            Shapes.torus(0.8, 0.2),
            (u, v, w) -> {
              double r = 0.4 + 0.1 * u * Math.cos(2 * PI * w);
              return polar(r, 2 * PI * v, 0.1 * u * Math.sin(2 * PI * w));
            }),
        solid(
            Shapes.prism(ell, 0.3),
            block(0, 0.6, 0, 0.2, -0.15, 0.15),
            block(0, 0.2, 0.2, 0.5, -0.15, 0.15)),
        solid(
            Shapes.prism(halfDisc, 0.3),
            (u, v, w) ->
                polar(0.2 * u, PI * (v - 0.5), 0.3 * (w - 0.5)).add(new Vector3D(0.3, 0, 0))),
        solid(
            Shapes.revolved(halfDisc),
            (u, v, w) -> {
              double angle = PI * (w - 0.5);
              return polar(0.3 + 0.2 * u * Math.cos(angle), 2 * PI * v, 0.2 * u * Math.sin(angle));
            }),
        solid(
            Shapes.revolved(ell),
            round(0, 0.2, z -> 0, z -> 0.6, 0),
            round(0.2, 0.5, z -> 0, z -> 0.2, 0)),
        solid(
            Shapes.revolved(z -> 0.2 + 0.1 * Math.sin(3 * z), 0.1, 1.4),
            round(0.1, 1.4, z -> 0, z -> 0.2 + 0.1 * Math.sin(3 * z), 0)));
  }

  static Stream<Arguments> shells() {
    Contour star = Contour.polygon(star());
    return Stream.of(
        thin(ThinShapes.ring(0.5), Quadrature.line((u, v, w) -> polar(0.25, 2 * PI * u, 0))),
        thin(
            ThinShapes.rod(0.5), Quadrature.line((u, v, w) -> new Vector3D(0, 0, 0.5 * (u - 0.5)))),
        thin(ThinShapes.disc(0.5), Quadrature.surface((u, v, w) -> polar(0.25 * u, 2 * PI * v, 0))),
        thin(
            ThinShapes.plate(0.4, 0.3),
            Quadrature.surface((u, v, w) -> new Vector3D(0.4 * (u - 0.5), 0.3 * (v - 0.5), 0))),
        thin(ThinShapes.plate(star), Quadrature.surface(fan(star()))),
        thin(ThinShapes.tube(0.5, 0.7), Quadrature.surface(taper(0.25, 0.25, -0.35, 0.35))),
        thin(ThinShapes.cone(0.5, 0.7), Quadrature.surface(taper(0.25, 0, 0, 0.7))),
        thin(ThinShapes.frustum(0.5, 0.2, 0.7), Quadrature.surface(taper(0.25, 0.1, 0, 0.7))),
        thin(
            ThinShapes.sphere(0.5),
            Quadrature.surface((u, v, w) -> spherical(0.25, 2 * PI * u, PI * (v - 0.5)))),
        thin(
            ThinShapes.sphericalCap(0.5, 0.1),
            Quadrature.surface(
                (u, v, w) -> {
                  double least = Math.asin(0.15 / 0.25);
                  return spherical(0.25, 2 * PI * u, least + (PI / 2 - least) * v)
                      .subtract(new Vector3D(0, 0, 0.15));
                })),
        thin(
            ThinShapes.torus(0.8, 0.2),
            Quadrature.surface(
                (u, v, w) ->
                    polar(
                        0.4 + 0.1 * Math.cos(2 * PI * v),
                        2 * PI * u,
                        0.1 * Math.sin(2 * PI * v)))));
  }

  @ParameterizedTest
  @MethodSource({"solids", "shells"})
  void aClosedFormIsWhatIntegrationOverTheShapeGives(Shape shape, Quadrature integrated) {
    shape
        .volume()
        .ifPresent(v -> assertEquals(integrated.measure(), v, TOLERANCE * integrated.measure()));
    assertNear(integrated.centre(), shape.datum().negate(), TOLERANCE);
    assertNear(integrated.perMass(), shape.perMass(), TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("solids")
  void theFacetsOfASolidEncloseNearlyItsVolume(Shape shape, Quadrature integrated) {
    double enclosed = 0;
    for (Outline.Solid solid : shape.drawn().get().solids()) {
      enclosed += volume(solid);
    }
    assertEquals(integrated.measure(), enclosed, 0.01 * integrated.measure());
  }

  private static double volume(Outline.Solid solid) {
    Facets skin = solid.skin();
    double sum = 0;
    for (int t = 0; t < skin.triangles(); t++) {
      Vector3D a = skin.vertex(skin.corner(t, 0));
      Vector3D b = skin.vertex(skin.corner(t, 1));
      Vector3D c = skin.vertex(skin.corner(t, 2));
      sum += a.dotProduct(b.crossProduct(c)) / 6;
    }
    return sum - solid.removed().stream().mapToDouble(ShapesTest::volume).sum();
  }

  @Test
  void anOutlineFarFromItsOriginKeepsItsDigits() {
    double far = 1e6;
    Contour square =
        Contour.polygon(
            List.of(at(far, far), at(far + 1, far), at(far + 1, far + 1), at(far, far + 1)));
    assertNear(Shapes.box(1, 1, 1).perMass(), Shapes.prism(square, 1).perMass(), 1e-15);
  }

  @Test
  void theSenseInWhichAnOutlineIsDrawnDoesNotMatter() {
    List<Vector2D> corners = star();
    List<Vector2D> backwards = new ArrayList<>(corners);
    Collections.reverse(backwards);
    Shape one = Shapes.prism(Contour.polygon(corners), 0.1);
    Shape other = Shapes.prism(Contour.polygon(backwards), 0.1);
    assertNear(one.perMass(), other.perMass(), 1e-14);
    assertTrue(other.volume().getAsDouble() > 0);
  }

  @Test
  void anArcKeepsToItsSide() {
    double radius = 0.5;
    // Three quarters of a circle, drawn either way, and the quarter that is left.
    Vector2D start = at(radius, 0);
    Vector2D end = at(0, -radius);
    Vector2D far = at(-radius * Math.sqrt(0.5), radius * Math.sqrt(0.5));
    double most = Contour.from(start).arcTo(far, end).close().area();
    double again = Contour.from(end).arcTo(far, start).close().area();
    double least = Contour.from(start).arcTo(far.negate(), end).close().area();
    assertEquals(PI * 0.25 * 0.75 + 0.125, most, 1e-14);
    assertEquals(most, again, 1e-14);
    assertEquals(PI * 0.25 - most, least, 1e-14);
  }

  @Test
  void degenerateOutlinesAreRefused() {
    assertRefused(
        "outline", "fewer than three", () -> Contour.polygon(List.of(at(0, 0), at(1, 0))));
    assertRefused(
        "outline", "no area", () -> Contour.polygon(List.of(at(0, 0), at(1, 1), at(2, 2))));
    assertRefused(
        "outline",
        "crosses",
        () -> Contour.polygon(List.of(at(0, 0), at(1, 1), at(1, 0), at(0, 1))));
    assertRefused(
        "outline",
        "neighbouring",
        () -> Contour.polygon(List.of(at(0, 0), at(0, 0), at(1, 0), at(0, 1))));
    assertRefused(
        "outline", "straight line", () -> Contour.from(at(0, 0)).arcTo(at(1, 1), at(2, 2)));
    assertRefused(
        "profile",
        "crosses the axis",
        () -> Shapes.revolved(Contour.polygon(List.of(at(-0.1, 0), at(1, 0), at(1, 1)))));
    assertRefused("outline", "no number", () -> Contour.from(at(Double.NaN, 0)));
  }

  @Test
  void impossibleDimensionsAreRefused() {
    assertRefused("bore", "no material", () -> Shapes.hollowSphere(0.1, 0.1));
    assertRefused("height", "sphere", () -> Shapes.sphericalCap(0.1, 0.2));
    assertRefused("section", "into itself", () -> Shapes.torus(0.1, 0.2));
    assertRefused("top", "positive", () -> Shapes.frustum(0.1, 0, 0.2));
    assertRefused("upper end", "not above", () -> Shapes.revolved(z -> 1, 1, 1));
    assertRefused("radius", "negative", () -> Shapes.revolved(z -> z, -1, 1));
    assertRefused("radius", "zero throughout", () -> Shapes.revolved(z -> 0, -1, 1));
    assertRefused("radius", "smoothly", () -> Shapes.revolved(z -> Math.random(), -1, 1));
    assertRefused("c", "positive", () -> Shapes.ellipsoid(1, 1, -1));
  }

  @Test
  void whatHasNoVolumeTakesNoDensity() {
    assertRefused("density", "thin ring has no volume", () -> ThinShapes.ring(1).ofDensity(7850));
    assertRefused("density", "point mass", () -> ThinShapes.point().ofDensity(7850));
    assertEquals(0, ThinShapes.point().ofMass(3).ownInertia().zz());
  }

  private static Arguments solid(Shape shape, Swept... parts) {
    return Arguments.of(Named.of(shape.name(), shape), Quadrature.solid(parts));
  }

  private static Arguments thin(Shape shape, Quadrature integrated) {
    return Arguments.of(Named.of(shape.name(), shape), integrated);
  }

  private static Vector2D at(double x, double y) {
    return new Vector2D(x, y);
  }

  private static Vector3D polar(double r, double angle, double z) {
    return new Vector3D(r * Math.cos(angle), r * Math.sin(angle), z);
  }

  private static Vector3D spherical(double r, double longitude, double latitude) {
    return polar(r * Math.cos(latitude), longitude, r * Math.sin(latitude));
  }

  /** A solid of revolution between two radii that depend on z, raised. */
  private static Swept round(
      double from, double to, DoubleUnaryOperator inner, DoubleUnaryOperator outer, double raised) {
    return (u, v, w) -> {
      double z = from + (to - from) * w;
      double least = inner.applyAsDouble(z);
      return polar(least + (outer.applyAsDouble(z) - least) * u, 2 * PI * v, z + raised);
    };
  }

  private static Swept ball(double inner, double outer) {
    return (u, v, w) -> spherical(inner + (outer - inner) * u, 2 * PI * v, PI * (w - 0.5));
  }

  private static Swept block(double a, double b, double c, double d, double e, double f) {
    return (u, v, w) -> new Vector3D(a + (b - a) * u, c + (d - c) * v, e + (f - e) * w);
  }

  /** The cap above its base: z = h sin(…) keeps the radius smooth at the top. */
  private static Swept cap(double radius, double height) {
    double below = height - radius;
    double least = Math.asin(-below / radius);
    return (u, v, w) -> {
      double latitude = least + (PI / 2 - least) * w;
      return polar(
          u * radius * Math.cos(latitude), 2 * PI * v, below + radius * Math.sin(latitude));
    };
  }

  private static Swept taper(double r0, double r1, double z0, double z1) {
    return (u, v, w) -> polar(r0 + (r1 - r0) * v, 2 * PI * u, z0 + (z1 - z0) * v);
  }

  private static List<Vector2D> star() {
    double[] radii = {0.5, 0.2, 0.4, 0.3, 0.6, 0.25, 0.45};
    List<Vector2D> corners = new ArrayList<>();
    for (int i = 0; i < radii.length; i++) {
      double angle = 2 * PI * i / radii.length;
      corners.add(at(radii[i] * Math.cos(angle), radii[i] * Math.sin(angle)));
    }
    return corners;
  }

  private static Swept[] fan(List<Vector2D> corners) {
    List<Swept> parts = new ArrayList<>();
    for (int i = 0; i < corners.size(); i++) {
      Vector2D a = corners.get(i);
      Vector2D b = corners.get((i + 1) % corners.size());
      parts.add(
          (u, v, w) -> {
            Vector2D p = new Vector2D(u * (1 - v), a, u * v, b);
            return new Vector3D(p.getX(), p.getY(), 0);
          });
    }
    return parts.toArray(Swept[]::new);
  }
}
