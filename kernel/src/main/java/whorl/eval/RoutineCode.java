package whorl.eval;

import java.util.Arrays;
import java.util.List;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.eval.NumericFailure.Reason;

/**
 * A call of a routine. What it does cannot be counted beforehand, so that each call looks whether
 * the evaluation is to end.
 */
record RoutineCode(Site site, Routine routine, List<Code.Real> arguments) implements Code.Real {
  @Override
  public double in(Activation activation) {
    double[] values = new double[arguments.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = arguments.get(i).in(activation);
    }
    if (Thread.currentThread().isInterrupted()) {
      throw interrupted();
    }
    double value;
    try {
      value = routine.apply(values);
    } catch (RoutineFailure failure) {
      throw failure.interrupted()
          ? interrupted()
          : failed(values, String.valueOf(failure.getMessage()));
    } catch (RuntimeException thrown) {
      throw failed(values, thrown.toString());
    }
    if (!Double.isFinite(value)) {
      throw withoutValue(values, "", value);
    }
    return value;
  }

  private NoValue failed(double[] values, String said) {
    // A routine that is interrupted may say so in words of its own.
    return Thread.currentThread().isInterrupted()
        ? interrupted()
        : withoutValue(values, said, Double.NaN);
  }

  private NoValue withoutValue(double[] values, String said, double given) {
    var call = new NumericFailure.Call(Arrays.stream(values).boxed().toList(), said);
    return site.noValue(call, given);
  }

  private NoValue interrupted() {
    return site.noValue(Reason.INTERRUPTED, 0);
  }
}
