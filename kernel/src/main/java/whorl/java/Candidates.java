package whorl.java;

import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import jdk.jshell.JShell;
import jdk.jshell.SourceCodeAnalysis.Suggestion;
import jdk.jshell.VarSnippet;
import whorl.assist.Completion;
import whorl.assist.Completion.Candidate;

/**
 * What could be typed in Java. JShell says what, not what sort of thing it is; that is told from
 * the way names are written in Java.
 */
final class Candidates {
  private static final int MOST = 500;
  private static final Pattern CONSTANT = Pattern.compile("[A-Z][A-Z0-9_$]+");
  private static final List<String> KEYWORDS =
      List.of(
          ("abstract assert boolean break byte case catch char class continue default do double else"
                  + " enum extends final finally float for if implements import instanceof int"
                  + " interface long new null private protected public record return short static"
                  + " super switch synchronized this throw throws true false try var void volatile"
                  + " while")
              .split(" "));

  private final JShell shell;

  Candidates(JShell shell) {
    this.shell = shell;
  }

  /** Magics whose names begin as typed. */
  Completion magics(Collection<String> names, String typed, int start, int cursor) {
    return new Completion(
        start,
        cursor,
        names.stream()
            .filter(name -> name.startsWith(typed))
            .sorted()
            .map(name -> new Candidate("%" + name, "magic", ""))
            .toList());
  }

  /**
   * What could follow a beginning of a statement.
   *
   * @param start where the statement begins in the cell
   */
  Completion java(String statement, int start) {
    var anchor = new int[1];
    List<Suggestion> suggestions =
        shell.sourceCodeAnalysis().completionSuggestions(statement, statement.length(), anchor);
    String typed = statement.substring(anchor[0]);
    boolean isPart = statement.substring(0, anchor[0]).stripTrailing().endsWith(".");
    boolean isImport = statement.stripLeading().startsWith("import ");
    Stream<String> words =
        isPart || typed.isEmpty()
            ? Stream.empty()
            : KEYWORDS.stream().filter(word -> word.startsWith(typed));
    var candidates = new LinkedHashMap<String, Candidate>();
    Stream.concat(
            suggestions.stream()
                .sorted(Comparator.comparing(suggestion -> !suggestion.matchesType()))
                .map(Suggestion::continuation),
            words)
        .limit(MOST)
        .forEach(text -> candidates.putIfAbsent(text, candidate(text, isPart, isImport)));
    int from = start + anchor[0];
    return new Completion(from, start + statement.length(), List.copyOf(candidates.values()));
  }

  private Candidate candidate(String text, boolean isPart, boolean isImport) {
    if (!isPart) {
      Optional<VarSnippet> variable =
          shell.variables().filter(each -> each.name().equals(text)).findFirst();
      if (variable.isPresent()) {
        return new Candidate(text, "variable", variable.get().typeName());
      }
      if (KEYWORDS.contains(text)) {
        return new Candidate(text, "keyword", "");
      }
    }
    return new Candidate(text, type(text, isPart, isImport), isPart ? "" : declared(text));
  }

  /** The heads of the methods that cells declare by a name. */
  private String declared(String text) {
    Map<String, String> heads = new LinkedHashMap<>();
    shell
        .methods()
        .filter(method -> text.startsWith(method.name() + "("))
        .forEach(
            method ->
                heads.put(
                    method.signature(),
                    result(method.signature())
                        + " "
                        + method.name()
                        + "("
                        + method.parameterTypes()
                        + ")"));
    return String.join("; ", heads.values());
  }

  private static String result(String signature) {
    return signature.substring(signature.lastIndexOf(')') + 1);
  }

  private static String type(String text, boolean isPart, boolean isImport) {
    char first = text.charAt(0);
    if (text.contains("(")) {
      return Character.isUpperCase(first) ? "class" : "method";
    }
    if (CONSTANT.matcher(text).matches()) {
      return "field";
    }
    if (Character.isUpperCase(first)) {
      return "class";
    }
    if (isImport || text.endsWith(".")) {
      return "module";
    }
    return isPart ? "field" : "variable";
  }
}
