package whorl.java;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.jspecify.annotations.Nullable;

/** The texts in Java that a file holds: the whole of it, or the Java cells of a notebook. */
final class LoadedFile {
  private static final Pattern HEAD = Pattern.compile("\\s*%%(\\w+)");
  private static final String JAVA = "java";

  private LoadedFile() {}

  static List<JavaText> texts(Path file) throws MagicFailure {
    String text = read(file);
    String name = String.valueOf(file.getFileName());
    if (!name.endsWith(".ipynb")) {
      return List.of(new JavaText(name, text));
    }
    try {
      List<JavaText> cells = cells(name, JsonParser.parseString(text));
      if (cells.isEmpty()) {
        throw new MagicFailure(file + " has no cells in Java.");
      }
      return cells;
    } catch (JsonParseException | IllegalStateException e) {
      throw new MagicFailure(file + " is not a notebook.", e);
    }
  }

  private static String read(Path file) throws MagicFailure {
    try {
      return Files.readString(file);
    } catch (NoSuchFileException e) {
      throw new MagicFailure(
          "There is no file " + file + " (looked for from " + Path.of("").toAbsolutePath() + ").",
          e);
    } catch (CharacterCodingException e) {
      throw new MagicFailure(file + " is not in UTF-8.", e);
    } catch (IOException e) {
      throw new MagicFailure(file + " cannot be read: " + e.getMessage(), e);
    }
  }

  private static List<JavaText> cells(String name, JsonElement notebook) {
    boolean plain = isJava(notebook.getAsJsonObject());
    var texts = new ArrayList<JavaText>();
    int position = 0;
    for (JsonElement element : notebook.getAsJsonObject().getAsJsonArray("cells")) {
      position++;
      JsonObject cell = element.getAsJsonObject();
      String source = source(cell.get("source"));
      if (string(cell.get("cell_type")).equals("code") && isJava(source, plain)) {
        texts.add(new JavaText(name + ", cell " + position, source));
      }
    }
    return texts;
  }

  private static boolean isJava(JsonObject notebook) {
    JsonObject metadata = object(notebook, "metadata");
    String language = string(object(metadata, "kernelspec").get("language"));
    if (language.isEmpty()) {
      language = string(object(metadata, "language_info").get("name"));
    }
    return language.toLowerCase(Locale.ROOT).equals(JAVA);
  }

  private static boolean isJava(String source, boolean plain) {
    var head = HEAD.matcher(source);
    return head.lookingAt() ? head.group(1).equals(JAVA) : plain;
  }

  private static String source(@Nullable JsonElement source) {
    return source instanceof JsonArray lines
        ? StreamSupport.stream(lines.spliterator(), false)
            .map(LoadedFile::string)
            .collect(Collectors.joining())
        : string(source);
  }

  private static JsonObject object(JsonObject parent, String name) {
    return parent.get(name) instanceof JsonObject child ? child : new JsonObject();
  }

  private static String string(@Nullable JsonElement element) {
    return element instanceof JsonPrimitive primitive ? primitive.getAsString() : "";
  }
}
