package whorl.eval;

import java.util.function.DoubleUnaryOperator;
import whorl.check.Operation.UnaryFunction;

/** A function at hand of one number. */
record RowFunction(UnaryFunction function) implements RowOperation {
  @Override
  public boolean handsOn(int operand) {
    return switch (function) {
      // exp(-inf) is 0 and atan(inf) is π/2.
      case EXP, ATAN -> false;
      case SQRT, CBRT, LN, LOG10, SIN, COS, TAN, ASIN, ACOS, ABS, FLOOR, CEIL, ROUND -> true;
    };
  }

  @Override
  public boolean isTotal() {
    return switch (function) {
      case CBRT, SIN, COS, TAN, ATAN, ABS, FLOOR, CEIL, ROUND -> true;
      case SQRT, EXP, LN, LOG10, ASIN, ACOS -> false;
    };
  }

  @Override
  public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
    switch (function) {
      case SQRT -> roots(rows, target, a);
      case ABS -> sizes(rows, target, a);
      default -> values(Arithmetic.of(function), rows, target, a);
    }
  }

  // The processor has vector instructions for these two; the others are calls in any case.

  private static void roots(int rows, double[] target, double[] a) {
    for (int i = 0; i < rows; i++) {
      target[i] = Math.sqrt(a[i]);
    }
  }

  private static void sizes(int rows, double[] target, double[] a) {
    for (int i = 0; i < rows; i++) {
      target[i] = Math.abs(a[i]);
    }
  }

  private static void values(DoubleUnaryOperator function, int rows, double[] target, double[] a) {
    for (int i = 0; i < rows; i++) {
      target[i] = function.applyAsDouble(a[i]);
    }
  }
}
