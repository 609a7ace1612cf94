package whorl.units.kind;

import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Rational;

/**
 * Formal powers of kinds, such as the square of a torque, which no table needs to name but which
 * must not be lost on the way through {@code sqrt(T1^2 + T2^2)} or {@code 1/(1/k1 + 1/k2)}.
 *
 * <p>A formal power keeps account of turns as its base does.
 */
final class FormalPowers {
  private static final int LARGEST = 3;

  private record Power(Kind base, int exponent) {}

  private final KindTable table;
  private final Map<Kind, Kind> roots = new HashMap<>();
  private int formal;
  private final Map<Power, Kind> kinds = new HashMap<>();
  private final Map<Kind, Power> powers = new HashMap<>();

  FormalPowers(KindTable table) {
    this.table = table;
  }

  /** A kind of the table by name, or a formal power of one, as {@code torque^2}. */
  Kind kind(String name) {
    int caret = name.indexOf('^');
    return caret < 0
        ? table.named(name)
        : add(table.named(name.substring(0, caret)), Integer.parseInt(name.substring(caret + 1)));
  }

  /** The formal power of a kind of the table; exponents 0 and 1 are none. */
  Kind add(Kind base, int exponent) {
    var power = new Power(base, exponent);
    @Nullable Kind known = kinds.get(power);
    if (known != null) {
      return known;
    }
    Kind kind = formal(base, base.name() + "^" + exponent, Rational.of(exponent));
    kinds.put(power, kind);
    powers.put(kind, power);
    return kind;
  }

  /** Makes a formal square root of a kind. */
  void addRoot(Kind kind) {
    roots.put(kind, formal(kind, "sqrt(" + kind.name() + ")", Rational.of(1, 2)));
  }

  /** The formal square root of a kind, if it has one. */
  Optional<Kind> formalRoot(Kind kind) {
    return Optional.ofNullable(roots.get(kind));
  }

  private Kind formal(Kind base, String name, Rational exponent) {
    Set<Kind.Mark> marks = EnumSet.of(Kind.Mark.INTERNAL);
    marks.addAll(base.marks());
    var kind =
        new Kind(
            table.kinds().size() + formal++,
            name,
            name,
            base.symbol(),
            base.dimension().power(exponent),
            null,
            marks,
            List.of());
    return kind;
  }

  /** The power of a kind that may be formal itself; none for the number one and where too high. */
  Optional<Kind> power(Kind kind, int exponent) {
    int total = exponent(kind) * exponent;
    Kind base = base(kind);
    if (total == 1) {
      return Optional.of(base);
    }
    return Math.abs(total) > LARGEST
        ? Optional.empty()
        : Optional.ofNullable(kinds.get(new Power(base, total)));
  }

  /** The kind of which this is a formal power; of any other, the kind itself. */
  Kind base(Kind kind) {
    @Nullable Power power = powers.get(kind);
    return power == null ? kind : power.base();
  }

  /** The exponent of a formal power; of any other kind, 1. */
  int exponent(Kind kind) {
    @Nullable Power power = powers.get(kind);
    return power == null ? 1 : power.exponent();
  }
}
