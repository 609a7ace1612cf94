package whorl.units.kind;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The author's own words for what a refusal is about, so that messages can speak in them. All of it
 * may be left out.
 *
 * @param declared the name being defined; empty if none
 * @param parts the source text of what was refused: the whole right side, the argument, or both
 *     sides of a sum
 * @param inside the names that stand in those parts, in order, with what they are
 * @param around further names of the sheet, nearest first, with what they are: for suggestions
 */
public record Context(
    String declared,
    List<String> parts,
    Map<String, Readings> inside,
    Map<String, Readings> around) {
  /** Nothing is known of the author's words. */
  public static final Context NONE = new Context("", List.of(), Map.of(), Map.of());

  /** Copies lists and maps, keeping their order. */
  public Context {
    parts = List.copyOf(parts);
    inside = Collections.unmodifiableMap(new LinkedHashMap<>(inside));
    around = Collections.unmodifiableMap(new LinkedHashMap<>(around));
  }

  /** With the name that is defined. */
  public Context declaring(String name) {
    return new Context(name, parts, inside, around);
  }

  /** With the source text of the parts refused. */
  public Context of(String... texts) {
    return new Context(declared, List.of(texts), inside, around);
  }

  /** With the names that stand in the parts refused. */
  public Context with(Map<String, Readings> names) {
    return new Context(declared, parts, names, around);
  }

  /** With other names of the sheet. */
  public Context among(Map<String, Readings> names) {
    return new Context(declared, parts, inside, names);
  }

  /** The first name inside the parts that may stand for a kind. */
  Optional<String> insideOf(Kind kind) {
    return named(inside, kind);
  }

  /** A name for a quantity of a kind, else the symbol of the kind. */
  String nameOf(Kind kind) {
    return named(around, kind).or(() -> named(inside, kind)).orElseGet(kind::symbol);
  }

  private static Optional<String> named(Map<String, Readings> names, Kind kind) {
    return names.entrySet().stream()
        .filter(name -> name.getValue().kinds().contains(kind))
        .map(Map.Entry::getKey)
        .findFirst();
  }

  /** The source text of a part, or a stand-in. */
  String part(int index, String standIn) {
    return index < parts.size() ? parts.get(index) : standIn;
  }
}
