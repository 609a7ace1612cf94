package whorl.report;

import java.util.List;

/** How many columns of a terminal a text takes: marks that combine take none, wide forms two. */
final class TextWidth {
  /** Hangul, kana and full-width forms, and pictures. */
  private static final List<Range> WIDE =
      List.of(
          new Range(0x1100, 0x115F),
          new Range(0x3000, 0x30FF),
          new Range(0xAC00, 0xD7A3),
          new Range(0xFF01, 0xFF60),
          new Range(0x1F300, 0x1FAFF));

  private record Range(int first, int last) {}

  private TextWidth() {}

  static int of(String text) {
    return text.codePoints().map(TextWidth::of).sum();
  }

  private static int of(int codePoint) {
    int type = Character.getType(codePoint);
    if (type == Character.NON_SPACING_MARK
        || type == Character.ENCLOSING_MARK
        || type == Character.FORMAT) {
      return 0;
    }
    return isWide(codePoint) ? 2 : 1;
  }

  private static boolean isWide(int codePoint) {
    return Character.isIdeographic(codePoint)
        || WIDE.stream().anyMatch(r -> codePoint >= r.first() && codePoint <= r.last());
  }

  /** The text with blanks behind it up to a width. */
  static String padded(String text, int width) {
    return text + " ".repeat(Math.max(0, width - of(text)));
  }

  /** The text with blanks in front of it up to a width. */
  static String padded(int width, String text) {
    return " ".repeat(Math.max(0, width - of(text))) + text;
  }
}
