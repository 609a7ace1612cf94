package whorl.page;

import java.util.Optional;

/**
 * The text of a cell without its first line where that names the language.
 *
 * @param language what the rest is written in
 * @param body the rest; it begins with the end of that line, so that lines keep their numbers
 * @param offset where the rest begins in the cell
 */
record CellText(PlainLanguage language, String body, int offset) {
  static final String JAVA = "%%java";
  static final String SHEET = "%%sheet";

  /**
   * Reads a cell.
   *
   * @param plain what a cell without such a line is written in
   */
  static CellText of(String code, PlainLanguage plain) {
    int start = code.length() - code.stripLeading().length();
    int lineEnd = code.indexOf('\n', start);
    int end = lineEnd < 0 ? code.length() : lineEnd;
    return named(code.substring(start, end).strip())
        .map(language -> new CellText(language, code.substring(end), end))
        .orElseGet(() -> new CellText(plain, code, 0));
  }

  private static Optional<PlainLanguage> named(String line) {
    return switch (line) {
      case JAVA -> Optional.of(PlainLanguage.JAVA);
      case SHEET -> Optional.of(PlainLanguage.SHEET);
      default -> Optional.empty();
    };
  }

  /** Whether a place in the cell stands in the rest. */
  boolean holds(int cursor) {
    return cursor >= offset;
  }
}
