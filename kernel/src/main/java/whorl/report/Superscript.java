package whorl.report;

import java.util.regex.Pattern;

/** Raised digits and signs as characters, for places that have no markup. */
final class Superscript {
  private static final String PLAIN = "0123456789-−+";
  private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁻⁺";

  /** Runs of raised digits and signs. */
  static final Pattern RUN = Pattern.compile("[" + RAISED + "]+");

  /** The plain form of a run. */
  static String lowered(String run) {
    var plain = new StringBuilder();
    run.chars().forEach(c -> plain.append(PLAIN.charAt(RAISED.indexOf(c))));
    return plain.toString().replace('-', '−');
  }

  private Superscript() {}

  /** Whether every character of the text has a raised form. */
  static boolean covers(String text) {
    return !text.isEmpty() && text.chars().allMatch(c -> PLAIN.indexOf(c) >= 0);
  }

  /** The raised form of a text that {@link #covers} accepts. */
  static String of(String text) {
    var raised = new StringBuilder();
    text.chars().forEach(c -> raised.append(RAISED.charAt(PLAIN.indexOf(c))));
    return raised.toString();
  }

  static String of(int number) {
    return of(Integer.toString(number));
  }
}
