package whorl.eval;

import java.util.List;
import whorl.check.Operation.Factor;
import whorl.eval.NumericFailure.Reason;

/** Factors of a product, applied from left to right to what stands before them. */
final class Factors {
  private final Code.Real[] values;
  private final boolean[] divisors;
  private final Site[] sites;

  private Factors(Code.Real[] values, boolean[] divisors, Site[] sites) {
    this.values = values;
    this.divisors = divisors;
    this.sites = sites;
  }

  static Factors of(List<Factor> factors, CodeWriter writer) {
    Code.Real[] values = new Code.Real[factors.size()];
    boolean[] divisors = new boolean[values.length];
    Site[] sites = new Site[values.length];
    for (int i = 0; i < values.length; i++) {
      Factor factor = factors.get(i);
      values[i] = writer.real(factor.value());
      divisors[i] = factor.divisor();
      sites[i] = writer.site(factor.value().span());
    }
    return new Factors(values, divisors, sites);
  }

  int count() {
    return values.length;
  }

  boolean isDivisor(int i) {
    return divisors[i];
  }

  /** The factor's value; refused where it is a divisor and zero. */
  double value(int i, Activation activation) {
    double value = values[i].in(activation);
    if (divisors[i] && value == 0) {
      throw sites[i].noValue(Reason.DIVISION_BY_ZERO, value);
    }
    return value;
  }

  /** A product so far, times the factor or over it. */
  double applied(double product, int i, double factor, Site whole) {
    double value = divisors[i] ? product / factor : product * factor;
    if (!Double.isFinite(value)) {
      throw whole.noValue(Reason.OVERFLOW, factor);
    }
    return value;
  }
}
