package whorl.report.sketch;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Outline;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Point;

/**
 * The things of a drawing in the world, with the lengths that the drawing chooses: how far axes
 * reach beyond what they pass through, how long arrows are.
 */
final class Scene {
  /** The longest arrow of each scale, as a share of the reach. */
  private static final double LONGEST = 1.2;

  private static final double TRIAD = 0.45;
  private static final double OVERHANG = 0.28;

  /** A straight line from one point to another. */
  record Segment(Vector3D from, Vector3D to) {
    Vector3D along() {
      return to.subtract(from);
    }
  }

  private final Map<Drawn.Body, Outline> bodies = new LinkedHashMap<>();
  private final Map<Drawn.Spot, Vector3D> spots = new LinkedHashMap<>();
  private final Map<Drawn.Line, Segment> axes = new LinkedHashMap<>();
  private final Map<Drawn.Axes, List<Segment>> triads = new LinkedHashMap<>();
  private final Map<Drawn.Arrow, Segment> arrows = new LinkedHashMap<>();

  Scene(List<Drawn> things) {
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Body body) {
        bodies.put(body, body.body().outline());
      } else if (thing instanceof Drawn.Spot spot) {
        spots.put(spot, spot.point().position());
      }
    }
    List<Vector3D> places = places(things);
    double size = Extent.of(places).halfDiagonal();
    double reach = size > 0 ? size : 1;
    Vector3D home = home(things);
    Map<String, Double> longest = longest(things);
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Arrow arrow) {
        Vector3D from = arrow.at().map(Point::position).orElse(home);
        double most = longest.getOrDefault(arrow.scale(), 0.0);
        double scale = most > 0 ? LONGEST * reach / most : 0;
        Segment segment = new Segment(from, from.add(scale, arrow.value()));
        arrows.put(arrow, segment);
        places.add(segment.from());
        places.add(segment.to());
      }
    }
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Line line) {
        axes.put(line, stretch(line.axis(), places, reach));
      } else if (thing instanceof Drawn.Axes frame) {
        triads.put(frame, triad(frame, TRIAD * reach));
      }
    }
  }

  Map<Drawn.Body, Outline> bodies() {
    return bodies;
  }

  Map<Drawn.Spot, Vector3D> spots() {
    return spots;
  }

  Map<Drawn.Line, Segment> axes() {
    return axes;
  }

  Map<Drawn.Axes, List<Segment>> triads() {
    return triads;
  }

  Map<Drawn.Arrow, Segment> arrows() {
    return arrows;
  }

  /** Directions that had better not be seen end on. */
  List<Vector3D> directions() {
    List<Vector3D> directions = new ArrayList<>();
    axes.values().forEach(segment -> directions.add(segment.along()));
    arrows.values().stream()
        .map(Segment::along)
        .filter(along -> along.getNormSq() > 0)
        .forEach(directions::add);
    return directions;
  }

  /** Points that span all that is drawn. */
  List<Vector3D> extremes() {
    List<Vector3D> extremes = new ArrayList<>(spots.values());
    bodies.values().forEach(outline -> extremes.addAll(points(outline)));
    bodies.keySet().forEach(body -> extremes.add(body.body().centre().position()));
    List<Segment> segments = new ArrayList<>(axes.values());
    segments.addAll(arrows.values());
    triads.values().forEach(segments::addAll);
    for (Segment segment : segments) {
      extremes.add(segment.from());
      extremes.add(segment.to());
    }
    return extremes;
  }

  /** Where bodies and points are, and where arrows begin. */
  private List<Vector3D> places(List<Drawn> things) {
    List<Vector3D> places = new ArrayList<>(spots.values());
    bodies.values().forEach(outline -> places.addAll(points(outline)));
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Body body) {
        places.add(body.body().centre().position());
      } else if (thing instanceof Drawn.Axes frame) {
        places.add(frame.frame().origin().position());
      } else if (thing instanceof Drawn.Arrow arrow) {
        arrow.at().ifPresent(at -> places.add(at.position()));
      }
    }
    return places;
  }

  private static List<Vector3D> points(Outline outline) {
    List<Vector3D> points = new ArrayList<>();
    outline.solids().forEach(solid -> addAll(solid.skin(), points));
    outline.sheets().forEach(sheet -> addAll(sheet, points));
    outline.wires().forEach(wire -> points.addAll(wire.points()));
    return points;
  }

  private static void addAll(Facets facets, List<Vector3D> points) {
    for (int v = 0; v < facets.vertices(); v++) {
      points.add(facets.vertex(v));
    }
  }

  /** Where free vectors are drawn from: the first body, or else the first point or axis. */
  private static Vector3D home(List<Drawn> things) {
    Vector3D home = null;
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Body body) {
        return body.body().centre().position();
      }
      if (home == null && thing instanceof Drawn.Spot spot) {
        home = spot.point().position();
      } else if (home == null && thing instanceof Drawn.Line line) {
        home = line.axis().through().position();
      } else if (home == null && thing instanceof Drawn.Axes frame) {
        home = frame.frame().origin().position();
      }
    }
    return home == null ? Vector3D.ZERO : home;
  }

  private static Map<String, Double> longest(List<Drawn> things) {
    Map<String, Double> longest = new LinkedHashMap<>();
    for (Drawn thing : things) {
      if (thing instanceof Drawn.Arrow arrow) {
        longest.merge(arrow.scale(), arrow.value().getNorm(), Math::max);
      }
    }
    return longest;
  }

  /** The stretch of an axis beside what is drawn, and somewhat more. */
  private static Segment stretch(Axis axis, List<Vector3D> places, double reach) {
    Vector3D through = axis.through().position();
    double from = 0;
    double to = 0;
    for (int i = 0; i < places.size(); i++) {
      double s = places.get(i).subtract(through).dotProduct(axis.along());
      from = i == 0 ? s : Math.min(from, s);
      to = i == 0 ? s : Math.max(to, s);
    }
    double over = OVERHANG * reach;
    return new Segment(
        through.add(from - over, axis.along()), through.add(to + 1.5 * over, axis.along()));
  }

  private static List<Segment> triad(Drawn.Axes frame, double length) {
    Vector3D origin = frame.frame().origin().position();
    List<Segment> axes = new ArrayList<>();
    for (Vector3D unit : List.of(Vector3D.PLUS_I, Vector3D.PLUS_J, Vector3D.PLUS_K)) {
      axes.add(new Segment(origin, origin.add(length, frame.frame().toWorld(unit))));
    }
    return axes;
  }
}
