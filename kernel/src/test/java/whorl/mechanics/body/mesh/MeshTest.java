package whorl.mechanics.body.mesh;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static whorl.mechanics.Near.assertNear;
import static whorl.mechanics.Near.assertRefused;

import java.io.IOException;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.ValueSource;
import whorl.mechanics.body.Body;
import whorl.mechanics.body.Facets;
import whorl.mechanics.body.Outline;
import whorl.mechanics.body.Shapes;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Turn;

class MeshTest {
  /** A triangle. */
  private record Facet(Vector3D a, Vector3D b, Vector3D c) {
    static Facet of(double... at) {
      return new Facet(
          new Vector3D(at[0], at[1], at[2]),
          new Vector3D(at[3], at[4], at[5]),
          new Vector3D(at[6], at[7], at[8]));
    }

    Facet reversed() {
      return new Facet(a, c, b);
    }

    Facet shifted(double by) {
      Vector3D shift = new Vector3D(by, by, by);
      return new Facet(a.add(shift), b.add(shift), c.add(shift));
    }

    List<Vector3D> corners() {
      return List.of(a, b, c);
    }
  }

  @TempDir Path folder;

  // The corner tetrahedron of the unit cube: volume 1/6; common practice.
  private static final List<Facet> CORNER =
      List.of(
          Facet.of(0, 0, 0, 0, 1, 0, 1, 0, 0),
          Facet.of(0, 0, 0, 1, 0, 0, 0, 0, 1),
          Facet.of(0, 0, 0, 0, 0, 1, 0, 1, 0),
          Facet.of(1, 0, 0, 0, 1, 0, 0, 0, 1));

  @ParameterizedTest
  @CsvFileSource(resources = "/whorl/mechanics/body/meshes.csv")
  void aPublishedMeshComesOutExactly(
      String id, String quantity, double value, double relative, double absolute)
      throws IOException, URISyntaxException {
    boolean steel = id.equals("M08");
    Path file = Path.of(resource(id).toURI());
    Body body =
        Mesh.read(file, steel ? 0.001 : 1)
            .shape()
            .ofDensity(steel ? 7850 : id.equals("I25") ? 1.5 : 1);
    Double computed = quantities(body).get(quantity);
    assertNotNull(computed, quantity);
    assertEquals(value, computed, Math.max(relative * Math.abs(value), absolute));
  }

  private static URL resource(String id) {
    URL found = MeshTest.class.getResource("/whorl/mechanics/body/meshes/" + id + ".obj");
    assertNotNull(found, id);
    return found;
  }

  private static Map<String, Double> quantities(Body body) {
    Map<String, Double> values = new HashMap<>();
    values.put("m", body.mass());
    values.put("volume", body.volume().getAsDouble());
    Vector3D centre = body.centre().minus(body.datum());
    values.put("cg_x", centre.getX());
    values.put("cg_y", centre.getY());
    values.put("cg_z", centre.getZ());
    put(values, "cg", body.ownInertia());
    put(values, "origin", body.inertia(body.datum()));
    return values;
  }

  private static void put(Map<String, Double> values, String about, InertiaTensor tensor) {
    values.put("Ixx_" + about, tensor.xx());
    values.put("Iyy_" + about, tensor.yy());
    values.put("Izz_" + about, tensor.zz());
    values.put("Ixy_" + about, tensor.xy());
    values.put("Iyz_" + about, tensor.yz());
    values.put("Ixz_" + about, tensor.zx());
  }

  @ParameterizedTest
  @ValueSource(strings = {"binary.stl", "text.stl", "faces.obj"})
  void theSameTrianglesGiveTheSameBodyInEveryForm(String name) throws IOException {
    Mesh mesh = Mesh.read(written(name, CORNER), 1);
    assertEquals(4, mesh.triangles());
    assertEquals(1 / 6.0, mesh.volume(), 1e-16);
    assertNear(new Vector3D(-0.25, -0.25, -0.25), mesh.shape().datum(), 1e-16);
  }

  @Test
  void theUnitOfTheFileScalesAllThatIsMade() throws IOException {
    Path file = written("corner.stl", CORNER);
    Body metres = Mesh.read(file, 1).shape().ofDensity(1);
    Body millimetres = Mesh.read(file, 0.001).shape().ofDensity(1);
    assertEquals(metres.mass() * 1e-9, millimetres.mass(), 1e-24);
    assertNear(metres.ownInertia().times(1e-15), millimetres.ownInertia(), 1e-14);
    assertRefused("unit of the file", "positive", () -> Mesh.read(file, 0));
  }

  @Test
  void aBinaryFileMayBeginLikeAText() throws IOException {
    byte[] bytes = Files.readAllBytes(written("binary.stl", CORNER));
    System.arraycopy("solid of a maker".getBytes(StandardCharsets.US_ASCII), 0, bytes, 0, 16);
    assertEquals(4, Mesh.read(Files.write(folder.resolve("solid.stl"), bytes), 1).triangles());
  }

  @Test
  void anInsideOutMeshIsRefused() {
    List<Facet> reversed = CORNER.stream().map(Facet::reversed).toList();
    assertRefused("mesh", "inside out", () -> Mesh.read(written("in.stl", reversed), 1));
  }

  @Test
  void anOpenMeshIsRefusedWithItsEdges() {
    assertRefused(
        "mesh",
        "3 edges belong to one triangle only",
        () -> Mesh.read(written("open.stl", CORNER.subList(0, 3)), 1));
    assertRefused(
        "mesh",
        "(0.0, 1.0, 0.0) to (1.0, 0.0, 0.0)",
        () -> Mesh.read(written("open.stl", CORNER.subList(0, 3)), 1));
  }

  @Test
  void aTurnedTriangleIsRefused() {
    List<Facet> turned = new ArrayList<>(CORNER);
    turned.set(2, turned.get(2).reversed());
    assertRefused(
        "mesh", "not consistently oriented", () -> Mesh.read(written("turned.stl", turned), 1));
  }

  @Test
  void trianglesThatStandTwiceAreRefused() {
    List<Facet> twice = new ArrayList<>(CORNER);
    twice.addAll(CORNER);
    assertRefused(
        "mesh", "More than two triangles", () -> Mesh.read(written("twice.stl", twice), 1));
  }

  @Test
  void aFlatMeshIsRefused() {
    Facet facet = CORNER.get(0);
    assertRefused(
        "mesh",
        "no volume",
        () -> Mesh.read(written("flat.stl", List.of(facet, facet.reversed())), 1));
  }

  @Test
  void shellsSideBySideAddUp() throws IOException {
    List<Facet> two = new ArrayList<>(CORNER);
    CORNER.forEach(facet -> two.add(facet.shifted(5)));
    assertEquals(1 / 3.0, Mesh.read(written("two.stl", two), 1).volume(), 1e-15);
  }

  @Test
  void oneShellOfSeveralThatIsInsideOutIsNamed() {
    List<Facet> two = new ArrayList<>(CORNER);
    CORNER.forEach(facet -> two.add(facet.shifted(5).reversed()));
    assertRefused("mesh", "around (5.5, 5.5, 5.5)", () -> Mesh.read(written("two.stl", two), 1));
  }

  @Test
  void aShellWithinAnotherIsACavityOnlyIfItFacesInwards() throws IOException {
    List<Facet> outer = cube(4);
    List<Facet> cavity = new ArrayList<>(outer);
    CORNER.forEach(facet -> cavity.add(facet.shifted(1).reversed()));
    assertEquals(64 - 1 / 6.0, Mesh.read(written("cavity.stl", cavity), 1).volume(), 1e-13);
    List<Facet> inlay = new ArrayList<>(outer);
    CORNER.forEach(facet -> inlay.add(facet.shifted(1)));
    assertRefused("mesh", "count twice", () -> Mesh.read(written("inlay.stl", inlay), 1));
  }

  /** A cube from the origin, by the facets of a box. */
  private static List<Facet> cube(double side) {
    Outline.Solid box =
        Shapes.box(side, side, side)
            .ofMass(1)
            .placed(
                Frame.in(
                    Frame.WORLD,
                    new Vector3D(side / 2, side / 2, side / 2),
                    Turn.about(Vector3D.PLUS_I, 0)))
            .outline()
            .solids()
            .get(0);
    List<Facet> facets = new ArrayList<>();
    for (int t = 0; t < box.skin().triangles(); t++) {
      Facets skin = box.skin();
      facets.add(
          new Facet(
              skin.vertex(skin.corner(t, 0)),
              skin.vertex(skin.corner(t, 1)),
              skin.vertex(skin.corner(t, 2))));
    }
    return facets;
  }

  @Test
  void aMeshFarFromTheOriginOfItsFileKeepsItsDigits() throws IOException {
    Body here = Mesh.read(written("here.stl", cube(4)), 1).shape().ofDensity(1);
    List<Facet> far = cube(4).stream().map(facet -> facet.shifted(1 << 20)).toList();
    Body there = Mesh.read(written("there.stl", far), 1).shape().ofDensity(1);
    assertNear(here.ownInertia(), there.ownInertia(), 1e-15);
    assertEquals(64, there.mass(), 1e-13);
  }

  @Test
  void theOrderOfTrianglesAndTheirFirstCornersDoNotMatter() throws IOException {
    List<Facet> shuffled = new ArrayList<>(cube(1));
    Collections.shuffle(shuffled, new Random(11));
    Body body = Mesh.read(written("shuffled.stl", shuffled), 1).shape().ofDensity(1);
    assertNear(Shapes.box(1, 1, 1).perMass(), body.ownInertia(), 1e-15);
  }

  @Test
  void facesOfObjMayHaveManyCornersAndNumbersFromTheEnd() throws IOException {
    String obj =
        """
        # a step: a block with one corner of its section cut out
        v 0 0 0\nv 2 0 0\nv 2 1 0\nv 1 1 0\nv 1 2 0\nv 0 2 0
        v 0 0 1\nv 2 0 1\nv 2 1 1\nv 1 1 1\nv 1 2 1\nv 0 2 1
        vt 0 0
        g bottom
        f 6/1 5/1 4/1 3/1 2/1 1/1
        f -6 -5 -4 -3 -2 -1
        f 1 2 8 7\nf 2 3 9 8\nf 3 4 10 9\nf 4 5 11 10\nf 5 6 12 11\nf 6 1 7 12
        """;
    Mesh mesh = Mesh.read(Files.writeString(folder.resolve("step.obj"), obj), 1);
    assertEquals(3, mesh.volume(), 1e-15);
  }

  @Test
  void damagedFilesAreRefusedWithTheirPlace() throws IOException {
    byte[] whole = Files.readAllBytes(written("whole.stl", CORNER));
    Path cut = Files.write(folder.resolve("cut.stl"), Arrays.copyOf(whole, 200));
    assertRefused(
        "mesh", "announces 4 triangles, but is of a size for 2.32", () -> Mesh.read(cut, 1));
    Path empty = Files.write(folder.resolve("empty.stl"), new byte[0]);
    assertRefused("mesh", "too short", () -> Mesh.read(empty, 1));
    refusedText("part.obj", "v 1 2 x\n", "Line 1 of the mesh file has “x”");
    refusedText("part.obj", "v 1 2\n", "too few numbers");
    refusedText("part.obj", "v 0 0 0\nf 1 2 3\n", "names vertex 2, but 1 stand above it");
    refusedText("part.obj", "v 0 0 0\nf 1 1\n", "fewer than three corners");
    refusedText("part.obj", "\n", "no triangles");
    refusedText("part.stl", "solid a\nvertex 0 0 0\n", "Line 2 of the mesh file has a corner");
    refusedText("part.stl", "solid a\nouter loop\nendloop\n", "ends a loop of 0 corners");
    refusedText("part.stl", "solid a\nouter loop\n", "cut off");
    refusedText("part.stl", "solid a\nhello\n", "no word of STL");
    refusedText("part.obj", "v 0 0 NaN\n", "no number");
    refusedText("part.dxf", "", "neither in .stl nor in .obj");
  }

  private void refusedText(String name, String text, String words) throws IOException {
    Path file = Files.writeString(folder.resolve(name), text);
    assertRefused("mesh", words, () -> Mesh.read(file, 1));
  }

  @Test
  void theSketchOfAMeshHasItsTriangles() throws IOException {
    Outline outline = Mesh.read(written("cube.stl", cube(2)), 0.5).shape().ofMass(1).outline();
    assertEquals(12, outline.solids().get(0).skin().triangles());
    for (int v = 0; v < outline.solids().get(0).skin().vertices(); v++) {
      Vector3D corner = outline.solids().get(0).skin().vertex(v);
      assertEquals(0.5, corner.getNormInf(), 1e-15);
    }
    assertTrue(outline.wires().isEmpty());
  }

  private Path written(String name, List<Facet> facets) throws IOException {
    Path file = folder.resolve(name);
    if (name.endsWith(".obj")) {
      return Files.writeString(file, obj(facets));
    }
    return name.startsWith("text") ? Files.writeString(file, text(facets)) : binary(file, facets);
  }

  private static Path binary(Path file, List<Facet> facets) throws IOException {
    ByteBuffer bytes = ByteBuffer.allocate(84 + 50 * facets.size()).order(ByteOrder.LITTLE_ENDIAN);
    bytes.position(80);
    bytes.putInt(facets.size());
    for (Facet facet : facets) {
      bytes.position(bytes.position() + 12);
      for (Vector3D corner : facet.corners()) {
        for (double c : corner.toArray()) {
          bytes.putFloat((float) c);
        }
      }
      bytes.putShort((short) 0);
    }
    return Files.write(file, bytes.array());
  }

  private static String text(List<Facet> facets) {
    StringBuilder text = new StringBuilder("solid part\n");
    for (Facet facet : facets) {
      text.append("  facet normal 0 0 0\n    outer loop\n");
      for (Vector3D corner : facet.corners()) {
        text.append(
            String.format(
                Locale.ROOT,
                "      vertex %e %e %e\n",
                corner.getX(),
                corner.getY(),
                corner.getZ()));
      }
      text.append("    endloop\n  endfacet\n");
    }
    return text.append("endsolid part\n").toString();
  }

  private static String obj(List<Facet> facets) {
    StringBuilder text = new StringBuilder();
    for (Facet facet : facets) {
      for (Vector3D corner : facet.corners()) {
        text.append("v " + corner.getX() + " " + corner.getY() + " " + corner.getZ() + "\n");
      }
      text.append("f -3 -2 -1\n");
    }
    return text.toString();
  }
}
