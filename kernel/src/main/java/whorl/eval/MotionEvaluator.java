package whorl.eval;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.check.MotionPlan;
import whorl.check.Operation;
import whorl.check.Type;
import whorl.mechanics.motion.Condition;
import whorl.mechanics.motion.Motion;
import whorl.mechanics.motion.MotionFailure;
import whorl.mechanics.motion.MotionRun;
import whorl.mechanics.motion.NoRate;

/**
 * Follows a checked motion. All its formulas are made ready once and work over one frame of
 * numbers; nothing is allocated from step to step but what the integrator keeps.
 */
public final class MotionEvaluator {
  /** Operations in functions of the sheet allowed in one run: about ten seconds of work. */
  private static final long MOST_OPERATIONS = 10 * ScalarEvaluator.MOST_OPERATIONS;

  private final MotionPlan plan;
  private final double[] frame;
  private final Object[] things;
  private final Meter meter;
  private final Procedure[] procedures;
  private final Activation[] activations;
  private final List<Operation> formulas = new ArrayList<>();

  private final int[] starts;
  private final int[] computed;
  private final int[] rates;
  private final int[] weights;
  private final int limit;
  private final @Nullable Truths stop;
  private final List<Truths> jumps;
  private final int size;

  private MotionEvaluator(MotionPlan plan, double[] given, Object[] things, long mostOperations) {
    this.plan = plan;
    this.frame = given.clone();
    this.things = things.clone();
    List<MotionPlan.State> states = plan.states();
    starts = states.stream().mapToInt(state -> formula(state.start())).toArray();
    computed = plan.computed().stream().mapToInt(one -> formula(one.value())).toArray();
    rates = states.stream().mapToInt(state -> formula(state.rate())).toArray();
    weights =
        states.stream()
            .mapToInt(
                state -> {
                  Operation.Real weight = state.weight();
                  return weight == null ? -1 : formula(weight);
                })
            .toArray();
    limit = formula(plan.limit());
    Operation.Truth condition = plan.stop();
    stop = condition == null ? null : new Truths(condition);
    jumps = plan.jumps().stream().map(Truths::new).toList();
    size = states.stream().mapToInt(state -> width(state.type())).sum();
    meter = new Meter(new Site(plan.limit().span(), ""), mostOperations);
    procedures = new CodeWriter().write(formulas);
    activations = new Activation[formulas.size()];
    for (int i = 0; i < activations.length; i++) {
      activations[i] = Activation.of(procedures, i, frame, this.things, meter);
    }
  }

  /**
   * Follows a motion.
   *
   * @param frame what it reads from the sheet, by slot
   * @param things the things that it reads, by slot
   */
  public static MotionOutcome evaluate(MotionPlan plan, double[] frame, Object... things) {
    MotionEvaluator evaluator;
    try {
      evaluator = new MotionEvaluator(plan, frame, things, MOST_OPERATIONS);
    } catch (NoValue none) {
      return new MotionOutcome.Failed(
          MotionOutcome.Obstacle.NO_VALUE, 0, List.of(), -1, none.failure());
    }
    return evaluator.follow();
  }

  private int formula(Operation operation) {
    formulas.add(operation);
    return formulas.size() - 1;
  }

  private static int width(Type type) {
    return type instanceof Type.Vector ? 3 : 1;
  }

  private MotionOutcome follow() {
    try {
      double time = real(limit);
      if (!(time > 0)) {
        return failed(MotionOutcome.Obstacle.LIMIT, 0, List.of(), -1, null);
      }
      double[] start = start();
      Motion motion =
          Motion.of(this::rates, start, time)
              .inGroups(plan.states().stream().mapToInt(state -> width(state.type())).toArray())
              .jumpingAt(List.copyOf(jumps))
              .polling(meter::look);
      MotionRun run = (stop == null ? motion : motion.stopWhen(stop)).run();
      var ran = new Run(run, columns(run));
      run.visit((at, state) -> visible(state));
      return new MotionOutcome.Ran(ran, meter.breaches());
    } catch (NoValue none) {
      return failed(MotionOutcome.Obstacle.NO_VALUE, 0, List.of(), -1, none.failure());
    } catch (MotionFailure failure) {
      return failed(failure);
    }
  }

  private MotionOutcome failed(MotionFailure failure) {
    MotionOutcome.Obstacle obstacle =
        switch (failure.reason()) {
          case NO_RATE -> MotionOutcome.Obstacle.NO_VALUE;
          case RUNAWAY -> MotionOutcome.Obstacle.RUNAWAY;
          case TO_AND_FRO -> MotionOutcome.Obstacle.TO_AND_FRO;
          case TOO_MANY_STEPS -> MotionOutcome.Obstacle.TOO_MANY_STEPS;
        };
    NumericFailure cause = failure.getCause() instanceof NoValue none ? none.failure() : null;
    if (cause != null && cause.reason() == NumericFailure.Reason.OVERFLOW) {
      obstacle = MotionOutcome.Obstacle.RUNAWAY;
    }
    var states = new ArrayList<Value>();
    double[] state = failure.state();
    try {
      visible(state);
      for (MotionPlan.State one : plan.states()) {
        states.add(valueAt(one.slot(), one.type()));
      }
    } catch (NoValue none) {
      states.clear();
    }
    return failed(obstacle, failure.time(), states, stateAt(failure.index()), cause);
  }

  private static MotionOutcome failed(
      MotionOutcome.Obstacle obstacle,
      double time,
      List<Value> states,
      int state,
      @Nullable NumericFailure failure) {
    return new MotionOutcome.Failed(obstacle, time, states, state, failure);
  }

  private Value valueAt(int slot, Type type) {
    return type instanceof Type.Vector
        ? new Value.Vector(frame[slot], frame[slot + 1], frame[slot + 2])
        : new Value.Real(frame[slot]);
  }

  /** The state that a place of what is integrated belongs to. */
  private int stateAt(int index) {
    int end = 0;
    for (int i = 0; i < plan.states().size(); i++) {
      end += width(plan.states().get(i).type());
      if (index >= 0 && index < end) {
        return i;
      }
    }
    return -1;
  }

  /** What is integrated, at the start. */
  private double[] start() {
    for (int i = 0; i < starts.length; i++) {
      put(starts[i], plan.states().get(i).slot());
    }
    for (int i = 0; i < computed.length; i++) {
      int slot = plan.computed().get(i).slot();
      Optional<MotionPlan.State> product =
          plan.states().stream().filter(one -> one.ofProduct() && one.slot() == slot).findFirst();
      if (product.isEmpty()) {
        put(computed[i], slot);
      } else {
        multiply(product.get(), real(weights[plan.states().indexOf(product.get())]));
      }
    }
    double[] start = new double[size];
    int place = 0;
    for (MotionPlan.State state : plan.states()) {
      int width = width(state.type());
      System.arraycopy(frame, state.integrated(), start, place, width);
      place += width;
    }
    return start;
  }

  private void multiply(MotionPlan.State state, double weight) {
    for (int k = 0; k < width(state.type()); k++) {
      frame[state.integrated() + k] = weight * frame[state.slot() + k];
    }
  }

  private double real(int formula) {
    return ((Code.Real) procedures[formula].code()).in(activations[formula]);
  }

  private void put(int formula, int slot) {
    Code code = procedures[formula].code();
    Activation activation = activations[formula];
    if (code instanceof Code.Real real) {
      frame[slot] = real.in(activation);
    } else if (code instanceof Code.Vector vector) {
      Value.Vector value = vector.in(activation);
      frame[slot] = value.x();
      frame[slot + 1] = value.y();
      frame[slot + 2] = value.z();
    } else {
      frame[slot] = ((Code.Truth) code).in(activation) ? 1 : 0;
    }
  }

  /** Puts the states and all that follows from them into the frame. */
  private void visible(double[] state) {
    int place = 0;
    for (MotionPlan.State one : plan.states()) {
      int width = width(one.type());
      System.arraycopy(state, place, frame, one.integrated(), width);
      place += width;
    }
    for (int i = 0; i < computed.length; i++) {
      put(computed[i], plan.computed().get(i).slot());
    }
  }

  private void rates(double time, double[] state, double[] into) {
    int at = 0;
    int place = 0;
    try {
      visible(state);
      for (; at < rates.length; at++) {
        MotionPlan.State one = plan.states().get(at);
        double weight = one.ofProduct() || weights[at] < 0 ? 1 : real(weights[at]);
        Code code = procedures[rates[at]].code();
        if (code instanceof Code.Vector vector) {
          Value.Vector value = vector.in(activations[rates[at]]);
          into[place] = value.x() / weight;
          into[place + 1] = value.y() / weight;
          into[place + 2] = value.z() / weight;
        } else {
          into[place] = real(rates[at]) / weight;
        }
        place += width(one.type());
      }
    } catch (NoValue none) {
      throw noRate(none, place);
    }
  }

  /** What ends the run for good is passed on; a state that cannot be left is not. */
  private static RuntimeException noRate(NoValue none, int index) {
    return switch (none.failure().reason()) {
      case INTERRUPTED, TOO_LONG, TOO_DEEP -> none;
      default -> new NoRate(index, none);
    };
  }

  private Map<String, Course> columns(MotionRun run) {
    // Courses are read long after the run, by any number of threads, one at a time.
    var reader = new MotionEvaluator(plan, frame, things, Long.MAX_VALUE / 2);
    var columns = new LinkedHashMap<String, Course>();
    for (MotionPlan.Column column : plan.columns()) {
      int width = width(column.quantity().type());
      columns.put(column.name(), new Course(run, width, reader.sampler(column, width)));
    }
    return columns;
  }

  private Course.Sampler sampler(MotionPlan.Column column, int width) {
    int place = 0;
    for (MotionPlan.State one : plan.states()) {
      if (one.slot() == column.slot() && !one.ofProduct()) {
        int from = place;
        return (time, state, into, slot) -> System.arraycopy(state, from, into, slot, width);
      }
      place += width(one.type());
    }
    return (time, state, into, slot) -> {
      synchronized (this) {
        visible(state);
        System.arraycopy(frame, column.slot(), into, slot, width);
      }
    };
  }

  /** A condition of the motion with a margin that tells how near it is to turning. */
  private final class Truths implements Condition {
    private final int whole;
    private final Margin margin;

    Truths(Operation.Truth condition) {
      this.whole = formula(condition);
      this.margin = marginOf(condition);
    }

    @Override
    public double margin(double time, double[] state) {
      try {
        visible(state);
        return margin.now();
      } catch (NoValue none) {
        return holds(time, state) ? 1 : -1;
      }
    }

    @Override
    public boolean holds(double time, double[] state) {
      try {
        visible(state);
        return ((Code.Truth) procedures[whole].code()).in(activations[whole]);
      } catch (NoValue none) {
        throw noRate(none, -1);
      }
    }
  }

  /** By how much a condition holds, with what the frame holds now. */
  @FunctionalInterface
  private interface Margin {
    double now();
  }

  private Margin marginOf(Operation.Truth condition) {
    if (condition instanceof Operation.Comparison comparison) {
      int left = formula(comparison.left());
      int right = formula(comparison.right());
      boolean upward =
          switch (comparison.relation()) {
            case LESS, AT_MOST -> false;
            case MORE, AT_LEAST -> true;
          };
      return () -> upward ? real(left) - real(right) : real(right) - real(left);
    } else if (condition instanceof Operation.AllOf all) {
      List<Margin> margins = all.conditions().stream().map(this::marginOf).toList();
      return () -> margins.stream().mapToDouble(Margin::now).min().orElse(1);
    } else if (condition instanceof Operation.AnyOf any) {
      List<Margin> margins = any.conditions().stream().map(this::marginOf).toList();
      return () -> margins.stream().mapToDouble(Margin::now).max().orElse(-1);
    }
    int plain = formula(condition);
    return () -> ((Code.Truth) procedures[plain].code()).in(activations[plain]) ? 1 : -1;
  }
}
