package whorl.mechanics.body.mesh;

import java.util.Arrays;
import whorl.mechanics.Refusal;

/**
 * Triangles while they are read. Corners at exactly the same place become one vertex, found by a
 * hash table of plain numbers with open addressing; triangles that thereby lose a corner enclose
 * nothing and are left out.
 */
final class Triangles {
  /** As many as arrays can hold with room to grow. */
  static final int MOST = 150_000_000;

  private double[] coordinates;
  private int vertices;
  private int[] corners;
  private int size;

  /** Vertex plus one at its place in the table; zero where the place is free. */
  private int[] table;

  private int shift;

  /** Expects about so many triangles. */
  Triangles(int expected) {
    // A closed surface has about half as many vertices as triangles.
    int capacity = Math.max(16, expected / 2 + expected / 16);
    coordinates = new double[3 * capacity];
    corners = new int[Math.max(48, 3 * expected)];
    setTable(Integer.highestOneBit(capacity) << 2);
  }

  private void setTable(int length) {
    table = new int[length];
    shift = 64 - Integer.numberOfTrailingZeros(length);
  }

  /** The vertex at a place; the same for the same place. */
  int vertex(double x, double y, double z) {
    // Adding zero makes the negative zero a positive one.
    double px = x + 0.0;
    double py = y + 0.0;
    double pz = z + 0.0;
    int slot = slot(px, py, pz);
    int mask = table.length - 1;
    for (int entry = table[slot]; entry != 0; entry = table[slot]) {
      int at = 3 * (entry - 1);
      if (coordinates[at] == px && coordinates[at + 1] == py && coordinates[at + 2] == pz) {
        return entry - 1;
      }
      slot = (slot + 1) & mask;
    }
    return added(slot, px, py, pz);
  }

  private int added(int slot, double x, double y, double z) {
    if (!Double.isFinite(x + y + z)) {
      throw new Refusal(
          "mesh",
          "A coordinate of triangle " + (size / 3 + 1) + " of the mesh is no number.",
          "Write the file again.");
    }
    if (3 * vertices == coordinates.length) {
      coordinates = Arrays.copyOf(coordinates, Math.multiplyExact(2, coordinates.length));
    }
    int vertex = vertices++;
    coordinates[3 * vertex] = x;
    coordinates[3 * vertex + 1] = y;
    coordinates[3 * vertex + 2] = z;
    table[slot] = vertex + 1;
    if (2 * vertices > table.length) {
      rehash();
    }
    return vertex;
  }

  private void rehash() {
    setTable(Math.multiplyExact(2, table.length));
    int mask = table.length - 1;
    for (int v = 0; v < vertices; v++) {
      int slot = slot(coordinates[3 * v], coordinates[3 * v + 1], coordinates[3 * v + 2]);
      while (table[slot] != 0) {
        slot = (slot + 1) & mask;
      }
      table[slot] = v + 1;
    }
  }

  /** From the high bits of a product: those depend on all bits of the factors. */
  private int slot(double x, double y, double z) {
    long mixed =
        Double.doubleToRawLongBits(x) * 0x9E3779B97F4A7C15L
            ^ Long.rotateLeft(Double.doubleToRawLongBits(y) * 0xC2B2AE3D27D4EB4FL, 21)
            ^ Long.rotateLeft(Double.doubleToRawLongBits(z) * 0x165667B19E3779F9L, 42);
    mixed ^= mixed >>> 32;
    return (int) ((mixed * 0x9E3779B97F4A7C15L) >>> shift);
  }

  /** A triangle of three vertices, anticlockwise as seen from outside. */
  void add(int a, int b, int c) {
    if (a == b || b == c || c == a) {
      return;
    }
    if (size == corners.length) {
      if (size / 3 >= MOST) {
        throw new Refusal("mesh", "The mesh has more than " + MOST + " triangles.", "Coarsen it.");
      }
      corners = Arrays.copyOf(corners, Math.multiplyExact(2, corners.length));
    }
    corners[size] = a;
    corners[size + 1] = b;
    corners[size + 2] = c;
    size += 3;
  }

  /** What was read, unchecked. */
  Surface surface() {
    if (size == 0) {
      throw new Refusal(
          "mesh", "The file holds no triangles.", "Check that the right file was written.");
    }
    return new Surface(
        coordinates, vertices, size == corners.length ? corners : Arrays.copyOf(corners, size));
  }
}
