package whorl.report;

import java.util.List;
import java.util.Map;
import whorl.report.sketch.Drawn;
import whorl.report.sketch.Sketch;

/**
 * A piece of HTML that is well formed by construction: text goes in escaped, elements close
 * themselves, and there is no way in for markup that came from a user.
 */
final class Html {
  /** Nothing. */
  static final Html NONE = new Html("");

  private static final Map<Integer, String> ENTITIES =
      Map.of(
          (int) '&', "&amp;",
          (int) '<', "&lt;",
          (int) '>', "&gt;",
          (int) '"', "&quot;",
          (int) '\'', "&#39;");

  private final String markup;

  private Html(String markup) {
    this.markup = markup;
  }

  /** Text, escaped for element content and for quoted attributes alike. */
  static Html text(String text) {
    var escaped = new StringBuilder(text.length() + 16);
    text.codePoints()
        .forEach(
            c -> {
              String entity = ENTITIES.get(c);
              if (entity != null) {
                escaped.append(entity);
              } else if (c == '\n' || c == '\t') {
                escaped.append((char) c);
              } else if (!isSafe(c)) {
                escaped.append('\uFFFD');
              } else {
                escaped.appendCodePoint(c);
              }
            });
    return new Html(escaped.toString());
  }

  /** Controls, halves of surrogate pairs and noncharacters have no place in a page. */
  private static boolean isSafe(int codePoint) {
    return !Character.isISOControl(codePoint)
        && Character.getType(codePoint) != Character.SURROGATE
        && (codePoint & 0xFFFE) != 0xFFFE;
  }

  /** An element without attributes. */
  static Html element(String tag, Html... content) {
    return new Html("<" + tag + ">" + all(content).markup + "</" + tag + ">");
  }

  /**
   * An element with an inline style.
   *
   * @param style declarations of our own, never text of a user
   */
  static Html styled(String tag, String style, Html... content) {
    return new Html(
        "<" + tag + " style=\"" + style + "\">" + all(content).markup + "</" + tag + ">");
  }

  /**
   * An element with an inline style and one attribute more.
   *
   * @param value text, escaped here
   */
  static Html styled(String tag, String style, String attribute, String value, Html... content) {
    return new Html(
        "<"
            + tag
            + " "
            + attribute
            + "=\""
            + text(value).markup
            + "\" style=\""
            + style
            + "\">"
            + all(content).markup
            + "</"
            + tag
            + ">");
  }

  /** A bar that shows how far something has come. */
  static Html progress(int done, int total) {
    return new Html("<progress value=\"" + done + "\" max=\"" + total + "\"></progress>");
  }

  /** A drawing, which escapes by itself what it has from users. */
  static Html drawing(List<Drawn> things) {
    return new Html(Sketch.svg(things));
  }

  /** Several pieces, one behind another. */
  static Html all(Html... pieces) {
    var joined = new StringBuilder();
    for (Html piece : pieces) {
      joined.append(piece.markup);
    }
    return new Html(joined.toString());
  }

  /** Several pieces, one behind another. */
  static Html all(Iterable<Html> pieces) {
    var joined = new StringBuilder();
    for (Html piece : pieces) {
      joined.append(piece.markup);
    }
    return new Html(joined.toString());
  }

  /** The markup. */
  @Override
  public String toString() {
    return markup;
  }
}
