/** Tests of the room that installs the kernel. */
@NullMarked
package whorl.install;

import org.jspecify.annotations.NullMarked;
