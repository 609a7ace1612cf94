/** Where something stands in a text, and messages that say what is wrong with it. */
@NullMarked
package whorl.diagnostic;

import org.jspecify.annotations.NullMarked;
