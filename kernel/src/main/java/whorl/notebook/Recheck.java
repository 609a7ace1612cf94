package whorl.notebook;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParseException;
import com.google.gson.JsonPrimitive;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.DoubleStream;
import org.jspecify.annotations.Nullable;
import whorl.report.NoteRecord;

/**
 * Compares what a note comes to now with the results stored in its file, cell by cell.
 *
 * <p>Two numbers agree if they differ by at most {@value #TOLERANCE} of the larger: machines round
 * functions such as the sine differently in the last digits, and no more. The parts of a vector are
 * measured by its largest.
 */
public final class Recheck {
  /** The largest relative difference between numbers that agree. */
  public static final double TOLERANCE = 1e-9;

  private final List<String> differences = new ArrayList<>();
  private int compared;

  /** Compares a note that was run with what its file holds. */
  public Recheck(NoteRun run) {
    for (CellRun cell : run.cells()) {
      // A cell in error has no results, which the error says already.
      if (cell.tookEffect()) {
        compare(cell);
      }
    }
  }

  /** What differs, one sentence each; empty if all agrees. */
  public List<String> differences() {
    return List.copyOf(differences);
  }

  /** How many results and verdicts were compared. */
  public int compared() {
    return compared;
  }

  private void compare(CellRun run) {
    String place = "cell " + run.cell().position() + ": ";
    Recorded now = Recorded.of(List.of(CanonicalJson.sorted(NoteRun.record(run))));
    List<JsonElement> records = run.cell().stored(NoteRecord.MEDIA_TYPE);
    if (records.isEmpty() && !now.isEmpty()) {
      differences.add(place + "no results are stored");
      return;
    }
    try {
      compare(place, Recorded.of(records), now);
    } catch (JsonParseException e) {
      differences.add(place + "the stored results cannot be read");
    }
  }

  private void compare(String place, Recorded stored, Recorded now) {
    for (String name : union(now.definitions().keySet(), stored.definitions().keySet())) {
      compared++;
      String difference =
          difference(name, stored.definitions().get(name), now.definitions().get(name));
      if (!difference.isEmpty()) {
        differences.add(place + difference);
      }
    }
    for (String name : union(now.verdicts().keySet(), stored.verdicts().keySet())) {
      compared++;
      String was = verdict(stored.verdicts().get(name));
      String is = verdict(now.verdicts().get(name));
      if (!was.equals(is)) {
        differences.add(place + name + " " + is + ", stored: " + was);
      }
    }
  }

  private static Set<String> union(Set<String> some, Set<String> others) {
    var all = new LinkedHashSet<>(some);
    all.addAll(others);
    return all;
  }

  private static String verdict(@Nullable Boolean holds) {
    return holds == null ? "is not there" : holds ? "holds" : "FAILS";
  }

  private static String difference(
      String name, Recorded.@Nullable Definition stored, Recorded.@Nullable Definition now) {
    if (now == null || stored == null) {
      return name + " is " + words(now) + ", stored: " + words(stored);
    }
    if (!now.kind().equals(stored.kind())) {
      return name + " is of the kind " + now.kind() + ", stored: " + stored.kind();
    }
    if (now.unit().equals(stored.unit()) && agree(stored.si(), now.si())) {
      return "";
    }
    return now.words().equals(stored.words())
        ? name + " is " + now.si() + " in coherent units, stored: " + stored.si()
        : name + " is " + words(now) + ", stored: " + words(stored);
  }

  private static String words(Recorded.@Nullable Definition definition) {
    return definition == null ? "not there" : definition.words();
  }

  private static boolean agree(JsonElement stored, JsonElement now) {
    double[] was = numbers(stored);
    double[] is = numbers(now);
    if (was.length != is.length || was.length == 0) {
      return stored.equals(now);
    }
    double size =
        DoubleStream.concat(DoubleStream.of(was), DoubleStream.of(is))
            .map(Math::abs)
            .max()
            .orElse(0);
    for (int i = 0; i < is.length; i++) {
      if (!(Math.abs(is[i] - was[i]) <= TOLERANCE * size)) {
        return false;
      }
    }
    return true;
  }

  /** All numbers of a value in order; none where there is anything else in it. */
  private static double[] numbers(JsonElement value) {
    var numbers = new ArrayList<Double>();
    return collected(value, numbers)
        ? numbers.stream().mapToDouble(Double::doubleValue).toArray()
        : new double[0];
  }

  private static boolean collected(JsonElement value, List<Double> numbers) {
    if (value instanceof JsonArray array) {
      return array.asList().stream().allMatch(part -> collected(part, numbers));
    } else if (value instanceof JsonObject object) {
      return object.asMap().values().stream().allMatch(part -> collected(part, numbers));
    } else if (value instanceof JsonPrimitive primitive && primitive.isNumber()) {
      numbers.add(primitive.getAsDouble());
      return true;
    }
    return false;
  }
}
