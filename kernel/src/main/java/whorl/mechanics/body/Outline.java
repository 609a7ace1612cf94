package whorl.mechanics.body;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * What a body looks like, for drawings and for telling whether one body lies within another.
 *
 * @param solids closed surfaces that enclose material
 * @param sheets open surfaces, of no thickness
 * @param wires lines
 */
public record Outline(List<Solid> solids, List<Facets> sheets, List<Wire> wires) {
  /** Nothing to be seen. */
  static final Outline NONE = new Outline(List.of(), List.of(), List.of());

  /**
   * A closed surface.
   *
   * @param skin the surface
   * @param removed what is taken out of it
   */
  public record Solid(Facets skin, List<Solid> removed) {
    /** Copies the list. */
    public Solid {
      removed = List.copyOf(removed);
    }

    Solid mapped(UnaryOperator<Vector3D> map, boolean mirroring) {
      return new Solid(
          skin.mapped(map, mirroring),
          removed.stream().map(solid -> solid.mapped(map, mirroring)).toList());
    }

    Solid less(List<Solid> others) {
      List<Solid> all = new ArrayList<>(removed);
      all.addAll(others);
      return new Solid(skin, all);
    }
  }

  /**
   * A line through points; a single point where it has one.
   *
   * @param points in order
   * @param closed whether it returns to the first
   */
  public record Wire(List<Vector3D> points, boolean closed) {
    /** Copies the list. */
    public Wire {
      points = List.copyOf(points);
    }
  }

  /** Copies the lists. */
  public Outline {
    solids = List.copyOf(solids);
    sheets = List.copyOf(sheets);
    wires = List.copyOf(wires);
  }

  /** A body with one closed surface. */
  public static Outline solid(Facets skin) {
    return new Outline(List.of(new Solid(skin, List.of())), List.of(), List.of());
  }

  static Outline sheet(Facets sheet) {
    return new Outline(List.of(), List.of(sheet), List.of());
  }

  static Outline wire(List<Vector3D> points, boolean closed) {
    return new Outline(List.of(), List.of(), List.of(new Wire(points, closed)));
  }

  /** The same with every point elsewhere; a mirroring map turns the triangles over. */
  public Outline mapped(UnaryOperator<Vector3D> map, boolean mirroring) {
    return new Outline(
        solids.stream().map(solid -> solid.mapped(map, mirroring)).toList(),
        sheets.stream().map(sheet -> sheet.mapped(map, mirroring)).toList(),
        wires.stream()
            .map(wire -> new Wire(wire.points().stream().map(map).toList(), wire.closed()))
            .toList());
  }

  Outline plus(Outline other) {
    return new Outline(
        concat(solids, other.solids), concat(sheets, other.sheets), concat(wires, other.wires));
  }

  Outline without(Outline other) {
    return new Outline(
        solids.stream().map(solid -> solid.less(other.solids)).toList(), sheets, wires);
  }

  private static <T> List<T> concat(List<T> first, List<T> second) {
    List<T> both = new ArrayList<>(first);
    both.addAll(second);
    return both;
  }
}
