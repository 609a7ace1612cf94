package whorl.report.sketch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.mechanics.Near.assertNear;

import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.junit.jupiter.api.Test;

class ViewTest {
  @Test
  void upStaysUp() {
    View view = View.showing(List.of());
    Vector3D seen = view.seen(Vector3D.PLUS_K);
    assertEquals(0, seen.getX(), 1e-15);
    assertTrue(seen.getY() < 0 && seen.getZ() > 0);
    assertNear(view.eye(), view.right().crossProduct(view.up()), 1e-15);
  }

  @Test
  void aDirectionThatWouldBeSeenEndOnTurnsTheView() {
    Vector3D endOn = View.showing(List.of()).eye();
    Vector3D seen = View.showing(List.of(endOn)).seen(endOn);
    assertTrue(Math.hypot(seen.getX(), seen.getY()) > Math.sin(Math.toRadians(20)));
  }

  @Test
  void theArcRoundAnArrowTurnsAsARightHandedScrewDoes() {
    for (Vector3D along :
        List.of(Vector3D.PLUS_K, Vector3D.MINUS_K, Vector3D.PLUS_J, new Vector3D(1, -2, 0.5))) {
      View view = View.showing(List.of(along));
      Stage stage = new Stage(view, 100, Vector3D.ZERO);
      Tracing tracing = new Tracing(sorted());
      ArrowArt art =
          ArrowArt.of(
              Sense.TURNING, stage, tracing, new Scene.Segment(Vector3D.ZERO, along), List.of());
      List<Stroke> strokes = art.strokes();
      List<Vector2D> before = strokes.get(strokes.size() - 1).points();
      // Seen from its tip an axial vector turns anticlockwise; y counts downwards.
      double towards = view.eye().dotProduct(along);
      Vector2D a = before.get(0);
      Vector2D b = before.get(before.size() / 2);
      Vector2D c = before.get(before.size() - 1);
      double clockwise =
          (b.getX() - a.getX()) * (c.getY() - a.getY())
              - (b.getY() - a.getY()) * (c.getX() - a.getX());
      assertEquals(-Math.signum(towards), Math.signum(clockwise), along.toString());
    }
  }

  private static Skins sorted() {
    Skins skins = new Skins();
    skins.sort();
    return skins;
  }
}
