package whorl.mechanics.body;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** Lines that are revolved or drawn, as corners; curves in steps of five degrees. */
final class Profiles {
  private static final int STEPS_OF_CURVE = 48;
  private static final double STEP = Math.PI / 36;

  private Profiles() {}

  static Vector2D at(double radius, double z) {
    return new Vector2D(radius, z);
  }

  /** The rectangle between two radii and two heights, anticlockwise. */
  static List<Vector2D> rectangle(double inner, double outer, double from, double to) {
    return List.of(at(inner, from), at(outer, from), at(outer, to), at(inner, to));
  }

  /**
   * An arc round a point, both ends included.
   *
   * @param from angle from the direction of growing radius, in rad
   * @param to angle at the other end
   */
  static List<Vector2D> arc(Vector2D centre, double radius, double from, double to) {
    int steps = Math.max(1, (int) Math.ceil(Math.abs(to - from) / STEP - 1e-9));
    List<Vector2D> points = new ArrayList<>();
    for (int i = 0; i <= steps; i++) {
      double angle = from + (to - from) * i / steps;
      points.add(centre.add(radius, new Vector2D(Math.cos(angle), Math.sin(angle))));
    }
    return points;
  }

  /** The half circle of a sphere from its lower to its upper pole, which lie on the axis. */
  static List<Vector2D> halfCircle(double radius) {
    return ends(arc(Vector2D.ZERO, radius, -Math.PI / 2, Math.PI / 2), true, true);
  }

  /** The circle of the section of a torus, anticlockwise. */
  static List<Vector2D> fullCircle(double radius, double section) {
    return arc(at(radius, 0), section, 0, 2 * Math.PI - STEP);
  }

  /**
   * A cap of a sphere from its base, at height zero, to its top.
   *
   * @param solid whether the base is drawn from its middle
   */
  static List<Vector2D> cap(double radius, double height, boolean solid) {
    double below = height - radius;
    double start = Math.asin(Math.max(-1, -below / radius));
    boolean whole = height == 2 * radius;
    List<Vector2D> round = ends(arc(at(0, below), radius, start, Math.PI / 2), whole, true);
    List<Vector2D> line = new ArrayList<>();
    if (solid && !whole) {
      line.add(at(0, 0));
    }
    line.addAll(round);
    return line;
  }

  /** The line of a radius over z, with both ends on the axis. */
  static List<Vector2D> sampled(DoubleUnaryOperator radius, double from, double to) {
    List<Vector2D> line = new ArrayList<>();
    line.add(at(0, from));
    for (int i = 0; i <= STEPS_OF_CURVE; i++) {
      double z = from + (to - from) * i / STEPS_OF_CURVE;
      line.add(at(radius.applyAsDouble(z), z));
    }
    line.add(at(0, to));
    return distinct(line);
  }

  /** A line without points that repeat the one before. */
  private static List<Vector2D> distinct(List<Vector2D> line) {
    List<Vector2D> kept = new ArrayList<>();
    for (Vector2D p : line) {
      if (kept.isEmpty() || !kept.get(kept.size() - 1).equals(p)) {
        kept.add(p);
      }
    }
    return kept;
  }

  /** Sets the ends of a line onto the axis exactly where they belong there. */
  static List<Vector2D> ends(List<Vector2D> line, boolean first, boolean last) {
    List<Vector2D> set = new ArrayList<>(line);
    if (first) {
      set.set(0, at(0, set.get(0).getY()));
    }
    if (last) {
      set.set(set.size() - 1, at(0, set.get(set.size() - 1).getY()));
    }
    return set;
  }

  /** A circle about the z axis. */
  static List<Vector3D> circle(double radius) {
    List<Vector3D> points = new ArrayList<>();
    for (Vector2D p : arc(Vector2D.ZERO, radius, 0, 2 * Math.PI - STEP)) {
      points.add(new Vector3D(p.getX(), p.getY(), 0));
    }
    return points;
  }
}
