package whorl.report.sketch;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.jspecify.annotations.Nullable;

/**
 * How a vector is drawn: a shaft, a head, and for an axial vector a second head and an arc round
 * the shaft that shows which way it turns.
 */
final class ArrowArt {
  private static final double HEAD = 12;
  private static final double RING = 15;
  private static final int RING_STEPS = 44;

  /**
   * Where along the shaft the arc may be, in shares of its length; the first that is seen is taken.
   */
  private static final double[] RING_AT = {0.72, 0.8, 0.64, 0.56, 0.48, 0.4, 0.32, 0.24, 0.16};

  /** How far arrows that lie on each other are moved apart. */
  private static final double APART = 9;

  private final Sense sense;
  private final Vector3D from;
  private final Vector3D to;
  private final Vector2D along;
  private final List<Stroke> shaft;
  private @Nullable Vector3D ringCentre;
  private final List<Vector2D> ringBehind = new ArrayList<>();
  private final List<Vector2D> ringBefore = new ArrayList<>();

  private ArrowArt(Sense sense, Vector3D from, Vector3D to, List<Stroke> shaft) {
    this.sense = sense;
    this.from = from;
    this.to = to;
    this.shaft = shaft;
    Vector2D flat = Stage.flat(to.subtract(from));
    along = flat.getNorm() < 1 ? Vector2D.ZERO : flat.normalize();
  }

  /**
   * Lays out an arrow.
   *
   * @param segment shaft in the world, from tail to tip
   * @param before arrows that are drawn already, which this one is not to cover
   */
  static ArrowArt of(
      Sense sense, Stage stage, Tracing tracing, Scene.Segment segment, List<ArrowArt> before) {
    Vector3D from = stage.seen(segment.from());
    Vector3D to = stage.seen(segment.to());
    ArrowArt plain = new ArrowArt(sense, from, to, List.of());
    long beside = before.stream().filter(plain::liesOn).count();
    Vector2D aside = new Vector2D(-plain.along.getY(), plain.along.getX());
    Vector3D moved = new Vector3D(aside.getX(), aside.getY(), 0).scalarMultiply(APART * beside);
    Vector3D start = from.add(moved);
    Vector3D end = to.add(moved);
    // The shaft ends within the head, so that its end does not blunt the point.
    Vector3D stop = end.subtract(plain.setBack(), end.subtract(start));
    ArrowArt art = new ArrowArt(sense, start, end, tracing.free(start, stop));
    if (sense.axial() && segment.along().getNormSq() > 0) {
      art.ring(stage.view(), segment.along().normalize(), art.ringShare(tracing, before));
    }
    return art;
  }

  /** The share of the shaft that the head covers. */
  private double setBack() {
    double length = Stage.flat(to.subtract(from)).getNorm();
    return length < HEAD ? 0 : 0.6 * HEAD / length;
  }

  private boolean liesOn(ArrowArt other) {
    Vector2D gap = Stage.flat(from.subtract(other.from));
    double off = Math.abs(along.getX() * gap.getY() - along.getY() * gap.getX());
    return Math.abs(along.dotProduct(other.along)) > 0.995 && off < 2 * APART;
  }

  /** A place for the arc that nothing hides, clear of the heads and of the arcs of others. */
  private double ringShare(Tracing tracing, List<ArrowArt> before) {
    double length = Stage.flat(to.subtract(from)).getNorm();
    for (double share : RING_AT) {
      Vector3D at = from.add(share, to.subtract(from));
      boolean clear = (1 - share) * length > 2 * HEAD;
      boolean apart =
          before.stream()
              .filter(other -> other.ringCentre != null)
              .allMatch(other -> Stage.flat(at.subtract(other.ringCentre)).getNorm() > RING);
      if (clear && apart && !tracing.hides(at)) {
        return share;
      }
    }
    return RING_AT[0];
  }

  /** An arc of five sixths of a turn, right-handed about the shaft, with its head in front. */
  private void ring(View view, Vector3D unit, double share) {
    Vector3D centre = from.add(share, to.subtract(from));
    ringCentre = centre;
    Vector3D front = view.eye().subtract(unit.dotProduct(view.eye()), unit);
    Vector3D first =
        front.getNorm() < 1e-6 ? view.up().crossProduct(unit).normalize() : front.normalize();
    Vector3D second = unit.crossProduct(first);
    // Angles count from the front: the arc begins at the side, goes round the back, and ends in
    // front.
    for (int i = 0; i <= RING_STEPS; i++) {
      double angle = Math.PI * (0.5 + 5 / 3.0 * i / RING_STEPS);
      Vector3D at = new Vector3D(RING * Math.cos(angle), first, RING * Math.sin(angle), second);
      Vector2D seen = Stage.flat(view.seen(at).add(centre));
      boolean behind = angle < 1.5 * Math.PI;
      if (!behind && ringBefore.isEmpty()) {
        ringBehind.add(seen);
      }
      (behind ? ringBehind : ringBefore).add(seen);
    }
  }

  Vector2D tip() {
    return Stage.flat(to);
  }

  Vector2D along() {
    return along;
  }

  /** All its lines. */
  List<Stroke> strokes() {
    List<Stroke> strokes = new ArrayList<>(shaft);
    strokes.add(new Stroke(List.of(Stage.flat(from), Stage.flat(to)), false, false));
    for (List<Vector2D> part : List.of(ringBehind, ringBefore)) {
      if (part.size() > 1) {
        strokes.add(new Stroke(part, false, false));
      }
    }
    return strokes;
  }

  void write(Svg svg) {
    String ink = "stroke=\"" + sense.colour() + "\" ";
    String fill = "fill=\"" + sense.colour() + "\"";
    if (ringBehind.size() > 1) {
      svg.line(ringBehind, ink + "stroke-width=\"1.2\" opacity=\"0.55\"");
    }
    svg.lines(
        shaft.stream().filter(Stroke::hidden).toList(),
        ink + "stroke-width=\"1.6\" stroke-dasharray=\"2 3.6\" opacity=\"0.75\"");
    svg.lines(shaft.stream().filter(s -> !s.hidden()).toList(), ink + "stroke-width=\"2\"");
    if (along.getNormSq() > 0) {
      svg.area(Heads.filled(tip(), along, HEAD), fill);
      if (sense.axial()) {
        svg.area(Heads.filled(tip().subtract(0.8 * HEAD, along), along, HEAD), fill);
      }
    } else {
      svg.dot(tip(), 3.2, ink + "stroke-width=\"1.6\"");
    }
    int n = ringBefore.size();
    if (n > 2) {
      svg.line(ringBefore, ink + "stroke-width=\"1.6\"");
      Vector2D end = ringBefore.get(n - 1);
      Vector2D way = end.subtract(ringBefore.get(n - 3));
      if (way.getNorm() > 0) {
        svg.area(Heads.filled(end.add(3, way.normalize()), way.normalize(), 8.5), fill);
      }
    }
  }
}
