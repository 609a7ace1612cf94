/**
 * Laws: what rotational mechanics lends to the language, each with its signature in kinds of
 * quantity, its formula, where it holds, its source and a worked example.
 */
@NullMarked
package whorl.laws;

import org.jspecify.annotations.NullMarked;
