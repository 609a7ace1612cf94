package whorl.syntax;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Texts that the tests of this room read. */
final class Resources {
  private static final Pattern ESCAPE = Pattern.compile("\\\\(?:([ntr\\\\])|u([0-9a-fA-F]{4}))");

  private Resources() {}

  static String text(String name) throws IOException {
    try (var stream = Resources.class.getResourceAsStream(name)) {
      if (stream == null) {
        throw new FileNotFoundException(name);
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  static List<String> lines(String name) throws IOException {
    return text(name).lines().toList();
  }

  /** A cell of a table with its escapes for line ends, tabs and single characters resolved. */
  static String unescaped(String cell) {
    return ESCAPE
        .matcher(cell)
        .replaceAll(found -> Matcher.quoteReplacement(resolved(found.group(1), found.group(2))));
  }

  private static String resolved(String letter, String code) {
    if (letter == null) {
      return Character.toString(Integer.parseInt(code, 16));
    }
    return switch (letter) {
      case "n" -> "\n";
      case "t" -> "\t";
      case "r" -> "\r";
      default -> "\\";
    };
  }
}
