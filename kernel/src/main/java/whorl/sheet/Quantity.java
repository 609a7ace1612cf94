package whorl.sheet;

import org.jspecify.annotations.Nullable;
import whorl.eval.Value;
import whorl.units.Unit;

/**
 * A result as the sheet shows it.
 *
 * @param value in coherent SI units
 * @param unit the unit it is shown in; the unit one for a plain number and for a truth value
 * @param chosen whether the author chose the unit; otherwise a readable multiple may be shown
 * @param kind the kind of quantity in words, as {@code moment of inertia}; empty where only the
 *     dimension is known
 * @param written the digits as the author wrote them, for an input; null for a result
 */
public record Quantity(
    Value value, Unit unit, boolean chosen, String kind, @Nullable String written) {}
