package whorl.java;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import jdk.jshell.Snippet;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.SnippetWrapper;

/**
 * Finds the lines of cells from which code comes. JShell puts a snippet into a class of its own
 * making, which has other lines, and into another when something that it mentions changes.
 */
final class Origins {
  private static final Pattern CLASS = Pattern.compile("(REPL\\.\\$JShell\\$\\d+[A-Z]*)(\\$.*)?");

  private final SourceCodeAnalysis analysis;
  private final Map<Snippet, Origin> origins = new LinkedHashMap<>();

  private record Origin(JavaText text, int start) {}

  /**
   * A line of a text.
   *
   * @param line from 1
   */
  record Place(JavaText text, int line) {}

  Origins(SourceCodeAnalysis analysis) {
    this.analysis = analysis;
  }

  /** Notes that a snippet stands at an index of a text. */
  synchronized void add(Snippet snippet, JavaText text, int start) {
    origins.put(snippet, new Origin(text, start));
  }

  /** Forgets a snippet. */
  synchronized void remove(Snippet snippet) {
    origins.remove(snippet);
  }

  /** Whether a frame of a stack is code of a cell. */
  static boolean isCell(StackTraceElement frame) {
    return CLASS.matcher(frame.getClassName()).matches();
  }

  /** The place from which a frame of a stack comes; none if it is unknown. */
  synchronized Optional<Place> of(StackTraceElement frame) {
    Matcher name = CLASS.matcher(frame.getClassName());
    if (!name.matches()) {
      return Optional.empty();
    }
    // Snippets that mention each other may share a class.
    var lines = new TreeMap<Integer, Place>();
    origins.forEach(
        (snippet, origin) -> {
          SnippetWrapper wrapper = analysis.wrapper(snippet);
          if (wrapper.fullClassName().equals(name.group(1))) {
            addLines(snippet.source(), origin, wrapper, lines);
          }
        });
    // A line that JShell adds follows the one that it belongs to.
    return Optional.ofNullable(lines.floorEntry(frame.getLineNumber())).map(Map.Entry::getValue);
  }

  private static void addLines(
      String code, Origin origin, SnippetWrapper wrapper, Map<Integer, Place> lines) {
    String wrapped = wrapper.wrapped();
    int[] ends =
        IntStream.range(0, wrapped.length()).filter(i -> wrapped.charAt(i) == '\n').toArray();
    for (int i = 0; i < code.length(); i++) {
      if (!Character.isWhitespace(code.charAt(i))) {
        int found = Arrays.binarySearch(ends, wrapper.sourceToWrappedPosition(i));
        int line = found < 0 ? -found : found + 1;
        if (!lines.containsKey(line)) {
          lines.put(line, new Place(origin.text(), origin.text().line(origin.start() + i)));
        }
      }
    }
  }
}
