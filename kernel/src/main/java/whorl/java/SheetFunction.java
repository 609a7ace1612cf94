package whorl.java;

/**
 * What a function of the sheet works out in Java. It must be pure: the same arguments always give
 * the same number.
 */
public interface SheetFunction {
  /** The number of its parameters. */
  int parameters();

  /**
   * Works out the function.
   *
   * @param arguments as many as it has parameters
   */
  double apply(double[] arguments) throws Exception;

  /** A function of no parameter. */
  @FunctionalInterface
  interface Of0 extends SheetFunction {
    /** Works out the function. */
    double apply() throws Exception;

    @Override
    default int parameters() {
      return 0;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply();
    }
  }

  /** A function of one parameter. */
  @FunctionalInterface
  interface Of1 extends SheetFunction {
    /** Works out the function. */
    double apply(double a) throws Exception;

    @Override
    default int parameters() {
      return 1;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0]);
    }
  }

  /** A function of two parameters. */
  @FunctionalInterface
  interface Of2 extends SheetFunction {
    /** Works out the function. */
    double apply(double a, double b) throws Exception;

    @Override
    default int parameters() {
      return 2;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0], x[1]);
    }
  }

  /** A function of three parameters. */
  @FunctionalInterface
  interface Of3 extends SheetFunction {
    /** Works out the function. */
    double apply(double a, double b, double c) throws Exception;

    @Override
    default int parameters() {
      return 3;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0], x[1], x[2]);
    }
  }

  /** A function of four parameters. */
  @FunctionalInterface
  interface Of4 extends SheetFunction {
    /** Works out the function. */
    double apply(double a, double b, double c, double d) throws Exception;

    @Override
    default int parameters() {
      return 4;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0], x[1], x[2], x[3]);
    }
  }

  /** A function of five parameters. */
  @FunctionalInterface
  interface Of5 extends SheetFunction {
    /** Works out the function. */
    double apply(double a, double b, double c, double d, double e) throws Exception;

    @Override
    default int parameters() {
      return 5;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0], x[1], x[2], x[3], x[4]);
    }
  }

  /** A function of six parameters. */
  @FunctionalInterface
  interface Of6 extends SheetFunction {
    /** Works out the function. */
    double apply(double a, double b, double c, double d, double e, double f) throws Exception;

    @Override
    default int parameters() {
      return 6;
    }

    @Override
    default double apply(double[] x) throws Exception {
      return apply(x[0], x[1], x[2], x[3], x[4], x[5]);
    }
  }
}
