package whorl.java;

import com.google.gson.JsonObject;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import jdk.jshell.JShell;
import jdk.jshell.SourceCodeAnalysis;
import org.dflib.jjava.jupyter.kernel.magic.MagicsRegistry;
import whorl.assist.Completeness;
import whorl.assist.Completion;

/** Answers what a front end asks about the text of a cell in Java, from what JShell knows. */
final class JavaServices {
  private static final String INDENT = "    ";
  private static final Pattern OPENED = Pattern.compile(".*[{(\\[]\\s*(//.*)?");

  private final SourceCodeAnalysis analysis;
  private final MagicsRegistry magics;
  private final Candidates candidates;
  private final JavaDocs docs;

  JavaServices(JShell shell, MagicsRegistry magics) {
    this.analysis = shell.sourceCodeAnalysis();
    this.magics = magics;
    this.candidates = new Candidates(shell);
    this.docs = new JavaDocs(analysis);
  }

  /** What could be typed at the cursor. */
  Completion complete(String code, int cursor) {
    var text = new JavaText("", code.substring(0, cursor));
    Optional<JavaText.Piece> last = last(text);
    if (last.isPresent() && last.get() instanceof JavaText.LineMagic magic) {
      boolean typing = cursor == magic.start() + 1 + magic.name().length();
      return typing
          ? candidates.magics(magics.getLineMagicNames(), magic.name(), magic.start(), cursor)
          : Completion.none(cursor);
    }
    int start = statement(text, last);
    if (text.code().substring(start).strip().equals("%")) {
      return candidates.magics(magics.getLineMagicNames(), "", cursor - 1, cursor);
    }
    return candidates.java(text.code().substring(start), start);
  }

  /**
   * What is known of the word at the cursor, or else of the method in whose parentheses it stands.
   */
  Optional<JsonObject> inspect(String code, int cursor) {
    int end = cursor;
    while (end < code.length() && Character.isJavaIdentifierPart(code.charAt(end))) {
      end++;
    }
    var text = new JavaText("", code.substring(0, end));
    Optional<JavaText.Piece> last = last(text);
    if (last.isPresent() && !(last.get() instanceof JavaText.Snippet)) {
      return Optional.empty();
    }
    int start = statement(text, last);
    return docs.of(text.code().substring(start), Math.max(0, cursor - start));
  }

  /** Whether a console may run the text as it is. */
  Completeness completeness(String code) {
    var text = new JavaText("", code);
    Optional<JavaText.Piece> last = last(text);
    if (last.isPresent() && last.get() instanceof JavaText.CellMagic magic) {
      boolean over = magic.body().isEmpty() || magic.body().endsWith("\n");
      return over ? new Completeness.Complete() : new Completeness.Incomplete("");
    }
    if (last.isEmpty() || !(last.get() instanceof JavaText.Snippet snippet)) {
      return new Completeness.Complete();
    }
    String rest = text.code().substring(snippet.start(), snippet.end());
    return switch (analysis.analyzeCompletion(rest).completeness()) {
      case COMPLETE, COMPLETE_WITH_SEMI, EMPTY -> new Completeness.Complete();
      case CONSIDERED_INCOMPLETE, DEFINITELY_INCOMPLETE ->
          new Completeness.Incomplete(indent(text.code()));
      case UNKNOWN -> new Completeness.Invalid();
    };
  }

  /** The indent of the last line, and more where it opens something. */
  private static String indent(String code) {
    String line = code.stripTrailing();
    line = line.substring(Math.max(line.lastIndexOf('\n'), line.lastIndexOf('\r')) + 1);
    String indent = line.substring(0, line.length() - line.stripLeading().length());
    return OPENED.matcher(line).matches() ? indent + INDENT : indent;
  }

  private Optional<JavaText.Piece> last(JavaText text) {
    List<JavaText.Piece> pieces = text.pieces(analysis, magics.getLineMagicNames());
    return pieces.isEmpty() ? Optional.empty() : Optional.of(pieces.get(pieces.size() - 1));
  }

  /** Where the statement begins that the end of a text belongs to. */
  private static int statement(JavaText text, Optional<JavaText.Piece> last) {
    int length = text.code().length();
    return last.filter(piece -> piece.end() == length).map(JavaText.Piece::start).orElse(length);
  }
}
