package whorl.assist;

import whorl.sheet.Sheet;

/**
 * Answers what a front end asks about a cell of the sheet while it is written. The text may be
 * unfinished or wrong around the cursor; the sheet is only read.
 */
public final class Assistant {
  private final Sheet sheet;

  /** An assistant that knows the names of a sheet. */
  public Assistant(Sheet sheet) {
    this.sheet = sheet;
  }

  /**
   * What could be typed at the cursor.
   *
   * @param text the text of one cell
   * @param cursor a place in it, in UTF-16 units
   */
  public Completion complete(String text, int cursor) {
    return Completer.complete(sheet, text, within(text, cursor));
  }

  /**
   * Whether a console may run a text as it is: not while a parenthesis is open, a line ends in an
   * operator, or a block has no rows or may get more. An empty line puts an end to all of that.
   */
  public static Completeness completeness(String text) {
    return Readiness.of(text);
  }

  /** A place in a text that does not lie in the middle of a character. */
  private static int within(String text, int cursor) {
    int place = Math.max(0, Math.min(cursor, text.length()));
    boolean middle =
        place > 0
            && place < text.length()
            && Character.isHighSurrogate(text.charAt(place - 1))
            && Character.isLowSurrogate(text.charAt(place));
    return middle ? place - 1 : place;
  }
}
