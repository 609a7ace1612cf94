package whorl.units.kind;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import whorl.units.Rational;

/**
 * What is known, before any value is, of a part of a formula.
 *
 * @param readings how it may be read
 * @param literal its exact value if it is a bare numeral, or worked out of bare numerals; a numeral
 *     with a unit has none
 */
public record Operand(Readings readings, @Nullable Rational literal) {

  /** A quantity with a value known only at run time. */
  public static Operand of(Readings readings) {
    return new Operand(readings, null);
  }

  /** A quantity stated to be of a kind. */
  public static Operand of(Kind kind) {
    return of(Readings.of(kind));
  }

  /** A bare numeral. */
  public static Operand numeral(Rational value) {
    return new Operand(Readings.NUMBER, value);
  }

  /** The exact value of a bare numeral. */
  public Optional<Rational> value() {
    return Optional.ofNullable(literal);
  }

  /** Whether this is the literal zero, which is zero of any kind. */
  boolean isZero() {
    return literal != null && literal.isZero();
  }
}
