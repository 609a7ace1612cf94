package whorl.eval;

import java.util.List;
import whorl.check.Operation.AllOf;
import whorl.check.Operation.AnyOf;
import whorl.check.Operation.Comparison;
import whorl.check.Operation.Truth;
import whorl.check.Operation.TruthCall;
import whorl.check.Operation.TruthCases;
import whorl.check.Operation.TruthChoice;
import whorl.check.Operation.TruthConstant;
import whorl.check.Operation.TruthInput;

/** Writes the code of conditions. */
final class TruthCodeWriter implements TruthCases<Code.Truth> {
  private final CodeWriter writer;

  TruthCodeWriter(CodeWriter writer) {
    this.writer = writer;
  }

  @Override
  public Code.Truth constant(TruthConstant constant) {
    boolean value = constant.value();
    return in -> value;
  }

  @Override
  public Code.Truth input(TruthInput input) {
    int slot = input.slot();
    return in -> in.frame()[slot] == 1;
  }

  @Override
  public Code.Truth comparison(Comparison comparison) {
    Code.Real left = writer.real(comparison.left());
    Code.Real right = writer.real(comparison.right());
    return switch (comparison.relation()) {
      case LESS -> in -> left.in(in) < right.in(in);
      case AT_MOST -> in -> left.in(in) <= right.in(in);
      case MORE -> in -> left.in(in) > right.in(in);
      case AT_LEAST -> in -> left.in(in) >= right.in(in);
    };
  }

  @Override
  public Code.Truth allOf(AllOf allOf) {
    Code.Truth[] conditions = conditions(allOf.conditions());
    return in -> {
      for (Code.Truth condition : conditions) {
        if (!condition.in(in)) {
          return false;
        }
      }
      return true;
    };
  }

  @Override
  public Code.Truth anyOf(AnyOf anyOf) {
    Code.Truth[] conditions = conditions(anyOf.conditions());
    return in -> {
      for (Code.Truth condition : conditions) {
        if (condition.in(in)) {
          return true;
        }
      }
      return false;
    };
  }

  private Code.Truth[] conditions(List<Truth> conditions) {
    return conditions.stream().map(writer::truth).toArray(Code.Truth[]::new);
  }

  @Override
  public Code.Truth choice(TruthChoice choice) {
    Code.Truth condition = writer.truth(choice.condition());
    Code.Truth then = writer.truth(choice.then());
    Code.Truth otherwise = writer.truth(choice.otherwise());
    return in -> condition.in(in) ? then.in(in) : otherwise.in(in);
  }

  @Override
  public Code.Truth call(TruthCall call) {
    return CallCode.of(call.callee(), call.arguments(), writer)::truth;
  }
}
