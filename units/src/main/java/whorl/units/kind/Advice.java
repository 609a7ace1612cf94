package whorl.units.kind;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What {@code advice.txt} has to say of two kinds.
 *
 * @param difference how they differ; may be empty
 * @param way how one is made of the other, with places for the author's words; may be empty
 */
record Advice(Kind found, Kind wanted, String difference, String way) {
  private static final List<Advice> ALL = all(ResourceLines.of("advice.txt"));
  private static final Pattern PLACE = Pattern.compile("\\{(\\w+)}");

  private static List<Advice> all(List<String> lines) {
    List<Advice> all = new ArrayList<>();
    for (String line : lines) {
      String[] columns = line.split(" *\\| *", -1);
      all.add(new Advice(Kind.named(columns[0]), Kind.named(columns[1]), columns[2], columns[3]));
    }
    return List.copyOf(all);
  }

  /** The first advice for a kind found where one of some others is wanted. */
  static Optional<Advice> on(List<Kind> found, List<Kind> wanted) {
    return ALL.stream()
        .filter(advice -> found.contains(advice.found) && wanted.contains(advice.wanted))
        .findFirst();
  }

  /** The first advice for two kinds that are joined, of which either may be the one found. */
  static Optional<Advice> onEither(List<Kind> some, List<Kind> others) {
    return ALL.stream()
        .filter(
            advice ->
                (some.contains(advice.found) && others.contains(advice.wanted))
                    || (others.contains(advice.found) && some.contains(advice.wanted)))
        .findFirst();
  }

  /** The way, in the author's words. */
  String way(Context context, String foundText) {
    Matcher place = PLACE.matcher(way);
    return place.replaceAll(
        match -> Matcher.quoteReplacement(words(match.group(1), context, foundText)));
  }

  private static String words(String place, Context context, String foundText) {
    return place.equals("found")
        ? FactorText.dividend(foundText)
        : context.nameFor(Kind.named(place), foundText);
  }
}
