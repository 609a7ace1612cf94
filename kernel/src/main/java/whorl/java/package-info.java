/**
 * Cells in Java: JShell in the JVM of the kernel, what cells print and show, magics, and the bridge
 * to the sheet.
 *
 * <p>Three threads take part. Whoever runs a cell waits; the thread of the {@link
 * whorl.java.JavaSide} compiles it and is never interrupted, since an interrupt would close the
 * files of the compiler; a {@link whorl.java.CellThread} runs the user's code, and is given up when
 * it does not end.
 */
@NullMarked
package whorl.java;

import org.jspecify.annotations.NullMarked;
