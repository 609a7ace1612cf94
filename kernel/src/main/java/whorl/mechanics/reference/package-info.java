/**
 * What moments, angular momenta and inertias are about: points, axes and frames, and how each
 * quantity is moved from one to another.
 */
@NullMarked
package whorl.mechanics.reference;

import org.jspecify.annotations.NullMarked;
