package whorl.diagnostic;

import java.util.List;

/**
 * A message to the author of a text: what is wrong, where, why, and what to do.
 *
 * @param code a stable label for tables and tests; never shown
 * @param problem one sentence in the author's terms
 * @param span where it is
 * @param label a few words under the caret, or empty
 * @param further other places that belong to it, each with its words
 * @param reason why, or empty
 * @param fix what to do, or empty
 */
public record Diagnostic(
    String code,
    String problem,
    Span span,
    String label,
    List<Label> further,
    String reason,
    String fix) {

  /** A further place with the words that stand under it. */
  public record Label(Span span, String text) {}

  /** Copies the list of further places. */
  public Diagnostic {
    further = List.copyOf(further);
  }

  /** A message with no words under the caret and no further places. */
  public static Diagnostic of(String code, String problem, Span span, String reason, String fix) {
    return new Diagnostic(code, problem, span, "", List.of(), reason, fix);
  }

  /** The same message with words under the caret. */
  public Diagnostic labelled(String words) {
    return new Diagnostic(code, problem, span, words, further, reason, fix);
  }

  /** The same message with one more place. */
  public Diagnostic with(Span place, String words) {
    var places = new java.util.ArrayList<>(further);
    places.add(new Label(place, words));
    return new Diagnostic(code, problem, span, label, places, reason, fix);
  }
}
