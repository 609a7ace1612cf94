package whorl.eval;

import java.util.List;
import java.util.function.IntBinaryOperator;
import whorl.check.Operation.AllOf;
import whorl.check.Operation.AnyOf;
import whorl.check.Operation.Comparison;
import whorl.check.Operation.Truth;
import whorl.check.Operation.TruthCall;
import whorl.check.Operation.TruthCases;
import whorl.check.Operation.TruthChoice;
import whorl.check.Operation.TruthConstant;
import whorl.check.Operation.TruthInput;

/** Writes conditions into the graph, as 1 where they hold and 0 where they do not. */
final class TruthNodes implements TruthCases<Integer> {
  private final RowGraphWriter writer;

  TruthNodes(RowGraphWriter writer) {
    this.writer = writer;
  }

  private RowGraph graph() {
    return writer.graph();
  }

  @Override
  public Integer constant(TruthConstant constant) {
    return known(constant.value());
  }

  private int known(boolean holds) {
    return graph().known(holds ? 1 : 0);
  }

  @Override
  public Integer input(TruthInput input) {
    return writer.slot(input.slot());
  }

  @Override
  public Integer comparison(Comparison comparison) {
    int left = writer.real(comparison.left());
    int right = writer.real(comparison.right());
    return switch (comparison.relation()) {
      case LESS -> graph().apply(RowArithmetic.LESS, left, right);
      case AT_MOST -> graph().apply(RowArithmetic.AT_MOST, left, right);
      case MORE -> graph().apply(RowArithmetic.LESS, right, left);
      case AT_LEAST -> graph().apply(RowArithmetic.AT_MOST, right, left);
    };
  }

  /** If the first holds, all of those behind it, else no. */
  @Override
  public Integer allOf(AllOf allOf) {
    return chain(
        allOf.conditions(), (first, behind) -> graph().select(first, behind, known(false)));
  }

  /** If the first holds, yes, else any of those behind it. */
  @Override
  public Integer anyOf(AnyOf anyOf) {
    return chain(anyOf.conditions(), (first, behind) -> graph().select(first, known(true), behind));
  }

  private int chain(List<Truth> conditions, IntBinaryOperator joined) {
    int last = conditions.size() - 1;
    int node = writer.truth(conditions.get(last));
    for (int i = last - 1; i >= 0; i--) {
      node = joined.applyAsInt(writer.truth(conditions.get(i)), node);
    }
    return node;
  }

  @Override
  public Integer choice(TruthChoice choice) {
    int condition = writer.truth(choice.condition());
    int then = writer.truth(choice.then());
    return graph().select(condition, then, writer.truth(choice.otherwise()));
  }

  @Override
  public Integer call(TruthCall call) {
    return writer.call(call.callee(), call.arguments()).get(0);
  }
}
