package whorl.units.kind;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The author's own words for what a refusal is about, so that messages can speak in them. All of it
 * may be left out.
 *
 * @param declared the name being defined; empty if none
 * @param parts the source text of what was refused: the whole right side, the argument, or both
 *     sides of a sum
 * @param numbers what numbers stand in those parts
 * @param factors of the part refused, if it is one product, each with its text as the key
 * @param inside the names that stand in those parts, in order, with what they are
 * @param around further names of the sheet, nearest first, with what they are: for suggestions
 */
public record Context(
    String declared,
    List<String> parts,
    Numbers numbers,
    List<Powered> factors,
    Map<String, Readings> inside,
    Map<String, Readings> around) {
  /** Nothing is known of the author's words. */
  public static final Context NONE =
      new Context("", List.of(), Numbers.NONE, List.of(), Map.of(), Map.of());

  /**
   * The numbers in a text that may have to do with turns.
   *
   * @param pi each π, with the numbers that belong to it
   * @param numerals bare numerals, as written
   */
  public record Numbers(List<WrittenPi> pi, List<String> numerals) {
    /** None at all. */
    public static final Numbers NONE = new Numbers(List.of(), List.of());

    /** Copies the lists. */
    public Numbers {
      pi = List.copyOf(pi);
      numerals = List.copyOf(numerals);
    }
  }

  /** Copies lists and maps, keeping their order. */
  public Context {
    parts = List.copyOf(parts);
    factors = List.copyOf(factors);
    inside = Collections.unmodifiableMap(new LinkedHashMap<>(inside));
    around = Collections.unmodifiableMap(new LinkedHashMap<>(around));
  }

  /** With the name that is defined. */
  public Context declaring(String name) {
    return new Context(name, parts, numbers, factors, inside, around);
  }

  /** With the source text of the parts refused. */
  public Context of(String... texts) {
    return new Context(declared, List.of(texts), numbers, factors, inside, around);
  }

  /** With the numbers that stand in the parts refused. */
  public Context counting(Numbers found) {
    return new Context(declared, parts, found, factors, inside, around);
  }

  /** With the factors of the product refused. */
  public Context madeOf(List<Powered> product) {
    return new Context(declared, parts, numbers, product, inside, around);
  }

  /** With the names that stand in the parts refused. */
  public Context with(Map<String, Readings> names) {
    return new Context(declared, parts, numbers, factors, names, around);
  }

  /** With other names of the sheet. */
  public Context among(Map<String, Readings> names) {
    return new Context(declared, parts, numbers, factors, inside, names);
  }

  /** The first name inside the parts that may stand for a kind. */
  Optional<String> insideOf(Kind kind) {
    return named(inside, kind, Set.of());
  }

  /**
   * A name for a quantity of a kind that does not stand in a text yet, else the symbol of the kind,
   * told apart from the names of the sheet.
   */
  String nameFor(Kind kind, String text) {
    Set<String> taken = FactorText.words(text);
    return named(around, kind, taken)
        .or(() -> named(inside, kind, taken))
        .orElseGet(() -> unused(kind.symbol(), taken));
  }

  /** Whether the sheet has a quantity of a kind that does not stand in a text yet. */
  boolean hasOther(Kind kind, String text) {
    return named(around, kind, FactorText.words(text)).isPresent();
  }

  private String unused(String symbol, Set<String> taken) {
    boolean used = around.containsKey(symbol) || inside.containsKey(symbol);
    return used || taken.contains(symbol) ? symbol + "_1" : symbol;
  }

  private static Optional<String> named(
      Map<String, Readings> names, Kind kind, Set<String> excluded) {
    return names.entrySet().stream()
        .filter(name -> !excluded.contains(name.getKey()))
        .filter(name -> name.getValue().kinds().contains(kind))
        .map(Map.Entry::getKey)
        .findFirst();
  }

  /** The source text of a part, or a stand-in. */
  String part(int index, String standIn) {
    return index < parts.size() ? parts.get(index) : standIn;
  }
}
