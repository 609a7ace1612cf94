/**
 * Rotational mechanics as a plain Java library: numbers in coherent SI units, vectors and rotations
 * of Commons Math. It knows nothing of the sheet language.
 *
 * <p>The world frame is right-handed with z up; gravity acts along minus z. Rotations are vector
 * operators: {@code applyTo} turns a vector.
 */
@NullMarked
package whorl.mechanics;

import org.jspecify.annotations.NullMarked;
