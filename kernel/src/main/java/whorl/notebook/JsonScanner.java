package whorl.notebook;

import java.util.BitSet;

/**
 * Checks that a text is JSON (RFC 8259), without recursion and without building anything, so that a
 * hostile file costs neither stack nor memory.
 *
 * <p>JSON readers in libraries hand back values but not where they stand, and a note must keep
 * every byte that is not ours; hence this scan, which {@link Json} then walks by position.
 */
final class JsonScanner {
  /** Deeper values are refused; other readers of notebooks give up near the same depth. */
  static final int DEEPEST = 1000;

  private final String text;
  private int at;
  private int depth;

  /** For each open bracket whether it is that of an object. */
  private final BitSet objects = new BitSet();

  private JsonScanner(String text) {
    this.text = text;
  }

  /**
   * The value that a text consists of; a byte order mark in front and blanks around are skipped.
   */
  static Json scan(String text) throws JsonFault {
    var scanner = new JsonScanner(text);
    if (text.startsWith("\uFEFF")) {
      scanner.at = 1;
    }
    scanner.blanks();
    int start = scanner.at;
    scanner.value();
    int end = scanner.at;
    scanner.blanks();
    if (scanner.at < text.length()) {
      throw new JsonFault(scanner.at, "more text stands behind the end of the note");
    }
    return new Json(text, start, end);
  }

  private void value() throws JsonFault {
    boolean open = opens();
    while (true) {
      if (!open) {
        scalar();
      } else if (!closes()) {
        open = opens();
        continue;
      }
      // A value is complete: close what it completes, up to a bracket with more to come.
      while (depth > 0 && !follows()) {
        close();
      }
      if (depth == 0) {
        return;
      }
      open = opens();
    }
  }

  /** Takes an opening bracket, if one stands here. */
  private boolean opens() throws JsonFault {
    char c = peek();
    if (c != '{' && c != '[') {
      return false;
    }
    if (depth == DEEPEST) {
      throw new JsonFault(at, "values are nested deeper than " + DEEPEST + " levels");
    }
    objects.set(depth++, c == '{');
    at++;
    blanks();
    return true;
  }

  /** Behind an opening bracket: takes the closing one, or else a first key where one is due. */
  private boolean closes() throws JsonFault {
    if (peek() == closing()) {
      close();
      return true;
    }
    if (inObject()) {
      key();
    }
    return false;
  }

  /** Behind a value: takes a comma and what must stand before the next value. */
  private boolean follows() throws JsonFault {
    blanks();
    char c = peek();
    if (c == closing()) {
      return false;
    }
    if (c != ',') {
      throw new JsonFault(at, "a comma or " + closing() + " must stand here");
    }
    at++;
    blanks();
    if (inObject()) {
      key();
    }
    return true;
  }

  private void close() {
    depth--;
    at++;
  }

  private boolean inObject() {
    return objects.get(depth - 1);
  }

  private char closing() {
    return inObject() ? '}' : ']';
  }

  private void key() throws JsonFault {
    if (peek() != '"') {
      throw new JsonFault(at, "a key in double quotes must stand here");
    }
    string();
    blanks();
    if (peek() != ':') {
      throw new JsonFault(at, "a colon must stand between a key and its value");
    }
    at++;
    blanks();
  }

  private void scalar() throws JsonFault {
    char c = peek();
    if (c == '"') {
      string();
    } else if (c == '-' || isDigit(c)) {
      number();
    } else if (!(word("true") || word("false") || word("null"))) {
      throw new JsonFault(at, "a value must stand here");
    }
  }

  private boolean word(String word) {
    boolean here = text.startsWith(word, at);
    at += here ? word.length() : 0;
    return here;
  }

  private void string() throws JsonFault {
    int start = at++;
    while (at < text.length()) {
      char c = text.charAt(at);
      if (c == '"') {
        at++;
        return;
      } else if (c == '\\') {
        escape();
      } else if (c < ' ') {
        throw new JsonFault(at, "a line break, tab or control character stands in a text");
      } else {
        at++;
      }
    }
    throw new JsonFault(start, "a text begins here and never ends");
  }

  private void escape() throws JsonFault {
    int start = at;
    at += 2;
    if (start + 1 < text.length() && "\"\\/bfnrt".indexOf(text.charAt(start + 1)) >= 0) {
      return;
    }
    boolean unicode = text.startsWith("u", start + 1) && start + 6 <= text.length();
    for (int i = start + 2; unicode && i < start + 6; i++) {
      unicode = Character.digit(text.charAt(i), 16) >= 0 && text.charAt(i) < 0x80;
    }
    if (!unicode) {
      throw new JsonFault(start, "a backslash stands in a text before something it cannot escape");
    }
    at = start + 6;
  }

  private void number() throws JsonFault {
    int start = at;
    at += text.charAt(at) == '-' ? 1 : 0;
    boolean leadingZero = at < text.length() && text.charAt(at) == '0';
    int whole = digits(start);
    if (leadingZero && whole > 1) {
      throw new JsonFault(start, "a number begins with a needless zero");
    }
    if (at < text.length() && text.charAt(at) == '.') {
      at++;
      digits(start);
    }
    if (at < text.length() && (text.charAt(at) == 'e' || text.charAt(at) == 'E')) {
      at++;
      if (at < text.length() && (text.charAt(at) == '+' || text.charAt(at) == '-')) {
        at++;
      }
      digits(start);
    }
  }

  private int digits(int start) throws JsonFault {
    int first = at;
    while (at < text.length() && isDigit(text.charAt(at))) {
      at++;
    }
    if (at == first) {
      throw new JsonFault(start, "a number lacks digits");
    }
    return at - first;
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }

  private void blanks() {
    while (at < text.length() && Json.isBlank(text.charAt(at))) {
      at++;
    }
  }

  private char peek() throws JsonFault {
    if (at >= text.length()) {
      throw new JsonFault(at, "the file ends here, in the middle of the note");
    }
    return text.charAt(at);
  }
}
