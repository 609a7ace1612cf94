/** The {@code whorl} command. */
@NullMarked
package whorl.cli;

import org.jspecify.annotations.NullMarked;
