package whorl.report.sketch;

import java.util.Optional;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.Point;

/** Something in a drawing, with its name. */
public sealed interface Drawn {
  /** The name as in the sheet; what follows the first underscore is set as a subscript. */
  String name();

  /** A body. */
  record Body(String name, whorl.mechanics.body.Body body) implements Drawn {}

  /** A point. */
  record Spot(String name, Point point) implements Drawn {}

  /** An axis. */
  record Line(String name, Axis axis) implements Drawn {}

  /** A frame. */
  record Axes(String name, Frame frame) implements Drawn {}

  /**
   * A vector. Vectors of one scale have lengths in proportion; others are not comparable.
   *
   * @param size the magnitude with its unit, as text
   * @param scale a word that those of one scale have in common, such as their kind
   * @param value along the axes of the world
   * @param at where it is drawn from; none for a free vector
   */
  record Arrow(
      String name, String size, String scale, Sense sense, Vector3D value, Optional<Point> at)
      implements Drawn {}
}
