package whorl.laws;

/**
 * A parameter of a law.
 *
 * @param word by which it is named in a call
 * @param symbol by which the formula calls it; empty for a thing that it does not name
 * @param sort what it takes
 * @param explanation what it is, in a few words
 * @param need what happens where it is left out
 */
public record Parameter(String word, String symbol, Sort sort, String explanation, Need need) {
  /** Whether it must be given. */
  public boolean isRequired() {
    return need instanceof Need.Required;
  }
}
