/** Tests of rotational mechanics. */
@NullMarked
package whorl.mechanics;

import org.jspecify.annotations.NullMarked;
