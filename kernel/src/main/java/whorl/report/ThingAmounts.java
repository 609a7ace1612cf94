package whorl.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.geometry.euclidean.threed.Rotation;
import org.apache.commons.math3.geometry.euclidean.threed.RotationConvention;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.eval.Value;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.InertiaTensor;
import whorl.mechanics.reference.Point;
import whorl.sheet.Setting;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Kind;

/** Sets things in space: what a second engineer needs to know them by. */
final class ThingAmounts {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();

  /** As wide as a digit, and never broken at. */
  private static final String DIGIT_SPACE = "\u2007";

  private ThingAmounts() {}

  static Amount of(Value.Thing thing, Setting setting) {
    Object content = thing.content();
    return switch (thing.sort()) {
      case POINT -> point((Point) content);
      case AXIS -> axis((Axis) content);
      case FRAME -> frame((Frame) content);
      case BODY -> body((Body) content);
      case FORCE -> force((BoundForce) content);
      case INERTIA -> tensor((InertiaTensor) content, setting);
      case MOTION, COURSE -> new Amount(true, thing.sort().withArticle(), "", "", List.of());
    };
  }

  private static Amount point(Point point) {
    var details = new ArrayList<String>();
    details.add("point, world axes");
    if (!point.isFixed()) {
      details.add("moves with " + vector(point.velocity(), "velocity").signed());
    }
    return with(vector(point.position(), "length"), details);
  }

  private static Amount axis(Axis axis) {
    Amount along = vector(axis.along(), "number");
    return new Amount(
        along.exact(),
        "along " + along.number(),
        along.power(),
        "",
        List.of("axis through " + place(axis.through())));
  }

  private static Amount frame(Frame frame) {
    var details = new ArrayList<String>();
    Rotation attitude = frame.attitude();
    if (attitude.getAngle() == 0) {
      details.add("frame along the axes of the world");
    } else {
      Vector3D about = attitude.getAxis(RotationConvention.VECTOR_OPERATOR);
      details.add(
          "frame turned "
              + number(attitude.getAngle(), "deg").text()
              + " about "
              + vector(about, "number").text());
    }
    if (!frame.origin().isFixed()) {
      details.add("origin moves with " + vector(frame.origin().velocity(), "velocity").signed());
    }
    if (frame.angularVelocity().getNormSq() > 0) {
      details.add("turns with " + vector(frame.angularVelocity(), "angular_velocity").signed());
    }
    Amount origin = vector(frame.origin().position(), "length");
    return new Amount(
        origin.exact(), "at " + origin.number(), origin.power(), origin.unit(), details);
  }

  private static Amount body(Body body) {
    Unit unit = UNITS.readable(UNITS.usual(Kind.named("mass")), body.mass());
    Amount mass = Amount.of(Figures.of(unit.fromSi(body.mass())), UnitSigns.of(unit));
    InertiaTensor inertia = body.massProperties().atCentre();
    return with(
        mass,
        List.of(
            "body, centre at " + place(body.centre()),
            "principal moments of inertia about it " + principal(inertia).signed()));
  }

  private static Amount force(BoundForce force) {
    return with(
        vector(force.force(), "force"), List.of("bound force, acts at " + place(force.at())));
  }

  /** Principal moments, then the tensor as a block. */
  private static Amount tensor(InertiaTensor tensor, Setting setting) {
    var details = new ArrayList<String>();
    details.add("principal moments");
    details.addAll(block(tensor));
    details.add("where I_xy = −∫ x y dm");
    details.add(
        Amounts.about(setting).map(about -> about + ", ").orElse("") + Amounts.axes(setting));
    return with(principal(tensor), details);
  }

  private static Amount principal(InertiaTensor tensor) {
    double[] moments = tensor.principalMoments();
    Unit unit =
        UNITS.readable(UNITS.usual(Kind.named("rotational_inertia")), moments[moments.length - 1]);
    return Amounts.triple(moments[0], moments[1], moments[2], unit, List.of());
  }

  private static List<String> block(InertiaTensor tensor) {
    double largest = tensor.principalMoments()[2];
    Unit unit = UNITS.readable(UNITS.usual(Kind.named("rotational_inertia")), largest);
    List<Double> elements =
        DoubleStream.of(
                tensor.xx(),
                tensor.xy(),
                tensor.zx(),
                tensor.xy(),
                tensor.yy(),
                tensor.yz(),
                tensor.zx(),
                tensor.yz(),
                tensor.zz())
            .mapToObj(unit::fromSi)
            .toList();
    List<Figure> figures = Figures.together(elements);
    int width = figures.stream().mapToInt(figure -> figure.significand().length()).max().orElse(0);
    var rows = new ArrayList<String>();
    String power = figures.get(0).power();
    rows.add("elements in " + (power.isEmpty() ? "" : power + " ") + UnitSigns.of(unit));
    for (int i = 0; i < 3; i++) {
      rows.add(
          figures.subList(3 * i, 3 * i + 3).stream()
              .map(figure -> padded(figure.significand(), width))
              .collect(Collectors.joining(DIGIT_SPACE)));
    }
    return rows;
  }

  private static String padded(String digits, int width) {
    return DIGIT_SPACE.repeat(width - digits.length()) + digits;
  }

  private static String place(Point point) {
    return vector(point.position(), "length").text();
  }

  private static Amount vector(Vector3D v, String kind) {
    Unit unit =
        kind.equals("number")
            ? Unit.ONE
            : UNITS.readable(UNITS.usual(Kind.named(kind)), v.getNorm());
    return Amounts.triple(v.getX(), v.getY(), v.getZ(), unit, List.of());
  }

  private static Amount number(double si, String symbol) {
    Unit unit = UNITS.resolve(whorl.units.UnitReader.read(symbol));
    return Amount.of(Figures.of(unit.fromSi(si)), UnitSigns.of(unit));
  }

  private static Amount with(Amount amount, List<String> details) {
    return new Amount(amount.exact(), amount.number(), amount.power(), amount.unit(), details);
  }
}
