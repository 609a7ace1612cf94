package whorl.eval;

import java.util.List;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import whorl.check.Operation.AngleBetween;
import whorl.check.Operation.Binary;
import whorl.check.Operation.Call;
import whorl.check.Operation.Choice;
import whorl.check.Operation.Constant;
import whorl.check.Operation.Dot;
import whorl.check.Operation.Input;
import whorl.check.Operation.Magnitude;
import whorl.check.Operation.Negation;
import whorl.check.Operation.Part;
import whorl.check.Operation.Power;
import whorl.check.Operation.Product;
import whorl.check.Operation.Real;
import whorl.check.Operation.RealCases;
import whorl.check.Operation.RealUse;
import whorl.check.Operation.Reduced;
import whorl.check.Operation.RoutineCall;
import whorl.check.Operation.Sum;
import whorl.check.Operation.Unary;
import whorl.check.Operation.UnaryFunction;
import whorl.check.Operation.VariablePower;
import whorl.eval.NumericFailure.Reason;
import whorl.laws.Work;

/** Writes the code of scalar operations. Every number the code gives is finite. */
final class RealCodeWriter implements RealCases<Code.Real> {
  private final CodeWriter writer;

  RealCodeWriter(CodeWriter writer) {
    this.writer = writer;
  }

  @Override
  public Code.Real constant(Constant constant) {
    double value = constant.value();
    return in -> value;
  }

  @Override
  public Code.Real input(Input input) {
    int slot = input.slot();
    return in -> in.frame()[slot];
  }

  @Override
  public Code.Real negation(Negation negation) {
    Code.Real operand = writer.real(negation.operand());
    return in -> -operand.in(in);
  }

  @Override
  public Code.Real sum(Sum sum) {
    return SumCode.of(sum, writer);
  }

  @Override
  public Code.Real product(Product product) {
    return ProductCode.of(product, writer);
  }

  @Override
  public Code.Real power(Power power) {
    Code.Real exponent = in -> power.exponent();
    return power(writer.site(power.span()), power.base(), exponent);
  }

  @Override
  public Code.Real variablePower(VariablePower power) {
    return power(writer.site(power.span()), power.base(), writer.real(power.exponent()));
  }

  private Code.Real power(Site whole, Real base, Code.Real exponent) {
    return new PowerCode(whole, writer.site(base.span()), writer.real(base), exponent);
  }

  @Override
  public Code.Real unary(Unary unary) {
    DoubleUnaryOperator function = Arithmetic.of(unary.function());
    Code.Real operand = writer.real(unary.operand());
    Reason reason = reason(unary.function());
    Site fault = writer.site(reason == Reason.OVERFLOW ? unary.span() : unary.operand().span());
    return in -> {
      double x = operand.in(in);
      double value = function.applyAsDouble(x);
      if (!Double.isFinite(value)) {
        throw fault.noValue(reason, x);
      }
      return value;
    };
  }

  /** Why a function has no value, if it has none. */
  private static Reason reason(UnaryFunction function) {
    return switch (function) {
      case SQRT -> Reason.ROOT_OF_NEGATIVE;
      case LN, LOG10 -> Reason.LOGARITHM_OF_NON_POSITIVE;
      case ASIN, ACOS -> Reason.ARC_OUT_OF_RANGE;
      // Of these only the exponential can fail for a finite operand.
      case CBRT, EXP, SIN, COS, TAN, ATAN, ABS, FLOOR, CEIL, ROUND -> Reason.OVERFLOW;
    };
  }

  @Override
  public Code.Real binary(Binary binary) {
    DoubleBinaryOperator function = Arithmetic.of(binary.function());
    Code.Real first = writer.real(binary.first());
    Code.Real second = writer.real(binary.second());
    Site whole = writer.site(binary.span());
    return in -> {
      double value = function.applyAsDouble(first.in(in), second.in(in));
      if (!Double.isFinite(value)) {
        throw whole.noValue(Reason.DIRECTION_OF_ZERO, 0);
      }
      return value;
    };
  }

  @Override
  public Code.Real choice(Choice choice) {
    Code.Truth condition = writer.truth(choice.condition());
    Code.Real then = writer.real(choice.then());
    Code.Real otherwise = writer.real(choice.otherwise());
    return in -> condition.in(in) ? then.in(in) : otherwise.in(in);
  }

  @Override
  public Code.Real part(Part part) {
    Code.Vector vector = writer.vector(part.vector());
    return switch (part.axis()) {
      case X -> in -> vector.in(in).x();
      case Y -> in -> vector.in(in).y();
      case Z -> in -> vector.in(in).z();
    };
  }

  @Override
  public Code.Real magnitude(Magnitude magnitude) {
    Code.Vector vector = writer.vector(magnitude.vector());
    Site whole = writer.site(magnitude.span());
    return in -> VectorArithmetic.magnitude(vector.in(in), whole);
  }

  @Override
  public Code.Real dot(Dot dot) {
    Code.Vector first = writer.vector(dot.first());
    Code.Vector second = writer.vector(dot.second());
    Site whole = writer.site(dot.span());
    return in -> VectorArithmetic.dot(first.in(in), second.in(in), whole);
  }

  @Override
  public Code.Real angleBetween(AngleBetween angle) {
    Code.Vector first = writer.vector(angle.first());
    Code.Vector second = writer.vector(angle.second());
    Site whole = writer.site(angle.span());
    Site firstSite = writer.site(angle.first().span());
    Site secondSite = writer.site(angle.second().span());
    return in -> {
      Value.Vector a = first.in(in);
      Value.Vector b = second.in(in);
      return VectorArithmetic.angle(
          VectorArithmetic.direction(a, whole, firstSite),
          VectorArithmetic.direction(b, whole, secondSite));
    };
  }

  @Override
  public Code.Real reduced(Reduced reduced) {
    Code.Real argument = reduced.argument() == null ? null : writer.real(reduced.argument());
    return new ReducedCode(
            writer.site(reduced.span()),
            reduced.reducer(),
            SampledCode.of(reduced.course(), writer),
            argument,
            reduced.unit())
        ::real;
  }

  @Override
  public Code.Real call(Call call) {
    return CallCode.of(call.callee(), call.arguments(), writer)::real;
  }

  @Override
  public Code.Real routineCall(RoutineCall call) {
    List<Code.Real> arguments = call.arguments().stream().map(writer::real).toList();
    return new RoutineCode(writer.site(call.span()), call.routine(), arguments);
  }

  @Override
  public Code.Real use(RealUse use) {
    UseCode code = writer.use(use.span(), use.use());
    var work = (Work.Real) use.use().rule().work();
    return in -> code.real(in, work);
  }
}
