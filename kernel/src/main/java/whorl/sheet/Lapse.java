package whorl.sheet;

/**
 * A law that a statement uses where it does not hold.
 *
 * @param law its name
 * @param condition what does not hold, in the symbols of the law
 * @param inFunction the function of the sheet that uses it, or empty
 */
public record Lapse(String law, String condition, String inFunction) {
  /** What would have to hold, as {@code ring: t ≤ D/10}. */
  public String text() {
    return (inFunction.isEmpty() ? "" : inFunction + ", ") + law + ": " + condition;
  }
}
