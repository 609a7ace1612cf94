/**
 * Kinds of quantity: what the dimension of a quantity leaves open.
 *
 * <p>A torque and an energy have one dimension, as have an angular velocity and a frequency, yet
 * neither can stand for the other. {@link whorl.units.kind.KindAlgebra} follows the kinds through a
 * formula. The kinds and the rules by which they combine are data, in {@code kinds.txt} and {@code
 * rules.txt} beside this package.
 */
@NullMarked
package whorl.units.kind;

import org.jspecify.annotations.NullMarked;
