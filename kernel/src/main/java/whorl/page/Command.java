package whorl.page;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A line that asks about the page or mends it, and is no part of the sheet.
 *
 * @param word what is asked for
 * @param names behind the word
 */
record Command(Word word, List<String> names) {
  /** The commands. */
  enum Word {
    DEFINITIONS("%definitions", "lists what the sheet defines, and where"),
    RESULTS("%results", "shows the steps of every cell as they stand"),
    WITHDRAW("%withdraw", "withdraws definitions by name; what uses them waits");

    private final String text;
    private final String effect;

    Word(String text, String effect) {
      this.text = text;
      this.effect = effect;
    }

    String text() {
      return text;
    }

    /** What it does, for people. */
    String effect() {
      return effect;
    }
  }

  /** Copies the list. */
  Command {
    names = List.copyOf(names);
  }

  /** The words of all commands. */
  static List<String> words() {
    return Arrays.stream(Word.values()).map(Word::text).toList();
  }

  /** Whether a cell of the sheet holds commands rather than statements. */
  static boolean begins(String body) {
    return body.stripLeading().startsWith("%");
  }

  /**
   * Reads a cell of commands, one a line.
   *
   * @throws IllegalArgumentException if a line is none, with a message for the author
   */
  static List<Command> read(String body) {
    var commands = new ArrayList<Command>();
    for (String line : body.lines().map(String::strip).toList()) {
      if (!line.isEmpty() && !line.startsWith("#")) {
        commands.add(ofLine(line));
      }
    }
    return commands;
  }

  private static Command ofLine(String line) {
    String text = line.split("#", 2)[0].strip();
    List<String> parts = List.of(text.split("[\\s,]+"));
    List<String> names = parts.subList(1, parts.size());
    Word word =
        Arrays.stream(Word.values())
            .filter(candidate -> candidate.text.equals(parts.get(0)))
            .findFirst()
            .orElseThrow(() -> new IllegalArgumentException(unknown(line)));
    if (word == Word.WITHDRAW && names.isEmpty()) {
      throw new IllegalArgumentException(
          "A name is missing: %withdraw n withdraws the definition of n.");
    }
    if (word != Word.WITHDRAW && !names.isEmpty()) {
      throw new IllegalArgumentException(
          word.text + " stands by itself, but behind it is: " + String.join(" ", names));
    }
    return new Command(word, names);
  }

  private static String unknown(String line) {
    String known = words().stream().collect(Collectors.joining(", "));
    return line.startsWith("%")
        ? "There is no command "
            + line.split("\\s+", 2)[0]
            + ". There are "
            + known
            + "; %%java on the first line begins a cell in Java."
        : "A cell with commands holds nothing else: move this line to a cell of its own: " + line;
  }
}
