package whorl.notebook;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * A note as text: the headings of its prose, and the steps of its cells. The prose itself stays in
 * the note; whoever prints one wants the results.
 */
public final class PrintedNote {
  private static final Pattern HEADING = Pattern.compile(" {0,3}#{1,6}[ \\t].*\\S.*");
  private static final Pattern FENCE = Pattern.compile(" {0,3}(```|~~~).*");

  private PrintedNote() {}

  /** The parts of the text, to be set apart by blank lines. */
  public static List<String> parts(Note note, NoteRun run) {
    var reports = run.cells().iterator();
    var parts = new ArrayList<String>();
    for (Cell cell : note.cells()) {
      if (cell.kind() == CellKind.MARKDOWN) {
        parts.addAll(headings(cell.source()));
      } else if (cell.kind().isCode()) {
        String text = CellOutputs.text(reports.next());
        if (!text.isEmpty()) {
          parts.add(text);
        }
      }
    }
    return parts;
  }

  private static List<String> headings(String prose) {
    var headings = new ArrayList<String>();
    boolean quoted = false;
    for (String line : prose.lines().toList()) {
      if (FENCE.matcher(line).matches()) {
        quoted = !quoted;
      } else if (!quoted && HEADING.matcher(line).matches()) {
        headings.add(line.strip());
      }
    }
    return headings;
  }
}
