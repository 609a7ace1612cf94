package whorl.notebook;

/**
 * A place in a file, as an editor shows it.
 *
 * @param line from 1
 * @param column in code points, from 1
 */
record TextPlace(int line, int column) {
  /**
   * The place of a UTF-16 index; a file may be too large to index all of its lines for one fault.
   */
  static TextPlace of(String text, int index) {
    int line = 1;
    int start = text.startsWith("\uFEFF") ? 1 : 0;
    for (int i = start; i < index; i++) {
      char c = text.charAt(i);
      boolean ends = c == '\n' || (c == '\r' && !text.startsWith("\n", i + 1));
      if (ends) {
        line++;
        start = i + 1;
      }
    }
    return new TextPlace(line, text.codePointCount(Math.min(start, index), index) + 1);
  }

  @Override
  public String toString() {
    return "line " + line + ", column " + column;
  }
}
