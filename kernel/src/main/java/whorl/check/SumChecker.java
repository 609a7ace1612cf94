package whorl.check;

import java.util.ArrayList;
import java.util.List;
import whorl.syntax.Expr;

/** Checks a sum: of numbers, of vectors, or with things in space among its terms. */
final class SumChecker {
  private final ExpressionChecker checker;
  private final Expr.Sum sum;
  private final List<Operation.Term> reals = new ArrayList<>();
  private final List<Operation.VectorTerm> vectors = new ArrayList<>();

  SumChecker(ExpressionChecker checker, Expr.Sum sum) {
    this.checker = checker;
    this.sum = sum;
  }

  Typed typed() {
    List<Typed> checked =
        sum.terms().stream()
            .map(term -> checker.check(term.value(), WrittenUnits.Reach.TERM))
            .toList();
    if (checked.stream().anyMatch(term -> term.operation() instanceof Operation.Thing)) {
      return new Space(checker).sum(sum, checked);
    }
    Expr.Term first = sum.terms().get(0);
    Typed total = checked.get(0);
    collect(first, total);
    for (int i = 1; i < sum.terms().size(); i++) {
      Expr.Term term = sum.terms().get(i);
      Typed next = checked.get(i);
      if (!next.isLike(total)) {
        throw CheckMessages.mixedCharacters(first.value().span(), total, term.value().span(), next);
      }
      collect(term, next);
      int terms = i;
      total = Kinds.added(total, () -> upTo(sum, terms), term.subtracted(), next, term.value());
    }
    Operation whole =
        vectors.isEmpty()
            ? new Operation.Sum(sum.span(), reals)
            : new Operation.VectorSum(sum.span(), vectors);
    return new Typed(whole, total.type(), total.literal());
  }

  /** The first terms of a sum. */
  static Expr upTo(Expr.Sum sum, int count) {
    Expr first = sum.terms().get(0).value();
    Expr last = sum.terms().get(count - 1).value();
    return count == 1
        ? first
        : new Expr.Sum(first.span().to(last.span()), sum.terms().subList(0, count));
  }

  private void collect(Expr.Term term, Typed typed) {
    if (typed.operation() instanceof Operation.Real real) {
      reals.add(new Operation.Term(term.subtracted(), real));
    } else if (typed.operation() instanceof Operation.Vector vector) {
      vectors.add(new Operation.VectorTerm(term.subtracted(), vector));
    } else {
      throw CheckMessages.conditionForNumber(term.value());
    }
  }
}
