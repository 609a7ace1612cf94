package whorl.eval;

import whorl.check.Operation.Sum;
import whorl.check.Operation.Term;
import whorl.eval.NumericFailure.Reason;

/** Terms added or subtracted from left to right. */
final class SumCode implements Code.Real {
  private final Site whole;
  private final Code.Real[] terms;
  private final boolean[] subtracted;

  private SumCode(Site whole, Code.Real[] terms, boolean[] subtracted) {
    this.whole = whole;
    this.terms = terms;
    this.subtracted = subtracted;
  }

  static SumCode of(Sum sum, CodeWriter writer) {
    Code.Real[] terms = new Code.Real[sum.terms().size()];
    boolean[] subtracted = new boolean[terms.length];
    for (int i = 0; i < terms.length; i++) {
      Term term = sum.terms().get(i);
      terms[i] = writer.real(term.value());
      subtracted[i] = term.subtracted();
    }
    return new SumCode(writer.site(sum.span()), terms, subtracted);
  }

  @Override
  public double in(Activation activation) {
    double first = terms[0].in(activation);
    double sum = subtracted[0] ? -first : first;
    for (int i = 1; i < terms.length; i++) {
      double term = terms[i].in(activation);
      sum = subtracted[i] ? sum - term : sum + term;
      if (!Double.isFinite(sum)) {
        throw whole.noValue(Reason.OVERFLOW, term);
      }
    }
    return sum;
  }
}
