package whorl.eval;

import whorl.diagnostic.Span;

/**
 * A part of a formula, as a failure names it.
 *
 * @param span where it stands
 * @param inFunction the function whose body it stands in, or empty
 */
record Site(Span span, String inFunction) {
  /** What to throw where this part has no value. */
  NoValue noValue(NumericFailure.Reason reason, double operand) {
    return new NoValue(new NumericFailure(reason, span, inFunction, operand));
  }

  /** What to throw where this part calls a routine that gives no number. */
  NoValue noValue(NumericFailure.Call call, double given) {
    return new NoValue(
        new NumericFailure(
            NumericFailure.Reason.ROUTINE_WITHOUT_VALUE, span, inFunction, given, call, null));
  }

  /** What to throw where a law cannot take this part. */
  NoValue noValue(NumericFailure.Refused refused) {
    return new NoValue(
        new NumericFailure(
            NumericFailure.Reason.REFUSED, span, inFunction, Double.NaN, null, refused));
  }
}
