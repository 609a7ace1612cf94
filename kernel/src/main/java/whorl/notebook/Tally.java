package whorl.notebook;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import whorl.sheet.Step;

/** How a run note stands, counted. */
public final class Tally {
  private final Map<Mark, Integer> marks = new EnumMap<>(Mark.class);
  private final int errors;

  private Tally(NoteRun run) {
    run.cells().stream().flatMap(cell -> cell.steps().stream()).forEach(this::count);
    errors = run.cells().stream().mapToInt(cell -> cell.errors().size()).sum();
  }

  /** Counts a step; a law outside its validity is an assumption that fails. */
  private void count(Step step) {
    marks.merge(Mark.of(step), 1, Integer::sum);
    int lapses = step.standing().lapses().size();
    if (lapses > 0) {
      marks.merge(Mark.ASSUMPTION_FAILS, lapses, Integer::sum);
    }
  }

  /** Counts the steps and errors of a run. */
  public static Tally of(NoteRun run) {
    return new Tally(run);
  }

  /** Whether something is wrong in the note. */
  public boolean hasErrors() {
    return errors > 0;
  }

  /** Whether some check or assumption fails. */
  public boolean hasFailures() {
    return marks.keySet().stream().anyMatch(Mark::isFailure);
  }

  /** The counts in words, such as {@code 12 results; 3 checks hold, 1 FAILS; 1 error}. */
  public String words() {
    var parts = new ArrayList<String>();
    parts.add(counted(count(Mark.RESULT), "result"));
    parts.addAll(verdicts("check", count(Mark.CHECK_HOLDS), count(Mark.CHECK_FAILS)));
    parts.addAll(
        verdicts("assumption", count(Mark.ASSUMPTION_HOLDS), count(Mark.ASSUMPTION_FAILS)));
    if (errors > 0) {
      parts.add(counted(errors, "error"));
    }
    return String.join("; ", parts);
  }

  private int count(Mark mark) {
    return marks.getOrDefault(mark, 0);
  }

  private static List<String> verdicts(String noun, int hold, int fail) {
    String fails = fail == 1 ? " FAILS" : " FAIL";
    if (hold == 0) {
      return fail == 0 ? List.of() : List.of(counted(fail, noun) + fails);
    }
    String holds = counted(hold, noun) + (hold == 1 ? " holds" : " hold");
    return List.of(fail == 0 ? holds : holds + ", " + fail + fails);
  }

  private static String counted(int number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }
}
