/** Tests of line drawings. */
@NullMarked
package whorl.report.sketch;

import org.jspecify.annotations.NullMarked;
