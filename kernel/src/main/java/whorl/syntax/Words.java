package whorl.syntax;

import java.util.Set;

/** The words of the language. All of them are written in lower case. */
public final class Words {
  /** Words that begin a statement. */
  public static final Set<String> STATEMENTS =
      Set.of(
          "check", "assume", "solve", "vary", "plot", "cases", "data", "motion", "sketch", "spread",
          "review");

  /** Words inside expressions and statements that cannot be names. */
  public static final Set<String> INNER =
      Set.of("if", "then", "else", "and", "or", "true", "false", "over", "with", "checks");

  /** Words that have a meaning in one place only and are free as names. */
  public static final Set<String> CONTEXTUAL =
      Set.of(
          "from", "to", "by", "in", "steps", "ratio", "against", "between", "so", "that", "for",
          "least", "most", "within", "nominal", "starts", "spin", "turned", "stop", "when", "body",
          "about", "load");

  /** Words that stand between operands or branches, never in the place of one. */
  static final Set<String> CONNECTING = Set.of("then", "else", "and", "or", "with");

  private Words() {}

  /** Whether a word cannot be a name. */
  public static boolean isReserved(String word) {
    return STATEMENTS.contains(word) || INNER.contains(word);
  }
}
