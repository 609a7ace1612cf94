/** Checked tree to values: one set of numbers at a time, or blocks of rows. */
@NullMarked
package whorl.eval;

import org.jspecify.annotations.NullMarked;
