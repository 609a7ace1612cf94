/** Names, kinds and units checked once; what comes out is a tree of operations on plain numbers. */
@NullMarked
package whorl.check;

import org.jspecify.annotations.NullMarked;
