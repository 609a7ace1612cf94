package whorl.eval;

import whorl.check.Operation.BinaryFunction;

/**
 * Operations on numbers, and on truth values written as 1 and 0. The loops are kept as plain as the
 * JIT compiler's vectoriser wants them: one target, no offsets, no calls.
 */
enum RowArithmetic implements RowOperation {
  NEGATE(true, true, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = -a[i];
      }
    }
  },
  ADD(false, true, true, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] + b[i];
      }
    }
  },
  SUBTRACT(false, true, true, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] - b[i];
      }
    }
  },
  MULTIPLY(false, true, true, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] * b[i];
      }
    }
  },
  /** A quotient; over an infinite divisor it would be 0. */
  DIVIDE(false, true, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] / b[i];
      }
    }
  },
  /**
   * The first operand, or NaN where the second has no value. The size of a finite number times 0 is
   * +0, which taken away changes no bit, not even the sign of a zero.
   */
  GUARD(true, true, true, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] - Math.abs(b[i]) * 0;
      }
    }
  },
  MIN(true, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = Math.min(a[i], b[i]);
      }
    }
  },
  MAX(true, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = Math.max(a[i], b[i]);
      }
    }
  },
  /** The angle of the point (b, a). */
  ATAN2(false, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = Arithmetic.angleOfPoint(a[i], b[i]);
      }
    }
  },
  POWER(false, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = Arithmetic.power(a[i], b[i]);
      }
    }
  },
  /** The magnitude of the vector (a, b, c). */
  MAGNITUDE(false, true, true, true) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = Arithmetic.magnitude(a[i], b[i], c[i]);
      }
    }
  },
  LESS(true, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] < b[i] ? 1 : 0;
      }
    }
  },
  AT_MOST(true, false, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        target[i] = a[i] <= b[i] ? 1 : 0;
      }
    }
  },
  /**
   * The second operand where the first holds, the third where it does not, NaN where the first has
   * no value. The operand that is not taken needs no value: that is how choices stay lazy.
   */
  SELECT(true, true, false, false) {
    @Override
    public void run(int rows, double[] target, double[] a, double[] b, double[] c) {
      for (int i = 0; i < rows; i++) {
        double holds = a[i];
        target[i] = holds == 1 ? b[i] : holds == 0 ? c[i] : Double.NaN;
      }
    }
  };

  private final boolean total;
  private final boolean handsOnFirst;
  private final boolean handsOnSecond;
  private final boolean handsOnThird;

  RowArithmetic(boolean total, boolean handsOnFirst, boolean handsOnSecond, boolean handsOnThird) {
    this.total = total;
    this.handsOnFirst = handsOnFirst;
    this.handsOnSecond = handsOnSecond;
    this.handsOnThird = handsOnThird;
  }

  static RowArithmetic of(BinaryFunction function) {
    return switch (function) {
      case ATAN2 -> ATAN2;
      case MIN -> MIN;
      case MAX -> MAX;
    };
  }

  @Override
  public boolean handsOn(int operand) {
    return switch (operand) {
      case 0 -> handsOnFirst;
      case 1 -> handsOnSecond;
      default -> handsOnThird;
    };
  }

  @Override
  public boolean isTotal() {
    return total;
  }
}
