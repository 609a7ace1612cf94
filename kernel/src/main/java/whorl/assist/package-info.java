/** What a front end asks about a text before it is run: what could follow, what a word means. */
@NullMarked
package whorl.assist;

import org.jspecify.annotations.NullMarked;
