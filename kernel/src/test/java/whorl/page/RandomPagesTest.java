package whorl.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Edits a page at random and compares it with the page that a new kernel gives when every cell runs
 * from the first to the last. Only pages whose every cell last ran without error are compared.
 */
class RandomPagesTest {
  private static final int EDITS = 80;

  /** What a user may write into a cell; together they use and define each other's names. */
  private static final List<String> TEXTS =
      List.of(
          "n [rpm] = 6000",
          "n [rpm] = 7200  # after the refit",
          "n = 100",
          "m [kg] = 412\nD [mm] = 900",
          "m [kg] = 380\nD [mm] = 0",
          "D [mm] = 900",
          "I [kg·m²] = 1/2*m*(D/2)^2",
          "I [kg·m²] = 41 kg·m²",
          "L [kN·m·s] = I*n\nE [MJ] = 1/2*I*n^2",
          "check E <= 10 MJ\ncheck L = 26.2 kN·m·s within 1 %",
          "assume n <= 7000 rpm",
          "p = m/D",
          "t_stop [s] = L/T_brake",
          "T_brake [N·m] = 350",
          "T_brake [N·m] = 1/k*350 N·m\nk = 2",
          "k = 0",
          "E [kJ]",
          "twice(x) = 2*x\nx = twice(k)",
          "x = twice(m)",
          "k = x",
          "%%java\nsheet.function(\"twice(x) [1]\", x -> 2 * x);",
          "# nothing but a remark",
          "this is no statement");

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void restartAndRunAllGivesThePageThatLiveEditingGave(long seed) {
    var random = new Random(seed);
    int compared = 0;
    var texts = new LinkedHashMap<String, String>();
    var failed = new TreeSet<String>();
    try (var page = new LivePage(PlainLanguage.SHEET)) {
      var shown = new ShownPage(page);
      for (int edit = 0; edit < EDITS; edit++) {
        List<String> ids = List.copyOf(texts.keySet());
        int choice = random.nextInt(10);
        if (!failed.isEmpty() && choice < 5) {
          // An author mends what is in error.
          String id = failed.iterator().next();
          texts.put(id, TEXTS.get(random.nextInt(TEXTS.size())));
          run(shown, id, texts, failed);
        } else if (choice == 0 && ids.size() > 2) {
          String gone = ids.get(random.nextInt(ids.size()));
          texts.remove(gone);
          failed.remove(gone);
          shown.delete(gone);
          // A deletion is told with the next run.
          rerunAny(shown, texts, failed, random);
        } else if (choice < 4 && !ids.isEmpty()) {
          rerunAny(shown, texts, failed, random);
        } else {
          String id = ids.size() < 8 ? "cell-" + edit : ids.get(random.nextInt(ids.size()));
          texts.put(id, TEXTS.get(random.nextInt(TEXTS.size())));
          run(shown, id, texts, failed);
        }
        if (failed.isEmpty() && edit % 3 == 0) {
          compared += compare(shown, texts) ? 1 : 0;
        }
      }
    }
    assertTrue(compared > 0, "no page was compared");
  }

  private static void rerunAny(
      ShownPage shown, Map<String, String> texts, Set<String> failed, Random random) {
    if (!texts.isEmpty()) {
      List<String> ids = List.copyOf(texts.keySet());
      run(shown, ids.get(random.nextInt(ids.size())), texts, failed);
    }
  }

  private static void run(
      ShownPage shown, String id, Map<String, String> texts, Set<String> failed) {
    if (shown.run(id, texts.getOrDefault(id, "")) instanceof CellAnswer.Failed) {
      failed.add(id);
    } else {
      failed.remove(id);
    }
  }

  /** Whether the page could be compared. */
  private static boolean compare(ShownPage live, Map<String, String> texts) {
    try (var page = new LivePage(PlainLanguage.SHEET)) {
      var fresh = new ShownPage(page);
      var refused = new ArrayList<String>();
      texts.forEach(
          (id, text) -> {
            if (fresh.run(id, text) instanceof CellAnswer.Failed) {
              refused.add(id);
            }
          });
      if (!refused.isEmpty()) {
        // Live, the definition that breaks the cell came later.
        return false;
      }
      texts
          .keySet()
          .forEach(id -> assertEquals(steps(fresh, id), steps(live, id), () -> id + texts));
      return true;
    }
  }

  /** The steps that a cell shows, without word of what happened when and elsewhere. */
  private static String steps(ShownPage shown, String id) {
    String text = shown.text(id);
    if (text.contains("does not stand")) {
      // The last good value, now stale, is known to the live page only.
      return "does not stand";
    }
    // A table ends with its second rule, and the number of a cell, which counts runs, may widen it.
    return text.substring(0, text.lastIndexOf('─') + 1)
        .replaceAll("\\[\\d+]", "[]")
        .replaceAll("([ ─])+", "$1");
  }
}
