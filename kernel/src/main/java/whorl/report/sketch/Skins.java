package whorl.report.sketch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntConsumer;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Outline;

/**
 * The surfaces of all bodies as seen: x to the right, y down, and depth towards the onlooker, all
 * in units of the drawing. A grid over the drawing finds the triangles that a line of sight meets.
 *
 * <p>Where material is follows from counting surfaces along the line of sight, so that what is
 * taken out of a body is open without any surface having been cut.
 */
final class Skins {
  /** A closed surface less others. */
  private record Material(int skin, List<Material> removed) {}

  private static final double CELL = 6;

  /** What is thinner than this hides nothing; rounding and facets make slivers. */
  private static final double SLIVER = 0.25;

  private final List<Material> materials = new ArrayList<>();
  private final List<Facets> skins = new ArrayList<>();
  private final List<Boolean> open = new ArrayList<>();

  private double[] xs = new double[0];
  private double[] ys = new double[0];
  private double[] depths = new double[0];

  /** Vertices of all triangles. */
  private int[] corners = new int[0];

  private int[] skinOf = new int[0];

  private double left;
  private double top;
  private int columns;
  private int rows;
  private int[] begin = new int[1];
  private int[] inCell = new int[0];

  /** What a line of sight meets, nearest first. */
  private double[] hitDepth = new double[64];

  private int[] hitSkin = new int[64];
  private int hits;
  private boolean[] inside = new boolean[0];

  /** Adds what a body looks like, seen. */
  void add(Outline seen) {
    for (Outline.Solid solid : seen.solids()) {
      materials.add(material(solid));
    }
    for (Facets sheet : seen.sheets()) {
      skin(sheet, true);
    }
  }

  private Material material(Outline.Solid solid) {
    int skin = skin(solid.skin(), false);
    return new Material(skin, solid.removed().stream().map(this::material).toList());
  }

  private int skin(Facets facets, boolean sheet) {
    skins.add(facets);
    open.add(sheet);
    return skins.size() - 1;
  }

  List<Facets> all() {
    return skins;
  }

  boolean isSheet(int skin) {
    return open.get(skin);
  }

  /** Whether lines on surfaces may lie within other material. */
  boolean overlap() {
    return skins.size() > 1;
  }

  /** Sorts the triangles; nothing is added after that. */
  void sort() {
    int vertices = skins.stream().mapToInt(Facets::vertices).sum();
    int triangles = skins.stream().mapToInt(Facets::triangles).sum();
    xs = new double[vertices];
    ys = new double[vertices];
    depths = new double[vertices];
    corners = new int[3 * triangles];
    skinOf = new int[triangles];
    inside = new boolean[skins.size()];
    int vertex = 0;
    int triangle = 0;
    for (int s = 0; s < skins.size(); s++) {
      Facets facets = skins.get(s);
      for (int t = 0; t < facets.triangles(); t++, triangle++) {
        skinOf[triangle] = s;
        for (int corner = 0; corner < 3; corner++) {
          corners[3 * triangle + corner] = vertex + facets.corner(t, corner);
        }
      }
      for (int v = 0; v < facets.vertices(); v++, vertex++) {
        Vector3D at = facets.vertex(v);
        xs[vertex] = at.getX();
        ys[vertex] = at.getY();
        depths[vertex] = at.getZ();
      }
    }
    fillGrid();
  }

  private void fillGrid() {
    left = Arrays.stream(xs).min().orElse(0);
    top = Arrays.stream(ys).min().orElse(0);
    columns = 1 + (int) ((Arrays.stream(xs).max().orElse(0) - left) / CELL);
    rows = 1 + (int) ((Arrays.stream(ys).max().orElse(0) - top) / CELL);
    begin = new int[columns * rows + 1];
    for (int t = 0; t < skinOf.length; t++) {
      eachCell(t, cell -> begin[cell + 1]++);
    }
    for (int cell = 0; cell < columns * rows; cell++) {
      begin[cell + 1] += begin[cell];
    }
    inCell = new int[begin[columns * rows]];
    int[] next = begin.clone();
    for (int t = 0; t < skinOf.length; t++) {
      int triangle = t;
      eachCell(t, cell -> inCell[next[cell]++] = triangle);
    }
  }

  private void eachCell(int t, IntConsumer cell) {
    int a = corners[3 * t];
    int b = corners[3 * t + 1];
    int c = corners[3 * t + 2];
    int c0 = (int) ((Math.min(xs[a], Math.min(xs[b], xs[c])) - left) / CELL);
    int c1 = (int) ((Math.max(xs[a], Math.max(xs[b], xs[c])) - left) / CELL);
    int r0 = (int) ((Math.min(ys[a], Math.min(ys[b], ys[c])) - top) / CELL);
    int r1 = (int) ((Math.max(ys[a], Math.max(ys[b], ys[c])) - top) / CELL);
    for (int row = r0; row <= r1; row++) {
      for (int column = c0; column <= c1; column++) {
        cell.accept(row * columns + column);
      }
    }
  }

  /** Whether anything stands between a point and the onlooker. */
  boolean hides(double x, double y, double depth) {
    sight(x, y, depth + SLIVER);
    Arrays.fill(inside, false);
    double since = Double.NaN;
    for (int i = 0; i < hits; i++) {
      if (isSheet(hitSkin[i])) {
        return true;
      }
      if (!Double.isNaN(since) && since - hitDepth[i] > SLIVER) {
        return true;
      }
      inside[hitSkin[i]] ^= true;
      since = anyMaterial() ? hitDepth[i] : Double.NaN;
    }
    return !Double.isNaN(since) && since - depth > 2 * SLIVER;
  }

  /** Whether a point is in material. */
  boolean contains(double x, double y, double depth) {
    sight(x, y, depth);
    Arrays.fill(inside, false);
    for (int i = 0; i < hits; i++) {
      inside[hitSkin[i]] ^= true;
    }
    return anyMaterial();
  }

  private boolean anyMaterial() {
    for (Material material : materials) {
      if (isIn(material)) {
        return true;
      }
    }
    return false;
  }

  private boolean isIn(Material material) {
    if (!inside[material.skin]) {
      return false;
    }
    for (Material removed : material.removed) {
      if (isIn(removed)) {
        return false;
      }
    }
    return true;
  }

  /** Collects what the line of sight to a point meets before it, nearest to the onlooker first. */
  private void sight(double x, double y, double depth) {
    hits = 0;
    int column = (int) Math.floor((x - left) / CELL);
    int row = (int) Math.floor((y - top) / CELL);
    if (column < 0 || column >= columns || row < 0 || row >= rows) {
      return;
    }
    int cell = row * columns + column;
    for (int i = begin[cell]; i < begin[cell + 1]; i++) {
      double at = depthOf(inCell[i], x, y);
      if (at > depth) {
        insert(at, skinOf[inCell[i]]);
      }
    }
  }

  private void insert(double depth, int skin) {
    if (hits == hitDepth.length) {
      hitDepth = Arrays.copyOf(hitDepth, 2 * hits);
      hitSkin = Arrays.copyOf(hitSkin, 2 * hits);
    }
    int at = hits++;
    while (at > 0 && hitDepth[at - 1] < depth) {
      hitDepth[at] = hitDepth[at - 1];
      hitSkin[at] = hitSkin[at - 1];
      at--;
    }
    hitDepth[at] = depth;
    hitSkin[at] = skin;
  }

  /** The depth of a triangle at a point of the drawing; minus infinity beside it. */
  private double depthOf(int triangle, double x, double y) {
    int a = corners[3 * triangle];
    int b = corners[3 * triangle + 1];
    int c = corners[3 * triangle + 2];
    double wc = side(a, b, x, y);
    double wa = side(b, c, x, y);
    double wb = side(c, a, x, y);
    boolean within = (wa > 0 && wb > 0 && wc > 0) || (wa < 0 && wb < 0 && wc < 0);
    if (!within) {
      return Double.NEGATIVE_INFINITY;
    }
    return (wa * depths[a] + wb * depths[b] + wc * depths[c]) / (wa + wb + wc);
  }

  /**
   * Twice the area of an edge with a point. The edge is always taken from its lower vertex, so that
   * of two triangles along it exactly one has the point, wherever rounding puts it.
   */
  private double side(int from, int to, double x, double y) {
    if (from > to) {
      return -side(to, from, x, y);
    }
    double area = (xs[to] - xs[from]) * (y - ys[from]) - (ys[to] - ys[from]) * (x - xs[from]);
    return area == 0 ? Double.MIN_NORMAL : area;
  }
}
