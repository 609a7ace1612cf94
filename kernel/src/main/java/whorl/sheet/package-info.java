/** Cells, definitions, the dependency graph, recalculation, and the steps that statements leave. */
@NullMarked
package whorl.sheet;

import org.jspecify.annotations.NullMarked;
