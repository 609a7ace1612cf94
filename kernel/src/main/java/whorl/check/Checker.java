package whorl.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import whorl.diagnostic.Diagnostic;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.kind.Readings;

/**
 * Checks a statement once: characters, dimensions, kinds, calls. Every name that it uses must have
 * a meaning in the scope, and {@link Availability} must have passed it.
 */
public final class Checker {
  private final Scope scope;

  /** A checker that knows the names of a scope. */
  public Checker(Scope scope) {
    this.scope = scope;
  }

  /** What a check came to. */
  public sealed interface Result {
    /** The statement is sound. */
    record Passed(Checked checked) implements Result {}

    /** The first mistake in it. */
    record Refused(Diagnostic diagnostic) implements Result {}
  }

  /** Checks a statement. */
  public Result check(Statement statement) {
    return check(statement, () -> checked(statement));
  }

  /** Checks the head of a function that a routine works out. */
  public Result check(Statement.Published head, Routine routine) {
    return check(head, () -> published(head, routine));
  }

  private Result check(Statement statement, Supplier<Checked> check) {
    try {
      return new Result.Passed(check.get());
    } catch (CheckFailure failure) {
      return new Result.Refused(failure.among(readings(statement)));
    }
  }

  /** A statement that is sound; empty for one that is not, with no message worded. */
  public Optional<Checked> sound(Statement statement) {
    try {
      return Optional.of(checked(statement));
    } catch (CheckFailure failure) {
      return Optional.empty();
    }
  }

  /** The names that a suggestion may use: parameters, then the sheet's. */
  private Map<String, Readings> readings(Statement statement) {
    var readings = new LinkedHashMap<String, Readings>();
    for (String name : scope.names()) {
      if (scope.meaning(name).orElse(null) instanceof Meaning.Quantity quantity) {
        if (quantity.type() instanceof Type.Real real) {
          readings.put(name, real.readings());
        } else if (quantity.type() instanceof Type.Vector vector) {
          readings.put(name, vector.readings());
        }
      }
    }
    if (statement instanceof Statement.Function function) {
      for (Statement.Parameter parameter : function.parameters()) {
        Meaning.Parameter checked = parameter(parameter);
        readings.put(checked.name(), checked.readings());
      }
    }
    return readings;
  }

  private Checked checked(Statement statement) {
    if (statement instanceof Statement.Definition definition) {
      return definition(definition);
    } else if (statement instanceof Statement.Function function) {
      return function(function);
    } else if (statement instanceof Statement.Show show) {
      return show(show);
    } else if (statement instanceof Statement.Check check) {
      return condition(check.condition());
    } else if (statement instanceof Statement.Assumption assumption) {
      return condition(assumption.condition());
    } else if (statement instanceof Statement.Reproduction reproduction) {
      return reproduction(reproduction);
    } else if (statement instanceof Statement.Motion motion) {
      return new MotionChecker(scope, motion).checked();
    } else if (statement instanceof Statement.Sketch sketch) {
      return sketch(sketch);
    }
    throw new IllegalStateException(
        statement instanceof Statement.Published
            ? "a head is checked with its routine: " + statement
            : "answered by Availability before the check: " + statement);
  }

  private Checked definition(Statement.Definition definition) {
    var frame = new Frame(0);
    var checker = new ExpressionChecker(scope, List.of(), frame);
    Formula formula =
        definition.bracket() == null
            ? undeclared(checker, definition.value())
            : declared(
                checker,
                definition.value(),
                Declaration.of(definition.name(), definition.bracket()));
    return value(checker, formula);
  }

  private Checked show(Statement.Show show) {
    var frame = new Frame(0);
    var checker = new ExpressionChecker(scope, List.of(), frame);
    Formula formula =
        show.bracket() == null
            ? undeclared(checker, show.value())
            : declared(checker, show.value(), Declaration.of(null, show.bracket()));
    return value(checker, formula);
  }

  private Checked function(Statement.Function function) {
    var frame = new Frame(function.parameters().size());
    var parameters = function.parameters().stream().map(Checker::parameter).toList();
    var checker = new ExpressionChecker(scope, parameters, frame);
    Formula formula =
        function.bracket() == null
            ? undeclared(checker, function.body())
            : declared(
                checker, function.body(), Declaration.of(function.name(), function.bracket()));
    String over = checker.over();
    if (over != null) {
      throw MotionMessages.courseInFunction(function.name(), function.body(), over);
    }
    return function(function.name(), parameters, formula, checker.basis());
  }

  private static Checked published(Statement.Published head, Routine routine) {
    var parameters = head.parameters().stream().map(Checker::parameter).toList();
    var declaration = Declaration.of(head.name(), head.bracket());
    List<Operation.Real> arguments =
        IntStream.range(0, parameters.size())
            .mapToObj(slot -> new Operation.Input(head.parameters().get(slot).span(), slot))
            .map(Operation.Real.class::cast)
            .toList();
    var call =
        new Operation.RoutineCall(
            head.span(), new RoutineInUnits(routine, parameters, declaration.unit()), arguments);
    Formula formula = declaration.formula(Typed.of(call, declaration.usualReadings()), call);
    var basis = new Basis(List.of(), List.of(), new FrameSize(parameters.size(), 0), List.of());
    return function(head.name(), parameters, formula, basis);
  }

  private static Checked function(
      Expr.Name name, List<Meaning.Parameter> parameters, Formula formula, Basis basis) {
    var body = new Operation.Body(name.name(), formula.operation(), basis.frameSize());
    var meaning =
        new Meaning.Function(
            name.name(),
            parameters,
            formula.type(),
            formula.unit(),
            formula.chosen(),
            body,
            basis.inputs());
    return new Checked.Function(basis, meaning, formula.kind());
  }

  private static Meaning.Parameter parameter(Statement.Parameter parameter) {
    String name = parameter.name().name();
    if (parameter.bracket() == null) {
      return new Meaning.Parameter(name, Unit.ONE, Readings.NUMBER);
    }
    var declaration = Declaration.of(parameter.name(), parameter.bracket());
    return new Meaning.Parameter(name, declaration.unit(), declaration.usualReadings());
  }

  private Checked condition(Expr condition) {
    var frame = new Frame(0);
    var checker = new ExpressionChecker(scope, List.of(), frame);
    Checked.Clause clause = clause(checker, condition);
    refuseCourse(checker, condition);
    return new Checked.Condition(checker.basis(), clause);
  }

  private Checked.Clause clause(ExpressionChecker checker, Expr condition) {
    if (condition instanceof Expr.AllOf allOf) {
      return new Checked.Clause.All(clauses(checker, allOf.conditions()));
    } else if (condition instanceof Expr.AnyOf anyOf) {
      return new Checked.Clause.Any(clauses(checker, anyOf.conditions()));
    } else if (condition instanceof Expr.Comparison comparison) {
      ExpressionChecker.Sides sides = checker.compared(comparison);
      Optional<Unit> left = checker.writtenUnit(comparison.left());
      Optional<Unit> right = checker.writtenUnit(comparison.right());
      Formula first = formula(sides.left(), left.or(() -> right));
      Formula second = formula(sides.right(), right.or(() -> left));
      return new Checked.Clause.Compared(
          comparison, first, second, Kinds.marginUnit(second.unit()));
    }
    return new Checked.Clause.Plain(checker.condition(condition));
  }

  private List<Checked.Clause> clauses(ExpressionChecker checker, List<Expr> conditions) {
    return conditions.stream().map(condition -> clause(checker, condition)).toList();
  }

  private Checked reproduction(Statement.Reproduction reproduction) {
    var frame = new Frame(0);
    var checker = new ExpressionChecker(scope, List.of(), frame);
    Typed value = checker.number(reproduction.value(), WrittenUnits.Reach.SIDE);
    Typed stated = checker.number(reproduction.stated(), WrittenUnits.Reach.SIDE);
    refuseCourse(checker, reproduction.value());
    Typed met =
        Kinds.meet(
            Kinds.Together.COMPARED, value, reproduction.value(), stated, reproduction.stated());
    Typed within = checker.number(reproduction.within(), WrittenUnits.Reach.SIDE);
    boolean relative = Kinds.isNumber(within);
    if (!relative) {
      Kinds.allowed(met, within, reproduction);
    }
    Optional<Unit> valueUnit = checker.writtenUnit(reproduction.value());
    Optional<Unit> statedUnit = checker.writtenUnit(reproduction.stated());
    return new Checked.Reproduction(
        checker.basis(),
        formula(value.read(met.operand()), statedUnit.or(() -> valueUnit)),
        formula(stated.read(met.operand()), statedUnit.or(() -> valueUnit)),
        formula(within, checker.writtenUnit(reproduction.within())),
        relative);
  }

  private Checked sketch(Statement.Sketch sketch) {
    var checker = new ExpressionChecker(scope, List.of(), new Frame(0));
    var things = new ArrayList<Checked.Drawn>();
    for (Expr text : sketch.things()) {
      Typed typed = checker.check(text);
      String over = checker.over();
      if (over != null) {
        throw MotionMessages.courseInSketch(text, over);
      } else if (!(typed.type() instanceof Type.Thing) && !(typed.type() instanceof Type.Vector)) {
        throw SpaceMessages.cannotBeDrawn(text, typed.type());
      }
      Formula formula = formula(typed, checker.writtenUnit(text));
      things.add(new Checked.Drawn(text, formula, checker.about(typed)));
    }
    return new Checked.Sketch(checker.basis(), things);
  }

  /** A course has a value for every instant of a motion, so its formula is one of courses too. */
  private static Checked value(ExpressionChecker checker, Formula formula) {
    String over = checker.over();
    return new Checked.Value(
        checker.basis(),
        over == null
            ? formula
            : new Formula(
                formula.operation(),
                new Type.Course(formula.type(), over),
                formula.unit(),
                formula.chosen(),
                formula.kind(),
                formula.operation()));
  }

  private static void refuseCourse(ExpressionChecker checker, Expr condition) {
    String over = checker.over();
    if (over != null) {
      throw MotionMessages.courseInCondition(condition, over);
    }
  }

  static Formula undeclared(ExpressionChecker checker, Expr value) {
    Typed typed = checker.check(value);
    return formula(typed, checker.seen(typed), checker.writtenUnit(value));
  }

  static Formula declared(ExpressionChecker checker, Expr value, Declaration declaration) {
    Unit unit = declaration.unit();
    if (Expressions.isBare(value)) {
      Typed bare = checker.check(value);
      Typed taken = ExpressionChecker.inUnit(bare, unit, declaration.usualReadings(), value.span());
      return declaration.formula(taken, checker.seen(taken));
    }
    Typed typed = checker.check(value, WrittenUnits.Reach.DECLARED);
    if (typed.operation() instanceof Operation.Truth) {
      throw CheckMessages.conditionWithUnit(value, declaration.bracket());
    } else if (typed.operation() instanceof Operation.Thing) {
      throw SpaceMessages.thingWithUnit(value, typed.type(), declaration.bracket().span());
    }
    Typed settled = Kinds.declared(typed, value, declaration);
    return declaration.formula(settled, checker.seen(settled));
  }

  private static Formula formula(Typed typed, Optional<Unit> written) {
    return formula(typed, typed.operation(), written);
  }

  private static Formula formula(Typed typed, Operation seen, Optional<Unit> written) {
    if (typed.operation() instanceof Operation.Truth) {
      return new Formula(typed.operation(), typed.type(), Unit.ONE, false, "", seen);
    } else if (typed.operation() instanceof Operation.Thing thing) {
      return new Formula(thing, typed.type(), Unit.ONE, false, thing.sort().words(), seen);
    }
    Readings readings = typed.operand().readings();
    return new Formula(
        typed.operation(),
        typed.type(),
        written
            .or(() -> Kinds.usualUnit(readings))
            .orElseThrow(() -> CheckMessages.noUnit(typed.span(), readings)),
        written.isPresent(),
        Kinds.words(readings),
        seen);
  }
}
