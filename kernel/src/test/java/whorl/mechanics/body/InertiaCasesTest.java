package whorl.mechanics.body;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;
import whorl.mechanics.reference.Turn;

/** The cases of {@code inertia.csv}, whose head says where they come from. */
class InertiaCasesTest {
  private static final double INCH = 0.0254;
  private static final double POUND = 0.45359237;
  private static final Vector3D X = Vector3D.PLUS_I;
  private static final Vector3D Y = Vector3D.PLUS_J;
  private static final Vector3D Z = Vector3D.PLUS_K;
  private static final Map<String, Double> COMPUTED = new HashMap<>();

  static {
    cylinderConesAndSpheres();
    blocksAndPlates();
    ringsAndTori();
    outlines();
    tensors();
    flywheel();
    cloud();
    bentPlate();
  }

  @ParameterizedTest
  @CsvFileSource(resources = "/whorl/mechanics/body/inertia.csv")
  void aCaseComesOutAsPublished(
      String id,
      String quantity,
      double value,
      String unit,
      double inSi,
      double relative,
      double absolute) {
    Double computed = COMPUTED.get(id + " " + quantity);
    assertNotNull(computed, () -> id + " " + quantity);
    double expected = value * inSi;
    assertEquals(expected, computed, Math.max(relative * Math.abs(expected), absolute));
  }

  private static void put(String id, String quantity, double value) {
    COMPUTED.put(id + " " + quantity, value);
  }

  private static void put(String id, InertiaTensor tensor) {
    put(id, "Ixx", tensor.xx());
    put(id, "Iyy", tensor.yy());
    put(id, "Izz", tensor.zz());
    put(id, "Ixy", tensor.xy());
    put(id, "Iyz", tensor.yz());
    put(id, "Ixz", tensor.zx());
  }

  private static double about(Body body, double x, double y, double z, Vector3D along) {
    return body.inertia(new Axis(Point.fixed(x, y, z), along)).value();
  }

  private static double central(Body body, Vector3D along) {
    return body.inertia(new Axis(body.centre(), along)).value();
  }

  /** Height of the centre of mass above the datum. */
  private static double height(Body body) {
    return body.centre().minus(body.datum()).getZ();
  }

  private static Body placed(Body body, double x, double y, double z, Rotation turned) {
    return body.placed(Frame.in(Frame.WORLD, new Vector3D(x, y, z), turned));
  }

  private static void cylinderConesAndSpheres() {
    Body disc = Shapes.solidCylinder(0.3, 0.06).ofDensity(7850);
    put("I01", "m", disc.mass());
    put("I01", "I_axial", central(disc, Z));
    put("I01", "I_trans_cg", central(disc, X));
    put("I01", "I_trans_endface", about(disc, 0, 0, 0.03, X));
    put("I05", "I_c", central(ThinShapes.sphere(0.5).ofMass(3), new Vector3D(1, 2, 3)));
    Body cone = Shapes.cone(0.4, 0.5).ofMass(12);
    double apex = 0.5 - height(cone);
    put("I06", "I_axial", central(cone, Z));
    put("I06", "zc_from_apex", apex);
    put("I06", "I_trans_apex", about(cone, 0, 0, apex, Y));
    put("I06", "I_trans_cg", central(cone, Y));
    put("I06", "I_trans_base", about(cone, 0, 0, cone.datum().position().getZ(), Y));
    Body frustum = Shapes.frustum(0.6, 0.4, 0.25).ofDensity(7850);
    put("I08", "m", frustum.mass());
    put("I08", "zc_from_base", height(frustum));
    put("I08", "I_axial", central(frustum, Z));
    Body hemisphere = ThinShapes.sphericalCap(0.3, 0.15).ofMass(1.5);
    put("I13", "zc_from_rim_plane", height(hemisphere));
    put("I13", "I_axial", central(hemisphere, Z));
    put("I13", "I_trans_cg", central(hemisphere, X));
    Body cap = Shapes.sphericalCap(0.4, 0.05).ofDensity(7800);
    put("I14", "m", cap.mass());
    put("I14", "zc_from_sphere_centre", 0.2 - 0.05 + height(cap));
    put("I14", "I_axial", central(cap, Z));
    Body paraboloid = Shapes.revolved(z -> 0.12 * Math.sqrt(z / 0.2), 0, 0.2).ofMass(5);
    put("I22", "I_axial", central(paraboloid, Z));
    put("I22", "zc_from_apex", height(paraboloid));
    put("I22", "I_trans_apex", about(paraboloid, 0, 0, paraboloid.datum().position().getZ(), X));
    put("I22", "I_trans_cg", central(paraboloid, X));
  }

  private static void blocksAndPlates() {
    Body ellipsoid = Shapes.ellipsoid(0.3, 0.2, 0.1).ofMass(10);
    put("I11", "Ixx", central(ellipsoid, X));
    put("I11", "Iyy", central(ellipsoid, Y));
    put("I11", "Izz", central(ellipsoid, Z));
    Body block = Shapes.box(0.4, 0.3, 0.2).ofMass(18);
    put("I15", "Ixx", central(block, X));
    put("I15", "Iyy", central(block, Y));
    put("I15", "Izz", central(block, Z));
    Body plate = ThinShapes.plate(24 * INCH, 18 * INCH).ofMass(10 * POUND);
    put("I16", "I_normal", central(plate, Z));
    put("I16", "I_about_axis_parallel_to_a", central(plate, X));
    put("I16", "I_normal_ft", central(plate, Z));
    put("I16", "I_edge_b_hinge", about(plate, 12 * INCH, 0, 0, Y));
  }

  private static void ringsAndTori() {
    Body torus = Shapes.torus(0.4, 0.06).ofDensity(1200);
    put("I09", "m", torus.mass());
    put("I09", "I_axial", central(torus, Z));
    put("I09", "I_diam", central(torus, X));
    Body shell = ThinShapes.torus(0.4, 0.06).ofMass(2);
    put("I10", "I_axial", central(shell, Z));
    put("I10", "I_diam", central(shell, X));
    Body ring = ThinShapes.ring(0.7).ofMass(5);
    put("I18", "I_axial", central(ring, Z));
    put("I18", "I_diam", central(ring, X));
    put("I18", "I_tangent_in_plane", about(ring, 0, 0.35, 0, X));
    put("I18", "I_rim_axis_parallel", about(ring, 0, 0.35, 0, Z));
  }

  private static void outlines() {
    for (int n : new int[] {3, 4, 5, 8}) {
      List<Vector2D> corners = new ArrayList<>();
      for (int i = 0; i < n; i++) {
        double angle = 2 * Math.PI * i / n;
        corners.add(new Vector2D(Math.cos(angle), Math.sin(angle)));
      }
      put("I20", "I_n" + n, central(Shapes.prism(Contour.polygon(corners), 1).ofMass(1), Z));
    }
    Contour half =
        Contour.from(new Vector2D(0, -0.1))
            .arcTo(new Vector2D(0.1, 0), new Vector2D(0, 0.1))
            .close();
    Body halfCylinder = Shapes.prism(half, 0.3).ofMass(8);
    Vector3D flat = halfCylinder.datum().position();
    put("I21", "xc_from_flat", -flat.getX());
    put("I21", "I_axis_of_full_cylinder", about(halfCylinder, flat.getX(), 0, 0, Z));
    put("I21", "I_parallel_axis_cg", central(halfCylinder, Z));
  }

  private static void tensors() {
    Body block = Shapes.box(0.2, 0.1, 0.06).ofMass(4);
    put("I23", placed(block, 0.3, -0.1, 0.15, Rotation.IDENTITY).inertia(Point.ORIGIN));
    Body disc = Shapes.solidCylinder(0.4, 0.02).ofMass(9);
    InertiaTensor skewed =
        placed(disc, 0, 0, 0, Turn.about(Y, Math.toRadians(2))).inertia(Point.ORIGIN);
    put("I24", "Izz", skewed.zz());
    put("I24", "Ixx", skewed.xx());
    put("I24", "Iyy", skewed.yy());
    put("I24", "abs_Ixz", Math.abs(skewed.zx()));
  }

  private static void flywheel() {
    double density = 0.26 * POUND / (INCH * INCH * INCH);
    Body rim = annulus(18, 15, 6, density);
    Body web = annulus(15, 4, 1, density);
    Body hub = annulus(4, 1.5, 7, density);
    Body wheel = Body.assembly(List.of(rim, web, hub));
    put("I27", "W", wheel.mass());
    put("I27", "WK2", central(wheel, Z));
    put("I27", "J", central(wheel, Z));
    put("I27", "k", wheel.radiusOfGyration(new Axis(Point.ORIGIN, Z)));
    put("I27", "rim_share", central(rim, Z) / central(wheel, Z));
  }

  private static Body annulus(double outer, double inner, double width, double density) {
    return Shapes.hollowCylinder(2 * outer * INCH, 2 * inner * INCH, width * INCH)
        .ofDensity(density);
  }

  private static void cloud() {
    Body cloud =
        Body.assembly(
            List.of(point(2, 1, 0, 0), point(3, 0, 1, 1), point(1, -1, 2, 0), point(4, 0, 0, -1)));
    put("I28", cloud.inertia(Point.ORIGIN));
    double[] principal = cloud.massProperties().atCentre().principalMoments();
    put("I28", "I1", principal[0]);
    put("I28", "I2", principal[1]);
    put("I28", "I3", principal[2]);
  }

  private static Body point(double mass, double x, double y, double z) {
    return placed(ThinShapes.point().ofMass(mass), x, y, z, Rotation.IDENTITY);
  }

  private static void bentPlate() {
    double perArea = 70;
    // Plates lie in their plane z = 0: the first is turned so that its normal is along x.
    Body first =
        placed(
            ThinShapes.plate(0.125, 0.1).ofMass(perArea * 0.125 * 0.1),
            0,
            0.0625,
            0.05,
            Frame.axes(Y, Z, X));
    Body second =
        placed(
            ThinShapes.plate(0.15, 0.075).ofMass(perArea * 0.15 * 0.075),
            0.0375,
            0.125,
            0.075,
            Frame.axes(Z, X, Y));
    Body plate = Body.assembly(List.of(first, second));
    put("I31", plate.inertia(Point.ORIGIN));
    Vector3D spin = new Vector3D(0, 0, 30);
    Vector3D velocity = spin.crossProduct(plate.centre().position());
    Vector3D momentum = plate.angularMomentum(spin, velocity, Point.ORIGIN).value();
    put("I31", "Hx", momentum.getX());
    put("I31", "Hy", momentum.getY());
    put("I31", "Hz", momentum.getZ());
    put("I31", "T", plate.kineticEnergy(spin, velocity));
  }
}
