/** Tests of points, axes, frames and what is about them. */
@NullMarked
package whorl.mechanics.reference;

import org.jspecify.annotations.NullMarked;
