package whorl.report.sketch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Shapes;
import whorl.mechanics.body.ThinShapes;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.Turn;

/** Surfaces given as seen: the third coordinate is the depth towards the onlooker. */
class SurfacesTest {
  private static final Body TUBE =
      Shapes.solidCylinder(100, 40).ofMass(4).without(Shapes.solidCylinder(60, 40).ofMass(1));

  private static Skins skins(Body... bodies) {
    Skins skins = new Skins();
    for (Body body : bodies) {
      skins.add(body.outline());
    }
    skins.sort();
    return skins;
  }

  private static Facets skin(Body body) {
    return body.outline().solids().get(0).skin();
  }

  private static Body turned(Body body, Rotation turn) {
    return body.placed(Frame.in(Frame.WORLD, Vector3D.ZERO, turn));
  }

  @Test
  void materialHidesWhatIsBehindIt() {
    Skins tube = skins(TUBE);
    assertTrue(tube.hides(40, 3, -50));
    assertTrue(tube.hides(40, 3, 0), "within");
    assertFalse(tube.hides(40, 3, 50), "in front");
    assertFalse(tube.hides(40, 3, 20), "on the surface");
    assertFalse(tube.hides(70, 3, -50), "beside");
  }

  @Test
  void aBoreHidesNothing() {
    Skins tube = skins(TUBE);
    assertFalse(tube.hides(1, 2, -50));
    assertFalse(tube.contains(1, 2, 0));
    assertTrue(tube.contains(40, 3, 0));
  }

  @Test
  void aSheetHidesWhatIsBehindIt() {
    Skins plate = skins(ThinShapes.plate(100, 100).ofMass(1));
    assertTrue(plate.hides(10, 20, -30));
    assertFalse(plate.hides(10, 20, 30));
  }

  @Test
  void aLineOfSightAlongAnEdgeMeetsOneOfItsTriangles() {
    // The diagonals of the end faces of a box run through its middle.
    Skins box = skins(Shapes.box(100, 100, 40).ofMass(1));
    assertTrue(box.hides(0, 0, -50));
    assertTrue(box.hides(10, 10, -50));
    assertTrue(box.hides(10, -10, -50));
    assertTrue(box.contains(0, 0, 0));
  }

  @Test
  void aBoxHasTwelveSharpEdgesAndNoDiagonals() {
    Rotation turn = Turn.about(new Vector3D(1, 2, 3), 1);
    List<Edge> edges = Features.of(skin(turned(Shapes.box(100, 60, 40).ofMass(1), turn)));
    assertEquals(12, edges.size());
    assertEquals(800, length(edges), 1e-9);
    assertEquals(6, edges.stream().filter(Edge::contour).count());
  }

  @Test
  void aCylinderHasTwoCirclesAndTwoContours() {
    Rotation turn = Turn.about(new Vector3D(1, 0.2, 0), 1.1);
    List<Edge> edges = Features.of(skin(turned(Shapes.solidCylinder(100, 80).ofMass(1), turn)));
    List<Edge> smooth = edges.stream().filter(edge -> edge.outward().getNormSq() > 0).toList();
    assertEquals(160, length(smooth), 0.1);
    assertEquals(144, edges.size() - smooth.size());
  }

  @Test
  void theContoursOfAConeMeetAtItsApex() {
    Rotation turn = Turn.about(new Vector3D(1, 0.2, 0), 1.3);
    Body cone = turned(Shapes.cone(100, 120).ofMass(1), turn);
    Vector3D apex = cone.frame().point(new Vector3D(0, 0, 90)).position();
    List<Edge> smooth =
        Features.of(skin(cone)).stream().filter(edge -> edge.outward().getNormSq() > 0).toList();
    assertEquals(2, smooth.size());
    for (Edge edge : smooth) {
      double near = Math.min(edge.from().distance(apex), edge.to().distance(apex));
      assertEquals(0, near, 1e-9);
      assertEquals(130, edge.from().distance(edge.to()), 1);
    }
  }

  @Test
  void aSphereIsSeenAsACircle() {
    List<Edge> edges = Features.of(skin(Shapes.solidSphere(100).ofMass(1)));
    assertEquals(100 * Math.PI, length(edges), 1);
    for (Edge edge : edges) {
      assertEquals(50, Math.hypot(edge.from().getX(), edge.from().getY()), 0.2);
    }
  }

  @Test
  void aRodThroughAPlateCrossesItInACircleOnEachSide() {
    Facets plate = skin(Shapes.box(100, 100, 10).ofMass(1));
    Facets rod = skin(Shapes.solidCylinder(30, 80).ofMass(1));
    assertEquals(2 * 30 * Math.PI, length(Crossings.of(plate, rod)), 0.3);
  }

  @Test
  void whatIsBuriedInAnotherBodyIsNotDrawn() {
    Body block = Shapes.box(100, 100, 100).ofMass(8);
    Body core = Shapes.box(20, 20, 20).ofMass(1);
    double alone = drawn(skins(block));
    assertEquals(alone, drawn(skins(block, core)), 1);
    assertTrue(drawn(skins(block.without(core))) > alone + 100, "a cavity is drawn as hidden");
  }

  private static double drawn(Skins skins) {
    double sum = 0;
    for (Stroke stroke : new Tracing(skins).surfaces()) {
      for (int i = 1; i < stroke.points().size(); i++) {
        sum += stroke.points().get(i).distance(stroke.points().get(i - 1));
      }
    }
    return sum;
  }

  private static double length(List<Edge> edges) {
    return edges.stream().mapToDouble(edge -> edge.from().distance(edge.to())).sum();
  }
}
