/**
 * Steps to what people and tools read: ruled tables as HTML and as text, and the record as JSON.
 */
@NullMarked
package whorl.report;

import org.jspecify.annotations.NullMarked;
