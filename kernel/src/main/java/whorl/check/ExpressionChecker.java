package whorl.check;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Interruption;
import whorl.diagnostic.Span;
import whorl.laws.Law;
import whorl.laws.Laws;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;
import whorl.units.Rational;
import whorl.units.Unit;
import whorl.units.kind.Readings;

/**
 * Turns an expression into a checked one. The first mistake ends the check of its statement with a
 * {@link CheckFailure}; names that have no meaning were found before.
 */
final class ExpressionChecker implements Expr.Cases<Typed> {
  private final Scope scope;
  private final List<Meaning.Parameter> parameters;
  private final Locals locals;
  private final Frame frame;
  private final boolean direct;
  private final List<Diagnostic> remarks = new ArrayList<>();
  private final List<Operation.Truth> choices = new ArrayList<>();

  /**
   * A checker for a formula of the sheet or the body of a function.
   *
   * @param parameters the function's parameters, which hide names of the sheet; their slots are the
   *     first of the frame
   */
  ExpressionChecker(Scope scope, List<Meaning.Parameter> parameters, Frame frame) {
    this(scope, parameters, Locals.NONE, frame, true);
  }

  private ExpressionChecker(
      Scope scope, List<Meaning.Parameter> parameters, Locals locals, Frame frame, boolean direct) {
    this.scope = scope;
    this.parameters = parameters;
    this.locals = locals;
    this.frame = frame;
    this.direct = direct;
  }

  /** A checker over the same frame for what another statement writes and this one rests on. */
  ExpressionChecker outside() {
    return new ExpressionChecker(scope, List.of(), locals, frame, false);
  }

  /** The folder of the note. */
  Path folder() {
    return scope.folder();
  }

  /** Whether an expression names a parameter or a state, so that its value is not always one. */
  boolean namesParameter(Expr expr) {
    var found = new ArrayList<Expr>();
    Expressions.walk(
        expr,
        part -> {
          if (part instanceof Expr.Name name
              && local(name).filter(typed -> !(typed.type() instanceof Type.Thing)).isPresent()) {
            found.add(part);
          }
        });
    return !found.isEmpty();
  }

  /** A checker for a part of a statement in which further names have a meaning of their own. */
  ExpressionChecker(Scope scope, Locals locals, Frame frame) {
    this(scope, List.of(), locals, frame, true);
  }

  /** A checker for a part of the formula that has a frame of its own. */
  ExpressionChecker inside(Frame inner, Locals captured) {
    return new ExpressionChecker(scope, List.of(), captured, inner, direct);
  }

  /** What has been read so far, and what looked odd. */
  Basis basis() {
    return new Basis(frame.inputs(), frame.courses(), frame.size(), remarks);
  }

  /** The motion whose courses are read, or null. */
  @Nullable String over() {
    return frame.over();
  }

  /** The conditions by which what was checked so far chooses. */
  List<Operation.Truth> choices() {
    return choices;
  }

  /** Notes something that looks odd, though it is sound. */
  void remark(Diagnostic remark) {
    remarks.add(remark);
  }

  Typed check(Expr expr) {
    Interruption.poll();
    return expr.match(this);
  }

  /**
   * Checks an expression whose unit, where it is written out, may serve any of its kinds, because
   * what stands beside it decides: a declared unit, a parameter, the other side of a comparison.
   */
  Typed check(Expr expr, WrittenUnits.Reach reach) {
    if (expr instanceof Expr.Numeral numeral && numeral.unit() != null) {
      return numeral(numeral, numeral.unit(), reach);
    } else if (expr instanceof Expr.InUnit inUnit) {
      return inUnit(inUnit, reach);
    } else if (expr instanceof Expr.Negation negation) {
      return negated(negation.span(), check(negation.operand(), reach));
    }
    return check(expr);
  }

  /** What shows a value along the axes of the frame that it is seen from. */
  Operation seen(Typed typed) {
    return new Space(this).seen(typed).operation();
  }

  /** What works out the point or axis that a quantity is about; null where it is about none. */
  Operation.@Nullable Thing about(Typed typed) {
    Reference reference = typed.type().about();
    return reference == null
        ? null
        : (Operation.Thing) new Space(this).at(reference.about()).operation();
  }

  /** Checks an expression that must be a number. */
  Typed number(Expr expr, WrittenUnits.Reach reach) {
    Typed typed = check(expr, reach);
    return switch (form(typed)) {
      case REAL -> typed;
      case VECTOR -> throw CheckMessages.vectorForNumber(expr);
      case TRUTH -> throw CheckMessages.conditionForNumber(expr);
      case THING -> throw SpaceMessages.thingForNumber(expr, typed.type());
    };
  }

  /** Checks an expression that must be a condition. */
  Operation.Truth condition(Expr expr) {
    Typed typed = check(expr);
    if (typed.operation() instanceof Operation.Truth truth) {
      return truth;
    }
    throw CheckMessages.notACondition(expr, typed);
  }

  private enum Form {
    REAL,
    VECTOR,
    TRUTH,
    THING
  }

  private static Form form(Typed typed) {
    if (typed.type() instanceof Type.Real) {
      return Form.REAL;
    } else if (typed.type() instanceof Type.Vector) {
      return Form.VECTOR;
    }
    return typed.type() instanceof Type.Truth ? Form.TRUTH : Form.THING;
  }

  private static Operation.Real real(Typed typed) {
    return (Operation.Real) typed.operation();
  }

  private static Operation.Vector vector(Typed typed) {
    return (Operation.Vector) typed.operation();
  }

  @Override
  public Typed numeral(Expr.Numeral numeral) {
    if (numeral.unit() != null) {
      return numeral(numeral, numeral.unit(), WrittenUnits.Reach.USUAL);
    }
    var constant = new Operation.Constant(numeral.span(), numeral.value());
    return new Typed(constant, new Type.Real(Readings.NUMBER), exact(numeral));
  }

  /** The exact value of a bare number, where it is of a size that rules of kinds can ask for. */
  private static @Nullable Rational exact(Expr.Numeral numeral) {
    double size = Math.abs(numeral.value());
    boolean modest = size == 0 || (size > 1e-30 && size < 1e30);
    return modest ? Rational.parse(numeral.digits()) : null;
  }

  private Typed numeral(Expr.Numeral numeral, Expr.UnitAt at, WrittenUnits.Reach reach) {
    Unit unit = WrittenUnits.resolve(at.text(), at.span());
    double si = unit.toSi(numeral.value());
    if (Double.isInfinite(si)) {
      throw CheckMessages.tooLarge(numeral.span());
    }
    return Typed.of(new Operation.Constant(numeral.span(), si), WrittenUnits.readings(unit, reach));
  }

  @Override
  public Typed inUnit(Expr.InUnit inUnit) {
    return inUnit(inUnit, WrittenUnits.Reach.USUAL);
  }

  private Typed inUnit(Expr.InUnit inUnit, WrittenUnits.Reach reach) {
    Unit unit = WrittenUnits.resolve(inUnit.unit().text(), inUnit.unit().span());
    Typed group = check(inUnit.group());
    if (form(group) == Form.TRUTH) {
      throw CheckMessages.conditionForNumber(inUnit.group());
    } else if (form(group) == Form.THING) {
      throw SpaceMessages.thingForNumber(inUnit.group(), group.type());
    }
    Kinds.plainNumberBeforeUnit(group, inUnit);
    return inUnit(group, unit, WrittenUnits.readings(unit, reach), inUnit.span());
  }

  /** A bare number or vector taken in a unit, with its factor folded in. */
  static Typed inUnit(Typed bare, Unit unit, Readings readings, Span span) {
    double factor = unit.factor().doubleValue();
    if (bare.operation() instanceof Operation.Vector vector) {
      var scale = new Operation.Factor(false, new Operation.Constant(span, factor));
      return Typed.of(new Operation.Scaled(span, vector, List.of(scale)), readings);
    }
    Operation.Real number = real(bare);
    if (number instanceof Operation.Constant constant) {
      return Typed.of(new Operation.Constant(span, unit.toSi(constant.value())), readings);
    }
    Operation.Real scaled =
        new Operation.Product(
            span,
            List.of(
                new Operation.Factor(false, number),
                new Operation.Factor(false, new Operation.Constant(span, factor))));
    if (unit.isReading()) {
      var zero = new Operation.Constant(span, unit.toSi(0));
      scaled =
          new Operation.Sum(
              span, List.of(new Operation.Term(false, scaled), new Operation.Term(false, zero)));
    }
    return Typed.of(scaled, readings);
  }

  @Override
  public Typed name(Expr.Name name) {
    Optional<Typed> local = local(name);
    if (local.isPresent()) {
      return local.get();
    }
    Optional<ConstantAtHand> constant = ConstantAtHand.named(name.name());
    if (constant.isPresent()) {
      return Typed.of(
          new Operation.Constant(name.span(), constant.get().value()), constant.get().readings());
    }
    Optional<Meaning> meaning = scope.meaning(name.name());
    if (meaning.isEmpty()) {
      throw Vocabulary.isFunction(name.name())
          ? CheckMessages.functionWithoutArguments(name)
          : new IllegalStateException("no meaning for " + name.name());
    }
    if (meaning.get() instanceof Meaning.Quantity quantity) {
      Meaning.Input input = frame.input(name.name(), quantity.type(), direct);
      if (quantity.type() instanceof Type.Course course) {
        return courses().name(name, input, course);
      }
      return new Typed(read(name.span(), input), named(quantity.type(), name), null);
    }
    if (meaning.get() instanceof Meaning.Motion motion) {
      throw MotionMessages.motionForNumber(name, motion);
    }
    throw CheckMessages.functionWithoutArguments(name);
  }

  /** What a name means here, whatever it means in the sheet: a parameter, a state. */
  Optional<Typed> local(Expr.Name name) {
    int slot = parameter(name.name());
    return slot >= 0
        ? Optional.of(
            Typed.of(new Operation.Input(name.span(), slot), parameters.get(slot).readings()))
        : locals.value(name);
  }

  boolean isLocal(Expr.Name name) {
    return local(name).isPresent();
  }

  /** The unit that the author chose for a local name, if any. */
  Optional<Unit> localUnit(String name) {
    int slot = parameter(name);
    return slot >= 0 ? Optional.of(parameters.get(slot).unit()) : locals.unit(name);
  }

  private Courses courses() {
    return new Courses(scope, this, frame);
  }

  /** One value of a course. */
  static Typed sample(Span span, CourseInput course) {
    return new Typed(read(span, course.sample(), course.slot()), course.sample(), null);
  }

  /** A value in a slot, of the type of another. */
  static Typed stored(Span span, Typed like, int slot) {
    return new Typed(read(span, like.type(), slot), like.type(), null);
  }

  /** The type of what a name stands for: a thing is known by its name from here on. */
  private static Type named(Type type, Expr.Name name) {
    return type instanceof Type.Thing thing && thing.identity() == null
        ? new Type.Thing(thing.sort(), new Anchor(name.name(), name))
        : type;
  }

  /** Position of a parameter, or −1 where a name is none. */
  private int parameter(String name) {
    for (int i = 0; i < parameters.size(); i++) {
      if (parameters.get(i).name().equals(name)) {
        return i;
      }
    }
    return -1;
  }

  /** The unit in which the author wrote, or declared, the value of an expression, if any. */
  Optional<Unit> writtenUnit(Expr expr) {
    if (expr instanceof Expr.Numeral numeral) {
      return resolved(numeral.unit());
    } else if (expr instanceof Expr.InUnit inUnit) {
      return resolved(inUnit.unit());
    } else if (expr instanceof Expr.Negation negation) {
      return writtenUnit(negation.operand());
    } else if (expr instanceof Expr.Magnitude magnitude) {
      return writtenUnit(magnitude.operand());
    } else if (expr instanceof Expr.Part part) {
      return courses().unit(part).or(() -> writtenUnit(part.of()));
    } else if (expr instanceof Expr.Name name) {
      return isLocal(name)
          ? localUnit(name.name())
          : scope.meaning(name.name()).flatMap(ExpressionChecker::chosenUnit);
    } else if (expr instanceof Expr.Call call) {
      Optional<CourseFunction> function = courseFunction(call);
      if (function.isPresent() && !call.arguments().isEmpty()) {
        return function.get() == CourseFunction.WHEN
            ? Optional.empty()
            : writtenUnit(call.arguments().get(0).value());
      }
      return scope.meaning(call.function().name()).flatMap(ExpressionChecker::chosenUnit);
    }
    return Optional.empty();
  }

  private static Optional<Unit> resolved(Expr.@Nullable UnitAt at) {
    return Optional.ofNullable(at).map(place -> WrittenUnits.resolve(place.text(), place.span()));
  }

  private static Optional<Unit> chosenUnit(Meaning meaning) {
    if (meaning instanceof Meaning.Quantity quantity) {
      return quantity.chosen() ? Optional.of(quantity.unit()) : Optional.empty();
    }
    return meaning instanceof Meaning.Function function && function.chosen()
        ? Optional.of(function.unit())
        : Optional.empty();
  }

  /** Reads what a name of the sheet stands for. */
  static Operation read(Span span, Meaning.Input input) {
    return read(span, input.type(), input.slot());
  }

  private static Operation read(Span span, Type type, int slot) {
    if (type instanceof Type.Real) {
      return new Operation.Input(span, slot);
    }
    if (type instanceof Type.Vector) {
      return new Operation.VectorInput(span, slot);
    } else if (type instanceof Type.Thing thing) {
      return new Operation.ThingInput(span, thing.sort(), slot);
    } else if (type instanceof Type.Course) {
      return new Operation.ThingInput(span, ThingSort.COURSE, slot);
    }
    return type instanceof Type.Tensor
        ? new Operation.ThingInput(span, ThingSort.INERTIA, slot)
        : new Operation.TruthInput(span, slot);
  }

  @Override
  public Typed part(Expr.Part part) {
    Optional<Typed> column = locals.part(part).or(() -> courses().part(part));
    if (column.isPresent()) {
      return column.get();
    }
    Typed whole = check(part.of());
    if (form(whole) == Form.THING) {
      return new Space(this).part(part, whole);
    }
    if (!(whole.type() instanceof Type.Vector type)) {
      throw CheckMessages.noParts(part, whole);
    }
    Operation.Axis axis =
        switch (part.name().name()) {
          case "x" -> Operation.Axis.X;
          case "y" -> Operation.Axis.Y;
          case "z" -> Operation.Axis.Z;
          default -> throw CheckMessages.noParts(part, whole);
        };
    Typed seen = new Space(this).seen(whole);
    return Typed.of(new Operation.Part(part.span(), vector(seen), axis), type.readings())
        .about(ofUnknown(whole));
  }

  @Override
  public Typed rate(Expr.Rate rate) {
    Typed of = check(rate.of());
    if (of.type() instanceof Type.Real || of.type() instanceof Type.Vector) {
      return Kinds.rate(rate, of);
    }
    throw MotionMessages.rateOf(rate, of);
  }

  @Override
  public Typed inFrame(Expr.InFrame inFrame) {
    return new Space(this).inFrame(inFrame);
  }

  @Override
  public Typed tolerance(Expr.Tolerance tolerance) {
    throw unavailable(tolerance);
  }

  @Override
  public Typed text(Expr.Text text) {
    throw CheckMessages.textHasNoUse(text);
  }

  private static IllegalStateException unavailable(Expr expr) {
    return new IllegalStateException("answered by Availability before the check: " + expr.span());
  }

  @Override
  public Typed vector(Expr.Vector vector) {
    var reach = WrittenUnits.Reach.TERM;
    Typed x = number(vector.x(), reach);
    Typed y = number(vector.y(), reach);
    Typed z = number(vector.z(), reach);
    Typed first = Kinds.meet(Kinds.Together.PARTS, x, vector.x(), y, vector.y());
    Typed all = Kinds.meet(Kinds.Together.PARTS, first, vector.x(), z, vector.z());
    return Typed.of(
            new Operation.Parts(vector.span(), real(x), real(y), real(z)), all.operand().readings())
        .about(all.type().about());
  }

  @Override
  public Typed negation(Expr.Negation negation) {
    return negated(negation.span(), check(negation.operand()));
  }

  private static Typed negated(Span span, Typed operand) {
    Rational literal = operand.literal() == null ? null : operand.literal().negate();
    return switch (form(operand)) {
      case REAL ->
          new Typed(
                  new Operation.Negation(span, real(operand)),
                  operand.type(),
                  literal,
                  operand.factors())
              .about(ofUnknown(operand));
      case VECTOR ->
          new Typed(
                  new Operation.VectorNegation(span, vector(operand)),
                  operand.type(),
                  null,
                  operand.factors())
              .about(ofUnknown(operand));
      case TRUTH -> throw CheckMessages.conditionForNumber(span);
      case THING -> throw SpaceMessages.thingForNumber(span, operand.type());
    };
  }

  private static @Nullable Reference ofUnknown(Typed typed) {
    Reference reference = typed.type().about();
    return reference == null ? null : reference.ofUnknown();
  }

  @Override
  public Typed sum(Expr.Sum sum) {
    return new SumChecker(this, sum).typed();
  }

  @Override
  public Typed product(Expr.Product product) {
    return new ProductChecker(this, product).typed();
  }

  @Override
  public Typed power(Expr.Power power) {
    Typed base = number(power.base(), WrittenUnits.Reach.USUAL);
    Typed exponent = number(power.exponent(), WrittenUnits.Reach.USUAL);
    if (exponent.literal() != null) {
      var operation =
          new Operation.Power(power.span(), real(base), exponent.literal().doubleValue());
      return Kinds.power(power, base, exponent.literal(), operation);
    }
    return Kinds.variablePower(
        power,
        base,
        exponent,
        new Operation.VariablePower(power.span(), real(base), real(exponent)));
  }

  @Override
  public Typed magnitude(Expr.Magnitude magnitude) {
    Typed operand = check(magnitude.operand());
    return magnitude(magnitude.span(), operand, magnitude.operand());
  }

  private static Typed magnitude(Span span, Typed operand, Expr source) {
    return switch (form(operand)) {
      case REAL ->
          new Typed(
              new Operation.Unary(span, Operation.UnaryFunction.ABS, real(operand)),
              operand.type(),
              null);
      case VECTOR ->
          Typed.of(new Operation.Magnitude(span, vector(operand)), operand.operand().readings())
              .about(ofUnknown(operand));
      case TRUTH -> throw CheckMessages.conditionForNumber(source);
      case THING -> throw SpaceMessages.thingForNumber(source, operand.type());
    };
  }

  @Override
  public Typed comparison(Expr.Comparison comparison) {
    Sides sides = compared(comparison);
    return Typed.of(sides.truth());
  }

  /** The two sides of a comparison, each as a number of the kind in which they are compared. */
  record Sides(Typed left, Typed right, Operation.Comparison truth) {}

  Sides compared(Expr.Comparison comparison) {
    Typed left = number(comparison.left(), WrittenUnits.Reach.SIDE);
    Typed right = number(comparison.right(), WrittenUnits.Reach.SIDE);
    Typed met =
        Kinds.meet(Kinds.Together.COMPARED, left, comparison.left(), right, comparison.right());
    Operation.Relation relation =
        switch (comparison.relation()) {
          case LESS -> Operation.Relation.LESS;
          case AT_MOST -> Operation.Relation.AT_MOST;
          case MORE -> Operation.Relation.MORE;
          case AT_LEAST -> Operation.Relation.AT_LEAST;
        };
    return new Sides(
        left.read(met.operand()),
        right.read(met.operand()),
        new Operation.Comparison(comparison.span(), real(left), relation, real(right)));
  }

  @Override
  public Typed allOf(Expr.AllOf allOf) {
    return Typed.of(
        new Operation.AllOf(
            allOf.span(), allOf.conditions().stream().map(this::condition).toList()));
  }

  @Override
  public Typed anyOf(Expr.AnyOf anyOf) {
    return Typed.of(
        new Operation.AnyOf(
            anyOf.span(), anyOf.conditions().stream().map(this::condition).toList()));
  }

  @Override
  public Typed choice(Expr.Choice choice) {
    Operation.Truth condition = condition(choice.condition());
    choices.add(condition);
    return new ChoiceChecker(this, choice).typed(condition);
  }

  @Override
  public Typed truth(Expr.Truth truth) {
    return Typed.of(new Operation.TruthConstant(truth.span(), truth.value()));
  }

  @Override
  public Typed call(Expr.Call call) {
    String name = call.function().name();
    if (isLocal(call.function())) {
      throw CheckMessages.notAFunction(call);
    }
    Optional<Meaning> meaning = scope.meaning(name);
    if (meaning.isPresent()) {
      if (meaning.get() instanceof Meaning.Function function) {
        return call(call, function);
      }
      throw CheckMessages.notAFunction(call);
    }
    List<Law> laws = Laws.named(name);
    if (!laws.isEmpty()) {
      return new LawCall(this, call, laws).typed();
    }
    Optional<CourseFunction> ofCourse = CourseFunction.named(name);
    if (ofCourse.isPresent()) {
      return courses().call(call, ofCourse.get());
    }
    FunctionAtHand atHand =
        FunctionAtHand.named(name)
            .orElseThrow(() -> new IllegalStateException("no meaning for " + name));
    return new CallAtHand(this, call, atHand).typed();
  }

  /** The function of courses that a call means, if the sheet does not hide it. */
  private Optional<CourseFunction> courseFunction(Expr.Call call) {
    return scope.meaning(call.function().name()).isPresent()
        ? Optional.empty()
        : CourseFunction.named(call.function().name());
  }

  private Typed call(Expr.Call call, Meaning.Function function) {
    List<Expr> values = Arguments.inOrder(call, function);
    var arguments = new ArrayList<Operation>();
    for (int i = 0; i < values.size(); i++) {
      Meaning.Parameter parameter = function.parameters().get(i);
      Expr value = values.get(i);
      Typed argument = number(value, WrittenUnits.Reach.DECLARED);
      arguments.add(Kinds.argument(argument, value, parameter, function).operation());
    }
    for (Meaning.Input capture : function.captures()) {
      Meaning.Input input = frame.input(capture.name(), capture.type(), false);
      arguments.add(read(call.span(), input));
    }
    Span span = call.span();
    return new Typed(
        called(span, function.result(), function.body(), arguments), function.result(), null);
  }

  private static Operation called(
      Span span, Type result, Operation.Body body, List<Operation> arguments) {
    if (result instanceof Type.Real) {
      return new Operation.Call(span, body, arguments);
    } else if (result instanceof Type.Vector) {
      return new Operation.VectorCall(span, body, arguments);
    }
    return body.body() instanceof Operation.Thing thing
        ? new Operation.ThingCall(span, thing.sort(), body, arguments)
        : new Operation.TruthCall(span, body, arguments);
  }
}
