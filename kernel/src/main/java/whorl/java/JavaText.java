package whorl.java;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.Completeness;
import jdk.jshell.SourceCodeAnalysis.CompletionInfo;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;

/**
 * A text in Java with magics: a cell, or what a cell loads. A line that begins with {@code %} and a
 * word is a magic if it stands between statements, and only there.
 *
 * <p>Places are indices into the text as a {@code String} has them.
 */
final class JavaText {
  private static final Pattern HEAD = Pattern.compile("\\s*(%%java\\b[^\\r\\n]*)");
  private static final Pattern LINE_MAGIC =
      Pattern.compile("^[ \\t]*%(\\w+)(?:[ \\t]+([^\\r\\n]*))?(?=[\\r\\n]|\\z)", Pattern.MULTILINE);
  private static final Pattern CELL_MAGIC =
      Pattern.compile("\\s*%%(\\w+)([^\\r\\n]*)(?:\\R(.*))?", Pattern.DOTALL);
  private static final Pattern ARGUMENT = Pattern.compile("\"((?:[^\"\\\\]|\\\\.)*)\"|\\S+");

  private final String label;
  private final Source source;
  private final String code;

  /** A part of a text that runs as a whole. */
  sealed interface Piece {
    /** Where it begins. */
    int start();

    /** Where it ends. */
    int end();
  }

  /**
   * Statements or declarations of Java, usually one.
   *
   * @param code what to run; where a semicolon was left out it is there
   * @param closed whether its author closed it with a semicolon
   */
  record Snippet(int start, int end, String code, boolean closed) implements Piece {}

  /** A magic of one line. */
  record LineMagic(int start, int end, String name, List<String> arguments) implements Piece {}

  /** A magic with the rest of the text. */
  record CellMagic(int start, int end, String name, List<String> arguments, String body)
      implements Piece {}

  /**
   * A text.
   *
   * @param label how messages call it, as {@code cell [2]}
   * @param text with or without a first line {@code %%java}
   */
  JavaText(String label, String text) {
    this.label = label;
    this.source = new Source(text);
    Matcher head = HEAD.matcher(text);
    this.code = head.lookingAt() ? " ".repeat(head.end()) + text.substring(head.end()) : text;
  }

  String label() {
    return label;
  }

  Source source() {
    return source;
  }

  /** The text as Java and magics, without its first line {@code %%java}. */
  String code() {
    return code;
  }

  /**
   * A stretch as messages point at it: on one line, and at the last sign of the text where it lies
   * behind that.
   */
  Span span(int start, int end) {
    int from = codePoints(Math.min(start, Math.max(0, code.stripTrailing().length() - 1)));
    Span line = source.lineSpan(source.line(from));
    return new Span(from, Math.max(from, Math.min(line.end(), codePoints(end))));
  }

  /** What messages about a piece as a whole point at. */
  Span span(Piece piece) {
    int start = piece.start();
    while (start < piece.end() && Character.isWhitespace(code.charAt(start))) {
      start++;
    }
    return lineSpan(line(start));
  }

  /** The last line that is not blank. */
  Span lastLine() {
    return lineSpan(line(Math.max(0, code.stripTrailing().length() - 1)));
  }

  /** A line without the blanks around it. */
  Span lineSpan(int line) {
    String written = source.lineText(line);
    int start = source.lineSpan(line).start();
    int indent = codePoints(written, written.length() - written.stripLeading().length());
    String bare = written.strip();
    return new Span(start + indent, start + indent + codePoints(bare, bare.length()));
  }

  /** The line of a place, from 1. */
  int line(int index) {
    return source.line(codePoints(index));
  }

  private int codePoints(int index) {
    return codePoints(code, Math.max(0, Math.min(index, code.length())));
  }

  private static int codePoints(String text, int index) {
    return text.codePointCount(0, index);
  }

  /**
   * The pieces of the text in order. What is not complete is a snippet up to the end, which the
   * compiler refuses with its reason.
   *
   * @param lineMagics those that are known; others are seen only where a statement could begin
   */
  List<Piece> pieces(SourceCodeAnalysis analysis, Set<String> lineMagics) {
    Matcher whole = CELL_MAGIC.matcher(code);
    if (whole.matches()) {
      return List.of(
          new CellMagic(
              code.indexOf("%%"),
              whole.end(2),
              whole.group(1),
              arguments(whole.group(2)),
              whole.group(3) == null ? "" : whole.group(3)));
    }
    var pieces = new ArrayList<Piece>();
    int at = 0;
    while (true) {
      Optional<Piece> piece = magicAt(at);
      if (piece.isEmpty()) {
        piece = snippetAt(at, analysis, lineMagics);
      }
      if (piece.isEmpty()) {
        return pieces;
      }
      pieces.add(piece.get());
      at = piece.get().end();
    }
  }

  private Optional<Piece> magicAt(int at) {
    int start = at;
    while (start < code.length() && Character.isWhitespace(code.charAt(start))) {
      start++;
    }
    Matcher magic = LINE_MAGIC.matcher(code);
    // The first sign of the text begins a line too; else only blanks may stand before it.
    return magic.find(lineStart(start)) && magic.start(1) == start + 1
        ? Optional.of(new LineMagic(start, magic.end(), magic.group(1), arguments(magic.group(2))))
        : Optional.empty();
  }

  private int lineStart(int index) {
    int start = index;
    while (start > 0 && "\r\n".indexOf(code.charAt(start - 1)) < 0) {
      start--;
    }
    return start;
  }

  private Optional<Piece> snippetAt(int at, SourceCodeAnalysis analysis, Set<String> lineMagics) {
    int end = at;
    while (true) {
      end = nextMagic(end, lineMagics);
      String rest = code.substring(at, end);
      CompletionInfo info = analysis.analyzeCompletion(rest);
      Completeness completeness = info.completeness();
      if (completeness == Completeness.EMPTY) {
        return end == code.length() ? Optional.empty() : magicAt(end);
      }
      boolean open =
          completeness == Completeness.DEFINITELY_INCOMPLETE
              || completeness == Completeness.CONSIDERED_INCOMPLETE;
      if (!open) {
        int snippetEnd = end - info.remaining().length();
        return Optional.of(
            new Snippet(
                at,
                snippetEnd,
                info.source(),
                code.substring(at, snippetEnd).stripTrailing().endsWith(";")));
      }
      if (end == code.length()) {
        return Optional.of(new Snippet(at, end, rest, false));
      }
      // The line stands within a comment, a text block or braces.
      end++;
    }
  }

  /** Where the first line of a known magic begins, from a place on; the end if there is none. */
  private int nextMagic(int from, Set<String> lineMagics) {
    Matcher magic = LINE_MAGIC.matcher(code);
    for (int at = from; magic.find(at); at = magic.end()) {
      if (lineMagics.contains(magic.group(1))) {
        return magic.start();
      }
    }
    return code.length();
  }

  private static List<String> arguments(@Nullable String text) {
    if (text == null) {
      return List.of();
    }
    return ARGUMENT
        .matcher(text)
        .results()
        .map(
            argument ->
                argument.group(1) == null
                    ? argument.group()
                    : argument.group(1).replaceAll("\\\\(.)", "$1"))
        .toList();
  }
}
