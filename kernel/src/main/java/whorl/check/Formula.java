package whorl.check;

import whorl.units.Unit;

/**
 * A checked formula, ready to be worked out over the frame of its statement.
 *
 * @param operation what to work out
 * @param type what comes out
 * @param unit the unit that the result is shown in
 * @param chosen whether the author chose that unit
 * @param kind the kind of the result in words; empty where only the dimension is known
 * @param seen what to work out to show the result along the axes of the frame that it is seen from;
 *     the operation itself for the world
 */
public record Formula(
    Operation operation, Type type, Unit unit, boolean chosen, String kind, Operation seen) {}
