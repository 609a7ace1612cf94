package whorl.eval;

import whorl.check.Operation.Cross;
import whorl.check.Operation.Direction;
import whorl.check.Operation.Parts;
import whorl.check.Operation.Scaled;
import whorl.check.Operation.VectorCall;
import whorl.check.Operation.VectorCases;
import whorl.check.Operation.VectorChoice;
import whorl.check.Operation.VectorInput;
import whorl.check.Operation.VectorNegation;
import whorl.check.Operation.VectorReduced;
import whorl.check.Operation.VectorSum;
import whorl.check.Operation.VectorTerm;
import whorl.check.Operation.VectorUse;
import whorl.laws.Work;

/** Writes the code of vector operations. Every part of a vector that the code gives is finite. */
final class VectorCodeWriter implements VectorCases<Code.Vector> {
  private final CodeWriter writer;

  VectorCodeWriter(CodeWriter writer) {
    this.writer = writer;
  }

  @Override
  public Code.Vector parts(Parts parts) {
    Code.Real x = writer.real(parts.x());
    Code.Real y = writer.real(parts.y());
    Code.Real z = writer.real(parts.z());
    return in -> new Value.Vector(x.in(in), y.in(in), z.in(in));
  }

  @Override
  public Code.Vector input(VectorInput input) {
    int slot = input.slot();
    return in -> {
      double[] frame = in.frame();
      return new Value.Vector(frame[slot], frame[slot + 1], frame[slot + 2]);
    };
  }

  @Override
  public Code.Vector negation(VectorNegation negation) {
    Code.Vector operand = writer.vector(negation.operand());
    return in -> negated(operand.in(in));
  }

  private static Value.Vector negated(Value.Vector v) {
    return new Value.Vector(-v.x(), -v.y(), -v.z());
  }

  @Override
  public Code.Vector sum(VectorSum sum) {
    Site whole = writer.site(sum.span());
    Code.Vector code = null;
    for (VectorTerm term : sum.terms()) {
      Code.Vector value = writer.vector(term.value());
      Code.Vector signed = term.subtracted() ? in -> negated(value.in(in)) : value;
      code = code == null ? signed : added(code, signed, whole);
    }
    if (code == null) {
      throw new IllegalArgumentException("a sum must have terms, but has none");
    }
    return code;
  }

  private static Code.Vector added(Code.Vector before, Code.Vector term, Site whole) {
    return in -> {
      Value.Vector a = before.in(in);
      Value.Vector b = term.in(in);
      return VectorArithmetic.finite(
          a.x() + b.x(), a.y() + b.y(), a.z() + b.z(), whole, VectorArithmetic.largestPart(b));
    };
  }

  @Override
  public Code.Vector scaled(Scaled scaled) {
    Site whole = writer.site(scaled.span());
    Code.Vector vector = writer.vector(scaled.vector());
    Factors factors = Factors.of(scaled.factors(), writer);
    return in -> {
      Value.Vector product = vector.in(in);
      for (int i = 0; i < factors.count(); i++) {
        double factor = factors.value(i, in);
        product =
            new Value.Vector(
                factors.applied(product.x(), i, factor, whole),
                factors.applied(product.y(), i, factor, whole),
                factors.applied(product.z(), i, factor, whole));
      }
      return product;
    };
  }

  @Override
  public Code.Vector cross(Cross cross) {
    Code.Vector first = writer.vector(cross.first());
    Code.Vector second = writer.vector(cross.second());
    Site whole = writer.site(cross.span());
    return in -> VectorArithmetic.cross(first.in(in), second.in(in), whole);
  }

  @Override
  public Code.Vector direction(Direction direction) {
    Code.Vector vector = writer.vector(direction.vector());
    Site whole = writer.site(direction.span());
    Site vectorSite = writer.site(direction.vector().span());
    return in -> VectorArithmetic.direction(vector.in(in), whole, vectorSite);
  }

  @Override
  public Code.Vector choice(VectorChoice choice) {
    Code.Truth condition = writer.truth(choice.condition());
    Code.Vector then = writer.vector(choice.then());
    Code.Vector otherwise = writer.vector(choice.otherwise());
    return in -> condition.in(in) ? then.in(in) : otherwise.in(in);
  }

  @Override
  public Code.Vector reduced(VectorReduced reduced) {
    Code.Real argument = reduced.argument() == null ? null : writer.real(reduced.argument());
    return new ReducedCode(
            writer.site(reduced.span()),
            reduced.reducer(),
            SampledCode.of(reduced.course(), writer),
            argument,
            reduced.unit())
        ::vector;
  }

  @Override
  public Code.Vector call(VectorCall call) {
    return CallCode.of(call.callee(), call.arguments(), writer)::vector;
  }

  @Override
  public Code.Vector use(VectorUse use) {
    UseCode code = writer.use(use.span(), use.use());
    var work = (Work.Vector) use.use().rule().work();
    return in -> code.vector(in, work);
  }
}
