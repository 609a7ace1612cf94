/** Dimensions, units of measurement and their catalogue; usable on its own. */
@NullMarked
package whorl.units;

import org.jspecify.annotations.NullMarked;
