package whorl.report;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import whorl.eval.Value;
import whorl.laws.ThingSort;
import whorl.mechanics.body.Body;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Frame;
import whorl.mechanics.reference.Point;
import whorl.report.sketch.Drawn;
import whorl.report.sketch.Sense;
import whorl.sheet.Depicted;
import whorl.sheet.Quantity;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Kind;

/** Turns what a sketch of the sheet names into what a drawing shows. */
final class Depictions {
  private static final Kind FORCE = Kind.named("force");

  private Depictions() {}

  static List<Drawn> of(List<Depicted> things) {
    return things.stream().map(Depictions::of).toList();
  }

  private static Drawn of(Depicted depicted) {
    String name = depicted.name();
    Quantity quantity = depicted.quantity();
    if (quantity.value() instanceof Value.Vector v) {
      return new Drawn.Arrow(
          name,
          size(quantity),
          quantity.kind().isEmpty() ? quantity.unit().symbol() : quantity.kind(),
          sense(quantity.kind()),
          vector(v),
          depicted.at().map(Depictions::place));
    }
    Value.Thing thing = (Value.Thing) quantity.value();
    return switch (thing.sort()) {
      case BODY -> new Drawn.Body(name, (Body) thing.content());
      case POINT -> new Drawn.Spot(name, (Point) thing.content());
      case AXIS -> new Drawn.Line(name, (Axis) thing.content());
      case FRAME -> new Drawn.Axes(name, (Frame) thing.content());
      case FORCE -> force(name, (BoundForce) thing.content(), size(quantity));
      case INERTIA, MOTION, COURSE ->
          throw new IllegalStateException("refused by the check: " + name);
    };
  }

  private static Drawn force(String name, BoundForce force, String size) {
    return new Drawn.Arrow(
        name, size, FORCE.words(), Sense.FORCE, force.force(), Optional.of(force.at()));
  }

  /** Where a vector is drawn that is about a point or an axis. */
  private static Point place(Value.Thing thing) {
    return thing.sort() == ThingSort.AXIS
        ? ((Axis) thing.content()).through()
        : (Point) thing.content();
  }

  /**
   * The magnitude of a vector or a force with its unit, marked where it is rounded; empty for
   * another thing.
   */
  static String size(Quantity quantity) {
    if (quantity.value() instanceof Value.Vector v) {
      return marked(
          new Quantity(
              new Value.Real(vector(v).getNorm()),
              quantity.unit(),
              quantity.chosen(),
              quantity.kind(),
              null));
    } else if (quantity.value() instanceof Value.Thing thing
        && thing.content() instanceof BoundForce force) {
      return marked(
          new Quantity(
              new Value.Real(force.force().getNorm()),
              UnitCatalogue.standard().usual(FORCE),
              false,
              FORCE.words(),
              null));
    }
    return "";
  }

  private static String marked(Quantity size) {
    Amount amount = Amounts.of(size);
    return amount.exact() ? amount.text() : amount.signed();
  }

  private static Vector3D vector(Value.Vector v) {
    return new Vector3D(v.x(), v.y(), v.z());
  }

  private static Sense sense(String words) {
    Kind kind = Kind.find(words).orElse(null);
    if (kind == null) {
      return Sense.POLAR;
    } else if (kind.isA(Kind.named("torque"))) {
      return Sense.MOMENT;
    } else if (kind.isA(Kind.named("angular_momentum"))) {
      return Sense.ANGULAR_MOMENTUM;
    } else if (kind.isA(Kind.named("angular_velocity"))
        || kind.isA(Kind.named("angular_acceleration"))) {
      return Sense.TURNING;
    }
    return kind.isA(FORCE) ? Sense.FORCE : Sense.POLAR;
  }
}
