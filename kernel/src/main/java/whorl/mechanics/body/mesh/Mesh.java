package whorl.mechanics.body.mesh;

import java.io.BufferedInputStream;
import java.io.BufferedReader;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.SequenceInputStream;
import java.nio.ByteBuffer;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.channels.ReadableByteChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import java.util.OptionalDouble;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.mechanics.Given;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Outline;
import whorl.mechanics.body.Shape;

/**
 * A homogeneous body inside a closed surface of triangles. Inner shells that face inwards bound
 * cavities.
 *
 * <p>Checked: the surface is closed, consistently oriented, faces outwards, and no edge has more
 * than two triangles. Not checked: whether it passes through itself.
 *
 * <p>Files of STL (binary and text) and OBJ hold numbers without a unit, so the unit of length has
 * to be given with each.
 */
public final class Mesh {
  private static final int BUFFER = 1 << 16;

  private final Surface surface;
  private final double unit;
  private final Moments moments;

  private Mesh(Surface surface, double unit) {
    this.surface = surface;
    this.unit = Given.positive("unit of the file", unit, "m");
    Edges.demandClosed(surface);
    Surface[] shells = Shells.of(surface);
    if (shells.length > 1) {
      new Nesting(shells).demandOutward();
    }
    moments = Moments.of(surface);
    if (moments.volume() < 0) {
      throw Nesting.insideOut("The mesh");
    }
  }

  /**
   * Reads a file whose name ends in {@code .stl} or {@code .obj}.
   *
   * @param file the file
   * @param unit the unit of length of its numbers, in m: 0.001 for a file in millimetres
   * @throws Refusal where the file is damaged, or where its surface is open, inconsistently
   *     oriented or inside out
   * @throws IOException where the file cannot be read
   */
  public static Mesh read(Path file, double unit) throws IOException {
    try (FileChannel channel = FileChannel.open(file)) {
      return read(String.valueOf(file.getFileName()), channel.size(), channel, unit);
    }
  }

  private static Mesh read(String name, long size, ReadableByteChannel channel, double unit)
      throws IOException {
    Given.positive("unit of the file", unit, "m");
    String lower = name.toLowerCase(Locale.ROOT);
    if (lower.endsWith(".obj")) {
      return new Mesh(new Obj().read(text(channel)), unit);
    }
    if (!lower.endsWith(".stl")) {
      throw new Refusal(
          "mesh",
          "The name of the file “" + name + "” ends neither in .stl nor in .obj.",
          "Write the mesh as one of these.");
    }
    byte[] head = new byte[(int) Math.min(StlBinary.HEAD, size)];
    ByteBuffer reading = ByteBuffer.wrap(head);
    while (reading.hasRemaining() && channel.read(reading) >= 0) {}
    return new Mesh(stl(head, size, channel), unit);
  }

  /**
   * The two forms of STL are told apart by the size that a binary one announces: its heading may
   * begin with {@code solid} like a text.
   */
  private static Surface stl(byte[] head, long size, ReadableByteChannel channel)
      throws IOException {
    boolean whole = head.length == StlBinary.HEAD;
    long triangles = whole ? StlBinary.triangles(head) : 0;
    if (whole && StlBinary.fits(triangles, size)) {
      if (triangles > Triangles.MOST) {
        throw new Refusal("mesh", "The mesh has " + triangles + " triangles.", "Coarsen it.");
      }
      return StlBinary.read(channel, (int) triangles);
    }
    String beginning = new String(head, StandardCharsets.ISO_8859_1).toLowerCase(Locale.ROOT);
    if (beginning.startsWith("solid")) {
      return new StlText().read(text(channel, head));
    }
    if (!whole) {
      throw new Refusal("mesh", "The file is too short for an STL file.", "Write the file again.");
    }
    throw new Refusal(
        "mesh",
        "The file announces "
            + triangles
            + " triangles, but is of a size for "
            + (size - StlBinary.HEAD) / (double) StlBinary.RECORD
            + ".",
        "The file is cut off or damaged: write it again.");
  }

  /** The bytes that were read ahead and what follows them, as lines. */
  private static BufferedReader text(ReadableByteChannel channel, byte... ahead) {
    InputStream all =
        new SequenceInputStream(new ByteArrayInputStream(ahead), Channels.newInputStream(channel));
    return new BufferedReader(
        new InputStreamReader(new BufferedInputStream(all, BUFFER), StandardCharsets.ISO_8859_1),
        BUFFER);
  }

  /** The number of triangles. */
  public int triangles() {
    return surface.triangles();
  }

  /** The volume inside, in m³. */
  public double volume() {
    return moments.volume() * unit * unit * unit;
  }

  /** The shape: its {@link Shape#datum} is the origin of the coordinates of the file. */
  public Shape shape() {
    Vector3D datum = moments.centre().scalarMultiply(-unit);
    return new Shape(
        "mesh",
        moments.perMass().times(unit * unit),
        OptionalDouble.of(volume()),
        datum,
        () -> Outline.solid(facets(datum)));
  }

  private Facets facets(Vector3D datum) {
    double[] coordinates = surface.coordinates();
    double[] scaled = new double[3 * surface.vertices()];
    double[] shift = datum.toArray();
    for (int i = 0; i < scaled.length; i++) {
      scaled[i] = unit * coordinates[i] + shift[i % 3];
    }
    return new Facets(scaled, surface.corners());
  }
}
