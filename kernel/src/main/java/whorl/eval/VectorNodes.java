package whorl.eval;

import java.util.List;
import whorl.check.Operation.Cross;
import whorl.check.Operation.Direction;
import whorl.check.Operation.Factor;
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

/** Writes vector operations into the graph, part by part. */
final class VectorNodes implements VectorCases<VectorNode> {
  private final RowGraphWriter writer;

  VectorNodes(RowGraphWriter writer) {
    this.writer = writer;
  }

  private RowGraph graph() {
    return writer.graph();
  }

  @Override
  public VectorNode parts(Parts parts) {
    int x = writer.real(parts.x());
    int y = writer.real(parts.y());
    return new VectorNode(x, y, writer.real(parts.z()));
  }

  @Override
  public VectorNode input(VectorInput input) {
    int slot = input.slot();
    return new VectorNode(writer.slot(slot), writer.slot(slot + 1), writer.slot(slot + 2));
  }

  @Override
  public VectorNode negation(VectorNegation negation) {
    return negated(writer.vector(negation.operand()));
  }

  private VectorNode negated(VectorNode node) {
    return node.map(part -> graph().apply(RowArithmetic.NEGATE, part));
  }

  @Override
  public VectorNode sum(VectorSum sum) {
    List<VectorTerm> terms = sum.terms();
    VectorNode node = signed(terms.get(0));
    for (VectorTerm term : terms.subList(1, terms.size())) {
      node = node.with(signed(term), (a, b) -> graph().apply(RowArithmetic.ADD, a, b));
    }
    return node;
  }

  private VectorNode signed(VectorTerm term) {
    VectorNode node = writer.vector(term.value());
    return term.subtracted() ? negated(node) : node;
  }

  @Override
  public VectorNode scaled(Scaled scaled) {
    VectorNode node = writer.vector(scaled.vector());
    for (Factor factor : scaled.factors()) {
      int value = writer.real(factor.value());
      node = node.map(part -> writer.applied(part, factor, value));
    }
    return node;
  }

  @Override
  public VectorNode cross(Cross cross) {
    VectorNode a = writer.vector(cross.first());
    VectorNode b = writer.vector(cross.second());
    return new VectorNode(
        difference(a.y(), b.z(), a.z(), b.y()),
        difference(a.z(), b.x(), a.x(), b.z()),
        difference(a.x(), b.y(), a.y(), b.x()));
  }

  /** {@code a b - c d}. */
  private int difference(int a, int b, int c, int d) {
    return graph()
        .apply(
            RowArithmetic.SUBTRACT,
            graph().apply(RowArithmetic.MULTIPLY, a, b),
            graph().apply(RowArithmetic.MULTIPLY, c, d));
  }

  @Override
  public VectorNode direction(Direction direction) {
    return writer.direction(writer.vector(direction.vector()));
  }

  @Override
  public VectorNode choice(VectorChoice choice) {
    int condition = writer.truth(choice.condition());
    VectorNode then = writer.vector(choice.then());
    VectorNode otherwise = writer.vector(choice.otherwise());
    return then.with(otherwise, (a, b) -> graph().select(condition, a, b));
  }

  @Override
  public VectorNode call(VectorCall call) {
    List<Integer> value = writer.call(call.callee(), call.arguments());
    return new VectorNode(value.get(0), value.get(1), value.get(2));
  }

  /** Laws are worked out row by row, so that each row is judged by where they hold. */
  @Override
  public VectorNode use(VectorUse use) {
    throw new RowGraphWriter.RowByRow();
  }

  /** Courses are followed row by row: a row that does not need one must not. */
  @Override
  public VectorNode reduced(VectorReduced reduced) {
    throw new RowGraphWriter.RowByRow();
  }
}
