package whorl.mechanics.body.mesh;

/**
 * Several sums at a time that keep what rounding cuts off (the method of Neumaier, after Kahan), so
 * that their error does not grow with the number of terms.
 */
final class CompensatedSums {
  private final double[] sums;
  private final double[] rests;

  CompensatedSums(int count) {
    sums = new double[count];
    rests = new double[count];
  }

  /** Adds one term to each sum. */
  void add(double[] terms) {
    for (int i = 0; i < sums.length; i++) {
      double sum = sums[i] + terms[i];
      rests[i] +=
          Math.abs(sums[i]) >= Math.abs(terms[i])
              ? (sums[i] - sum) + terms[i]
              : (terms[i] - sum) + sums[i];
      sums[i] = sum;
    }
  }

  /** A sum. */
  double value(int index) {
    return sums[index] + rests[index];
  }
}
