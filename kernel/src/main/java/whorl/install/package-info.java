/** Puts the kernel where Jupyter looks for kernels. */
@NullMarked
package whorl.install;

import org.jspecify.annotations.NullMarked;
