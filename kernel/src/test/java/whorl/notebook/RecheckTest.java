package whorl.notebook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RecheckTest {
  private static final String[] CELLS = {
    "# Wheel", "m [kg] = 4\nv = (3, 0, 4) m/s", "F [kN] = m * g_n\ncheck m <= 5 kg\nassume m > 0 kg"
  };

  private static List<String> differences(String stored) throws NoteFileException {
    return new Recheck(Notes.run(Note.parse("n.ipynb", stored))).differences();
  }

  @Test
  void aNoteAgreesWithTheRunThatWroteIt() throws NoteFileException {
    var recheck = new Recheck(Notes.run(Notes.executed(Notes.of(CELLS))));
    assertEquals(List.of(), recheck.differences());
    assertEquals(5, recheck.compared());
  }

  @Test
  void aNoteThatWasNeverRunHasNothingToAgreeWith() throws NoteFileException {
    assertEquals(
        List.of("cell 2: no results are stored", "cell 3: no results are stored"),
        differences(Notes.of(CELLS).text()));
  }

  /** What is written in the stored file in place of what stood there, and what is then found. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "\"si\": 4,          | \"si\": 4.000000001,  | ``",
        "\"si\": 4,          | \"si\": 4.0,          | ``",
        "\"si\": 4,          | \"si\": 4.00000001,   | cell 2: m is 4 in coherent units, stored: 4.00000001",
        "\"si\": 4,          | \"si\": \"4\",        | cell 2: m is 4 in coherent units, stored: \"4\"",
        "\"si\": [3, 0, 4]   | \"si\": [3, 1e-9, 4]  | ``",
        "\"si\": [3, 0, 4]   | \"si\": [3, 1e-8, 4]  | cell 2: v is [3,0,4] in coherent units, stored: [3,1e-8,4]",
        "\"si\": [3, 0, 4]   | \"si\": [3, 0]        | cell 2: v is [3,0,4] in coherent units, stored: [3,0]",
        "\"unit\": \"kg\"    | \"unit\": \"t\"       | cell 2: m is 4 kg, stored: 4 t",
        "\"kind\": \"mass\"  | \"kind\": \"force\"   | cell 2: m is of the kind mass, stored: force",
        "m [kg] = 4          | m [kg] = 3            | cell 2: m is 3 kg, stored: 4 kg; cell 3: F is 0.02941995 kN, stored: 0.0392266 kN",
        "\"m\": {            | \"M\": {              | cell 2: m is 4 kg, stored: not there; cell 2: M is not there, stored: 4 kg",
        "true, \"share\": 0.8 | false, \"share\": 0.8 | cell 3: check m ≤ 5 kg holds, stored: FAILS",
        "\"m > 0 kg\"         | \"m > 1 kg\"          | cell 3: assumption m > 0 kg holds, stored: is not there; cell 3: assumption m > 1 kg is not there, stored: holds",
        "\"definitions\": {   | \"definitions\": 7, \"x\": { | cell 2: the stored results cannot be read; cell 3: the stored results cannot be read",
      })
  void everyDifferenceIsNamed(String before, String after, String found) throws NoteFileException {
    String stored = Notes.executed(Notes.of(CELLS)).text();
    assertTrue(stored.contains(before), stored);
    assertEquals(found, String.join("; ", differences(stored.replace(before, after))));
  }
}
