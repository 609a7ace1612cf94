package whorl.sheet;

import org.jspecify.annotations.Nullable;
import whorl.eval.Value;
import whorl.units.Unit;

/**
 * A result as the sheet shows it.
 *
 * @param value in coherent SI units, parts of vectors and tensors along the axes of its setting
 * @param unit the unit it is shown in; the unit one for a plain number and for a truth value
 * @param chosen whether the author chose the unit; otherwise a readable multiple may be shown
 * @param kind the kind of quantity in words, as {@code moment of inertia}; empty where only the
 *     dimension is known
 * @param written the digits as the author wrote them, for an input; null for a result
 * @param setting what it is about and where it is seen from
 */
public record Quantity(
    Value value,
    Unit unit,
    boolean chosen,
    String kind,
    @Nullable String written,
    Setting setting) {
  /** A quantity that is about nothing and seen from the world. */
  public Quantity(Value value, Unit unit, boolean chosen, String kind, @Nullable String written) {
    this(value, unit, chosen, kind, written, Setting.NONE);
  }
}
