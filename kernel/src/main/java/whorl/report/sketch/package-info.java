/**
 * Line drawings of things in space: bodies, points, axes, frames and vectors, as SVG. A drawing is
 * a pure function of the things in it.
 */
@NullMarked
package whorl.report.sketch;

import org.jspecify.annotations.NullMarked;
