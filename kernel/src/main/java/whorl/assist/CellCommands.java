package whorl.assist;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import whorl.assist.Completion.Candidate;
import whorl.report.InfoCard;

/** The words with a per cent sign in front that say something about a cell or the page. */
final class CellCommands {
  private static final Pattern TYPED = Pattern.compile("%%?[a-z]*");
  private static final Pattern WORD = Pattern.compile("%%?[a-z]+");

  private final List<Candidate> all;

  CellCommands(List<Candidate> all) {
    this.all = List.copyOf(all);
  }

  /** All commands, for an empty cell. */
  List<Candidate> all() {
    return all;
  }

  /** Whether a cell holds commands and no statements; they begin with one sign. */
  static boolean fill(String text) {
    String start = text.stripLeading();
    return start.startsWith("%") && !start.startsWith("%%");
  }

  /** Whether the first word of a line of commands, or of a cell, is what stands at the cursor. */
  static boolean areTyped(String text, String inFront) {
    String typed = typed(inFront);
    boolean first = inFront.strip().equals(typed);
    return TYPED.matcher(typed).matches() ? first || fill(text) : typed.isEmpty() && fill(text);
  }

  /** The commands that begin as typed. */
  Completion complete(String inFront) {
    String typed = typed(inFront);
    boolean first = inFront.strip().equals(typed);
    return new Completion(
        inFront.length() - typed.length(),
        inFront.length(),
        all.stream()
            .filter(command -> command.text().startsWith(typed))
            .filter(command -> first || !command.text().startsWith("%%"))
            .toList());
  }

  /** The line of the cursor up to it, without the blanks in front. */
  private static String typed(String inFront) {
    return inFront.substring(inFront.lastIndexOf('\n') + 1).stripLeading();
  }

  /** The card of the command that the cursor touches. */
  Optional<InfoCard> card(String text, int cursor) {
    Matcher word = WORD.matcher(text);
    while (word.find()) {
      if (word.start() <= cursor && cursor <= word.end()) {
        return all.stream()
            .filter(command -> command.text().equals(word.group()))
            .map(command -> new InfoCard(command.text(), command.detail(), List.of()))
            .findFirst();
      }
    }
    return Optional.empty();
  }
}
