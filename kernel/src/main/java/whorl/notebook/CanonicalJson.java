package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;

/**
 * Values in the form that Jupyter gives them when it saves a notebook, so that opening and saving
 * one there changes nothing: keys sorted, texts of several lines as a list of lines.
 */
final class CanonicalJson {
  private static final Pattern IN_LINES =
      Pattern.compile("text/.*|application/javascript|image/svg\\+xml");

  /** A line with its end, divided where Jupyter divides. */
  private static final Pattern LINE =
      Pattern.compile(
          "[^E]*(?:\\r\\n|[E])|[^E]+".replace("E", "\\n\\x0B\\f\\r\\x1C-\\x1E\\x85\\u2028\\u2029"));

  private CanonicalJson() {}

  /** A text as a list of lines with their ends. */
  static JsonArray lines(String text) {
    var lines = new JsonArray();
    LINE.matcher(text).results().forEach(line -> lines.add(line.group()));
    return lines;
  }

  /** An output's forms by MIME type. */
  static JsonObject bundle(Map<String, JsonElement> data) {
    var bundle = new JsonObject();
    new TreeMap<>(data)
        .forEach(
            (type, value) -> {
              boolean inLines =
                  value instanceof JsonPrimitive text
                      && text.isString()
                      && IN_LINES.matcher(type).matches();
              bundle.add(type, inLines ? lines(value.getAsString()) : sorted(value));
            });
    return bundle;
  }

  /** The same value with the keys of its objects sorted. */
  static JsonElement sorted(JsonElement value) {
    if (value instanceof JsonObject object) {
      var sorted = new JsonObject();
      new TreeMap<>(object.asMap()).forEach((key, member) -> sorted.add(key, sorted(member)));
      return sorted;
    }
    if (value instanceof JsonArray array) {
      var sorted = new JsonArray();
      array.forEach(element -> sorted.add(sorted(element)));
      return sorted;
    }
    return value;
  }
}
