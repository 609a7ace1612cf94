package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * Checks the rigid body of a motion. Within the motion its name stands for the body as it moves, so
 * that {@code weight(wheel)} acts where the wheel is, and {@code … @ wheel} turns with it.
 */
final class RigidChecker {
  private static final Kind ANGLE = Kind.named("angle");
  private static final Kind ANGULAR_VELOCITY = Kind.named("angular_velocity");
  private static final Kind TORQUE = Kind.named("torque");
  private static final Kind FORCE = Kind.named("force");

  private final Scope scope;
  private final Frame frame;
  private final ExpressionChecker fromSheet;
  private final MotionLine.Body line;
  private final MotionLine.@Nullable Attitude attitude;
  private final Operation.Thing source;
  private final Operation.@Nullable Thing about;
  private final @Nullable Anchor point;
  private final int slot;
  private final int columns;
  private boolean isRead;

  private RigidChecker(
      Scope scope,
      Frame frame,
      ExpressionChecker fromSheet,
      MotionLine.Body line,
      MotionLine.@Nullable Attitude attitude) {
    this.scope = scope;
    this.frame = frame;
    this.fromSheet = fromSheet;
    this.line = line;
    this.attitude = attitude;
    Typed body = fromSheet.check(line.name());
    if (!(body.operation() instanceof Operation.Thing thing) || thing.sort() != ThingSort.BODY) {
      throw MotionMessages.notABody(line.name());
    }
    this.source = thing;
    Typed held = fromSheet.check(line.about());
    if (!(held.operation() instanceof Operation.Thing where) || where.sort() != ThingSort.POINT) {
      throw MotionMessages.notAPoint(line.about(), held);
    }
    this.about = isCentre(line.about()) ? null : where;
    this.point = new Space(fromSheet).anchor(held, line.about());
    this.slot = frame.reserve(new Type.Thing(ThingSort.BODY));
    this.columns = frame.size().numbers();
    for (RigidPlan.Column column : RigidPlan.Column.values()) {
      frame.reserve(type(column));
    }
  }

  /** The body of a motion, if it has one. */
  static Optional<RigidChecker> of(
      Scope scope, Frame frame, ExpressionChecker fromSheet, Statement.Motion motion) {
    MotionLine.Body body = null;
    MotionLine.Attitude attitude = null;
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Body next) {
        if (body != null) {
          throw MotionMessages.twice(line.span(), motion.name().name(), "bodies");
        }
        body = next;
      } else if (line instanceof MotionLine.Attitude next) {
        if (attitude != null) {
          throw MotionMessages.twice(line.span(), next.body().name(), "starts");
        }
        attitude = next;
      }
    }
    if (attitude != null && (body == null || !body.name().name().equals(attitude.body().name()))) {
      throw MotionMessages.noBody(attitude);
    }
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Load load && body == null) {
        throw MotionMessages.loadOnNothing(load);
      }
    }
    return body == null
        ? Optional.empty()
        : Optional.of(new RigidChecker(scope, frame, fromSheet, body, attitude));
  }

  String name() {
    return line.name().name();
  }

  /** Whether a point is written as the centre of mass of the body. */
  private boolean isCentre(Expr about) {
    return about instanceof Expr.Part part
        && part.name().name().equals("centre")
        && part.of() instanceof Expr.Name name
        && name.name().equals(name());
  }

  private Type type(RigidPlan.Column column) {
    Readings readings =
        column.kind().equals("number") ? Readings.NUMBER : Readings.of(Kind.named(column.kind()));
    if (column.width() == 1) {
      return new Type.Real(readings);
    }
    Reference reference =
        column == RigidPlan.Column.MOMENTUM && point != null ? new Reference(point, null) : null;
    return new Type.Vector(readings, reference, null);
  }

  // What its name means within the motion

  /** The body as it moves. */
  Typed moving(Expr.Name name) {
    isRead = true;
    return turned(name);
  }

  private Typed turned(Expr.Name name) {
    var type = new Type.Thing(ThingSort.BODY, new Anchor(name.name(), name));
    return ExpressionChecker.stored(name.span(), new Typed(source, type, null), slot);
  }

  /** What can be read of the body only while it moves. */
  Optional<Typed> part(Expr.Part part) {
    if (part.of() instanceof Expr.Name name && name.name().equals(name())) {
      for (RigidPlan.Column column : RigidPlan.Column.values()) {
        if (column.word().equals(part.name().name())) {
          var like = new Typed(source, type(column), null);
          return Optional.of(
              ExpressionChecker.stored(part.span(), like, columns + column.offset()));
        }
      }
    }
    return Optional.empty();
  }

  List<MotionPlan.Column> planColumns() {
    var all = new ArrayList<MotionPlan.Column>();
    for (RigidPlan.Column column : RigidPlan.Column.values()) {
      Type type = type(column);
      Readings readings =
          type instanceof Type.Vector vector ? vector.readings() : ((Type.Real) type).readings();
      Unit unit = Kinds.usualUnit(readings).orElse(Unit.ONE);
      all.add(
          new MotionPlan.Column(
              name() + "." + column.word(),
              new Meaning.Quantity(type, unit, false),
              Kinds.words(readings),
              columns + column.offset(),
              false));
    }
    return all;
  }

  // The plan

  RigidPlan plan(ExpressionChecker inMotion, List<MotionLine> lines) {
    Operation.Vector spin = spin();
    Operation.Real angle = null;
    Operation turnedAbout = null;
    MotionLine.Turn turn = attitude == null ? null : attitude.turn();
    if (turn != null) {
      Typed typed = fromSheet.number(turn.angle(), WrittenUnits.Reach.SIDE);
      if (!typed.operand().readings().canBe(ANGLE)) {
        throw MotionMessages.angleNeeded(turn.angle(), typed);
      }
      angle = (Operation.Real) typed.operation();
      turnedAbout = turnedAbout(turn.about());
    }
    List<RigidPlan.Load> loads =
        lines.stream()
            .filter(MotionLine.Load.class::isInstance)
            .map(load -> load(inMotion, (MotionLine.Load) load))
            .toList();
    return new RigidPlan(
        name(), source, slot, about, angle, turnedAbout, spin, loads, columns, isRead);
  }

  private Operation.@Nullable Vector spin() {
    Expr spin = attitude == null ? null : attitude.spin();
    if (spin == null) {
      return null;
    }
    var withTurned = new ExpressionChecker(scope, new Turned(), frame);
    Typed typed = withTurned.check(spin, WrittenUnits.Reach.SIDE);
    if (typed.operation() instanceof Operation.Vector vector
        && typed.operand().readings().canBe(ANGULAR_VELOCITY)) {
      return vector;
    }
    throw MotionMessages.spinNeeded(spin, typed);
  }

  private Operation turnedAbout(Expr about) {
    Typed typed = fromSheet.check(about);
    boolean isAxis =
        typed.operation() instanceof Operation.Thing thing && thing.sort() == ThingSort.AXIS;
    if (isAxis || typed.operation() instanceof Operation.Vector) {
      return typed.operation();
    }
    throw MotionMessages.axisNeeded(about);
  }

  private RigidPlan.Load load(ExpressionChecker inMotion, MotionLine.Load load) {
    boolean isWeight = isWeight(load.value());
    boolean readBefore = isRead;
    Typed typed = inMotion.check(load.value());
    if (isWeight) {
      isRead = readBefore;
    }
    if (typed.operation() instanceof Operation.Thing thing && thing.sort() == ThingSort.FORCE) {
      return new RigidPlan.Load(thing, isWeight);
    }
    if (typed.operation() instanceof Operation.Vector vector) {
      if (typed.operand().readings().canBe(TORQUE)) {
        return new RigidPlan.Load(vector, false);
      }
      if (typed.operand().readings().canBe(FORCE)) {
        throw MotionMessages.forceWithoutPoint(load.value());
      }
    }
    throw MotionMessages.notALoad(load.value());
  }

  /** Whether a load is the weight of the body, by the law of that name and with a constant g. */
  private boolean isWeight(Expr value) {
    return value instanceof Expr.Call call
        && call.function().name().equals("weight")
        && scope.meaning("weight").isEmpty()
        && !call.arguments().isEmpty()
        && call.arguments().get(0).value() instanceof Expr.Name name
        && name.name().equals(name())
        && call.arguments().stream()
            .skip(1)
            .allMatch(argument -> argument.value() instanceof Expr.Numeral);
  }

  /** The body as it is turned at the start, and besides it only the sheet. */
  private final class Turned implements Locals {
    @Override
    public Optional<Typed> value(Expr.Name name) {
      return name.name().equals(name()) ? Optional.of(turned(name)) : fromSheet.local(name);
    }

    @Override
    public Optional<Unit> unit(String name) {
      return Optional.empty();
    }
  }
}
