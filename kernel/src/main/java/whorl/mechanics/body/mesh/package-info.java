/** Bodies from closed surfaces of triangles: reading files, checking them, and their moments. */
@NullMarked
package whorl.mechanics.body.mesh;

import org.jspecify.annotations.NullMarked;
