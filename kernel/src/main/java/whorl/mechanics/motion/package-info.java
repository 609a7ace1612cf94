/**
 * Motion: systems of rates and rigid bodies followed over time, with what came out kept at every
 * instant. Plain doubles in coherent SI units; knows nothing of the language.
 */
@NullMarked
package whorl.mechanics.motion;

import org.jspecify.annotations.NullMarked;
