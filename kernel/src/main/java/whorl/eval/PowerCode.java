package whorl.eval;

import whorl.eval.NumericFailure.Reason;

/**
 * A power.
 *
 * @param whole the power, at fault where it is too large
 * @param baseSite the base, at fault where it is negative or zero and must not be
 */
record PowerCode(Site whole, Site baseSite, Code.Real base, Code.Real exponent)
    implements Code.Real {
  @Override
  public double in(Activation activation) {
    double x = base.in(activation);
    double y = exponent.in(activation);
    double value = Arithmetic.power(x, y);
    if (!Double.isFinite(value)) {
      throw noValue(x, y);
    }
    return value;
  }

  private NoValue noValue(double x, double y) {
    if (x == 0) {
      return baseSite.noValue(Reason.ZERO_TO_NEGATIVE_POWER, x);
    }
    if (x < 0 && y != Math.rint(y)) {
      return baseSite.noValue(Reason.ROOT_OF_NEGATIVE, x);
    }
    return whole.noValue(Reason.OVERFLOW, x);
  }
}
