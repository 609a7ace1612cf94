/**
 * Gyroscopes: the couple of a spinning body whose axis turns, tops on a pivot, wheels in gimbals,
 * and spin that changes because inertia does. Plain doubles in coherent SI units.
 */
@NullMarked
package whorl.mechanics.gyro;

import org.jspecify.annotations.NullMarked;
