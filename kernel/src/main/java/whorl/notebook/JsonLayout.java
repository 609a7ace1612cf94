package whorl.notebook;

import com.google.gson.FormattingStyle;
import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.JsonElement;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;

/**
 * How a file lays out its JSON, so that what is written into it looks like the rest: Jupyter
 * indents by one blank, other tools by two or four, some write one line.
 */
final class JsonLayout {
  /** The layout that Jupyter gives to a notebook. */
  static final JsonLayout JUPYTER = new JsonLayout("\n", " ", true);

  /**
   * Half of a pair that stands alone: legal in JSON as an escape only, for UTF-8 cannot hold it.
   */
  private static final Pattern LONE_SURROGATE = Pattern.compile("\\p{Cs}");

  private final String newline;
  private final Gson lines;
  private final Gson oneLine;

  private JsonLayout(String newline, String indent, boolean spaced) {
    this.newline = newline;
    var compact = FormattingStyle.COMPACT.withSpaceAfterSeparators(spaced);
    this.oneLine = gson(compact);
    this.lines = gson(compact.withNewline(newline).withIndent(indent));
  }

  private static Gson gson(FormattingStyle style) {
    return new GsonBuilder()
        .serializeNulls()
        .disableHtmlEscaping()
        .setFormattingStyle(style)
        .create();
  }

  /** The layout of a file, told by the first member of its outermost object. */
  static JsonLayout of(Json root) {
    Json.Member first = root.members().get(0);
    String lead = root.text().substring(root.start() + 1, first.key().start());
    int lineStart = lineStart(lead, lead.length());
    boolean windows = lead.startsWith("\r\n", lineStart - 2);
    String newline = lead.substring(Math.max(0, lineStart - (windows ? 2 : 1)), lineStart);
    boolean spaced = Json.isBlank(root.text().charAt(first.value().start() - 1));
    return new JsonLayout(newline, lead.substring(lineStart), spaced);
  }

  /** Writes a value with its closing bracket at the left edge. */
  String write(JsonElement value) {
    return escaped(lines.toJson(value));
  }

  /**
   * Writes an object of the file with some members set: those it has in their place, the others at
   * its end.
   *
   * @param object an object with at least one member
   * @return the new text of the object
   */
  String set(Json object, Map<String, JsonElement> values) {
    String text = object.text();
    List<Json.Member> members = object.members();
    var missing = new LinkedHashMap<>(values);
    var written = new StringBuilder();
    int copied = object.start();
    for (Json.Member member : members) {
      JsonElement value = values.get(member.name());
      if (value != null) {
        written.append(text, copied, member.value().start());
        written.append(write(value, text, member.key().start()));
        copied = member.value().end();
        missing.remove(member.name());
      }
    }
    int end = members.get(members.size() - 1).value().end();
    written.append(text, copied, end);
    // What stands around the key of the first member stands around those of the added ones.
    Json.Member first = members.get(0);
    String lead = text.substring(object.start() + 1, first.key().start());
    String colon = text.substring(first.key().end(), first.value().start());
    missing.forEach(
        (name, value) ->
            written
                .append(',')
                .append(lead)
                .append('"')
                .append(name)
                .append('"')
                .append(colon)
                .append(write(value, text, first.key().start())));
    return written.append(text, end, object.end()).toString();
  }

  /**
   * Writes the value of a key. Where the key begins its line, the lines of the value are indented
   * like it, else the value is written in one line.
   */
  private String write(JsonElement value, String text, int key) {
    int lineStart = lineStart(text, key);
    String margin = text.substring(lineStart, key);
    boolean beginsLine = lineStart > 0 && !newline.isEmpty() && margin.isBlank();
    // No line break stands inside a JSON text, so every one found is of the layout.
    return escaped(
        beginsLine
            ? lines.toJson(value).replace(newline, newline + margin)
            : oneLine.toJson(value));
  }

  private static String escaped(String json) {
    return LONE_SURROGATE
        .matcher(json)
        .replaceAll(found -> String.format("\\\\u%04x", (int) found.group().charAt(0)));
  }

  /** Index of the start of the line that an index stands in. */
  private static int lineStart(String text, int index) {
    int start = index;
    while (start > 0 && text.charAt(start - 1) != '\n' && text.charAt(start - 1) != '\r') {
      start--;
    }
    return start;
  }
}
