package whorl.java;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * What an exception says and where it came from: the lines of cells, innermost first, and of the
 * libraries only a little above the cell that called them.
 */
final class Frames {
  private static final int MOST_OF_CELLS = 10;
  private static final int MOST_OF_LIBRARIES = 4;
  private static final int MOST_CAUSES = 5;

  private static final Pattern WRAPPER = Pattern.compile("(REPL\\.)?\\$JShell\\$\\d+[A-Z]*\\$?");
  private static final Pattern LAMBDA = Pattern.compile("lambda\\$.*");
  private static final String CONSTRUCTOR = "<init>";
  private static final String SNIPPET = "do_it$";

  private final Origins origins;

  Frames(Origins origins) {
    this.origins = origins;
  }

  /** The simple name of the class of an exception. */
  static String type(Throwable thrown) {
    String name = thrown.getClass().getSimpleName();
    return name.isEmpty() ? withoutWrappers(thrown.getClass().getName()) : name;
  }

  /** The type of an exception and what it says. */
  static String words(Throwable thrown) {
    String message = thrown.getLocalizedMessage();
    return message == null || message.isBlank()
        ? type(thrown)
        : type(thrown) + ": " + withoutWrappers(message.strip());
  }

  /** A text without the names of the classes that JShell makes. */
  static String withoutWrappers(String text) {
    return WRAPPER.matcher(text).replaceAll("");
  }

  /** What an exception says and the line of a cell from which it came, in one line. */
  String summary(Throwable thrown) {
    String place =
        Arrays.stream(thrown.getStackTrace())
            .flatMap(frame -> origins.of(frame).stream())
            .findFirst()
            .map(known -> " (" + known.text().label() + ", line " + known.line() + ")")
            .orElse("");
    return words(thrown).lines().findFirst().orElse("") + place;
  }

  /** The innermost line of a text from which an exception came. */
  Optional<Integer> line(Throwable thrown, JavaText text) {
    return Arrays.stream(thrown.getStackTrace())
        .flatMap(frame -> origins.of(frame).stream())
        .filter(place -> place.text() == text)
        .map(Origins.Place::line)
        .findFirst();
  }

  /**
   * Where an exception and its causes came from, line by line.
   *
   * @param known a line that needs no saying, where the exception came from nowhere else
   */
  List<String> lines(Throwable thrown, Origins.Place known) {
    var lines = new ArrayList<String>();
    List<String> frames = frames(thrown);
    if (!frames.equals(List.of(words("", known)))) {
      lines.addAll(frames);
    }
    var seen = Collections.newSetFromMap(new IdentityHashMap<Throwable, Boolean>());
    seen.add(thrown);
    @Nullable Throwable cause = thrown.getCause();
    while (cause != null && seen.add(cause) && seen.size() <= MOST_CAUSES + 1) {
      lines.add("Caused by " + words(cause));
      lines.addAll(frames(cause));
      cause = cause.getCause();
    }
    return lines;
  }

  private List<String> frames(Throwable thrown) {
    StackTraceElement[] stack = thrown.getStackTrace();
    int first = 0;
    while (first < stack.length && !Origins.isCell(stack[first])) {
      first++;
    }
    var lines = new ArrayList<String>(library(Arrays.asList(stack).subList(0, first)));
    var cells = new ArrayList<String>();
    for (StackTraceElement frame : stack) {
      origins.of(frame).map(place -> words(within(frame), place)).ifPresent(cells::add);
    }
    lines.addAll(shortened(cells));
    return lines;
  }

  private static List<String> library(List<StackTraceElement> frames) {
    // How the kernel came to refuse something is no help.
    int own = 0;
    for (int i = 0; i < frames.size(); i++) {
      own = frames.get(i).getClassName().startsWith("whorl.") ? i + 1 : own;
    }
    List<String> lines =
        frames.subList(own, frames.size()).stream().map(frame -> "at " + frame).toList();
    if (lines.size() <= MOST_OF_LIBRARIES) {
      return lines;
    }
    // What threw, and what the cell called.
    var ends = new ArrayList<>(lines.subList(0, MOST_OF_LIBRARIES / 2));
    ends.add("… " + (lines.size() - MOST_OF_LIBRARIES) + " more");
    ends.addAll(lines.subList(lines.size() - MOST_OF_LIBRARIES / 2, lines.size()));
    return ends;
  }

  /** A recursion fills the stack with the same few lines. */
  private static List<String> shortened(List<String> lines) {
    var distinct = new LinkedHashMap<String, Integer>();
    lines.forEach(line -> distinct.merge(line, 1, Integer::sum));
    var shortened = new ArrayList<String>();
    distinct.forEach(
        (line, times) -> shortened.add(times == 1 ? line : line + "  (" + times + " times)"));
    return shortened.size() <= MOST_OF_CELLS ? shortened : shortened.subList(0, MOST_OF_CELLS);
  }

  private static String words(String within, Origins.Place place) {
    String where = place.text().label() + ", line " + place.line();
    String written = place.text().source().lineText(place.line()).strip();
    return "in " + (within.isEmpty() ? where : within + ", " + where) + ":  " + written;
  }

  /** The method as its author knows it. */
  private static String within(StackTraceElement frame) {
    String method = frame.getMethodName();
    if (LAMBDA.matcher(method).matches()) {
      return "a lambda";
    }
    String owner = withoutWrappers(frame.getClassName()).replace('$', '.');
    if (method.equals(CONSTRUCTOR)) {
      return "new " + owner;
    }
    return method.equals(SNIPPET) ? "" : owner.isEmpty() ? method : owner + "." + method;
  }
}
