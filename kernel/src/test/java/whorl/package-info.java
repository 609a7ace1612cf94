/** Tests of the kernel as a whole. */
@NullMarked
package whorl;

import org.jspecify.annotations.NullMarked;
