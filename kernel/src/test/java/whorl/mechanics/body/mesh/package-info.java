/** Tests of bodies from triangle meshes, and the benchmark of reading them. */
@NullMarked
package whorl.mechanics.body.mesh;

import org.jspecify.annotations.NullMarked;
