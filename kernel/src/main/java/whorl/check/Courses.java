package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.units.Unit;
import whorl.units.kind.Kind;
import whorl.units.kind.Readings;

/**
 * Checks what is read from motions: a course stands for one value of it at a time, so that a
 * formula that reads it is a formula of numbers like any other, and is itself a course; a function
 * such as {@code peak} makes one value of such a formula.
 */
final class Courses {
  /** The part of every motion that tells how long it lasted. */
  static final String DURATION = "duration";

  private static final Readings TIME = Readings.of(Kind.named("time"));

  private final Scope scope;
  private final ExpressionChecker checker;
  private final Frame frame;

  Courses(Scope scope, ExpressionChecker checker, Frame frame) {
    this.scope = scope;
    this.checker = checker;
    this.frame = frame;
  }

  /** A part that is a column of a motion, or its duration; empty for any other part. */
  Optional<Typed> part(Expr.Part part) {
    Meaning.Motion motion = motion(part);
    if (motion == null) {
      return Optional.empty();
    }
    String column = path(part);
    if (column.equals(DURATION)) {
      return Optional.of(duration(part, motion));
    }
    Meaning.Quantity quantity = motion.columns().get(column);
    if (quantity != null) {
      Meaning.Input source = source(motion, true);
      var course = new Type.Course(quantity.type(), motion.name());
      return Optional.of(sample(part, source, column, course));
    }
    if (part.of() instanceof Expr.Part inner && motion.columns().containsKey(path(inner))) {
      return Optional.empty();
    }
    throw MotionMessages.noColumn(part, motion);
  }

  /** The unit that the author chose for a column. */
  Optional<Unit> unit(Expr.Part part) {
    Meaning.Motion motion = motion(part);
    return Optional.ofNullable(motion)
        .map(known -> known.columns().get(path(part)))
        .filter(Meaning.Quantity::chosen)
        .map(Meaning.Quantity::unit);
  }

  /** A name that stands for a course. */
  Typed name(Expr.Name name, Meaning.Input source, Type.Course course) {
    return sample(name, source, "", course);
  }

  private Meaning.Input source(Meaning.Motion motion, boolean direct) {
    var type = new Type.Thing(ThingSort.MOTION);
    return frame.input(motion.name(), type, direct);
  }

  private Typed sample(Expr text, Meaning.Input source, String column, Type.Course type) {
    String over = frame.over();
    if (over != null && !over.equals(type.over())) {
      throw MotionMessages.twoMotions(text.span(), over, type.over());
    }
    return ExpressionChecker.sample(text.span(), frame.course(source, column, type));
  }

  private Meaning.@Nullable Motion motion(Expr.Part part) {
    Expr root = part.of();
    while (root instanceof Expr.Part inner) {
      root = inner.of();
    }
    return root instanceof Expr.Name name
            && !checker.isLocal(name)
            && scope.meaning(name.name()).orElse(null) instanceof Meaning.Motion motion
        ? motion
        : null;
  }

  /** What stands behind the name of the motion. */
  private static String path(Expr.Part part) {
    return part.of() instanceof Expr.Part inner
        ? path(inner) + "." + part.name().name()
        : part.name().name();
  }

  private Typed duration(Expr.Part part, Meaning.Motion motion) {
    var inner = new Frame(0);
    Meaning.Input source = inner.input(motion.name(), new Type.Thing(ThingSort.MOTION), true);
    var course = new Type.Course(new Type.Real(TIME), motion.name());
    Typed time = ExpressionChecker.sample(part.span(), inner.course(source, DURATION, course));
    Operation.Sampled sampled = sampled(part.span(), time, inner, List.of());
    return Typed.of(
        new Operation.Reduced(
            part.span(), Operation.Reducer.LAST, sampled, null, MotionMessages.SECOND),
        TIME);
  }

  /** A call of a function that makes one value of a course. */
  Typed call(Expr.Call call, CourseFunction function) {
    List<Expr> values = arguments(call, function);
    Expr course = values.get(0);
    var inner = new Frame(0);
    var captured = new Captured(checker, inner);
    ExpressionChecker sampling = checker.inside(inner, captured);
    Typed value = sampling.check(course);
    String over = inner.over();
    if (over == null) {
      throw MotionMessages.courseNeeded(call, function, course);
    }
    if (!(value.type() instanceof Type.Real
        || (value.type() instanceof Type.Vector && function.takesVectors()))) {
      throw MotionMessages.courseOfNumbers(call, function, course, value.type());
    }
    Unit unit =
        sampling
            .writtenUnit(course)
            .or(() -> Kinds.usualUnit(value.operand().readings()))
            .orElseThrow(() -> CheckMessages.noUnit(course.span(), value.operand().readings()));
    Operation.Sampled sampled = sampled(course.span(), value, inner, captured.list());
    Operation.Real argument =
        values.size() == 1 ? null : argument(function, value, course, values.get(1));
    if (value.operation() instanceof Operation.Vector) {
      return Typed.of(
          new Operation.VectorReduced(call.span(), function.reducer(), sampled, argument, unit),
          value.operand().readings());
    }
    return Typed.of(
        new Operation.Reduced(call.span(), function.reducer(), sampled, argument, unit),
        function == CourseFunction.WHEN ? TIME : value.operand().readings());
  }

  private static List<Expr> arguments(Expr.Call call, CourseFunction function) {
    for (Expr.Argument argument : call.arguments()) {
      if (argument.name() != null) {
        throw MotionMessages.namedArgument(argument, function);
      }
    }
    if (call.arguments().size() != function.parameters().size()) {
      throw MotionMessages.argumentCount(call, function);
    }
    return call.arguments().stream().map(Expr.Argument::value).toList();
  }

  private Operation.Real argument(
      CourseFunction function, Typed value, Expr course, Expr argument) {
    Typed typed = checker.number(argument, WrittenUnits.Reach.SIDE);
    if (function == CourseFunction.AT) {
      if (!typed.operand().readings().canBe(Kind.named("time"))) {
        throw MotionMessages.timeNeeded("at", argument, typed);
      }
    } else {
      Kinds.meet(Kinds.Together.COMPARED, value, course, typed, argument);
    }
    return (Operation.Real) typed.operation();
  }

  /** What a course is worked out from, where the formula around it reads the sheet for it. */
  private Operation.Sampled sampled(
      Span span, Typed value, Frame inner, List<Operation.Capture> locals) {
    var captures = new ArrayList<>(locals);
    for (Meaning.Input input : inner.inputs()) {
      Meaning.Input outer = frame.input(input.name(), input.type(), input.direct());
      captures.add(new Operation.Capture(ExpressionChecker.read(span, outer), input.slot()));
    }
    var body = new Operation.Body("", value.operation(), inner.size());
    return new Operation.Sampled(body, captures, inner.courses());
  }

  /** The local names of the formula around a course, taken over into its frame. */
  private static final class Captured implements Locals {
    private final ExpressionChecker around;
    private final Frame inner;
    private final List<Operation.Capture> captures = new ArrayList<>();

    Captured(ExpressionChecker around, Frame inner) {
      this.around = around;
      this.inner = inner;
    }

    List<Operation.Capture> list() {
      return captures;
    }

    @Override
    public Optional<Typed> value(Expr.Name name) {
      return around
          .local(name)
          .map(
              typed -> {
                int slot = inner.reserve(typed.type());
                captures.add(new Operation.Capture(typed.operation(), slot));
                return ExpressionChecker.stored(name.span(), typed, slot);
              });
    }

    @Override
    public Optional<Unit> unit(String name) {
      return around.localUnit(name);
    }
  }
}
