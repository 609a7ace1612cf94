package whorl.jupyter;

/**
 * A text with a cursor. Messages count places in code points, and Java in halves of them, which is
 * not the same for 𝜔; here one becomes the other.
 *
 * @param code the text
 * @param cursor where the cursor stands, as Java counts
 */
record CursorText(String code, int cursor) {
  /** What a request asks about; a cursor outside of the text stands at its nearest end. */
  static CursorText of(Content content) throws BadContentException {
    String code = content.text("code");
    int length = code.codePointCount(0, code.length());
    int cursor = Math.max(0, Math.min(content.number("cursor_pos", length), length));
    return new CursorText(code, code.offsetByCodePoints(0, cursor));
  }

  /** A place in the text as messages count. */
  int codePoints(int place) {
    return code.codePointCount(0, place);
  }
}
