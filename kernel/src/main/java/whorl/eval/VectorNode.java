package whorl.eval;

import java.util.function.IntBinaryOperator;
import java.util.function.IntUnaryOperator;

/**
 * The nodes of the parts of a vector in a {@link RowGraph}. The vector has no value where one of
 * its parts has none.
 */
record VectorNode(int x, int y, int z) {
  VectorNode map(IntUnaryOperator change) {
    return new VectorNode(change.applyAsInt(x), change.applyAsInt(y), change.applyAsInt(z));
  }

  VectorNode with(VectorNode other, IntBinaryOperator combination) {
    return new VectorNode(
        combination.applyAsInt(x, other.x),
        combination.applyAsInt(y, other.y),
        combination.applyAsInt(z, other.z));
  }
}
