/** Tests of bodies. */
@NullMarked
package whorl.mechanics.body;

import org.jspecify.annotations.NullMarked;
