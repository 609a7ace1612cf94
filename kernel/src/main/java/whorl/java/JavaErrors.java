package whorl.java;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import jdk.jshell.Diag;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;

/** Words what is wrong with a text in Java. */
final class JavaErrors {
  private static final String COMPILER = "CompileError";
  private static final String UNRESOLVED = "UnresolvedReference";
  private static final String MAGIC = "MagicError";

  private static final Pattern SYMBOL = Pattern.compile("symbol:\\s+(.*)");
  private static final Pattern NOWHERE = Pattern.compile("location:\\s+class");

  private final Frames frames;

  JavaErrors(Frames frames) {
    this.frames = frames;
  }

  /** What the compiler does not take. */
  static Failure refused(List<Diag> reasons, JavaText text, JavaText.Snippet snippet) {
    List<Diagnostic> errors =
        reasons.stream()
            .filter(Diag::isError)
            .map(reason -> refused(reason, text, snippet.start()))
            .toList();
    return new Failure(
        COMPILER,
        text,
        errors.isEmpty()
            ? List.of(error("The compiler does not take this.", text.span(snippet), ""))
            : errors);
  }

  private static Diagnostic refused(Diag reason, JavaText text, int start) {
    var said = new ArrayList<String>();
    for (String line : Frames.withoutWrappers(reason.getMessage(Locale.ENGLISH)).lines().toList()) {
      String words = line.strip();
      Matcher symbol = SYMBOL.matcher(words);
      if (symbol.matches() && said.size() == 1) {
        said.set(0, said.get(0) + ": " + symbol.group(1));
      } else if (!NOWHERE.matcher(words).matches()) {
        said.add(words);
      }
    }
    return error(
        said.get(0),
        text.span(start + (int) reason.getStartPosition(), start + (int) reason.getEndPosition()),
        String.join("\n", said.subList(1, said.size())));
  }

  /** An exception that code of cells let through. */
  Failure thrown(Throwable thrown, JavaText text, Span at) {
    Span place = frames.line(thrown, text).map(text::lineSpan).orElse(at);
    int line = text.source().line(place.start());
    return new Failure(
        Frames.type(thrown),
        text,
        List.of(
            error(
                Frames.words(thrown),
                place,
                String.join("\n", frames.lines(thrown, new Origins.Place(text, line))))));
  }

  /** An exception that cannot even be said. */
  static Failure unsayable(Throwable thrown, JavaText text, Span at) {
    String type = Frames.type(thrown);
    return new Failure(type, text, List.of(error(type, at, "")));
  }

  /** A declaration was used that mentions something not declared. */
  static Failure unresolved(String declaration, String missing, JavaText text, Span at) {
    String problem = declaration + " mentions " + missing + ", which is not declared.";
    return new Failure(UNRESOLVED, text, List.of(error(problem, at, "")));
  }

  /** A magic says that it cannot do what was asked. */
  static Failure magic(String problem, JavaText text, Span at) {
    return new Failure(MAGIC, text, List.of(error(problem, at, "")));
  }

  private static Diagnostic error(String problem, Span place, String reason) {
    return Diagnostic.of("java", problem, place, reason, "");
  }
}
