package whorl.notebook;

import com.google.gson.JsonElement;
import com.google.gson.JsonParser;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A value where it stands in a text that {@link JsonScanner} has found to be JSON. Parts are looked
 * up in the text when asked for; nothing is copied, so that what is not asked for stays as written.
 *
 * @param text the whole text
 * @param start index of the first character of the value
 * @param end index behind its last character
 */
record Json(String text, int start, int end) {

  /**
   * A member of an object.
   *
   * @param key its key, a string
   * @param value its value
   */
  record Member(Json key, Json value) {
    String name() {
      return key.string();
    }
  }

  boolean isObject() {
    return text.charAt(start) == '{';
  }

  boolean isArray() {
    return text.charAt(start) == '[';
  }

  boolean isString() {
    return text.charAt(start) == '"';
  }

  /** The value as written. */
  String written() {
    return text.substring(start, end);
  }

  /** The text that a string stands for. */
  String string() {
    String inside = text.substring(start + 1, end - 1);
    return inside.indexOf('\\') < 0 ? inside : element().getAsString();
  }

  /** The value as a tree of the JSON library. */
  JsonElement element() {
    return JsonParser.parseString(written());
  }

  /** The members of an object in the order written; none for any other value. */
  List<Member> members() {
    var members = new ArrayList<Member>();
    int at = isObject() ? behindBlanks(start + 1) : end;
    while (at < end - 1) {
      Json key = valueAt(at);
      Json value = valueAt(behindBlanks(behindBlanks(key.end) + 1));
      members.add(new Member(key, value));
      at = next(value.end);
    }
    return members;
  }

  /** The value of a member; of several with the same name the last, as other readers have it. */
  Optional<Json> member(String name) {
    return members().stream()
        .filter(member -> member.name().equals(name))
        .reduce((first, second) -> second)
        .map(Member::value);
  }

  /** The elements of an array; none for any other value. */
  List<Json> elements() {
    var elements = new ArrayList<Json>();
    int at = isArray() ? behindBlanks(start + 1) : end;
    while (at < end - 1) {
      Json element = valueAt(at);
      elements.add(element);
      at = next(element.end);
    }
    return elements;
  }

  /** From behind a part to the start of the next one, or to the closing bracket. */
  private int next(int behind) {
    int joint = behindBlanks(behind);
    return text.charAt(joint) == ',' ? behindBlanks(joint + 1) : joint;
  }

  private int behindBlanks(int at) {
    int next = at;
    while (isBlank(text.charAt(next))) {
      next++;
    }
    return next;
  }

  private Json valueAt(int at) {
    char first = text.charAt(at);
    int behind =
        switch (first) {
          case '"' -> behindString(at);
          case '{', '[' -> behindBrackets(at);
          default -> behindWord(at);
        };
    return new Json(text, at, behind);
  }

  private int behindWord(int at) {
    int next = at;
    while (",]} \t\r\n".indexOf(text.charAt(next)) < 0) {
      next++;
    }
    return next;
  }

  private int behindBrackets(int at) {
    int next = at;
    int depth = 0;
    do {
      char c = text.charAt(next);
      if (c == '"') {
        next = behindString(next);
      } else {
        depth += c == '{' || c == '[' ? 1 : c == '}' || c == ']' ? -1 : 0;
        next++;
      }
    } while (depth > 0);
    return next;
  }

  private int behindString(int at) {
    int next = at + 1;
    while (text.charAt(next) != '"') {
      next += text.charAt(next) == '\\' ? 2 : 1;
    }
    return next + 1;
  }

  static boolean isBlank(char c) {
    return c == ' ' || c == '\t' || c == '\n' || c == '\r';
  }
}
