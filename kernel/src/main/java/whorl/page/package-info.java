/**
 * A live page: cells in the sheet language and in Java on one sheet, results refreshed where they
 * stand. Knows nothing of how a front end is reached.
 */
@NullMarked
package whorl.page;

import org.jspecify.annotations.NullMarked;
