package whorl.check;

import whorl.diagnostic.Span;
import whorl.syntax.Expr;

/** Checks a choice between two values, which must be alike. */
final class ChoiceChecker {
  private final Expr.Choice choice;
  private final Typed then;
  private final Typed otherwise;

  ChoiceChecker(ExpressionChecker checker, Expr.Choice choice) {
    this.choice = choice;
    this.then = checker.check(choice.then(), WrittenUnits.Reach.TERM);
    this.otherwise = checker.check(choice.otherwise(), WrittenUnits.Reach.TERM);
  }

  /** The value chosen by a condition. */
  Typed typed(Operation.Truth condition) {
    Span span = choice.span();
    Operation one = then.operation();
    Operation other = otherwise.operation();
    if (one instanceof Operation.Real a && other instanceof Operation.Real b) {
      return alike(new Operation.Choice(span, condition, a, b));
    } else if (one instanceof Operation.Vector a && other instanceof Operation.Vector b) {
      return alike(new Operation.VectorChoice(span, condition, a, b));
    } else if (one instanceof Operation.Truth a && other instanceof Operation.Truth b) {
      return Typed.of(new Operation.TruthChoice(span, condition, a, b));
    } else if (one instanceof Operation.Thing a && other instanceof Operation.Thing b) {
      return ofOneSort(new Operation.ThingChoice(span, condition, a, b));
    }
    throw CheckMessages.mixedCharacters(
        choice.then().span(), then, choice.otherwise().span(), otherwise);
  }

  private Typed alike(Operation whole) {
    Typed met =
        Kinds.meet(Kinds.Together.BRANCHES, then, choice.then(), otherwise, choice.otherwise());
    return new Typed(whole, met.type(), null);
  }

  private Typed ofOneSort(Operation.ThingChoice whole) {
    if (whole.then().sort() != whole.otherwise().sort()) {
      throw SpaceMessages.mixedThings(choice, whole.then().sort(), whole.otherwise().sort());
    }
    Typed typed = Typed.of(whole);
    return then.type() instanceof Type.Tensor tensor
        ? typed
            .about(References.shared(then, choice::then, otherwise, choice.otherwise()))
            .seenFrom(tensor.frame())
        : typed;
  }
}
