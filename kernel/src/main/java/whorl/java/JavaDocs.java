package whorl.java;

import com.google.gson.JsonObject;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.Documentation;

/** What JShell knows of a name in Java: its declaration, and what its author wrote about it. */
final class JavaDocs {
  private static final int MOST = 12;
  private static final Pattern INLINE_TAG = Pattern.compile("\\{@\\w+\\s+([^{}]*)\\}");
  private static final Pattern HTML_TAG = Pattern.compile("</?[a-zA-Z][^>]*>");
  private static final Pattern BLANK_LINES = Pattern.compile("\\n(?:[ \\t]*\\n)+");
  private static final Pattern MARGIN = Pattern.compile("(?m)^[ \\t]+");

  private final SourceCodeAnalysis analysis;

  JavaDocs(SourceCodeAnalysis analysis) {
    this.analysis = analysis;
  }

  /**
   * What is known of the last word of a beginning of a statement, or else of the method in whose
   * parentheses the cursor stands.
   */
  Optional<JsonObject> of(String statement, int cursor) {
    List<Documentation> found = documentation(statement, statement.length());
    if (found.isEmpty()) {
      // JShell takes a method for one only from its parenthesis on.
      found = documentation(statement + "(", statement.length() + 1);
    }
    if (found.isEmpty()) {
      found = documentation(statement, Math.min(cursor, statement.length()));
    }
    return found.isEmpty() ? Optional.empty() : Optional.of(bundle(found));
  }

  private List<Documentation> documentation(String statement, int at) {
    return analysis.documentation(statement, at, true);
  }

  private static JsonObject bundle(List<Documentation> found) {
    var bundle = new JsonObject();
    bundle.addProperty(
        "text/plain",
        found.stream().limit(MOST).map(JavaDocs::plain).collect(Collectors.joining("\n\n")));
    bundle.addProperty(
        "text/html",
        found.stream().limit(MOST).map(JavaDocs::html).collect(Collectors.joining("\n")));
    return bundle;
  }

  private static String plain(Documentation one) {
    String words = words(one);
    return words.isEmpty() ? one.signature() : one.signature() + "\n\n" + words;
  }

  private static String html(Documentation one) {
    String words = words(one);
    return "<div><code>"
        + escaped(one.signature())
        + "</code></div>"
        + (words.isEmpty()
            ? ""
            : "<div style=\"white-space: pre-wrap\">" + escaped(words) + "</div>");
  }

  /** The comment as text: nobody needs its markup to read it. */
  private static String words(Documentation one) {
    if (one.javadoc() == null) {
      return "";
    }
    String text = INLINE_TAG.matcher(one.javadoc()).replaceAll("$1");
    text = HTML_TAG.matcher(text).replaceAll("");
    text = MARGIN.matcher(text).replaceAll("");
    return BLANK_LINES
        .matcher(text)
        .replaceAll("\n\n")
        .replace("&lt;", "<")
        .replace("&gt;", ">")
        .replace("&nbsp;", " ")
        .replace("&amp;", "&")
        .strip();
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
