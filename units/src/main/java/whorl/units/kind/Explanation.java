package whorl.units.kind;

/**
 * A refusal in the words of an engineer. All wording about kinds is in {@link Wording}, {@link
 * TurnWording} and {@code advice.txt}.
 *
 * <p>A line ends with a full stop, or with a formula to write. The author's text within a sentence
 * stands between backquotes.
 *
 * @param problem what is wrong, one sentence
 * @param reason why, or empty
 * @param fix what to do, or empty
 */
public record Explanation(String problem, String reason, String fix) {

  /** Puts a refusal into words. */
  public static Explanation of(Refusal refusal, Context context) {
    return refusal.match(new Wording(context));
  }

  /** Puts a remark into words. */
  public static String of(Remark remark) {
    return "The "
        + Wording.number(remark.numeral())
        + " looks like a conversion from per minute to per second. "
        + Wording.capital(remark.kind().withArticle())
        + " carries its unit, and no conversion is needed.";
  }

  /** The same with another problem. */
  Explanation about(String other) {
    return new Explanation(other, reason, fix);
  }
}
