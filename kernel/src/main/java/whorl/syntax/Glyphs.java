package whorl.syntax;

import java.text.Normalizer;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;

/**
 * A text as the characters a reader sees: a letter and the accents behind it are one character, in
 * Unicode's composed form where there is one. Every character knows where it stands in the text as
 * written.
 */
final class Glyphs {
  /** A letter with accents that has no composed form. */
  static final int ACCENTED = -1;

  /** Behind the last character. */
  static final int NONE = -2;

  // More accents than this on one letter are no writing; composing them would take quadratic time.
  private static final int MOST_MARKS = 8;

  private final Source source;
  private final int[] characters;
  private final int[] offsets;
  private final int count;

  Glyphs(Source source) {
    this.source = source;
    int[] written = source.text().codePoints().toArray();
    characters = new int[written.length];
    offsets = new int[written.length + 1];
    int n = 0;
    int i = 0;
    while (i < written.length) {
      int start = i++;
      if (!Characters.isLineEnd(written[start])) {
        while (i < written.length && Characters.isMark(written[i])) {
          i++;
        }
      }
      characters[n] = composed(written, start, i);
      offsets[n++] = start;
    }
    offsets[n] = written.length;
    count = n;
  }

  private static int composed(int[] written, int start, int end) {
    int length = end - start;
    if (length == 1 && written[start] < 0x300) {
      return written[start];
    }
    if (length - 1 > MOST_MARKS) {
      return ACCENTED;
    }
    String text = Normalizer.normalize(new String(written, start, length), Normalizer.Form.NFC);
    if (text.codePointCount(0, text.length()) == 1) {
      return text.codePointAt(0);
    }
    return length == 1 ? written[start] : ACCENTED;
  }

  /** Number of characters. */
  int count() {
    return count;
  }

  /** A character as composed, or {@link #NONE} behind the end. */
  int at(int index) {
    return index < count ? characters[index] : NONE;
  }

  /** A character with look-alikes folded, or {@link #NONE} behind the end. */
  int folded(int index) {
    return Characters.fold(at(index));
  }

  /** Where the characters from one index up to another stand. */
  Span span(int from, int to) {
    return new Span(offsets[from], offsets[to]);
  }

  /** The characters from one index up to another, composed but not folded. */
  String text(int from, int to) {
    var text = new StringBuilder(to - from);
    for (int i = from; i < to; i++) {
      if (characters[i] == ACCENTED) {
        text.append(source.slice(span(i, i + 1)));
      } else {
        text.appendCodePoint(characters[i]);
      }
    }
    return text.toString();
  }

  /** The characters from one index up to another, folded; none of them accented. */
  String foldedText(int from, int to) {
    var text = new StringBuilder(to - from);
    for (int i = from; i < to; i++) {
      text.appendCodePoint(folded(i));
    }
    return text.toString();
  }
}
