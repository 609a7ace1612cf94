package whorl.units;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Finds what may be meant by a symbol that is not known: spellings of the trade, slips of case,
 * slips of the finger.
 */
final class NearSymbols {

  private static final int MOST = 4;

  /** From this length on, a symbol may be two slips away. */
  private static final int LONG_SYMBOL = 5;

  /** Shorter symbols differ by one letter from too many others. */
  private static final int SHORTEST_WITH_SLIPS = 3;

  private static final Pattern SYMBOL_AND_POWER = Pattern.compile("(\\D+)([1-9])");

  private final Symbols symbols;
  private final Set<String> plain = new LinkedHashSet<>();
  private final Set<String> prefixed = new LinkedHashSet<>();
  private final Map<String, List<String>> tradeSpellings = new HashMap<>();

  NearSymbols(Symbols symbols, List<CatalogueRow> rows) {
    this.symbols = symbols;
    for (CatalogueRow row : rows) {
      if (row.isSymbol()) {
        plain.add(row.symbol());
        if (row.prefixable()) {
          for (Prefix prefix : Prefix.values()) {
            prefixed.add(prefix.symbol() + row.symbol());
          }
        }
      }
      row.aliases().stream().filter(UnitText::isSymbol).forEach(a -> plain.add(a.plain()));
    }
    for (List<String> cells : CommaSeparated.lines("trade-spellings.csv", 2)) {
      tradeSpellings.put(cells.get(0), CommaSeparated.words(cells.get(1)));
    }
  }

  /** The likeliest first. */
  List<String> near(String symbol) {
    Set<String> found = new LinkedHashSet<>(tradeSpellings.getOrDefault(symbol, List.of()));
    usualSpelling(symbol).ifPresent(found::add);
    addSameLetters(symbol, found);
    if (found.isEmpty()) {
      addSlips(symbol, found);
    }
    return found.stream().limit(MOST).toList();
  }

  private void addSameLetters(String symbol, Set<String> found) {
    for (Set<String> candidates : List.of(plain, prefixed)) {
      candidates.stream().filter(symbol::equalsIgnoreCase).forEach(found::add);
    }
  }

  private void addSlips(String symbol, Set<String> found) {
    if (symbol.length() < SHORTEST_WITH_SLIPS) {
      return;
    }
    String written = symbol.toLowerCase(Locale.ROOT);
    int most = symbol.length() < LONG_SYMBOL ? 1 : 2;
    for (int slips = 1; slips <= most; slips++) {
      for (String candidate : plain) {
        boolean tooShort = candidate.length() < SHORTEST_WITH_SLIPS;
        if (!tooShort && slips(written, candidate.toLowerCase(Locale.ROOT)) == slips) {
          found.add(candidate);
        }
      }
    }
  }

  /** What the trade means by a spelling that is not the one of the catalogue. */
  Optional<String> usualSpelling(String symbol) {
    List<String> known = tradeSpellings.getOrDefault(symbol, List.of());
    if (!known.isEmpty()) {
      return Optional.of(known.get(0));
    }
    return power(symbol)
        .or(() -> productWithoutSign(symbol))
        .or(() -> word(symbol))
        .or(() -> otherCase(symbol));
  }

  /** {@code khz} is {@code kHz}; {@code mw} may be two. */
  private Optional<String> otherCase(String symbol) {
    Set<String> found = new LinkedHashSet<>();
    addSameLetters(symbol, found);
    return found.size() == 1 ? found.stream().findFirst() : Optional.empty();
  }

  /** {@code m2} is {@code m^2}. */
  private Optional<String> power(String symbol) {
    Matcher parts = SYMBOL_AND_POWER.matcher(symbol);
    return parts.matches() && symbols.knows(parts.group(1))
        ? Optional.of(parts.group(1) + "^" + parts.group(2))
        : Optional.empty();
  }

  /** {@code MNm} is {@code MN·m}, {@code kgcm2} is {@code kg·cm^2}: a force or mass by a length. */
  private Optional<String> productWithoutSign(String symbol) {
    for (int i = symbol.length() - 1; i > 0; i--) {
      String first = symbol.substring(0, i);
      Matcher power = SYMBOL_AND_POWER.matcher(symbol.substring(i));
      String second = power.matches() ? power.group(1) : symbol.substring(i);
      if ((measures(first, "force") || measures(first, "mass")) && measures(second, "length")) {
        return Optional.of(first + "·" + second + (power.matches() ? "^" + power.group(2) : ""));
      }
    }
    return Optional.empty();
  }

  private boolean measures(String symbol, String kind) {
    List<Member> members = symbols.members(symbol);
    return members.size() == 1
        && members.get(0).symbol().equals(symbol)
        && members.get(0).row().kind().name().equals(kind);
  }

  /** {@code Newtons} is {@code N}, {@code kilowatt} is {@code kW}. */
  private Optional<String> word(String symbol) {
    String word = symbol.toLowerCase(Locale.ROOT);
    for (String singular : List.of(word, word.replaceFirst("s$", ""))) {
      for (Prefix prefix : Prefix.values()) {
        if (singular.startsWith(prefix.word())) {
          List<Member> members = symbols.members(singular.substring(prefix.word().length()));
          if (isWord(members, singular, prefix)) {
            return Optional.of(prefix.symbol() + members.get(0).row().symbol());
          }
        }
      }
    }
    return Optional.empty();
  }

  private static boolean isWord(List<Member> members, String word, Prefix prefix) {
    boolean spelled = word.length() - prefix.word().length() >= SHORTEST_WITH_SLIPS;
    return spelled
        && members.size() == 1
        && members.get(0).prefix() == Prefix.NONE
        && (prefix == Prefix.NONE || members.get(0).row().prefixable());
  }

  /** Letters left out, put in, exchanged, or swapped with a neighbour (optimal alignment). */
  private static int slips(String a, String b) {
    int[][] distance = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      distance[i][0] = i;
    }
    for (int j = 0; j <= b.length(); j++) {
      distance[0][j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        int least =
            Math.min(
                distance[i - 1][j - 1] + change,
                Math.min(distance[i - 1][j], distance[i][j - 1]) + 1);
        boolean swapped =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        distance[i][j] = swapped ? Math.min(least, distance[i - 2][j - 2] + 1) : least;
      }
    }
    return distance[a.length()][b.length()];
  }
}
