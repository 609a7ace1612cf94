package whorl.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import whorl.check.Routine;
import whorl.check.RoutineFailure;
import whorl.eval.Value;

/**
 * Cells run, functions published from Java, consoles typed into, cells and names withdrawn, runs
 * interrupted, in any order: after each step the sheet is what a new one is that holds the
 * definitions that must stand now.
 */
class RandomEditsTest {
  private static final int QUANTITIES = 8;
  private static final int FUNCTIONS = 3;

  /** A name as it must stand: where, and as what. */
  private record Entry(String cell, String line, Optional<Routine> routine) {}

  private final Map<String, Entry> model = new TreeMap<>();
  private final Set<String> typed = new HashSet<>();
  private final Sheet sheet = new Sheet();
  private int count;
  private boolean interrupting;

  static LongStream seeds() {
    return LongStream.range(0, 60);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theSheetIsAlwaysThatOfTheDefinitionsThatStand(long seed) {
    var random = new SplittableRandom(seed);
    for (int step = 0; step < 60; step++) {
      Map<String, Optional<Double>> before = values(sheet);
      Set<String> own;
      CellOutcome outcome;
      switch (random.nextInt(8)) {
        case 0, 1, 2 -> {
          String cell = "cell " + random.nextInt(4);
          Map<String, Entry> text = text(random, cell);
          own = text.keySet();
          outcome = sheet.run(new CellId(cell), cell, lines(text));
          expect(outcome, cell, text);
        }
        case 3, 4 -> {
          String cell = "typed " + count++;
          Map<String, Entry> text = text(random, cell);
          own = text.keySet();
          outcome = sheet.runFromConsole(new CellId(cell), cell, lines(text) + "\n1 + 1");
          assertTrue(outcome.tookEffect(), outcome.errors()::toString);
          typed.add(cell);
          take(cell, text);
        }
        case 5 -> {
          String cell = "java " + random.nextInt(2);
          Map<String, Entry> functions = functions(random, cell);
          own = functions.keySet();
          outcome = sheet.publish(new CellId(cell), cell, published(functions));
          expect(outcome, cell, functions);
        }
        case 6 -> {
          String cell = (random.nextBoolean() ? "cell " : "java ") + random.nextInt(2);
          own = Set.of();
          outcome = sheet.withdraw(new CellId(cell));
          take(cell, Map.of());
        }
        default -> {
          String name = "q" + random.nextInt(QUANTITIES);
          own = Set.of();
          outcome = sheet.withdraw(name);
          assertEquals(model.remove(name) != null, outcome.tookEffect());
        }
      }
      assertEquals(values(fresh()), values(sheet), "step " + step);
      assertEquals(
          model.keySet(),
          sheet.definitions().stream()
              .map(Definition::name)
              .collect(Collectors.toCollection(TreeSet::new)));
      assertChangesAreTold(before, outcome, own);
      interrupt(random);
    }
  }

  /** A run that is refused exactly if it would define what another cell of the page defines. */
  private void expect(CellOutcome outcome, String cell, Map<String, Entry> text) {
    boolean refused =
        text.keySet().stream()
            .map(model::get)
            .filter(Objects::nonNull)
            .anyMatch(entry -> !entry.cell().equals(cell) && !typed.contains(entry.cell()));
    assertEquals(!refused, outcome.tookEffect(), outcome.errors()::toString);
    if (!refused) {
      take(cell, text);
    }
  }

  private void take(String cell, Map<String, Entry> text) {
    model.values().removeIf(entry -> entry.cell().equals(cell));
    model.putAll(text);
  }

  private static Map<String, Entry> text(SplittableRandom random, String cell) {
    var text = new TreeMap<String, Entry>();
    int size = random.nextInt(1, 5);
    for (int i = 0; i < size; i++) {
      int n = random.nextInt(QUANTITIES + FUNCTIONS);
      String name = n < QUANTITIES ? "q" + n : "f" + (n - QUANTITIES);
      text.put(name, new Entry(cell, line(random, n), Optional.empty()));
    }
    return text;
  }

  /** A definition that uses only names before it, so that no ring closes. */
  private static String line(SplittableRandom random, int n) {
    int number = random.nextInt(100);
    if (n >= QUANTITIES) {
      return "f%d(x) = x + %d * q0".formatted(n - QUANTITIES, number);
    }
    if (n == 0 || random.nextInt(4) == 0) {
      return "q%d = %d".formatted(n, number);
    }
    String value = "q" + random.nextInt(n);
    return random.nextBoolean()
        ? "q%d = %s + %d".formatted(n, value, number)
        : "q%d = f%d(%s) / 2".formatted(n, random.nextInt(FUNCTIONS), value);
  }

  private static String lines(Map<String, Entry> text) {
    return text.values().stream().map(Entry::line).collect(Collectors.joining("\n"));
  }

  private Map<String, Entry> functions(SplittableRandom random, String cell) {
    var functions = new TreeMap<String, Entry>();
    for (int f = 0; f < FUNCTIONS; f++) {
      if (random.nextInt(3) == 0) {
        int number = random.nextInt(100);
        Routine routine =
            x -> {
              if (interrupting) {
                throw RoutineFailure.ofInterrupt();
              }
              return 3 * x[0] + number;
            };
        functions.put("f" + f, new Entry(cell, "f" + f + "(x) [1]", Optional.of(routine)));
      }
    }
    return functions;
  }

  private static List<PublishedFunction> published(Map<String, Entry> functions) {
    return functions.values().stream()
        .map(entry -> new PublishedFunction(entry.line(), entry.routine().orElseThrow()))
        .toList();
  }

  private Sheet fresh() {
    var fresh = new Sheet();
    model.forEach(
        (name, entry) -> {
          var id = new CellId(name);
          CellOutcome outcome =
              entry.routine().isPresent()
                  ? fresh.publish(id, name, published(Map.of(name, entry)))
                  : fresh.run(id, name, entry.line());
          assertTrue(outcome.tookEffect(), outcome.errors()::toString);
        });
    return fresh;
  }

  private static Map<String, Optional<Double>> values(Sheet sheet) {
    var values = new TreeMap<String, Optional<Double>>();
    for (int i = 0; i < QUANTITIES; i++) {
      String name = "q" + i;
      values.put(name, sheet.quantity(name).map(q -> ((Value.Real) q.value()).value()));
    }
    return values;
  }

  private void assertChangesAreTold(
      Map<String, Optional<Double>> before, CellOutcome outcome, Set<String> own) {
    Map<String, Optional<Double>> now = values(sheet);
    var changed = new HashMap<String, List<Double>>();
    var stopped = new TreeSet<String>();
    before.forEach(
        (name, was) -> {
          Optional<Double> is = Objects.requireNonNull(now.get(name));
          if (was.isPresent() && is.isPresent() && !was.equals(is) && !own.contains(name)) {
            changed.put(name, List.of(was.get(), is.get()));
          }
          if (was.isPresent() && is.isEmpty() && model.containsKey(name) && !own.contains(name)) {
            stopped.add(name);
          }
        });
    var told = new HashMap<String, List<Double>>();
    for (CellOutcome.Change change : outcome.changes()) {
      told.put(
          change.name(),
          Stream.of(change.before(), change.now())
              .map(quantity -> ((Value.Real) quantity.value()).value())
              .toList());
    }
    assertEquals(changed, told);
    assertEquals(
        stopped,
        outcome.stopped().stream()
            .filter(name -> name.startsWith("q"))
            .collect(Collectors.toCollection(TreeSet::new)));
  }

  /** Runs something that calls a routine and is interrupted there, which must change nothing. */
  private void interrupt(SplittableRandom random) {
    var calling = new ArrayList<String>();
    model.forEach(
        (name, entry) -> {
          if (entry.routine().isPresent()) {
            calling.add(name);
          }
        });
    if (calling.isEmpty()) {
      return;
    }
    Map<String, Optional<Double>> before = values(sheet);
    String name = calling.get(random.nextInt(calling.size()));
    interrupting = true;
    CellOutcome outcome =
        sheet.run(new CellId("interrupted"), "interrupted", "z = " + name + "(1)\ny = z");
    interrupting = false;
    assertTrue(outcome.interrupted());
    assertEquals(before, values(sheet));
    assertTrue(sheet.card("z").isEmpty());
  }
}
