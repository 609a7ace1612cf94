package whorl.report.sketch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.MassProperties;
import whorl.mechanics.body.Shapes;
import whorl.mechanics.body.ThinShapes;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;
import whorl.mechanics.reference.Turn;

class SketchTest {
  private static final Body WHEEL =
      Shapes.solidCylinder(0.32, 0.03)
          .ofDensity(7850)
          .placed(Frame.WORLD, new Vector3D(0, 0, 0.18), Vector3D.PLUS_K);
  private static final Drawn.Body DRAWN_WHEEL = new Drawn.Body("wheel", WHEEL);

  private static Drawn.Arrow arrow(String name, Sense sense, Vector3D value) {
    return new Drawn.Arrow(name, "1 N", name, sense, value, Optional.empty());
  }

  static Stream<List<Drawn>> scenes() {
    Body catalogue = Body.of(new MassProperties(3, Vector3D.ZERO, InertiaTensor.diagonal(1, 1, 1)));
    return Stream.of(
        List.of(),
        List.of(new Drawn.Spot("A", Point.ORIGIN)),
        List.of(new Drawn.Body("p", ThinShapes.point().ofMass(1))),
        List.of(new Drawn.Body("motor", catalogue)),
        List.of(arrow("F", Sense.FORCE, Vector3D.ZERO)),
        List.of(arrow("L", Sense.ANGULAR_MOMENTUM, new Vector3D(0, 579, 0))),
        List.of(new Drawn.Line("a", new Axis(Point.fixed(1e9, 0, 0), Vector3D.PLUS_J))),
        List.of(
            DRAWN_WHEEL,
            new Drawn.Axes("ship", Frame.in(Frame.WORLD, Vector3D.ZERO, Turn.zTo(Vector3D.PLUS_I))),
            arrow("L", Sense.ANGULAR_MOMENTUM, Vector3D.PLUS_K),
            arrow("M", Sense.MOMENT, Vector3D.MINUS_K)));
  }

  @ParameterizedTest
  @MethodSource("scenes")
  void aDrawingIsWellFormedAndOfSensibleSize(List<Drawn> things) throws Exception {
    String svg = Sketch.svg(things);
    Document document =
        DocumentBuilderFactory.newInstance()
            .newDocumentBuilder()
            .parse(new ByteArrayInputStream(svg.getBytes(StandardCharsets.UTF_8)));
    assertEquals("svg", document.getDocumentElement().getTagName());
    assertFalse(svg.contains("NaN") || svg.contains("Infinity"), svg);
    String[] box = document.getDocumentElement().getAttribute("viewBox").split(" ", -1);
    assertTrue(Double.parseDouble(box[2]) > 20 && Double.parseDouble(box[2]) < 1000, svg);
    assertTrue(Double.parseDouble(box[3]) > 20 && Double.parseDouble(box[3]) < 700, svg);
    for (Drawn thing : things) {
      assertTrue(svg.contains(">" + thing.name() + "</tspan>") || svg.contains("ship"), svg);
    }
  }

  @Test
  void theSameThingsGiveTheSameDrawing() {
    assertEquals(Sketch.svg(List.of(DRAWN_WHEEL)), Sketch.svg(List.of(DRAWN_WHEEL)));
  }

  @Test
  void textOfUsersIsEscaped() {
    String svg =
        Sketch.svg(
            List.of(
                new Drawn.Arrow(
                    "a<b_&\"", "<i>1</i>", "s", Sense.POLAR, Vector3D.PLUS_I, Optional.empty())));
    assertTrue(svg.contains("a&lt;b") && svg.contains("&amp;&quot;"), svg);
    assertFalse(svg.contains("<i>") || svg.contains("a<b"), svg);
  }

  @Test
  void anAxialVectorIsToldFromAPolarOneByMoreThanColour() {
    String force = Sketch.svg(List.of(arrow("F", Sense.FORCE, Vector3D.PLUS_I)));
    String moment = Sketch.svg(List.of(arrow("F", Sense.MOMENT, Vector3D.PLUS_I)));
    assertEquals(1, count("<path[^>]*fill=\"#", force), "one head");
    assertEquals(3, count("<path[^>]*fill=\"#", moment), "two heads and that of the arc");
  }

  private static long count(String pattern, String text) {
    return Pattern.compile(pattern).matcher(text).results().count();
  }

  @Test
  void aPointWithinABodyIsAnOpenDot() {
    String within = Sketch.svg(List.of(DRAWN_WHEEL, new Drawn.Spot("C", WHEEL.centre())));
    String before = Sketch.svg(List.of(DRAWN_WHEEL, new Drawn.Spot("C", Point.fixed(0, 0, 0.5))));
    assertTrue(within.contains("r=\"3\" stroke"), within);
    assertTrue(before.contains("r=\"2.6\" fill"), before);
  }

  @Test
  void labelsOfPointsAtOnePlaceDoNotOverlap() {
    List<Drawn> points =
        Stream.of("A", "B", "C_long", "D", "E", "F_2")
            .map(name -> (Drawn) new Drawn.Spot(name, Point.fixed(0.1, 0, 0.2)))
            .toList();
    Matcher text =
        Pattern.compile("<text x=\"([-.0-9]+)\" y=\"([-.0-9]+)\"").matcher(Sketch.svg(points));
    List<double[]> places =
        text.results()
            .map(r -> new double[] {Double.parseDouble(r.group(1)), Double.parseDouble(r.group(2))})
            .toList();
    // Those of the points first, then x, y and z of the world.
    for (int i = 0; i < points.size(); i++) {
      for (int j = 0; j < i; j++) {
        double[] a = places.get(i);
        double[] b = places.get(j);
        assertTrue(
            Math.abs(a[1] - b[1]) >= Labels.HEIGHT || Math.abs(a[0] - b[0]) > 8, i + " and " + j);
      }
    }
  }
}
