package whorl.units.kind;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Dimension;

/**
 * A kind of quantity, as torque, energy or angular velocity: what is alike in quantities that may
 * be added and compared (VIM 1.2). Kinds of one dimension may differ.
 *
 * <p>A kind may be a special case of another, its parent: a radius is a length, a damping ratio a
 * number. It then goes wherever the parent goes.
 *
 * <p>Some kinds arise only on the way through a formula and have no name in the trade, as the time
 * per radian {@code 1/ω} or the square of a torque. They are <em>internal</em> and are never shown
 * to people; what is found is then said in units.
 *
 * <p>There is one object for each kind, so that kinds are compared by identity.
 */
public final class Kind {

  /** What else the rules need to know about a kind; explained at the head of {@code kinds.txt}. */
  enum Mark {
    INTERNAL,
    RATE,
    COUNT,
    ALONE,
    ASIDE,
    PLAIN
  }

  private final int index;
  private final String name;
  private final String words;
  private final String symbol;
  private final Dimension dimension;
  private final @Nullable Kind parent;
  private final Set<Mark> marks;
  private final List<String> alsoRead;

  Kind(
      int index,
      String name,
      String words,
      String symbol,
      Dimension dimension,
      @Nullable Kind parent,
      Set<Mark> marks,
      List<String> alsoRead) {
    this.index = index;
    this.name = name;
    this.words = words;
    this.symbol = symbol;
    this.dimension = dimension;
    this.parent = parent;
    this.marks = Set.copyOf(marks);
    this.alsoRead = List.copyOf(alsoRead);
  }

  /**
   * The kind with a row name, as {@code rotational_inertia}.
   *
   * @throws IllegalArgumentException if there is none
   */
  public static Kind named(String name) {
    return KindTable.STANDARD.named(name);
  }

  /**
   * The kind that people mean by some words: those shown, the row name with blanks or low lines, or
   * a usual synonym, in any case of letters. Internal kinds are not found.
   */
  public static Optional<Kind> find(String words) {
    return KindTable.STANDARD.find(words);
  }

  /** All kinds of the table, internal ones too, in its order. */
  public static List<Kind> all() {
    return KindTable.STANDARD.kinds();
  }

  /** The row name, as {@code rotational_inertia}. */
  public String name() {
    return name;
  }

  /** The name shown to people, as {@code moment of inertia}. */
  public String words() {
    return words;
  }

  /**
   * The name with its article, as {@code a moment of inertia} or {@code an energy}. Of an internal
   * kind what it is measured in, as {@code a quantity in m²/s²}.
   */
  public String withArticle() {
    if (isInternal()) {
      return "a quantity in " + CoherentUnit.text(Readings.of(this));
    }
    return ("aeiou".indexOf(words.charAt(0)) < 0 ? "a " : "an ") + words;
  }

  /** A symbol for a quantity of this kind, as {@code T} for a torque. */
  public String symbol() {
    return symbol;
  }

  /** Other words by which people may name the kind. */
  public List<String> alsoRead() {
    return alsoRead;
  }

  /** The dimension that all quantities of this kind have. */
  public Dimension dimension() {
    return dimension;
  }

  /** The kind of which this is a special case. */
  public Optional<Kind> parent() {
    return Optional.ofNullable(parent);
  }

  /** Whether the kind is never shown to people. */
  public boolean isInternal() {
    return marks.contains(Mark.INTERNAL);
  }

  /** Whether this is the other kind or, through its parents, a special case of it. */
  public boolean isA(Kind other) {
    return this == other || (parent != null && parent.isA(other));
  }

  /** Whether a quantity of one kind may stand for one of the other: one is a case of the other. */
  public boolean goesWith(Kind other) {
    return isA(other) || other.isA(this);
  }

  /** Place in the tables of the rules. */
  int index() {
    return index;
  }

  boolean has(Mark mark) {
    return marks.contains(mark);
  }

  Set<Mark> marks() {
    return marks;
  }

  boolean isNumber() {
    return isA(KindTable.STANDARD.number());
  }

  @Override
  public String toString() {
    return name;
  }
}
