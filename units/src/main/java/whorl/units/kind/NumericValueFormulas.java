package whorl.units.kind;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import whorl.units.Rational;

/** The constants of {@code numeric-values.txt}, which explains its columns. */
final class NumericValueFormulas {
  static final NumericValueFormulas STANDARD =
      new NumericValueFormulas(KindTable.STANDARD, ResourceLines.of("numeric-values.txt"));

  /** A line: constants that are wrong beside all kinds of one of the sets. */
  private record Line(Set<Rational> constants, List<Set<Kind>> beside, String formula) {}

  private final List<Line> lines = new ArrayList<>();

  NumericValueFormulas(KindTable kinds, List<String> lines) {
    for (String line : lines) {
      String[] columns = line.split(" *\\| *", -1);
      this.lines.add(
          new Line(
              Set.copyOf(words(columns[0], " +").stream().map(Rational::parse).toList()),
              words(columns[1], " +").stream()
                  .map(set -> Set.copyOf(words(set, "\\+").stream().map(kinds::named).toList()))
                  .toList(),
              columns[2]));
    }
  }

  private static List<String> words(String text, String separator) {
    return List.of(text.split(separator, -1));
  }

  /** Why a constant is refused beside quantities of some kinds, if it is. */
  Optional<Refusal> refusal(Rational constant, Set<Kind> beside) {
    return lines.stream()
        .filter(line -> line.constants().contains(constant))
        .filter(line -> line.beside().stream().anyMatch(beside::containsAll))
        .<Refusal>map(line -> new Refusal.NumericValue(constant, line.formula()))
        .findFirst();
  }
}
