package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import whorl.diagnostic.Span;
import whorl.syntax.Expr;
import whorl.units.kind.Judgement;
import whorl.units.kind.Kind;
import whorl.units.kind.KindAlgebra;
import whorl.units.kind.Operand;
import whorl.units.kind.Readings;

/** Checks a call of a function at hand. */
final class CallAtHand {
  private static final Readings ANGLE = Readings.of(Kind.named("angle"));

  private final ExpressionChecker checker;
  private final Expr.Call call;
  private final FunctionAtHand function;
  private final Span span;

  CallAtHand(ExpressionChecker checker, Expr.Call call, FunctionAtHand function) {
    this.checker = checker;
    this.call = call;
    this.function = function;
    this.span = call.span();
  }

  Typed typed() {
    for (Expr.Argument argument : call.arguments()) {
      if (argument.name() != null) {
        throw CheckMessages.namedArgumentAtHand(argument, function);
      }
    }
    if (!function.takes(call.arguments().size())) {
      throw CheckMessages.argumentCount(call, function);
    }
    return switch (function) {
      case SQRT -> root(2, Operation.UnaryFunction.SQRT);
      case CBRT -> root(3, Operation.UnaryFunction.CBRT);
      case EXP -> applied(KindAlgebra::exponentialOf, Operation.UnaryFunction.EXP);
      case LN -> applied(KindAlgebra::logarithmOf, Operation.UnaryFunction.LN);
      case LOG10 -> applied(KindAlgebra::logarithmOf, Operation.UnaryFunction.LOG10);
      case SIN -> applied(KindAlgebra::sineOf, Operation.UnaryFunction.SIN);
      case COS -> applied(KindAlgebra::sineOf, Operation.UnaryFunction.COS);
      case TAN -> applied(KindAlgebra::sineOf, Operation.UnaryFunction.TAN);
      case ASIN -> applied(KindAlgebra::arcOf, Operation.UnaryFunction.ASIN);
      case ACOS -> applied(KindAlgebra::arcOf, Operation.UnaryFunction.ACOS);
      case ATAN -> applied(KindAlgebra::arcOf, Operation.UnaryFunction.ATAN);
      case FLOOR -> rounded(Operation.UnaryFunction.FLOOR);
      case CEIL -> rounded(Operation.UnaryFunction.CEIL);
      case ROUND -> rounded(Operation.UnaryFunction.ROUND);
      case ABS -> checker.magnitude(new Expr.Magnitude(span, argument(0)));
      case ATAN2 -> atan2();
      case MIN -> extreme(Operation.BinaryFunction.MIN);
      case MAX -> extreme(Operation.BinaryFunction.MAX);
      case ANGLE -> Typed.of(new Operation.AngleBetween(span, vector(0), vector(1)), ANGLE);
      case UNIT -> direction();
      case CROSS -> joined(Expr.Joint.CROSS);
      case DOT -> joined(Expr.Joint.DOT);
    };
  }

  private Expr argument(int index) {
    return call.arguments().get(index).value();
  }

  private static Operation.Real real(Typed typed) {
    return (Operation.Real) typed.operation();
  }

  private Typed root(int degree, Operation.UnaryFunction operation) {
    Typed operand = checker.number(argument(0), WrittenUnits.Reach.USUAL);
    return Kinds.root(
        argument(0), operand, degree, new Operation.Unary(span, operation, real(operand)));
  }

  private Typed applied(Function<Operand, Judgement> rule, Operation.UnaryFunction operation) {
    Typed operand = checker.number(argument(0), WrittenUnits.Reach.USUAL);
    return Kinds.applied(
        rule,
        function.word(),
        argument(0),
        operand,
        new Operation.Unary(span, operation, real(operand)));
  }

  private Typed rounded(Operation.UnaryFunction operation) {
    Typed operand = checker.number(argument(0), WrittenUnits.Reach.USUAL);
    return Kinds.rounded(
        function.word(),
        argument(0),
        operand,
        checker.writtenUnit(argument(0)),
        new Operation.Unary(span, operation, real(operand)));
  }

  private Typed atan2() {
    Typed y = checker.number(argument(0), WrittenUnits.Reach.TERM);
    Typed x = checker.number(argument(1), WrittenUnits.Reach.TERM);
    Kinds.meet(Kinds.Together.COMPARED, y, argument(0), x, argument(1));
    return Typed.of(
        new Operation.Binary(span, Operation.BinaryFunction.ATAN2, real(y), real(x)), ANGLE);
  }

  private Typed extreme(Operation.BinaryFunction operation) {
    Typed extreme = checker.number(argument(0), WrittenUnits.Reach.TERM);
    for (int i = 1; i < call.arguments().size(); i++) {
      Typed next = checker.number(argument(i), WrittenUnits.Reach.TERM);
      Typed met = Kinds.meet(Kinds.Together.COMPARED, extreme, argument(i - 1), next, argument(i));
      extreme =
          Typed.of(
                  new Operation.Binary(span, operation, real(extreme), real(next)),
                  met.operand().readings())
              .about(met.type().about());
    }
    return extreme;
  }

  private Typed direction() {
    Typed vector = checkedVector(0);
    return Typed.of(
            new Operation.Direction(span, (Operation.Vector) vector.operation()), Readings.NUMBER)
        .seenFrom(((Type.Vector) vector.type()).frame());
  }

  private Operation.Vector vector(int index) {
    return (Operation.Vector) checkedVector(index).operation();
  }

  private Typed checkedVector(int index) {
    Typed typed = checker.check(argument(index));
    if (typed.type() instanceof Type.Vector) {
      return typed;
    }
    throw CheckMessages.vectorNeeded(function, argument(index));
  }

  /** {@code cross(a, b)} and {@code dot(a, b)} are the operators between their arguments. */
  private Typed joined(Expr.Joint joint) {
    vector(0);
    vector(1);
    var factors = new ArrayList<Expr.Factor>();
    factors.add(new Expr.Factor(Expr.Joint.TIMES, argument(0)));
    factors.add(new Expr.Factor(joint, argument(1)));
    return checker.product(new Expr.Product(span, List.copyOf(factors)));
  }
}
