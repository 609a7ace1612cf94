package whorl.units.kind;

import whorl.units.Rational;

/**
 * A factor of a product: an operand with its exponent, negative below the fraction bar.
 *
 * @param key equal for two factors that are one and the same quantity, as {@code w} and {@code w}
 *     in {@code I*w*w}. Structural equality of the expressions serves; factors with equal keys
 *     become a power. It matters: {@code I*w*w} is never a torque, {@code I*w1*w2} may be one
 * @param operand what is known of it
 * @param exponent not zero
 */
public record Powered(Object key, Operand operand, Rational exponent) {}
