package whorl.units;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;

/** Random units of the catalogue, the same in each run. */
final class RandomUnits {

  private static final List<CatalogueRow> SYMBOLS =
      CatalogueFile.rows().stream().filter(CatalogueRow::isSymbol).toList();

  private RandomUnits() {}

  /** Products of up to six members with exponents of either sign. */
  static Stream<UnitText> texts(long seed, int count) {
    var random = new SplittableRandom(seed);
    return Stream.generate(() -> new UnitText(members(random, 1), members(random, 0))).limit(count);
  }

  private static List<UnitText.Power> members(SplittableRandom random, int least) {
    List<UnitText.Power> members = new ArrayList<>();
    int count = random.nextInt(least, 4);
    for (int i = 0; i < count; i++) {
      int exponent = random.nextInt(1, 5);
      members.add(
          new UnitText.Power(symbol(random), random.nextInt(8) == 0 ? -exponent : exponent));
    }
    return members;
  }

  private static String symbol(SplittableRandom random) {
    CatalogueRow row = SYMBOLS.get(random.nextInt(SYMBOLS.size()));
    Prefix[] prefixes = Prefix.values();
    Prefix prefix = row.prefixable() ? prefixes[random.nextInt(prefixes.length)] : Prefix.NONE;
    return prefix.symbol() + row.symbol();
  }
}
