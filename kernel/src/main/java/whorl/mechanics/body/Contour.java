package whorl.mechanics.body;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;

/**
 * A closed line in a plane that does not cross itself, of straight pieces and circular arcs: the
 * outline of a prism, or half the section of a body of revolution. In which sense it is drawn does
 * not matter.
 */
public final class Contour {
  /** Nodes per piece; exact for straight pieces, and for arcs of an eighth turn to rounding. */
  private static final GaussIntegrator GAUSS = new GaussIntegratorFactory().legendre(10);

  private static final double LONGEST_ARC = Math.PI / 4;
  private static final double FACET = Math.PI / 36;

  /** A part of a contour, run through as its parameter goes from −1 to 1. */
  private sealed interface Piece {
    Vector2D at(double s);

    /** Rate of the second coordinate with the parameter. */
    double rise(double s);
  }

  private record Line(Vector2D from, Vector2D to) implements Piece {
    @Override
    public Vector2D at(double s) {
      return new Vector2D((1 - s) / 2, from, (1 + s) / 2, to);
    }

    @Override
    public double rise(double s) {
      return (to.getY() - from.getY()) / 2;
    }
  }

  private record Arc(Vector2D centre, double radius, double start, double sweep) implements Piece {
    private double angle(double s) {
      return start + sweep * (1 + s) / 2;
    }

    @Override
    public Vector2D at(double s) {
      double angle = angle(s);
      return centre.add(radius, new Vector2D(Math.cos(angle), Math.sin(angle)));
    }

    @Override
    public double rise(double s) {
      return radius * Math.cos(angle(s)) * sweep / 2;
    }
  }

  /** What is integrated round a contour, together with the second coordinate. */
  @FunctionalInterface
  interface Integrand {
    double at(double x, double y);
  }

  private final Vector2D reference;
  private final List<Piece> pieces;
  private final List<Vector2D> polygon;
  private final double sense;
  private final double area;

  /** Of pieces measured from the reference. */
  private Contour(Vector2D reference, List<Piece> pieces, List<Vector2D> polygon) {
    this.reference = reference;
    this.pieces = List.copyOf(pieces);
    double enclosed = round((x, y) -> x);
    demandSimple(polygon, enclosed);
    sense = Math.signum(enclosed);
    area = Math.abs(enclosed);
    List<Vector2D> anticlockwise = new ArrayList<>(polygon);
    if (sense < 0) {
      Collections.reverse(anticlockwise);
    }
    this.polygon = List.copyOf(anticlockwise);
  }

  /**
   * The polygon with these corners, in m.
   *
   * @throws Refusal where there are fewer than three corners, where two neighbours coincide, where
   *     the sides enclose no area, or where they cross
   */
  public static Contour polygon(List<Vector2D> corners) {
    if (corners.size() < 3) {
      throw new Refusal(
          "outline",
          "The outline has fewer than three corners, so it encloses nothing.",
          "Give its corners in order, each once.");
    }
    Path path = from(corners.get(0));
    for (Vector2D corner : corners.subList(1, corners.size())) {
      path.lineTo(corner);
    }
    return path.close();
  }

  /** Begins a contour at a point, in m. */
  public static Path from(Vector2D start) {
    return new Path(start);
  }

  /** A contour while it is drawn. */
  public static final class Path {
    private final List<Piece> pieces = new ArrayList<>();
    private final List<Vector2D> polygon = new ArrayList<>();
    private final Vector2D start;
    private Vector2D end;

    private Path(Vector2D start) {
      this.start = finite(start);
      end = this.start;
    }

    /** A straight line to a point. */
    public Path lineTo(Vector2D to) {
      finite(to);
      if (to.equals(end)) {
        throw new Refusal(
            "outline",
            "Two neighbouring corners of the outline are both at " + text(to) + ".",
            "Give each corner once; the outline closes by itself.");
      }
      pieces.add(new Line(end.subtract(start), to.subtract(start)));
      polygon.add(end);
      end = to;
      return this;
    }

    /**
     * A circular arc through a point to another.
     *
     * @throws Refusal where the three points lie on a straight line
     */
    public Path arcTo(Vector2D through, Vector2D to) {
      Vector2D a = finite(through).subtract(end);
      Vector2D b = finite(to).subtract(end);
      double twice = 2 * (a.getX() * b.getY() - a.getY() * b.getX());
      if (Math.abs(twice) <= 1e-12 * a.getNorm() * b.getNorm()) {
        throw new Refusal(
            "outline",
            "The three points of an arc, "
                + text(end)
                + ", "
                + text(through)
                + " and "
                + text(to)
                + ", lie on a straight line.",
            "Give a point of the arc between its ends, or draw a straight line.");
      }
      Vector2D toCentre =
          new Vector2D(
              (b.getY() * a.getNormSq() - a.getY() * b.getNormSq()) / twice,
              (a.getX() * b.getNormSq() - b.getX() * a.getNormSq()) / twice);
      Vector2D centre = end.add(toCentre);
      double from = Math.atan2(-toCentre.getY(), -toCentre.getX());
      Vector2D last = to.subtract(centre);
      double until = Math.atan2(last.getY(), last.getX());
      // The cross product of the chords tells which way round the arc goes.
      double sweep = until - from;
      if (twice > 0) {
        sweep += sweep <= 0 ? 2 * Math.PI : 0;
      } else {
        sweep -= sweep >= 0 ? 2 * Math.PI : 0;
      }
      arc(centre, toCentre.getNorm(), from, sweep);
      end = to;
      return this;
    }

    private void arc(Vector2D centre, double radius, double from, double sweep) {
      int parts = (int) Math.ceil(Math.abs(sweep) / LONGEST_ARC);
      for (int i = 0; i < parts; i++) {
        pieces.add(
            new Arc(centre.subtract(start), radius, from + sweep * i / parts, sweep / parts));
      }
      int facets = Math.max(2, (int) Math.ceil(Math.abs(sweep) / FACET));
      Piece whole = new Arc(centre, radius, from, sweep);
      for (int i = 0; i < facets; i++) {
        polygon.add(i == 0 ? end : whole.at(2.0 * i / facets - 1));
      }
    }

    /** Closes the contour, with a straight line where it does not end where it began. */
    public Contour close() {
      if (!end.equals(start)) {
        lineTo(start);
      }
      if (pieces.size() < 2) {
        throw new Refusal("outline", "The outline encloses nothing.", "Give its corners in order.");
      }
      return new Contour(start, pieces, polygon);
    }
  }

  /** The area that is enclosed, in m². */
  public double area() {
    return area;
  }

  /** The corners, arcs broken into straight pieces of five degrees; anticlockwise. */
  List<Vector2D> polygon() {
    return polygon;
  }

  /** The point from which {@link #integral} measures. */
  Vector2D reference() {
    return reference;
  }

  /**
   * The integral round the contour, anticlockwise, of a function times the increment of the second
   * coordinate: by Green's theorem the integral over the area of the derivative of the function by
   * its first argument. Coordinates are measured from {@link #reference}, so that a contour far
   * from the origin keeps its digits.
   */
  double integral(Integrand integrand) {
    return sense * round(integrand);
  }

  private double round(Integrand integrand) {
    double sum = 0;
    for (Piece piece : pieces) {
      sum +=
          GAUSS.integrate(
              s -> {
                Vector2D at = piece.at(s);
                return integrand.at(at.getX(), at.getY()) * piece.rise(s);
              });
    }
    return sum;
  }

  private static Vector2D finite(Vector2D v) {
    if (v.isNaN() || v.isInfinite()) {
      throw new Refusal("outline", "A coordinate of the outline is no number.", "");
    }
    return v;
  }

  private static String text(Vector2D v) {
    return "(" + Given.text(v.getX(), "") + ", " + Given.text(v.getY(), "") + ") m";
  }

  private static void demandSimple(List<Vector2D> corners, double enclosed) {
    int n = corners.size();
    for (int i = 0; i < n; i++) {
      Vector2D a = corners.get(i);
      Vector2D b = corners.get((i + 1) % n);
      for (int j = i + 2; j < n; j++) {
        boolean neighbours = i == 0 && j == n - 1;
        Vector2D c = corners.get(j);
        Vector2D d = corners.get((j + 1) % n);
        if (!neighbours && meet(a, b, c, d)) {
          throw new Refusal(
              "outline",
              "The outline crosses or touches itself near " + text(c) + ".",
              "Give the corners in the order in which one walks round the outline.");
        }
      }
    }
    double size = corners.stream().mapToDouble(c -> c.distance(corners.get(0))).max().orElse(0);
    if (Math.abs(enclosed) <= 1e-12 * size * size) {
      throw new Refusal(
          "outline", "The outline encloses no area.", "Give corners that are not on one line.");
    }
  }

  private static boolean meet(Vector2D a, Vector2D b, Vector2D c, Vector2D d) {
    return Math.max(a.getX(), b.getX()) >= Math.min(c.getX(), d.getX())
        && Math.max(c.getX(), d.getX()) >= Math.min(a.getX(), b.getX())
        && Math.max(a.getY(), b.getY()) >= Math.min(c.getY(), d.getY())
        && Math.max(c.getY(), d.getY()) >= Math.min(a.getY(), b.getY())
        && side(a, b, c) * side(a, b, d) <= 0
        && side(c, d, a) * side(c, d, b) <= 0;
  }

  private static double side(Vector2D a, Vector2D b, Vector2D p) {
    return Math.signum(
        (b.getX() - a.getX()) * (p.getY() - a.getY())
            - (b.getY() - a.getY()) * (p.getX() - a.getX()));
  }
}
