package whorl.eval;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Deque;
import java.util.List;
import whorl.eval.FixedPart.Broadcast;

/**
 * Puts the nodes of a graph that the results need in order, and gives them registers. A register is
 * free again after the last step that reads it, and the one freed last is taken first, so that few
 * registers are in use and those stay in the first-level cache.
 */
final class BlockPlanner {
  /** A node and the column of results that its values go to. */
  record Result(int node, int column) {}

  private static final int NONE = -1;

  private final RowGraph graph;
  private final BitSet varyingSlots;
  private final List<Result> results;

  private final int[] readsLeft;
  private final int[] registerOf;
  private final Deque<Integer> free = new ArrayDeque<>();
  private final List<Broadcast> broadcasts = new ArrayList<>();
  private final List<BlockStep> steps = new ArrayList<>();
  private int registers;

  private BlockPlanner(RowGraph graph, BitSet varyingSlots, List<Result> results) {
    this.graph = graph;
    this.varyingSlots = varyingSlots;
    this.results = results;
    this.readsLeft = new int[graph.size()];
    this.registerOf = new int[graph.size()];
    Arrays.fill(registerOf, NONE);
  }

  /**
   * Plans a program.
   *
   * @param varyingSlots slots that are columns, in the order of the columns
   * @param results what to store
   */
  static BlockPlan plan(RowGraph graph, BitSet varyingSlots, List<Result> results) {
    return new BlockPlanner(graph, varyingSlots, results).plan();
  }

  private BlockPlan plan() {
    countReads();
    for (int node = 0; node < graph.size(); node++) {
      if (readsLeft[node] > 0) {
        if (graph.varies(node) && graph.node(node) instanceof RowGraph.Applied applied) {
          compute(node, applied);
        }
        store(node);
      }
    }
    return new BlockPlan(FixedPart.of(graph, broadcasts), steps, registers);
  }

  private void countReads() {
    results.forEach(result -> readsLeft[result.node()]++);
    for (int node = graph.size() - 1; node >= 0; node--) {
      if (readsLeft[node] > 0
          && graph.varies(node)
          && graph.node(node) instanceof RowGraph.Applied applied) {
        applied.operands().forEach(operand -> readsLeft[operand]++);
      }
    }
  }

  private void compute(int node, RowGraph.Applied applied) {
    List<Integer> operands = applied.operands();
    int[] read = new int[3];
    for (int i = 0; i < operands.size(); i++) {
      read[i] = register(operands.get(i));
    }
    operands.forEach(this::release);
    registerOf[node] = allocate();
    steps.add(
        new BlockStep.Compute(applied.operation(), registerOf[node], read[0], read[1], read[2]));
  }

  private void store(int node) {
    for (Result result : results) {
      if (result.node() == node) {
        steps.add(new BlockStep.Store(register(node), result.column()));
        release(node);
      }
    }
  }

  /** The register that holds a node; columns and fixed values are fetched when first read. */
  private int register(int node) {
    if (registerOf[node] == NONE) {
      if (graph.varies(node)) {
        registerOf[node] = allocate();
        int slot = ((RowGraph.Slot) graph.node(node)).slot();
        int column = varyingSlots.get(0, slot).cardinality();
        steps.add(new BlockStep.Load(column, registerOf[node]));
      } else {
        // Filled before the first step, so it cannot be one that an earlier step has used.
        registerOf[node] = registers++;
        broadcasts.add(new Broadcast(node, registerOf[node]));
      }
    }
    return registerOf[node];
  }

  /** Notes that a node was read once; the registers of fixed values stay theirs. */
  private void release(int node) {
    readsLeft[node]--;
    if (readsLeft[node] == 0 && graph.varies(node)) {
      free.push(registerOf[node]);
    }
  }

  private int allocate() {
    return free.isEmpty() ? registers++ : free.pop();
  }
}
