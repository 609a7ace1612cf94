package whorl.check;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.Supplier;
import whorl.diagnostic.Diagnostic;
import whorl.laws.Law;
import whorl.laws.Parameter;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.Rational;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.kind.Explanation;
import whorl.units.kind.Judgement;
import whorl.units.kind.Kind;
import whorl.units.kind.KindAlgebra;
import whorl.units.kind.Operand;
import whorl.units.kind.Powered;
import whorl.units.kind.Readings;

/**
 * The kind algebra as the checker asks it: what is accepted becomes the type of an expression, what
 * is refused a message at its place.
 */
final class Kinds {
  private static final UnitCatalogue UNITS = UnitCatalogue.standard();
  private static final Kind LENGTH = Kind.named("length");
  private static final Kind TEMPERATURE = Kind.named("temperature");
  private static final Kind TEMPERATURE_DIFFERENCE = Kind.named("temperature_difference");

  private Kinds() {}

  static boolean isNumber(Typed typed) {
    return typed.operand().readings().canBe(Kind.named("number"))
        && typed.operand().readings().dimension().isOne();
  }

  /** The kinds of a quantity in words, or empty where only the dimension is known. */
  static String words(Readings readings) {
    boolean named = readings.kinds().stream().anyMatch(kind -> !kind.isInternal());
    return named ? readings.words() : "";
  }

  /** The unit in which a quantity is shown where the author chose none, if there is one. */
  static Optional<Unit> usualUnit(Readings readings) {
    return readings.kinds().stream()
        .filter(kind -> !kind.isInternal())
        .findFirst()
        .map(UNITS::usual)
        .or(() -> UNITS.coherent(readings.dimension()));
  }

  /** The unit for a difference of two values shown in a unit. */
  static Unit marginUnit(Unit unit) {
    return unit.isReading() ? UNITS.usual(TEMPERATURE_DIFFERENCE) : unit;
  }

  static void plainNumberBeforeUnit(Typed group, Expr.InUnit inUnit) {
    if (!isNumber(group)) {
      throw CheckMessages.unitBehindQuantity(inUnit, group.operand().readings().withArticle());
    }
  }

  /** Why two quantities must be alike. */
  enum Together {
    COMPARED,
    EQUATED,
    PARTS,
    BRANCHES
  }

  /** The common reading of two quantities that must be alike. */
  static Typed meet(Together together, Typed left, Expr leftText, Typed right, Expr rightText) {
    Judgement judgement = KindAlgebra.compared(left.operand(), right.operand());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.unlike(
          refused.refusal(), together, part(leftText, left), part(rightText, right));
    }
    return left.read(((Judgement.Accepted) judgement).operand())
        .about(References.shared(left, () -> leftText, right, rightText));
  }

  /**
   * A sum or difference so far, with the next term.
   *
   * @param soFar the sum so far as written, asked for only where it goes into a message
   */
  static Typed added(
      Typed total, Supplier<Expr> soFar, boolean subtracted, Typed next, Expr nextText) {
    Judgement judgement =
        subtracted
            ? KindAlgebra.minus(total.operand(), next.operand())
            : KindAlgebra.plus(total.operand(), next.operand());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.unlike(
          refused.refusal(), Together.COMPARED, part(soFar.get(), total), part(nextText, next));
    }
    return total
        .read(((Judgement.Accepted) judgement).operand())
        .about(References.shared(total, soFar, next, nextText));
  }

  static Typed product(
      List<Powered> factors,
      Expr.Product product,
      Operation operation,
      Consumer<Diagnostic> remarks) {
    Judgement judgement = KindAlgebra.product(factors);
    if (judgement instanceof Judgement.Accepted accepted) {
      accepted
          .remark()
          .map(remark -> CheckMessages.remark(Explanation.of(remark), product))
          .ifPresent(remarks);
    }
    return typed(operation, accepted(judgement, product, factors)).madeOf(factors);
  }

  /** The rate of a quantity: its kind is that of the quantity over a time. */
  static Typed rate(Expr.Rate rate, Typed of) {
    var factors = new KindFactors();
    factors.add(rate.of(), of, Rational.ONE);
    var time = Typed.of(new Operation.Constant(rate.span(), 1), Readings.of(Kind.named("time")));
    factors.add(new Expr.Text(rate.span(), "time"), time, Rational.of(-1));
    Operand operand = accepted(KindAlgebra.product(factors.list()), rate, factors.list());
    return typed(of.operation(), operand).madeOf(factors.list());
  }

  /** The two sides of an equation of motion. */
  static void equated(Typed rate, Expr rateText, Typed value, Expr valueText) {
    meet(Together.EQUATED, rate, rateText, value, valueText);
  }

  static Typed power(Expr.Power power, Typed base, Rational exponent, Operation.Real operation) {
    Operand operand = accepted(KindAlgebra.power(base.operand(), exponent), power);
    Typed typed = typed(operation, operand);
    return exponent.isInteger() && !exponent.isZero()
        ? typed.madeOf(KindFactors.of(power.base(), base, exponent))
        : typed;
  }

  static Typed variablePower(
      Expr.Power power, Typed base, Typed exponent, Operation.Real operation) {
    return typed(
        operation, accepted(KindAlgebra.variablePower(base.operand(), exponent.operand()), power));
  }

  static Typed root(Expr text, Typed operand, int degree, Operation.Real operation) {
    return typed(operation, accepted(KindAlgebra.root(operand.operand(), degree), text));
  }

  /** A function at hand of a quantity, judged by its rule. */
  static Typed applied(
      Function<Operand, Judgement> rule,
      String function,
      Expr text,
      Typed operand,
      Operation.Real operation) {
    Judgement judgement = rule.apply(operand.operand());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.functionAtHand(refused.refusal(), function, part(text, operand));
    }
    return typed(operation, ((Judgement.Accepted) judgement).operand());
  }

  /** Functions that round take plain numbers only. */
  static Typed rounded(
      String function, Expr text, Typed operand, Optional<Unit> written, Operation.Real operation) {
    if (!isNumber(operand)) {
      Optional<Unit> unit = written.or(() -> usualUnit(operand.operand().readings()));
      throw CheckMessages.numberNeeded(function, text, operand, unit);
    }
    return Typed.of(operation, Readings.NUMBER);
  }

  static Typed cross(Typed left, Typed right, Expr text) {
    var operation =
        new Operation.Cross(
            text.span(), (Operation.Vector) left.operation(), (Operation.Vector) right.operation());
    return typed(operation, accepted(KindAlgebra.cross(left.operand(), right.operand()), text));
  }

  static Typed dot(Typed left, Typed right, Expr text) {
    var operation =
        new Operation.Dot(
            text.span(), (Operation.Vector) left.operation(), (Operation.Vector) right.operation());
    return typed(operation, accepted(KindAlgebra.dot(left.operand(), right.operand()), text));
  }

  /** A right side that fits its declaration, settled to the kind declared. */
  static Typed declared(Typed value, Expr text, Declaration declaration) {
    Judgement judgement = assigned(value.operand(), declaration.wanted(), declaration.unit());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.declared(refused.refusal(), part(text, value), declaration);
    }
    return value.read(((Judgement.Accepted) judgement).operand());
  }

  static Typed argument(
      Typed value, Expr text, Meaning.Parameter parameter, Meaning.Function function) {
    Judgement judgement = assigned(value.operand(), parameter.readings().kinds(), parameter.unit());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.argument(refused.refusal(), part(text, value), parameter, function);
    }
    return value;
  }

  /** Whether a number or vector is of one of some kinds; of any where there are none. */
  static boolean fits(Typed value, List<Kind> kinds) {
    return kinds.isEmpty()
        || KindAlgebra.assigned(value.operand(), kinds, kinds.get(0).dimension())
            instanceof Judgement.Accepted;
  }

  /** An argument of a law must be of one of some kinds; of any where there are none. */
  static void lawArgument(Typed value, Expr text, List<Kind> kinds, Parameter parameter, Law law) {
    if (kinds.isEmpty()) {
      return;
    }
    Judgement judgement = KindAlgebra.assigned(value.operand(), kinds, kinds.get(0).dimension());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.lawArgument(refused.refusal(), part(text, value), kinds, parameter, law);
    }
  }

  /** What displaces a point must be a length. */
  static void meetLength(Typed value, Expr text) {
    if (!fits(value, List.of(LENGTH))) {
      throw SpaceMessages.displacedByNoLength(text, value);
    }
  }

  /** A unit for which no kind is named asks at least for the readings of its members. */
  private static Judgement assigned(Operand value, List<Kind> wanted, Unit unit) {
    return wanted.isEmpty()
        ? KindAlgebra.assigned(value, unit.readings())
        : KindAlgebra.assigned(value, wanted, unit.dimension());
  }

  /** A deviation of the kind of the values that are compared. */
  static void allowed(Typed compared, Typed within, Statement.Reproduction reproduction) {
    Readings readings = compared.operand().readings();
    boolean reading = readings.kinds().contains(TEMPERATURE);
    Operand difference = reading ? Operand.of(TEMPERATURE_DIFFERENCE) : Operand.of(readings);
    Judgement judgement = KindAlgebra.compared(difference, within.operand());
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.within(
          refused.refusal(), part(reproduction.within(), within), reproduction);
    }
  }

  private static Typed typed(Operation operation, Operand operand) {
    return operation instanceof Operation.Vector
        ? new Typed(operation, new Type.Vector(operand.readings()), null)
        : new Typed(operation, new Type.Real(operand.readings()), operand.literal());
  }

  private static KindMessages.Part part(Expr text, Typed typed) {
    return new KindMessages.Part(text.span(), text, typed);
  }

  private static Operand accepted(Judgement judgement, Expr text) {
    return accepted(judgement, text, List.of());
  }

  private static Operand accepted(Judgement judgement, Expr text, List<Powered> factors) {
    if (judgement instanceof Judgement.Refused refused) {
      throw KindMessages.refused(refused.refusal(), text, factors);
    }
    return ((Judgement.Accepted) judgement).operand();
  }

  /** A kind or unit as the first word of a sentence. */
  static String capital(String words) {
    return words.isEmpty()
        ? words
        : words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
  }
}
