package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Outline;

/**
 * An axonometric line drawing of things in space. What stands behind a body is dashed and faint,
 * axes are chain lines, vectors arrows. An axial vector has a double head and round its shaft the
 * sense of its turning, so that it is told from a force at a glance.
 */
public final class Sketch {
  private static final double WIDTH = 560;
  private static final double HEIGHT = 400;
  private static final double MARGIN = 14;

  private static final String PLAIN = "currentColor";
  private static final String INK = "stroke=\"currentColor\" ";
  private static final String FILLED = "fill=\"currentColor\"";
  private static final String CONTOUR = INK + "stroke-width=\"1.7\"";
  private static final String SHARP = INK + "stroke-width=\"1.1\"";
  private static final String HIDDEN =
      INK + "stroke-width=\"0.8\" stroke-dasharray=\"3.5 3\" opacity=\"0.38\"";
  private static final String AXIS =
      INK + "stroke-width=\"0.9\" stroke-dasharray=\"15 3.5 2 3.5\" opacity=\"0.8\"";
  private static final String AXIS_BEHIND =
      INK + "stroke-width=\"0.9\" stroke-dasharray=\"15 3.5 2 3.5\" opacity=\"0.35\"";
  private static final String WIRE = INK + "stroke-width=\"2.6\"";
  private static final String LEADER = INK + "stroke-width=\"0.7\" opacity=\"0.55\"";

  private final Scene scene;
  private final Stage stage;
  private final Tracing tracing;
  private final Svg svg = new Svg();
  private final Labels labels = new Labels();
  private final List<Vector2D> marks = new ArrayList<>();
  private final List<Caption> captions = new ArrayList<>();

  /** A label that waits until all lines are known. */
  private record Caption(Label label, Vector2D at, Vector2D away, String fill, boolean leader) {}

  private Sketch(List<Drawn> things) {
    scene = new Scene(things);
    stage = Stage.fitting(View.showing(scene.directions()), scene.extremes(), WIDTH, HEIGHT);
    Skins skins = new Skins();
    for (Outline outline : scene.bodies().values()) {
      skins.add(outline.mapped(stage::seen, true));
    }
    skins.sort();
    tracing = new Tracing(skins);
  }

  /** Draws things; those that come later stand on top where nothing hides them. */
  public static String svg(List<Drawn> things) {
    String title =
        things.stream().map(Drawn::name).collect(Collectors.joining(", ", "Sketch of ", ""));
    return new Sketch(things).drawn(title);
  }

  private String drawn(String title) {
    bodies();
    scene.axes().forEach(this::axis);
    scene.triads().forEach(this::triad);
    arrows();
    scene.spots().forEach(this::spot);
    captions.forEach(this::write);
    return framed(title);
  }

  private void bodies() {
    List<Stroke> strokes = tracing.surfaces();
    labels.avoid(strokes);
    svg.lines(strokes.stream().filter(Stroke::hidden).filter(s -> !s.contour()).toList(), HIDDEN);
    svg.lines(strokes.stream().filter(s -> !s.hidden() && !s.contour()).toList(), SHARP);
    svg.lines(strokes.stream().filter(s -> !s.hidden() && s.contour()).toList(), CONTOUR);
    scene.bodies().forEach(this::body);
  }

  private void body(Drawn.Body body, Outline outline) {
    List<Vector2D> seen = new ArrayList<>();
    outline.solids().forEach(solid -> addAll(solid.skin(), seen));
    outline.sheets().forEach(sheet -> addAll(sheet, seen));
    for (Outline.Wire wire : outline.wires()) {
      wire(wire);
      wire.points().forEach(p -> seen.add(flat(p)));
    }
    seen.forEach(this::mark);
    Vector2D corner = flat(body.body().centre().position());
    if (seen.isEmpty()) {
      centreMark(corner);
    }
    for (Vector2D p : seen) {
      // The label goes to the upper left, where arrows along axes rarely are.
      if (p.getY() + 0.8 * p.getX() < corner.getY() + 0.8 * corner.getX()) {
        corner = p;
      }
    }
    caption(Label.of(body.name(), "", false), corner, new Vector2D(-1, -1), PLAIN, true);
  }

  private void addAll(Facets facets, List<Vector2D> seen) {
    for (int v = 0; v < facets.vertices(); v++) {
      seen.add(flat(facets.vertex(v)));
    }
  }

  private void wire(Outline.Wire wire) {
    List<Vector3D> points = wire.points();
    if (points.size() == 1) {
      svg.dot(flat(points.get(0)), 4, FILLED);
      return;
    }
    List<Stroke> strokes = new ArrayList<>();
    int pieces = wire.closed() ? points.size() : points.size() - 1;
    for (int i = 0; i < pieces; i++) {
      Vector3D to = points.get((i + 1) % points.size());
      strokes.addAll(tracing.free(stage.seen(points.get(i)), stage.seen(to)));
    }
    List<Stroke> joined = Chains.joined(strokes);
    labels.avoid(joined);
    svg.lines(joined.stream().filter(Stroke::hidden).toList(), HIDDEN);
    svg.lines(joined.stream().filter(s -> !s.hidden()).toList(), WIRE);
  }

  /** A body of which only mass and inertia are known: a circle with opposite quarters filled. */
  private void centreMark(Vector2D at) {
    double r = 7;
    svg.dot(at, r, INK + "stroke-width=\"1.1\"");
    for (int quarter = 0; quarter < 4; quarter += 2) {
      List<Vector2D> slice = new ArrayList<>(List.of(at));
      for (int i = 0; i <= 9; i++) {
        double angle = Math.PI / 2 * (quarter + i / 9.0);
        slice.add(at.add(r, new Vector2D(Math.cos(angle), Math.sin(angle))));
      }
      svg.area(slice, FILLED);
    }
    labels.avoid(new Labels.Box(at.getX() - r, at.getY() - r, at.getX() + r, at.getY() + r));
  }

  private void axis(Drawn.Line line, Scene.Segment segment) {
    List<Stroke> strokes = tracing.free(stage.seen(segment.from()), stage.seen(segment.to()));
    labels.avoid(strokes);
    svg.lines(strokes.stream().filter(Stroke::hidden).toList(), AXIS_BEHIND);
    svg.lines(strokes.stream().filter(s -> !s.hidden()).toList(), AXIS);
    Vector2D tip = flat(segment.to());
    Vector2D along = unit(stage.direction(segment.along()));
    if (along.getNormSq() > 0) {
      svg.line(Heads.open(tip, along, 8), INK + "stroke-width=\"1\" opacity=\"0.8\"");
    }
    mark(tip);
    mark(flat(segment.from()));
    caption(Label.of(line.name(), "", false), tip, along, PLAIN, false);
  }

  private void triad(Drawn.Axes frame, List<Scene.Segment> axes) {
    String[] names = {"x", "y", "z"};
    String subscript = frame.name();
    for (int i = 0; i < axes.size(); i++) {
      Scene.Segment axis = axes.get(i);
      List<Stroke> strokes = tracing.free(stage.seen(axis.from()), stage.seen(axis.to()));
      labels.avoid(strokes);
      svg.lines(strokes.stream().filter(Stroke::hidden).toList(), HIDDEN);
      svg.lines(strokes.stream().filter(s -> !s.hidden()).toList(), SHARP);
      Vector2D tip = flat(axis.to());
      Vector2D along = unit(stage.direction(axis.along()));
      svg.area(Heads.filled(tip, along, 7), FILLED);
      mark(tip);
      caption(new Label(names[i], subscript, "", false), tip, along, PLAIN, false);
    }
    spotMark(axes.get(0).from());
  }

  private void spot(Drawn.Spot spot, Vector3D position) {
    spotMark(position);
    caption(Label.of(spot.name(), "", false), flat(position), new Vector2D(1, 1), PLAIN, false);
  }

  /** A dot; open where it is behind a surface. */
  private void spotMark(Vector3D position) {
    Vector2D at = flat(position);
    boolean hidden = tracing.hides(stage.seen(position));
    svg.dot(at, hidden ? 3 : 2.6, hidden ? INK + "stroke-width=\"1.1\"" : FILLED);
    labels.avoid(new Labels.Box(at.getX() - 3, at.getY() - 3, at.getX() + 3, at.getY() + 3));
    mark(at);
  }

  private void arrows() {
    List<ArrowArt> before = new ArrayList<>();
    scene
        .arrows()
        .forEach(
            (arrow, segment) -> {
              ArrowArt art = ArrowArt.of(arrow.sense(), stage, tracing, segment, before);
              before.add(art);
              art.write(svg);
              labels.avoid(art.strokes());
              art.strokes().forEach(stroke -> stroke.points().forEach(this::mark));
              caption(
                  Label.of(arrow.name(), arrow.size(), true),
                  art.tip(),
                  art.along(),
                  arrow.sense().colour(),
                  false);
            });
  }

  private void caption(Label label, Vector2D at, Vector2D away, String fill, boolean leader) {
    captions.add(new Caption(label, at, away, fill, leader));
  }

  private void write(Caption caption) {
    double width = caption.label.width();
    Labels.Box box = labels.place(caption.at, caption.away, width);
    Vector2D near = box.nearest(caption.at);
    if (caption.leader && near.distance(caption.at) > 6) {
      svg.line(List.of(near, caption.at), LEADER);
    }
    svg.label(new Vector2D(box.left(), box.bottom() - 4), caption.label, caption.fill);
    mark(new Vector2D(box.left(), box.top()));
    mark(new Vector2D(box.right(), box.bottom() + 3));
  }

  /** The axes of the world in the emptiest corner, and a frame that holds all. */
  private String framed(String title) {
    Extent seen = Extent.of(marks.stream().map(m -> new Vector3D(m.getX(), m.getY(), 0)).toList());
    double left = seen.least().getX();
    double right = seen.most().getX();
    double top = seen.least().getY();
    double bottom = seen.most().getY();
    Labels.Box corner = labels.emptiest(Triad.corners(left, top, right, bottom));
    Triad.write(svg, stage, corner);
    left = Math.min(left, corner.left()) - MARGIN;
    top = Math.min(top, corner.top()) - MARGIN;
    right = Math.max(right, corner.right()) + MARGIN;
    bottom = Math.max(bottom, corner.bottom()) + MARGIN;
    return svg.picture(left, top, right - left, bottom - top, title);
  }

  private Vector2D flat(Vector3D world) {
    return Stage.flat(stage.seen(world));
  }

  private void mark(Vector2D at) {
    marks.add(at);
  }

  /** The unit vector along a vector; zero where that is seen end on. */
  private static Vector2D unit(Vector2D v) {
    double norm = v.getNorm();
    return norm < 1e-9 ? Vector2D.ZERO : v.scalarMultiply(1 / norm);
  }
}
