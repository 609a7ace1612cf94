package whorl.check;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.kind.Kind;

/**
 * Checks a motion. Its states and locals are names of the motion and hide those of the sheet; a
 * local may stand before what it is made of, as everywhere in a sheet.
 */
final class MotionChecker implements Locals {
  private static final Kind TIME = Kind.named("time");
  private static final Kind ANGULAR_VELOCITY = Kind.named("angular_velocity");
  private static final Kind INERTIA = Kind.named("rotational_inertia");

  private final Statement.Motion motion;
  private final Frame frame = new Frame(0);
  private final ExpressionChecker checker;
  private final ExpressionChecker fromSheet;
  private final Map<String, State> states = new LinkedHashMap<>();
  private final Map<String, Local> locals = new LinkedHashMap<>();
  private final List<MotionPlan.Computed> computed = new ArrayList<>();
  private final @Nullable RigidChecker rigid;

  MotionChecker(Scope scope, Statement.Motion motion) {
    this.motion = motion;
    this.checker = new ExpressionChecker(scope, this, frame);
    this.fromSheet = new ExpressionChecker(scope, new NoLocals(), frame);
    this.rigid = RigidChecker.of(scope, frame, fromSheet, motion).orElse(null);
  }

  /** A state, while its lines are brought together. */
  private static final class State {
    final MotionLine.Start line;
    final Formula start;
    final int slot;
    MotionLine.@Nullable Equation equation;

    /** The factors that go with the state; none where the equation is of the bare rate. */
    List<Expr.Factor> weight = List.of();

    boolean ofProduct;
    int integrated;
    Progress progress = Progress.OPEN;

    State(MotionLine.Start line, Formula start, int slot) {
      this.line = line;
      this.start = start;
      this.slot = slot;
      this.integrated = slot;
    }

    String name() {
      return line.state().name();
    }
  }

  /** A local, while it is checked. */
  private static final class Local {
    final MotionLine.Local line;
    Progress progress = Progress.OPEN;
    @Nullable Formula formula;
    int slot;

    Local(MotionLine.Local line) {
      this.line = line;
    }
  }

  /** How far a value that is worked out at every instant has been checked. */
  private enum Progress {
    OPEN,
    UNDERWAY,
    DONE
  }

  Checked.Motion checked() {
    starts();
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Equation equation) {
        assign(equation);
      }
    }
    for (State state : states.values()) {
      if (state.equation == null) {
        throw MotionMessages.noRate(state.line);
      }
      if (state.ofProduct) {
        state.integrated = frame.reserve(state.start.type());
      }
    }
    if (states.isEmpty() && rigid == null) {
      throw MotionMessages.empty(motion);
    }
    locals.values().forEach(this::settle);
    states.values().forEach(this::settle);
    List<MotionPlan.State> planned = states.values().stream().map(this::planned).toList();
    Operation.Truth stop = stop();
    RigidPlan body = rigid == null ? null : rigid.plan(checker, motion.lines());
    var plan = new MotionPlan(planned, computed, stop, limit(), checker.choices(), columns(), body);
    String over = checker.over();
    if (over != null) {
      throw MotionMessages.courseInMotion(motion.name(), over);
    }
    return new Checked.Motion(checker.basis(), motion.name().name(), plan);
  }

  // Lines

  private void starts() {
    var names = new HashSet<String>();
    for (MotionLine line : motion.lines()) {
      Expr.Name name = named(line);
      if (name == null) {
        continue;
      }
      if (name.name().equals(Courses.DURATION)) {
        throw MotionMessages.reservedColumn(name);
      }
      if (!names.add(name.name())) {
        throw MotionMessages.twice(name.span(), name.name(), "meanings");
      }
    }
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Start start) {
        Formula formula = formula(fromSheet, start.state(), start.bracket(), start.value());
        if (!(formula.type() instanceof Type.Real || formula.type() instanceof Type.Vector)) {
          throw MotionMessages.stateOfNumbers(start);
        }
        int slot = frame.reserve(formula.type());
        states.put(start.state().name(), new State(start, formula, slot));
      } else if (line instanceof MotionLine.Local local) {
        locals.put(local.name().name(), new Local(local));
      }
    }
  }

  private static Expr.@Nullable Name named(MotionLine line) {
    if (line instanceof MotionLine.Start start) {
      return start.state();
    }
    return line instanceof MotionLine.Local local ? local.name() : null;
  }

  private static Formula formula(
      ExpressionChecker checker, Expr.Name name, Statement.@Nullable Bracket bracket, Expr value) {
    return bracket == null
        ? Checker.undeclared(checker, value)
        : Checker.declared(checker, value, Declaration.of(name, bracket));
  }

  /** Finds the state that an equation is of. */
  private void assign(MotionLine.Equation equation) {
    Expr rate = equation.rate();
    if (rate instanceof Expr.Rate ofName && ofName.of() instanceof Expr.Name name) {
      take(equation, state(equation, name), List.of(), false);
    } else if (rate instanceof Expr.Product product) {
      List<Expr.Factor> factors = product.factors();
      Expr.Factor last = factors.get(factors.size() - 1);
      var name = (Expr.Name) ((Expr.Rate) last.value()).of();
      take(equation, state(equation, name), factors.subList(0, factors.size() - 1), false);
    } else if (((Expr.Rate) rate).of() instanceof Expr.Product product) {
      Expr.Factor own = ownFactor(equation, product);
      var others = new ArrayList<>(product.factors());
      others.remove(own);
      take(equation, state(equation, (Expr.Name) own.value()), others, true);
    } else {
      throw MotionMessages.notAState(((Expr.Rate) rate).of());
    }
  }

  /** The one factor of a product that is a state without another equation. */
  private Expr.Factor ownFactor(MotionLine.Equation equation, Expr.Product product) {
    List<Expr.Factor> candidates =
        product.factors().stream()
            .filter(
                factor ->
                    factor.joint() == Expr.Joint.TIMES
                        && factor.value() instanceof Expr.Name name
                        && states.containsKey(name.name())
                        && !hasRateOfItsOwn(name.name()))
            .toList();
    if (candidates.size() != 1) {
      throw MotionMessages.noStateInProduct(equation);
    }
    return candidates.get(0);
  }

  private boolean hasRateOfItsOwn(String name) {
    return motion.lines().stream()
        .anyMatch(
            line ->
                line instanceof MotionLine.Equation equation
                    && bareState(equation.rate()).filter(name::equals).isPresent());
  }

  /** The state whose rate stands on a left side by its name. */
  private static Optional<String> bareState(Expr rate) {
    Expr last = rate;
    if (rate instanceof Expr.Product product) {
      last = product.factors().get(product.factors().size() - 1).value();
    }
    return last instanceof Expr.Rate of && of.of() instanceof Expr.Name name
        ? Optional.of(name.name())
        : Optional.empty();
  }

  private State state(MotionLine.Equation equation, Expr.Name name) {
    State state = states.get(name.name());
    if (state == null) {
      throw locals.containsKey(name.name())
          ? MotionMessages.notAState(name)
          : MotionMessages.noStart(equation, name.name());
    }
    return state;
  }

  private static void take(
      MotionLine.Equation equation, State state, List<Expr.Factor> weight, boolean ofProduct) {
    if (state.equation != null) {
      throw MotionMessages.twice(equation.span(), state.name(), "equations");
    }
    state.equation = equation;
    state.weight = List.copyOf(weight);
    state.ofProduct = ofProduct && !weight.isEmpty();
  }

  private Operation.@Nullable Truth stop() {
    Operation.Truth stop = null;
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Stop condition) {
        if (stop != null) {
          throw MotionMessages.twice(line.span(), motion.name().name(), "conditions to stop");
        }
        stop = checker.condition(condition.condition());
      }
    }
    return stop;
  }

  private Operation.Real limit() {
    Operation.Real limit = null;
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Limit within) {
        if (limit != null) {
          throw MotionMessages.twice(line.span(), motion.name().name(), "time limits");
        }
        Typed time = fromSheet.number(within.time(), WrittenUnits.Reach.SIDE);
        if (!time.operand().readings().canBe(TIME)) {
          throw MotionMessages.timeNeeded("within", within.time(), time);
        }
        limit = (Operation.Real) time.operation();
      }
    }
    if (limit == null) {
      throw MotionMessages.noLimit(motion);
    }
    return limit;
  }

  // What is worked out at every instant

  private void settle(Local local) {
    switch (local.progress) {
      case DONE -> {}
      case UNDERWAY -> throw MotionMessages.circle(local.line.name());
      case OPEN -> {
        local.progress = Progress.UNDERWAY;
        MotionLine.Local line = local.line;
        Formula formula = formula(checker, line.name(), line.bracket(), line.value());
        local.formula = formula;
        local.slot = frame.reserve(formula.type());
        computed.add(new MotionPlan.Computed(local.slot, formula.operation()));
        local.progress = Progress.DONE;
      }
    }
  }

  /** A state that is found from its product has to be worked out before it is read. */
  private void settle(State state) {
    if (!state.ofProduct || state.progress == Progress.DONE) {
      return;
    }
    MotionLine.Equation equation = equation(state);
    if (state.progress == Progress.UNDERWAY) {
      throw MotionMessages.inertiaOfOwnState(equation, state.name());
    }
    state.progress = Progress.UNDERWAY;
    Operation.Real weight = weight(state);
    Span span = equation.rate().span();
    var over = List.of(new Operation.Factor(true, weight));
    Operation value =
        state.start.type() instanceof Type.Vector
            ? new Operation.Scaled(span, new Operation.VectorInput(span, state.integrated), over)
            : new Operation.Product(
                span,
                List.of(
                    new Operation.Factor(false, new Operation.Input(span, state.integrated)),
                    over.get(0)));
    computed.add(new MotionPlan.Computed(state.slot, value));
    state.progress = Progress.DONE;
  }

  private static MotionLine.Equation equation(State state) {
    if (state.equation == null) {
      throw MotionMessages.noRate(state.line);
    }
    return state.equation;
  }

  private Operation.@Nullable Real weightOf(State state) {
    return state.weight.isEmpty() ? null : weight(state);
  }

  private Operation.Real weight(State state) {
    List<Expr.Factor> factors = state.weight;
    Expr.Factor first = factors.get(0);
    Expr.Factor last = factors.get(factors.size() - 1);
    Expr text =
        factors.size() == 1 && first.joint() == Expr.Joint.TIMES
            ? first.value()
            : new Expr.Product(first.value().span().to(last.value().span()), factors);
    return (Operation.Real) checker.number(text, WrittenUnits.Reach.USUAL).operation();
  }

  private MotionPlan.State planned(State state) {
    MotionLine.Equation equation = equation(state);
    refuseRate(equation.value());
    Typed left = checker.check(equation.rate());
    Typed right = checker.check(equation.value(), WrittenUnits.Reach.SIDE);
    boolean isVector = left.type() instanceof Type.Vector;
    if (isVector != right.type() instanceof Type.Vector || right.type() instanceof Type.Truth) {
      throw MotionMessages.mixed(equation, isVector);
    }
    Kinds.equated(left, equation.rate(), right, equation.value());
    Operation.Real weight = weightOf(state);
    boolean varies = state.weight.stream().anyMatch(factor -> dependsOnState(factor.value()));
    if (!varies) {
      refuseAmbiguous(state, equation);
    }
    return new MotionPlan.State(
        state.name(),
        state.start.type(),
        state.slot,
        state.integrated,
        state.start.operation(),
        right.operation(),
        weight,
        state.ofProduct,
        !varies
            ? MotionPlan.Balance.NONE
            : state.ofProduct ? MotionPlan.Balance.SAME_MATTER : MotionPlan.Balance.MATTER_LEAVES);
  }

  private static void refuseRate(Expr value) {
    Expressions.walk(
        value,
        part -> {
          if (part instanceof Expr.Rate rate) {
            throw MotionMessages.rateOnRight(rate);
          }
        });
  }

  /** Refuses a rate of turning that is divided by an inertia which changes with the motion. */
  private void refuseAmbiguous(State state, MotionLine.Equation equation) {
    if (!canBe(new Typed(state.start.operation(), state.start.type(), null), ANGULAR_VELOCITY)) {
      return;
    }
    for (Expr text : madeOf(equation.value())) {
      Expressions.walk(
          text,
          part -> {
            if (part instanceof Expr.Product product) {
              for (Expr.Factor factor : product.factors()) {
                if (factor.joint() == Expr.Joint.OVER
                    && dependsOnState(factor.value())
                    && canBe(checker.check(factor.value()), INERTIA)) {
                  throw MotionMessages.whichMatter(equation, state.name(), factor.value());
                }
              }
            }
          });
    }
  }

  private static boolean canBe(Typed typed, Kind kind) {
    return typed.type() instanceof Type.Real
        ? typed.operand().readings().kinds().contains(kind)
        : typed.type() instanceof Type.Vector && typed.operand().readings().kinds().contains(kind);
  }

  /** An expression, and those of the locals that it is made of. */
  private List<Expr> madeOf(Expr value) {
    var texts = new ArrayList<Expr>(List.of(value));
    var seen = new HashSet<String>();
    for (int i = 0; i < texts.size(); i++) {
      for (String name : names(texts.get(i))) {
        Local local = locals.get(name);
        if (local != null && seen.add(name)) {
          texts.add(local.line.value());
        }
      }
    }
    return texts;
  }

  private boolean dependsOnState(Expr value) {
    return madeOf(value).stream()
        .anyMatch(text -> names(text).stream().anyMatch(states::containsKey));
  }

  private static Set<String> names(Expr value) {
    var names = new HashSet<String>();
    Expressions.walk(
        value,
        part -> {
          if (part instanceof Expr.Name name) {
            names.add(name.name());
          }
        });
    return names;
  }

  private List<MotionPlan.Column> columns() {
    var columns = new ArrayList<MotionPlan.Column>();
    if (rigid != null) {
      columns.addAll(rigid.planColumns());
    }
    for (MotionLine line : motion.lines()) {
      if (line instanceof MotionLine.Start start) {
        State state = states.get(start.state().name());
        if (state != null) {
          columns.add(column(state.name(), state.start, state.slot, true));
        }
      }
    }
    for (Local local : locals.values()) {
      Formula formula = local.formula;
      if (formula != null && !(formula.type() instanceof Type.Truth)) {
        columns.add(column(local.line.name().name(), formula, local.slot, false));
      }
    }
    return columns;
  }

  private static MotionPlan.Column column(String name, Formula formula, int slot, boolean isState) {
    var quantity = new Meaning.Quantity(formula.type(), formula.unit(), formula.chosen());
    return new MotionPlan.Column(name, quantity, formula.kind(), slot, isState);
  }

  // Names of the motion

  @Override
  public Optional<Typed> part(Expr.Part part) {
    return rigid == null ? Optional.empty() : rigid.part(part);
  }

  @Override
  public Optional<Typed> value(Expr.Name name) {
    if (rigid != null && name.name().equals(rigid.name())) {
      return Optional.of(rigid.moving(name));
    }
    State state = states.get(name.name());
    if (state != null) {
      settle(state);
      return Optional.of(stored(name.span(), state.start, state.slot));
    }
    Local local = locals.get(name.name());
    if (local == null) {
      return Optional.empty();
    }
    settle(local);
    Formula formula = local.formula;
    return formula == null
        ? Optional.empty()
        : Optional.of(stored(name.span(), formula, local.slot));
  }

  private static Typed stored(Span span, Formula formula, int slot) {
    return ExpressionChecker.stored(
        span, new Typed(formula.operation(), formula.type(), null), slot);
  }

  @Override
  public Optional<Unit> unit(String name) {
    State state = states.get(name);
    Local local = locals.get(name);
    Formula formula = state != null ? state.start : local == null ? null : local.formula;
    return Optional.ofNullable(formula).filter(Formula::chosen).map(Formula::unit);
  }

  /** The names of the motion where only the sheet counts. */
  private final class NoLocals implements Locals {
    @Override
    public Optional<Typed> value(Expr.Name name) {
      if (motion.lines().stream()
          .map(MotionChecker::named)
          .anyMatch(local -> local != null && local.name().equals(name.name()))) {
        throw MotionMessages.stateInStart(name);
      }
      return Optional.empty();
    }

    @Override
    public Optional<Unit> unit(String name) {
      return Optional.empty();
    }
  }
}
