package whorl.check;

import java.nio.file.Path;
import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.laws.Rule;
import whorl.laws.ThingSort;
import whorl.units.Unit;

/**
 * A checked tree: operations on plain numbers in coherent SI units, every conversion factor folded
 * in. Operations come in four characters that cannot be mixed up: {@link Real}, {@link Vector},
 * {@link Truth} and {@link Thing}. Inputs are read from a frame by slot: of its doubles a real
 * takes one, a vector three in the order x, y, z, a truth value one (1 for true, 0 for false); a
 * thing in space takes one of the frame's slots for things.
 *
 * <p>Every node keeps the span of the expression that it came from, in the text of its definition,
 * so that a numeric failure can name the part at fault.
 */
public sealed interface Operation {
  /** The expression it came from. */
  Span span();

  /** An operation with a scalar result. */
  sealed interface Real extends Operation {
    /** Answers one question for every form of scalar operation. */
    <R> R match(RealCases<R> cases);
  }

  /** An operation with a vector result. */
  sealed interface Vector extends Operation {
    /** Answers one question for every form of vector operation. */
    <R> R match(VectorCases<R> cases);
  }

  /** A condition. */
  sealed interface Truth extends Operation {
    /** Answers one question for every form of condition. */
    <R> R match(TruthCases<R> cases);
  }

  /** An operation that gives a thing in space. */
  sealed interface Thing extends Operation {
    /** What sort of thing it gives. */
    ThingSort sort();

    /** Answers one question for every form of operation that gives a thing. */
    <R> R match(ThingCases<R> cases);
  }

  /**
   * The forms of scalar operation.
   *
   * @param <R> type of the answer
   */
  interface RealCases<R> {
    R constant(Constant constant);

    R input(Input input);

    R negation(Negation negation);

    R sum(Sum sum);

    R product(Product product);

    R power(Power power);

    R variablePower(VariablePower power);

    R unary(Unary unary);

    R binary(Binary binary);

    R choice(Choice choice);

    R part(Part part);

    R magnitude(Magnitude magnitude);

    R dot(Dot dot);

    R angleBetween(AngleBetween angle);

    R call(Call call);

    R routineCall(RoutineCall call);

    R use(RealUse use);

    R reduced(Reduced reduced);
  }

  /**
   * The forms of vector operation.
   *
   * @param <R> type of the answer
   */
  interface VectorCases<R> {
    R parts(Parts parts);

    R input(VectorInput input);

    R negation(VectorNegation negation);

    R sum(VectorSum sum);

    R scaled(Scaled scaled);

    R cross(Cross cross);

    R direction(Direction direction);

    R choice(VectorChoice choice);

    R call(VectorCall call);

    R use(VectorUse use);

    R reduced(VectorReduced reduced);
  }

  /**
   * The forms of condition.
   *
   * @param <R> type of the answer
   */
  interface TruthCases<R> {
    R constant(TruthConstant constant);

    R input(TruthInput input);

    R comparison(Comparison comparison);

    R allOf(AllOf allOf);

    R anyOf(AnyOf anyOf);

    R choice(TruthChoice choice);

    R call(TruthCall call);
  }

  /**
   * The forms of operation that give a thing in space.
   *
   * @param <R> type of the answer
   */
  interface ThingCases<R> {
    R input(ThingInput input);

    R choice(ThingChoice choice);

    R call(ThingCall call);

    R use(ThingUse use);
  }

  /** A number. */
  record Constant(Span span, double value) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.constant(this);
    }
  }

  /** The number in a slot of the frame. */
  record Input(Span span, int slot) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.input(this);
    }
  }

  /** {@code -x}. */
  record Negation(Span span, Real operand) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.negation(this);
    }
  }

  /** A term of a sum. */
  record Term(boolean subtracted, Real value) {}

  /** Terms added or subtracted from left to right. */
  record Sum(Span span, List<Term> terms) implements Real {
    /** Copies the terms. */
    public Sum {
      terms = List.copyOf(terms);
    }

    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.sum(this);
    }
  }

  /** A factor of a product; a divisor divides what stands to its left. */
  record Factor(boolean divisor, Real value) {}

  /** Factors multiplied or divided from left to right. */
  record Product(Span span, List<Factor> factors) implements Real {
    /** Copies the factors. */
    public Product {
      factors = List.copyOf(factors);
    }

    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.product(this);
    }
  }

  /** A constant power. */
  record Power(Span span, Real base, double exponent) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.power(this);
    }
  }

  /** A power whose exponent is worked out. */
  record VariablePower(Span span, Real base, Real exponent) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.variablePower(this);
    }
  }

  /** A function at hand of one number. */
  record Unary(Span span, UnaryFunction function, Real operand) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.unary(this);
    }
  }

  /** Functions at hand of one number. Angles are in radians. */
  enum UnaryFunction {
    SQRT,
    CBRT,
    EXP,
    LN,
    LOG10,
    SIN,
    COS,
    TAN,
    ASIN,
    ACOS,
    ATAN,
    ABS,
    FLOOR,
    CEIL,
    ROUND
  }

  /** A function at hand of two numbers. */
  record Binary(Span span, BinaryFunction function, Real first, Real second) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.binary(this);
    }
  }

  /** Functions at hand of two numbers. */
  enum BinaryFunction {
    ATAN2,
    MIN,
    MAX
  }

  /** One of two numbers; the other is not worked out. */
  record Choice(Span span, Truth condition, Real then, Real otherwise) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.choice(this);
    }
  }

  /** A part of a vector. */
  enum Axis {
    X,
    Y,
    Z
  }

  /** The part of a vector along one axis. */
  record Part(Span span, Vector vector, Axis axis) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.part(this);
    }
  }

  /** The magnitude of a vector. */
  record Magnitude(Span span, Vector vector) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.magnitude(this);
    }
  }

  /** The dot product of two vectors. */
  record Dot(Span span, Vector first, Vector second) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.dot(this);
    }
  }

  /** The angle between two vectors, in radians, from 0 to π. */
  record AngleBetween(Span span, Vector first, Vector second) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.angleBetween(this);
    }
  }

  /**
   * A checked function body with the layout of its frame: its parameters first, in order, then what
   * it reads from the sheet.
   *
   * @param name as in the sheet
   * @param body what it works out
   * @param frame the room that it takes
   */
  record Body(String name, Operation body, FrameSize frame) {
    /** A body that reads no things in space. */
    public Body(String name, Operation body, int numbers) {
      this(name, body, new FrameSize(numbers, 0));
    }
  }

  /**
   * Arguments in order of the slots of the callee's frame: those of the parameters, then those that
   * hand on what the function reads from the sheet.
   */
  record Call(Span span, Body callee, List<Operation> arguments) implements Real {
    /** Copies the arguments. */
    public Call {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.call(this);
    }
  }

  /**
   * A call of a routine, which is worked out outside the sheet.
   *
   * @param routine takes and gives coherent SI units, and leaves its arguments as they are
   */
  record RoutineCall(Span span, Routine routine, List<Real> arguments) implements Real {
    /** Copies the arguments. */
    public RoutineCall {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.routineCall(this);
    }
  }

  /** What becomes of a course. */
  enum Reducer {
    FIRST,
    LAST,
    PEAK,
    LEAST,
    MEAN,
    RMS,
    /** The value at a time. */
    AT,
    /** The time at which a value is first reached. */
    WHEN
  }

  /**
   * What a course is worked out from: one value of it at a time, in a frame of its own.
   *
   * @param body what is worked out for every instant
   * @param captures what stays the same during the motion
   * @param courses what has a value for every instant
   */
  record Sampled(Body body, List<Capture> captures, List<CourseInput> courses) {
    /** Copies the lists. */
    public Sampled {
      captures = List.copyOf(captures);
      courses = List.copyOf(courses);
    }
  }

  /**
   * A value of the frame around a course that its own frame takes over.
   *
   * @param slot first slot of it in the frame of the course
   */
  record Capture(Operation value, int slot) {}

  /**
   * What a course comes to as a number.
   *
   * @param argument the time for {@link Reducer#AT}, the value for {@link Reducer#WHEN}; else null
   * @param unit in which a message shows values of the course
   */
  record Reduced(Span span, Reducer reducer, Sampled course, @Nullable Real argument, Unit unit)
      implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.reduced(this);
    }
  }

  /** What a course of vectors comes to: the first, the last, or the one at a time. */
  record VectorReduced(
      Span span, Reducer reducer, Sampled course, @Nullable Real argument, Unit unit)
      implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.reduced(this);
    }
  }

  /** A vector from its parts. */
  record Parts(Span span, Real x, Real y, Real z) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.parts(this);
    }
  }

  /** The vector in three slots of the frame. */
  record VectorInput(Span span, int slot) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.input(this);
    }
  }

  /** {@code -v}. */
  record VectorNegation(Span span, Vector operand) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.negation(this);
    }
  }

  /** A term of a vector sum. */
  record VectorTerm(boolean subtracted, Vector value) {}

  /** Vectors added or subtracted from left to right. */
  record VectorSum(Span span, List<VectorTerm> terms) implements Vector {
    /** Copies the terms. */
    public VectorSum {
      terms = List.copyOf(terms);
    }

    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.sum(this);
    }
  }

  /** A vector times numbers, or over them. */
  record Scaled(Span span, Vector vector, List<Factor> factors) implements Vector {
    /** Copies the factors. */
    public Scaled {
      factors = List.copyOf(factors);
    }

    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.scaled(this);
    }
  }

  /** The cross product of two vectors. */
  record Cross(Span span, Vector first, Vector second) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.cross(this);
    }
  }

  /** The unit vector along a vector. */
  record Direction(Span span, Vector vector) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.direction(this);
    }
  }

  /** One of two vectors; the other is not worked out. */
  record VectorChoice(Span span, Truth condition, Vector then, Vector otherwise) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.choice(this);
    }
  }

  /** A call of a function with a vector result; arguments as in {@link Call}. */
  record VectorCall(Span span, Body callee, List<Operation> arguments) implements Vector {
    /** Copies the arguments. */
    public VectorCall {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.call(this);
    }
  }

  /** A truth value. */
  record TruthConstant(Span span, boolean value) implements Truth {
    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.constant(this);
    }
  }

  /** The truth value in a slot of the frame. */
  record TruthInput(Span span, int slot) implements Truth {
    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.input(this);
    }
  }

  /** How two numbers are compared. */
  enum Relation {
    LESS,
    AT_MOST,
    MORE,
    AT_LEAST
  }

  /** A comparison of two numbers. */
  record Comparison(Span span, Real left, Relation relation, Real right) implements Truth {
    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.comparison(this);
    }
  }

  /** All hold; those behind one that does not hold are not worked out. */
  record AllOf(Span span, List<Truth> conditions) implements Truth {
    /** Copies the conditions. */
    public AllOf {
      conditions = List.copyOf(conditions);
    }

    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.allOf(this);
    }
  }

  /** One holds; those behind it are not worked out. */
  record AnyOf(Span span, List<Truth> conditions) implements Truth {
    /** Copies the conditions. */
    public AnyOf {
      conditions = List.copyOf(conditions);
    }

    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.anyOf(this);
    }
  }

  /** One of two conditions. */
  record TruthChoice(Span span, Truth condition, Truth then, Truth otherwise) implements Truth {
    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.choice(this);
    }
  }

  /** A call of a function that answers yes or no; arguments as in {@link Call}. */
  record TruthCall(Span span, Body callee, List<Operation> arguments) implements Truth {
    /** Copies the arguments. */
    public TruthCall {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(TruthCases<R> cases) {
      return cases.call(this);
    }
  }

  /**
   * What goes into one use of a rule for one of its parameters.
   *
   * @param parameter by number, from 0
   * @param values one, or as many as the author wrote where the parameter takes a list
   * @param list whether the parameter takes a list
   */
  record Argument(int parameter, List<Operation> values, boolean list) {
    /** Copies the values. */
    public Argument {
      values = List.copyOf(values);
    }

    /** The one value of a parameter. */
    public static Argument of(int parameter, Operation value) {
      return new Argument(parameter, List.of(value), false);
    }
  }

  /**
   * A rule at work: a law, or the reading of a part.
   *
   * @param rule whose work gives what the operation around it gives
   * @param arguments in the order in which they are worked out; what is not given is left out
   * @param files what is given by the names of files
   */
  record Use(Rule rule, List<Argument> arguments, List<FileArgument> files) {
    /** Copies the arguments. */
    public Use {
      arguments = List.copyOf(arguments);
      files = List.copyOf(files);
    }

    /** A use without files. */
    public Use(Rule rule, List<Argument> arguments) {
      this(rule, arguments, List.of());
    }
  }

  /** A file that goes into a use of a rule. */
  record FileArgument(Span span, int parameter, Path file) {}

  /** A rule that gives a number. */
  record RealUse(Span span, Use use) implements Real {
    @Override
    public <R> R match(RealCases<R> cases) {
      return cases.use(this);
    }
  }

  /** A rule that gives a vector. */
  record VectorUse(Span span, Use use) implements Vector {
    @Override
    public <R> R match(VectorCases<R> cases) {
      return cases.use(this);
    }
  }

  /** A rule that gives a thing in space. */
  record ThingUse(Span span, ThingSort sort, Use use) implements Thing {
    @Override
    public <R> R match(ThingCases<R> cases) {
      return cases.use(this);
    }
  }

  /** The thing in a slot of the frame. */
  record ThingInput(Span span, ThingSort sort, int slot) implements Thing {
    @Override
    public <R> R match(ThingCases<R> cases) {
      return cases.input(this);
    }
  }

  /** One of two things; the other is not worked out. */
  record ThingChoice(Span span, Truth condition, Thing then, Thing otherwise) implements Thing {
    @Override
    public ThingSort sort() {
      return then.sort();
    }

    @Override
    public <R> R match(ThingCases<R> cases) {
      return cases.choice(this);
    }
  }

  /** A call of a function that gives a thing; arguments as in {@link Call}. */
  record ThingCall(Span span, ThingSort sort, Body callee, List<Operation> arguments)
      implements Thing {
    /** Copies the arguments. */
    public ThingCall {
      arguments = List.copyOf(arguments);
    }

    @Override
    public <R> R match(ThingCases<R> cases) {
      return cases.call(this);
    }
  }
}
