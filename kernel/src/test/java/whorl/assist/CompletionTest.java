package whorl.assist;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.assist.Completion.Candidate;
import whorl.sheet.CellId;
import whorl.sheet.Sheet;

class CompletionTest {
  private static final Assistant ASSISTANT =
      new Assistant(
          Samples.sheet(),
          Stream.of("%%java", "%%sheet", "%results", "%withdraw")
              .map(command -> new Candidate(command, "magic", ""))
              .toList());

  static Stream<String> lines() {
    return Samples.lines("completion.txt");
  }

  @ParameterizedTest
  @MethodSource("lines")
  void offersWhatFits(String line) {
    String[] sides = line.split(" => ", -1);
    String text = sides[0].replace("⏎", "\n");
    int cursor = text.indexOf('‸');
    Completion completion = ASSISTANT.complete(text.replace("‸", ""), cursor);
    List<String> offered = completion.candidates().stream().map(Candidate::text).toList();
    String all = line + "\noffered: " + offered;
    assertEquals(cursor, completion.end(), all);
    assertTrue(completion.start() <= cursor, all);
    assertEquals(offered.stream().distinct().toList(), offered, all);
    var only = new ArrayList<String>();
    for (String word : sides[1].split(", ", -1)) {
      if (word.equals("nothing")) {
        assertEquals(List.of(), offered, all);
      } else if (word.startsWith("not ")) {
        assertFalse(offered.contains(word.substring(4)), all);
      } else if (word.startsWith("first ")) {
        assertEquals(word.substring(6), offered.stream().findFirst().orElse(""), all);
      } else if (word.startsWith("only ")) {
        only.add(word.substring(5));
      } else {
        assertTrue(offered.contains(word), all);
      }
    }
    if (!only.isEmpty()) {
      assertEquals(only, offered, all);
    }
  }

  @Test
  void detailsSayWhatHelpsToChoose() {
    assertEquals("angular momentum, 0.9848 kN·m·s", detail("x = L", "L"));
    assertEquals("mass, 86 kg", detail("x = m", "m"));
    assertEquals("v_rim(d [mm], n [rpm]) [m/s]", detail("x = v", "v_rim"));
    assertEquals("has no value yet", detail("x = wa", "waits"));
    assertEquals("kilonewton metre, torque or energy", detail("z [kN", "kN·m"));
    assertEquals("atan2(y, x)", detail("x = at", "atan2"));
    assertEquals("9.80665 m/s²", detail("x = g", "g_n"));
    assertEquals("q [kg] = 3", detail("q [kg] = 3\nx = q", "q"));
  }

  private static String detail(String text, String candidate) {
    return ASSISTANT.complete(text, text.length()).candidates().stream()
        .filter(one -> one.text().equals(candidate))
        .findFirst()
        .orElseThrow()
        .detail();
  }

  @Test
  void aLongCellInALargeSheetIsAnsweredWithinReason() {
    var sheet = new Sheet();
    var text = new StringBuilder();
    for (int i = 0; i < 1000; i++) {
      text.append("a_").append(i).append(" [kg] = ").append(i).append("\n");
    }
    sheet.run(new CellId("1"), "cell [1]", text.toString());
    text.setLength(0);
    text.append("b_0 [kg] = a_1\n");
    for (int i = 1; i < 500; i++) {
      text.append("b_").append(i).append(" [kg] = 2 * b_").append(i - 1).append(" + a_2\n");
    }
    String line = "check b_50 <= 10 ";
    Completion units =
        assertTimeoutPreemptively(
            Duration.ofSeconds(20),
            () -> new Assistant(sheet).complete(text + line, text.length() + line.length()));
    assertEquals("kg", units.candidates().get(0).text());
    String far = "check b_499 <= 10 ";
    Completion any = new Assistant(sheet).complete(text + far, text.length() + far.length());
    assertTrue(any.candidates().stream().anyMatch(unit -> unit.text().equals("kg")));
  }
}
