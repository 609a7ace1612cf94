package whorl.eval;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import whorl.check.Operation;
import whorl.check.Operation.Body;
import whorl.check.Operation.Factor;

/**
 * Writes checked trees into a {@link RowGraph}, function bodies in place of their calls. The order
 * of operations is that of {@link CodeWriter}'s code, so that both come to the same bits.
 */
final class RowGraphWriter {
  /** Operations to write for one formula; with more, finding what is shared takes too long. */
  private static final int MOST_OPERATIONS = 5_000;

  /** Levels of operations and calls to write, for the sake of the stack. */
  private static final int MOST_LEVELS = 1_000;

  /** Says that a formula is not to be written out but worked out row by row. */
  static final class RowByRow extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RowByRow() {
      super("formula is worked out row by row", null, false, false);
    }
  }

  /** A call of a body, by number, with these nodes as arguments. */
  private record CallKey(int body, List<Integer> arguments) {}

  private final RowGraph graph;
  private final RealNodes reals = new RealNodes(this);
  private final VectorNodes vectors = new VectorNodes(this);
  private final TruthNodes truths = new TruthNodes(this);
  private final IdentityHashMap<Body, Integer> bodies = new IdentityHashMap<>();
  private final Map<CallKey, List<Integer>> calls = new HashMap<>();

  private final List<Integer> formulaFrame;
  private List<Integer> frame;
  private int operations;
  private int level;

  /** Prepares to write formulas over one frame of so many slots. */
  RowGraphWriter(RowGraph graph, int frameSize) {
    this.graph = graph;
    this.formulaFrame = IntStream.range(0, frameSize).mapToObj(graph::slot).toList();
    this.frame = formulaFrame;
  }

  /**
   * The nodes of a formula's value: one, or three for a vector.
   *
   * @throws RowByRow if it is too large, calls a routine or reads things in space; the writer stays
   *     usable
   */
  List<Integer> write(Operation formula) {
    frame = formulaFrame;
    operations = 0;
    level = 0;
    return any(formula);
  }

  RowGraph graph() {
    return graph;
  }

  /** The node of a slot in the frame of the formula or body being written. */
  int slot(int slot) {
    return frame.get(slot);
  }

  int real(Operation.Real operation) {
    enter();
    int node = operation.match(reals);
    level--;
    return node;
  }

  VectorNode vector(Operation.Vector operation) {
    enter();
    VectorNode node = operation.match(vectors);
    level--;
    return node;
  }

  int truth(Operation.Truth operation) {
    enter();
    int node = operation.match(truths);
    level--;
    return node;
  }

  private void enter() {
    operations++;
    level++;
    if (operations > MOST_OPERATIONS || level > MOST_LEVELS) {
      throw new RowByRow();
    }
  }

  private List<Integer> any(Operation operation) {
    if (operation instanceof Operation.Real real) {
      return List.of(real(real));
    }
    if (operation instanceof Operation.Vector vector) {
      VectorNode node = vector(vector);
      return List.of(node.x(), node.y(), node.z());
    }
    if (operation instanceof Operation.Thing) {
      throw new RowByRow();
    }
    return List.of(truth((Operation.Truth) operation));
  }

  /** A product so far, times the value of a factor or over it. */
  int applied(int product, Factor factor, int value) {
    if (!factor.divisor()) {
      return graph.apply(RowArithmetic.MULTIPLY, product, value);
    }
    if (graph.node(value) instanceof RowGraph.Known known && isPowerOfTwo(known.value())) {
      // Cheaper, and the same to the bit: the reciprocal is exact.
      return graph.apply(RowArithmetic.MULTIPLY, product, graph.known(1 / known.value()));
    }
    return graph.apply(RowArithmetic.DIVIDE, product, value);
  }

  private static boolean isPowerOfTwo(double value) {
    int exponent = Math.getExponent(value);
    return Math.abs(exponent) < Double.MAX_EXPONENT && Math.abs(value) == Math.scalb(1.0, exponent);
  }

  /** The nodes of a call's value. */
  List<Integer> call(Body callee, List<Operation> arguments) {
    List<Integer> calleeFrame = arguments.stream().flatMap(a -> any(a).stream()).toList();
    CallKey key = new CallKey(bodies.computeIfAbsent(callee, added -> bodies.size()), calleeFrame);
    List<Integer> known = calls.get(key);
    if (known != null) {
      return known;
    }
    List<Integer> value = afterArguments(body(callee, calleeFrame), calleeFrame);
    calls.put(key, value);
    return value;
  }

  private List<Integer> body(Body callee, List<Integer> calleeFrame) {
    List<Integer> callerFrame = frame;
    frame = calleeFrame;
    List<Integer> value = any(callee.body());
    frame = callerFrame;
    return value;
  }

  /** Arguments must have a value even where the body does not read them. */
  private List<Integer> afterArguments(List<Integer> value, List<Integer> arguments) {
    int first = value.get(0);
    for (int argument : arguments) {
      first = graph.guarded(first, argument);
    }
    List<Integer> guarded = new ArrayList<>(value);
    guarded.set(0, first);
    return List.copyOf(guarded);
  }

  /** The unit vector along a vector; where the magnitude is 0, 0/0 says that there is none. */
  VectorNode direction(VectorNode v) {
    int magnitude = magnitude(v);
    return v.map(part -> graph.apply(RowArithmetic.DIVIDE, part, magnitude));
  }

  int magnitude(VectorNode v) {
    return graph.apply(RowArithmetic.MAGNITUDE, v.x(), v.y(), v.z());
  }
}
