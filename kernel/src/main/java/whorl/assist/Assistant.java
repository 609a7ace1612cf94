package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import whorl.assist.Completion.Candidate;
import whorl.sheet.Sheet;

/**
 * Answers what a front end asks about a cell of the sheet while it is written. The text may be
 * unfinished or wrong around the cursor; the sheet is only read. Places in a text are counted in
 * UTF-16 units, as Java does.
 */
public final class Assistant {
  private final Sheet sheet;
  private final CellCommands commands;

  /** An assistant that knows the names of a sheet. */
  public Assistant(Sheet sheet) {
    this(sheet, List.of());
  }

  /**
   * An assistant that knows the commands of a page too.
   *
   * @param commands the words that may begin a cell, with their per cent signs
   */
  public Assistant(Sheet sheet, List<Candidate> commands) {
    this.sheet = sheet;
    this.commands = new CellCommands(commands);
  }

  /** What could be typed at a place of a cell. */
  public Completion complete(String text, int cursor) {
    int place = within(text, cursor);
    String inFront = text.substring(0, place);
    if (CellCommands.areTyped(text, inFront)) {
      return commands.complete(inFront);
    }
    Optional<AtCursor> at = AtCursor.in(text, place);
    if (at.isEmpty()) {
      return Completion.none(place);
    }
    if (Signs.areTyped(inFront)) {
      return Signs.complete(inFront);
    }
    var completer = new Completer(sheet, at.get());
    if (CellCommands.fill(text)) {
      return completer.definitions(place);
    }
    Completion completion = completer.completion(place);
    return inFront.isBlank() ? withCommands(completion) : completion;
  }

  private Completion withCommands(Completion completion) {
    var candidates = new ArrayList<>(completion.candidates());
    candidates.addAll(commands.all());
    return new Completion(completion.start(), completion.end(), candidates);
  }

  /**
   * What is known of the word at a place of a cell, or of the function in whose parentheses it
   * stands.
   *
   * @param detail 0 for the usual, more for all
   */
  public Optional<Card> inspect(String text, int cursor, int detail) {
    int place = within(text, cursor);
    return commands
        .card(text, place)
        .or(
            () ->
                WordAt.in(text, place)
                    .flatMap(word -> new Inspector(sheet, word, detail > 0).card()))
        .map(Card::of);
  }

  /**
   * Whether a console may run a text as it is: not while a parenthesis is open, a line ends in an
   * operator, or a block has no rows or may get more. An empty line puts an end to all of that.
   */
  public static Completeness completeness(String text) {
    return Readiness.of(text);
  }

  /** A place in a text that does not lie in the middle of a character. */
  private static int within(String text, int cursor) {
    int place = Math.max(0, Math.min(cursor, text.length()));
    boolean middle =
        place > 0
            && place < text.length()
            && Character.isHighSurrogate(text.charAt(place - 1))
            && Character.isLowSurrogate(text.charAt(place));
    return middle ? place - 1 : place;
  }
}
