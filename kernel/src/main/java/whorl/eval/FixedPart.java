package whorl.eval;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;

/**
 * The part of a graph that is the same for all rows; worked out once a run.
 *
 * @param graph holds the nodes
 * @param nodes those needed, operands first
 * @param broadcasts those that the rows read, with their registers
 */
record FixedPart(RowGraph graph, List<Integer> nodes, List<Broadcast> broadcasts) {
  /** A fixed node and the register that holds its value in every row. */
  record Broadcast(int node, int register) {}

  static FixedPart of(RowGraph graph, List<Broadcast> broadcasts) {
    BitSet needed = new BitSet();
    broadcasts.forEach(broadcast -> needed.set(broadcast.node()));
    for (int node = needed.length(); node >= 0; node = needed.previousSetBit(node - 1)) {
      if (needed.get(node) && graph.node(node) instanceof RowGraph.Applied applied) {
        applied.operands().forEach(needed::set);
      }
    }
    return new FixedPart(graph, needed.stream().boxed().toList(), List.copyOf(broadcasts));
  }

  /** Fills the registers that hold fixed values. */
  void broadcast(double[] frame, double[][] registers) {
    double[] values = new double[graph.size()];
    for (int node : nodes) {
      values[node] = value(node, frame, values);
    }
    for (Broadcast broadcast : broadcasts) {
      Arrays.fill(registers[broadcast.register()], values[broadcast.node()]);
    }
  }

  private double value(int number, double[] frame, double[] values) {
    RowGraph.Node node = graph.node(number);
    if (node instanceof RowGraph.Known known) {
      return known.value();
    }
    if (node instanceof RowGraph.Slot slot) {
      return frame[slot.slot()];
    }
    return ((RowGraph.Applied) node).value(operand -> values[operand]);
  }
}
