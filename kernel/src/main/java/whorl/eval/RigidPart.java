package whorl.eval;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.jspecify.annotations.Nullable;
import whorl.check.Operation;
import whorl.check.RigidPlan;
import whorl.mechanics.Refusal;
import whorl.mechanics.body.Body;
import whorl.mechanics.motion.Load;
import whorl.mechanics.motion.RigidMotion;
import whorl.mechanics.motion.Support;
import whorl.mechanics.reference.Axis;
import whorl.mechanics.reference.BoundForce;
import whorl.mechanics.reference.Point;

/** The rigid body of a motion at work, over the frame of the motion. */
final class RigidPart {
  private final RigidPlan plan;
  private final MotionFrame frame;
  private final int source;
  private final int about;
  private final int angle;
  private final int turnedAbout;
  private final int spin;
  private final List<Integer> loads = new ArrayList<>();
  private @Nullable RigidMotion motion;

  RigidPart(RigidPlan plan, MotionFrame frame) {
    this.plan = plan;
    this.frame = frame;
    this.source = frame.formula(plan.source());
    this.about = formula(plan.about());
    this.angle = formula(plan.angle());
    this.turnedAbout = formula(plan.turnedAbout());
    this.spin = formula(plan.spin());
    plan.loads().forEach(load -> loads.add(frame.formula(load.value())));
  }

  private int formula(@Nullable Operation operation) {
    return operation == null ? -1 : frame.formula(operation);
  }

  /** Puts the body where it starts. */
  RigidMotion begin(double limit) {
    try {
      Body body = turned((Body) frame.thing(source));
      frame.put(plan.slot(), body);
      Vector3D rate = spin < 0 ? Vector3D.ZERO : frame.vector(spin);
      Support support =
          about < 0 ? new Support.Free() : new Support.Pivot((Point) frame.thing(about));
      RigidMotion begun = RigidMotion.of(body, support, rate, loads(body), limit);
      if (about < 0) {
        begun = begun.moving(body.centre().velocity());
      }
      motion = begun;
      show(begun.start());
      return begun;
    } catch (Refusal refusal) {
      var site = new Site(plan.source().span(), "");
      throw site.noValue(new NumericFailure.Refused(plan.name(), refusal.reason(), refusal.fix()));
    }
  }

  private Body turned(Body body) {
    if (angle < 0 || turnedAbout < 0) {
      return body;
    }
    if (plan.turnedAbout() instanceof Operation.Thing) {
      return body.turned((Axis) frame.thing(turnedAbout), frame.real(angle));
    }
    Point through = about < 0 ? body.centre() : (Point) frame.thing(about);
    return body.turned(new Axis(through, frame.vector(turnedAbout)), frame.real(angle));
  }

  private List<Load> loads(Body body) {
    var acting = new ArrayList<Load>();
    for (int i = 0; i < loads.size(); i++) {
      int formula = loads.get(i);
      if (plan.loads().get(i).isWeight()) {
        var weight = (BoundForce) frame.thing(formula);
        acting.add(new Load.Weight(-weight.force().getZ() / body.mass()));
      } else if (plan.loads().get(i).value() instanceof Operation.Vector) {
        acting.add(
            new Load.Varying(
                (time, state) -> new Load.Wrench(Vector3D.ZERO, frame.vector(formula))));
      } else {
        acting.add(new Load.Varying((time, state) -> force(formula, state)));
      }
    }
    return acting;
  }

  private Load.Wrench force(int formula, double[] state) {
    var force = (BoundForce) frame.thing(formula);
    Vector3D arm = force.at().position().subtract(motion().point(state));
    return new Load.Wrench(force.force(), arm.crossProduct(force.force()));
  }

  private RigidMotion motion() {
    if (motion == null) {
      throw new IllegalStateException("the body has not begun to move");
    }
    return motion;
  }

  /** Puts what is read of the body in a state into the frame. */
  void show(double[] state) {
    RigidMotion moving = motion();
    put(RigidPlan.Column.AXIS, moving.axis(state));
    frame.put(plan.columns() + RigidPlan.Column.SPIN.offset(), moving.spin(state));
    put(RigidPlan.Column.RATE, moving.rate(state));
    put(RigidPlan.Column.MOMENTUM, moving.momentum(state));
    put(RigidPlan.Column.AT, moving.centre(state));
    if (plan.isRead()) {
      frame.put(plan.slot(), moving.body(state));
    }
  }

  private void put(RigidPlan.Column column, Vector3D value) {
    int slot = plan.columns() + column.offset();
    frame.put(slot, value.getX());
    frame.put(slot + 1, value.getY());
    frame.put(slot + 2, value.getZ());
  }

  /** The rates of the states of the body, with what the frame shows now. */
  void rates(double time, double[] state, double[] rates) {
    motion().rates(time, state, rates);
  }
}
