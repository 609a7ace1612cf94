package whorl.eval;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import whorl.check.MotionPlan;
import whorl.check.Operation;
import whorl.check.RigidPlan;
import whorl.check.Type;
import whorl.mechanics.motion.Condition;
import whorl.mechanics.motion.Motion;
import whorl.mechanics.motion.MotionFailure;
import whorl.mechanics.motion.MotionRun;
import whorl.mechanics.motion.NoRate;
import whorl.mechanics.motion.RigidMotion;

/**
 * Follows a checked motion. All its formulas are made ready once and work over one frame of
 * numbers.
 */
public final class MotionEvaluator {
  /** Operations in functions of the sheet allowed in one run: about ten seconds of work. */
  private static final long MOST_OPERATIONS = 10 * ScalarEvaluator.MOST_OPERATIONS;

  private final MotionPlan plan;
  private final MotionFrame frame;
  private final Meter meter;

  private final int[] starts;
  private final int[] computed;
  private final int[] rates;
  private final int[] weights;
  private final int limit;
  private final @Nullable Truths stop;
  private final List<Truths> jumps;
  private final @Nullable RigidPart rigid;

  /** Numbers that the states take, without those of a rigid body behind them. */
  private final int size;

  private MotionEvaluator(MotionPlan plan, double[] numbers, Object[] things, long mostOperations) {
    this.plan = plan;
    this.frame = new MotionFrame(numbers, things);
    List<MotionPlan.State> states = plan.states();
    starts = states.stream().mapToInt(state -> frame.formula(state.start())).toArray();
    computed = plan.computed().stream().mapToInt(one -> frame.formula(one.value())).toArray();
    rates = states.stream().mapToInt(state -> frame.formula(state.rate())).toArray();
    weights =
        states.stream()
            .mapToInt(
                state -> {
                  Operation.Real weight = state.weight();
                  return weight == null ? -1 : frame.formula(weight);
                })
            .toArray();
    limit = frame.formula(plan.limit());
    Operation.Truth condition = plan.stop();
    stop = condition == null ? null : new Truths(condition);
    jumps = plan.jumps().stream().map(Truths::new).toList();
    RigidPlan body = plan.rigid();
    rigid = body == null ? null : new RigidPart(body, frame);
    size = states.stream().mapToInt(state -> width(state.type())).sum();
    meter = new Meter(new Site(plan.limit().span(), ""), mostOperations);
    frame.ready(meter);
  }

  /**
   * Follows a motion.
   *
   * @param numbers what it reads from the sheet, by slot
   * @param things the things that it reads, by slot
   */
  public static MotionOutcome evaluate(MotionPlan plan, double[] numbers, Object... things) {
    MotionEvaluator evaluator;
    try {
      evaluator = new MotionEvaluator(plan, numbers, things, MOST_OPERATIONS);
    } catch (NoValue none) {
      return withoutValue(none);
    }
    return evaluator.follow();
  }

  private static MotionOutcome withoutValue(NoValue none) {
    return new MotionOutcome.Failed(
        MotionOutcome.Obstacle.NO_VALUE, 0, List.of(), -1, none.failure());
  }

  private static int width(Type type) {
    return type instanceof Type.Vector ? 3 : 1;
  }

  private MotionOutcome follow() {
    try {
      double time = frame.real(limit);
      if (!(time > 0)) {
        return new MotionOutcome.Failed(MotionOutcome.Obstacle.LIMIT, 0, List.of(), -1, null);
      }
      RigidMotion body = rigid == null ? null : rigid.begin(time);
      MotionRun run =
          body != null && plan.states().isEmpty() && jumps.isEmpty() && body.isConservative()
              ? run(body)
              : run(body, time);
      var ran = new Run(run, columns(run, time));
      run.visit((at, state) -> show(state));
      return new MotionOutcome.Ran(ran, meter.breaches());
    } catch (NoValue none) {
      return withoutValue(none);
    } catch (MotionFailure failure) {
      return failed(failure);
    }
  }

  private MotionRun run(RigidMotion body) {
    RigidMotion polled = body.polling(meter::look);
    return (stop == null ? polled : polled.stopWhen(stop)).run();
  }

  private MotionRun run(@Nullable RigidMotion body, double time) {
    double[] start = start();
    IntStream groups = plan.states().stream().mapToInt(state -> width(state.type()));
    if (body != null) {
      double[] ofBody = body.start();
      start = Arrays.copyOf(start, size + ofBody.length);
      System.arraycopy(ofBody, 0, start, size, ofBody.length);
      groups = IntStream.concat(groups, Arrays.stream(body.groups()));
    }
    Motion motion =
        Motion.of(this::rates, start, time)
            .inGroups(groups.toArray())
            .jumpingAt(List.copyOf(jumps))
            .polling(meter::look);
    return (stop == null ? motion : motion.stopWhen(stop)).run();
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
    try {
      show(failure.state());
      for (MotionPlan.State one : plan.states()) {
        states.add(valueAt(one.slot(), one.type()));
      }
    } catch (NoValue none) {
      states.clear();
    }
    return new MotionOutcome.Failed(
        obstacle, failure.time(), states, stateAt(failure.index()), cause);
  }

  private Value valueAt(int slot, Type type) {
    double[] numbers = frame.numbers();
    return type instanceof Type.Vector
        ? new Value.Vector(numbers[slot], numbers[slot + 1], numbers[slot + 2])
        : new Value.Real(numbers[slot]);
  }

  /** The state that a place of what is integrated belongs to, or −1 for a rigid body. */
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

  /** What is integrated of the states, at the start. */
  private double[] start() {
    for (int i = 0; i < starts.length; i++) {
      frame.store(starts[i], plan.states().get(i).slot());
    }
    for (int i = 0; i < computed.length; i++) {
      int slot = plan.computed().get(i).slot();
      Optional<MotionPlan.State> product =
          plan.states().stream().filter(one -> one.ofProduct() && one.slot() == slot).findFirst();
      if (product.isEmpty()) {
        frame.store(computed[i], slot);
      } else {
        multiply(product.get(), frame.real(weights[plan.states().indexOf(product.get())]));
      }
    }
    double[] start = new double[size];
    int place = 0;
    for (MotionPlan.State state : plan.states()) {
      int width = width(state.type());
      System.arraycopy(frame.numbers(), state.integrated(), start, place, width);
      place += width;
    }
    return start;
  }

  private void multiply(MotionPlan.State state, double weight) {
    double[] numbers = frame.numbers();
    for (int k = 0; k < width(state.type()); k++) {
      numbers[state.integrated() + k] = weight * numbers[state.slot() + k];
    }
  }

  /** Puts the states and all that follows from them into the frame. */
  private void show(double[] state) {
    int place = 0;
    for (MotionPlan.State one : plan.states()) {
      int width = width(one.type());
      System.arraycopy(state, place, frame.numbers(), one.integrated(), width);
      place += width;
    }
    if (rigid != null) {
      rigid.show(ofBody(state));
    }
    for (int i = 0; i < computed.length; i++) {
      frame.store(computed[i], plan.computed().get(i).slot());
    }
  }

  private double[] ofBody(double[] state) {
    return size == 0 ? state : Arrays.copyOfRange(state, size, state.length);
  }

  private void rates(double time, double[] state, double[] into) {
    int place = 0;
    try {
      show(state);
      for (int i = 0; i < rates.length; i++) {
        MotionPlan.State one = plan.states().get(i);
        int width = width(one.type());
        frame.store(rates[i], into, place);
        if (!one.ofProduct() && weights[i] >= 0) {
          double weight = frame.real(weights[i]);
          for (int k = 0; k < width; k++) {
            into[place + k] /= weight;
          }
        }
        place += width;
      }
      if (rigid != null) {
        double[] ofBody = new double[state.length - size];
        rigid.rates(time, ofBody(state), ofBody);
        System.arraycopy(ofBody, 0, into, size, ofBody.length);
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

  private Map<String, Course> columns(MotionRun run, double time) {
    // Courses are read long after the run, by any number of threads, one at a time.
    var reader = new MotionEvaluator(plan, frame.numbers(), frame.things(), Long.MAX_VALUE / 2);
    if (reader.rigid != null) {
      reader.rigid.begin(time);
    }
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
        show(state);
        System.arraycopy(frame.numbers(), column.slot(), into, slot, width);
      }
    };
  }

  /** A condition of the motion with a margin that tells how near it is to turning. */
  private final class Truths implements Condition {
    private final int whole;
    private final Margin margin;

    Truths(Operation.Truth condition) {
      this.whole = frame.formula(condition);
      this.margin = marginOf(condition);
    }

    @Override
    public double margin(double time, double[] state) {
      try {
        show(state);
        return margin.now();
      } catch (NoValue none) {
        return holds(time, state) ? 1 : -1;
      }
    }

    @Override
    public boolean holds(double time, double[] state) {
      try {
        show(state);
        return frame.truth(whole);
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
      int left = frame.formula(comparison.left());
      int right = frame.formula(comparison.right());
      boolean upward =
          switch (comparison.relation()) {
            case LESS, AT_MOST -> false;
            case MORE, AT_LEAST -> true;
          };
      return () ->
          upward ? frame.real(left) - frame.real(right) : frame.real(right) - frame.real(left);
    } else if (condition instanceof Operation.AllOf all) {
      List<Margin> margins = all.conditions().stream().map(this::marginOf).toList();
      return () -> margins.stream().mapToDouble(Margin::now).min().orElse(1);
    } else if (condition instanceof Operation.AnyOf any) {
      List<Margin> margins = any.conditions().stream().map(this::marginOf).toList();
      return () -> margins.stream().mapToDouble(Margin::now).max().orElse(-1);
    }
    int plain = frame.formula(condition);
    return () -> frame.truth(plain) ? 1 : -1;
  }
}
