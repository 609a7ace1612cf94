package whorl.eval;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;

/**
 * The operations of several formulas as one graph in which equal operations on equal operands are
 * one node, wherever in the formulas they stand. Nodes are numbered so that operands come first.
 */
final class RowGraph {
  /** A node. */
  sealed interface Node {}

  /** A number known beforehand. */
  record Known(double value) implements Node {}

  /** The number in a slot of the frame. */
  record Slot(int slot) implements Node {}

  /** An operation on the nodes with these numbers, of which there are one to three. */
  record Applied(RowOperation operation, List<Integer> operands) implements Node {
    Applied {
      operands = List.copyOf(operands);
    }

    /** The result where the values of the operands are known. */
    double value(IntToDoubleFunction valueOf) {
      return operation.value(operands.stream().mapToDouble(valueOf::applyAsDouble).toArray());
    }
  }

  private final BitSet varyingSlots;
  private final List<Node> nodes = new ArrayList<>();
  private final Map<Node, Integer> numbers = new HashMap<>();
  private final BitSet varying = new BitSet();
  private final BitSet mayFail = new BitSet();

  RowGraph(BitSet varyingSlots) {
    this.varyingSlots = (BitSet) varyingSlots.clone();
  }

  int size() {
    return nodes.size();
  }

  Node node(int number) {
    return nodes.get(number);
  }

  /** Whether the node's value differs between rows. */
  boolean varies(int number) {
    return varying.get(number);
  }

  int known(double value) {
    return numberOf(new Known(value));
  }

  int slot(int slot) {
    return numberOf(new Slot(slot));
  }

  /** An operation that has no value wherever one of its operands has none. */
  int apply(RowOperation operation, int... operands) {
    int result = applyUnguarded(operation, operands);
    for (int i = 0; i < operands.length; i++) {
      if (!operation.handsOn(i)) {
        result = guarded(result, operands[i]);
      }
    }
    return result;
  }

  /**
   * An operation without guards, for where an operand need not have a value or where its lack of
   * one is seen to otherwise.
   */
  int applyUnguarded(RowOperation operation, int... operands) {
    List<Integer> list = new ArrayList<>();
    for (int operand : operands) {
      list.add(operand);
    }
    Applied applied = new Applied(operation, list);
    return list.stream().allMatch(operand -> nodes.get(operand) instanceof Known)
        ? known(folded(applied))
        : numberOf(applied);
  }

  /** A choice; only the operand taken must have a value. */
  int select(int condition, int then, int otherwise) {
    return then == otherwise
        ? guarded(then, condition)
        : applyUnguarded(RowArithmetic.SELECT, condition, then, otherwise);
  }

  /** A node that has no value where another has none, and else is the first. */
  int guarded(int number, int needed) {
    return !mayFail.get(needed) || failsWith(number, needed)
        ? number
        : applyUnguarded(RowArithmetic.GUARD, number, needed);
  }

  /** Whether a node is sure to have no value where another has none. */
  private boolean failsWith(int number, int needed) {
    BitSet seen = new BitSet();
    seen.set(number);
    // Operands have smaller numbers, so one pass down meets every node behind those that lead to
    // it.
    for (int at = number; at > needed; at = seen.previousSetBit(at - 1)) {
      if (nodes.get(at) instanceof Applied applied) {
        for (int i = 0; i < applied.operands().size(); i++) {
          if (applied.operation().handsOn(i)) {
            seen.set(applied.operands().get(i));
          }
        }
      }
    }
    return seen.get(needed);
  }

  private double folded(Applied applied) {
    return applied.value(operand -> ((Known) nodes.get(operand)).value());
  }

  private int numberOf(Node node) {
    Integer known = numbers.get(node);
    if (known != null) {
      return known;
    }
    int number = nodes.size();
    nodes.add(node);
    numbers.put(node, number);
    describe(number, node);
    return number;
  }

  private void describe(int number, Node node) {
    if (node instanceof Known known) {
      mayFail.set(number, !Double.isFinite(known.value()));
    } else if (node instanceof Slot slot) {
      varying.set(number, varyingSlots.get(slot.slot()));
    } else if (node instanceof Applied applied) {
      varying.set(number, applied.operands().stream().anyMatch(varying::get));
      mayFail.set(
          number,
          !applied.operation().isTotal() || applied.operands().stream().anyMatch(mayFail::get));
    }
  }
}
