package whorl.notebook;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import whorl.sheet.InputSetting;

/** Gives inputs of a note other values, in the text of the note, where they are defined. */
public final class InputSettings {
  private InputSettings() {}

  /**
   * A note with some inputs set.
   *
   * @throws IllegalArgumentException if a name is set twice, unknown or derived, with a message for
   *     people
   */
  public static Note applied(Note note, List<InputSetting> settings) throws NoteFileException {
    var names = new HashSet<String>();
    Note set = note;
    for (InputSetting setting : settings) {
      if (!names.add(setting.name())) {
        throw new IllegalArgumentException(setting.name() + " is set twice");
      }
      set = applied(set, setting);
    }
    return set;
  }

  private static Note applied(Note note, InputSetting setting) throws NoteFileException {
    var texts = new LinkedHashMap<Integer, String>();
    for (Cell cell : note.cells()) {
      if (cell.kind() == CellKind.SHEET) {
        InputSetting.Applied applied = setting.applyTo(cell.source());
        switch (applied.found()) {
          case ABSENT -> {}
          case INPUT -> texts.put(cell.position(), applied.text());
          case DERIVED ->
              throw new IllegalArgumentException(
                  setting.name()
                      + " cannot be set, for cell "
                      + cell.position()
                      + " derives it; only an input can be set");
        }
      }
    }
    if (texts.isEmpty()) {
      throw new IllegalArgumentException("there is no input " + setting.name() + " to set");
    }
    return note.withSources(texts);
  }
}
