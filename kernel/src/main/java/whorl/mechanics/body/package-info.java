/** Bodies: their mass, centre of mass and inertia, from shapes, parts, triangle meshes or data. */
@NullMarked
package whorl.mechanics.body;

import org.jspecify.annotations.NullMarked;
