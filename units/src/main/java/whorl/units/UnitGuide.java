package whorl.units;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import whorl.units.kind.Kind;

/**
 * What people look up about units: how they may be written, what they are called, where their sizes
 * come from.
 */
public final class UnitGuide {
  private static final Kind LENGTH = Kind.named("length");

  /** Prefixes as the trade reaches for them: thousands first, the nearest to one in front. */
  private static final List<Prefix> PREFIXES =
      Stream.of(Prefix.values())
          .filter(prefix -> prefix != Prefix.NONE)
          .sorted(
              Comparator.<Prefix>comparingInt(prefix -> prefix.powerOfTen() % 3 == 0 ? 0 : 1)
                  .thenComparingInt(prefix -> Math.abs(prefix.powerOfTen()))
                  .thenComparingInt(prefix -> -prefix.powerOfTen()))
          .toList();

  private final UnitCatalogue catalogue;
  private final Map<UnitText, Entry> entries = new LinkedHashMap<>();

  /**
   * A way to write a unit.
   *
   * @param text the unit
   * @param symbol the unit with raised exponents
   * @param alsoRead the aliases and names of a row of the catalogue
   * @param prefixed whether it is a row of the catalogue with an SI prefix in front
   */
  public record Entry(UnitText text, String symbol, Set<String> alsoRead, boolean prefixed) {
    /** Copies the set. */
    public Entry {
      alsoRead = Set.copyOf(alsoRead);
    }
  }

  UnitGuide(UnitCatalogue catalogue, List<CatalogueRow> rows, Symbols symbols) {
    this.catalogue = catalogue;
    Map<UnitText, Set<String>> alsoRead = new LinkedHashMap<>();
    for (CatalogueRow row : rows) {
      Set<String> words = alsoRead.computeIfAbsent(row.text(), text -> new LinkedHashSet<>());
      row.aliases().forEach(alias -> words.add(alias.plain()));
      words.add(row.name());
    }
    alsoRead.forEach((text, words) -> add(text, words, false));
    for (Prefix prefix : PREFIXES) {
      for (CatalogueRow row : rows) {
        @Nullable UnitText text = prefixed(row.text(), prefix, symbols);
        if (text != null && !entries.containsKey(text)) {
          add(text, Set.of(), true);
        }
      }
    }
  }

  private void add(UnitText text, Set<String> alsoRead, boolean prefixed) {
    entries.put(text, new Entry(text, text.typeset(), alsoRead, prefixed));
  }

  /** A unit with a prefix in front, or null if its first member takes none or means another. */
  private static @Nullable UnitText prefixed(UnitText text, Prefix prefix, Symbols symbols) {
    if (text.over().isEmpty()) {
      return null;
    }
    UnitText.Power first = text.over().get(0);
    List<Member> bare = symbols.members(first.symbol());
    String symbol = prefix.symbol() + first.symbol();
    List<Member> members = symbols.members(symbol);
    boolean means =
        bare.size() == 1
            && bare.get(0).prefix() == Prefix.NONE
            && members.size() == 1
            && members.get(0).prefix() == prefix
            && members.get(0).row().text().equals(bare.get(0).row().text());
    if (!means) {
      return null;
    }
    List<UnitText.Power> over = new ArrayList<>(text.over());
    over.set(0, new UnitText.Power(symbol, first.exponent()));
    return new UnitText(over, text.under());
  }

  /** Ways to write units: the rows of the catalogue in their order, then those with prefixes. */
  public Collection<Entry> entries() {
    return Collections.unmodifiableCollection(entries.values());
  }

  /** A unit, whether it is among the {@link #entries} or not. */
  public Entry entry(UnitText text) {
    Entry known = entries.get(text);
    return known == null ? new Entry(text, text.typeset(), Set.of(), false) : known;
  }

  /**
   * A unit in words, as {@code kilonewton metre}: the name of its row, or the names of its members.
   *
   * @throws UnknownUnitException if a symbol is not known
   */
  public String words(UnitText text) {
    return catalogue.name(text).orElseGet(() -> productInWords(text));
  }

  private String productInWords(UnitText text) {
    List<Member> members = catalogue.composition(text).members();
    var words = new ArrayList<String>();
    members.stream()
        .filter(member -> member.exponent() > 0)
        .map(UnitGuide::words)
        .forEach(words::add);
    List<String> under =
        members.stream().filter(member -> member.exponent() < 0).map(UnitGuide::words).toList();
    if (!under.isEmpty()) {
      words.add(words.isEmpty() ? "one per" : "per");
      words.addAll(under);
    }
    return words.isEmpty() ? "one" : String.join(" ", words);
  }

  private static String words(Member member) {
    // What a row says in parentheses tells it from others of its name; here its company does.
    String name = member.prefix().word() + member.row().name().replaceAll(" \\(.*\\)", "");
    boolean length = member.row().kind() == LENGTH;
    return switch (Math.abs(member.exponent())) {
      case 1 -> name;
      case 2 -> length ? "square " + name : name + " squared";
      case 3 -> length ? "cubic " + name : name + " cubed";
      default -> name + " to the power " + Math.abs(member.exponent());
    };
  }

  /**
   * Where the size of a unit comes from: the source of its row, or those of its members, each once.
   *
   * @throws UnknownUnitException if a symbol is not known
   */
  public List<String> sources(UnitText text) {
    return catalogue
        .rowWrittenAs(text)
        .map(row -> List.of(row.source()))
        .orElseGet(
            () ->
                catalogue.composition(text).members().stream()
                    .map(member -> member.row().source())
                    .distinct()
                    .toList());
  }
}
