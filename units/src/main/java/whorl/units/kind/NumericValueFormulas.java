package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import whorl.units.Rational;

/** The constants of {@code numeric-values.txt}, which explains its columns. */
final class NumericValueFormulas {
  static final NumericValueFormulas STANDARD =
      new NumericValueFormulas(KindTable.STANDARD, ResourceLines.of("numeric-values.txt"));

  /** What a constant is wrong beside: all kinds of one of the sets. */
  private record Line(List<Set<Kind>> beside, Optional<String> formula) {}

  private final Map<Rational, List<Line>> lines = new HashMap<>();

  NumericValueFormulas(KindTable kinds, List<String> lines) {
    for (String text : lines) {
      String[] columns = text.split(" *\\| *", -1);
      List<Set<Kind>> beside =
          words(columns[1], " +").stream()
              .map(set -> Set.copyOf(words(set, "\\+").stream().map(kinds::named).toList()))
              .toList();
      var line = new Line(beside, Optional.of(columns[2]).filter(formula -> !formula.isEmpty()));
      for (String constant : words(columns[0], " +")) {
        this.lines.computeIfAbsent(Rational.parse(constant), key -> new ArrayList<>()).add(line);
      }
    }
  }

  private static List<String> words(String text, String separator) {
    return List.of(text.split(separator, -1));
  }

  /** Why a constant is refused beside quantities of some kinds, if it is. */
  Optional<Refusal> refusal(Rational constant, Supplier<Set<Kind>> beside) {
    @Nullable List<Line> known = lines.get(constant);
    if (known == null) {
      return Optional.empty();
    }
    Set<Kind> kinds = beside.get();
    return known.stream()
        .filter(line -> line.beside().stream().anyMatch(kinds::containsAll))
        .<Refusal>map(line -> new Refusal.NumericValue(constant, line.formula()))
        .findFirst();
  }
}
