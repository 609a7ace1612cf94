/** Tests of evaluation, and the benchmark that holds it against a loop written by hand. */
@NullMarked
package whorl.eval;

import org.jspecify.annotations.NullMarked;
