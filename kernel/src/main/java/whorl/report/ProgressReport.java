package whorl.report;

/**
 * How far a recalculation has come.
 *
 * @param html a fragment that needs no style sheet and no script
 * @param text the same for a terminal
 */
public record ProgressReport(String html, String text) {
  /**
   * Sets a state of work.
   *
   * @param done statements worked out
   * @param total statements to be worked out
   */
  public static ProgressReport of(int done, int total) {
    String text = "Recalculating: " + done + " of " + total + " statements.";
    Html html = Html.styled("div", Look.NOTE, Html.progress(done, total), Html.text(" " + text));
    return new ProgressReport(html.toString(), text);
  }
}
