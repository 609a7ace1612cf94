package whorl.assist;

import java.util.List;
import whorl.assist.Completion.Candidate;

/** The words at the start of a cell that say what the whole of it is. */
final class CellCommands {
  private static final List<Candidate> ALL =
      List.of(
          new Candidate("%%java", "magic", "the cell is Java"),
          new Candidate("%%sheet", "magic", "the cell is of the sheet"));

  private CellCommands() {}

  /** The commands that begin as typed. */
  static List<Candidate> beginning(String typed) {
    return ALL.stream().filter(command -> command.text().startsWith(typed)).toList();
  }
}
