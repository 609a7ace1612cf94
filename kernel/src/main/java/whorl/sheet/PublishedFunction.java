package whorl.sheet;

import whorl.check.Routine;

/**
 * A function that a Java cell gives to the sheet.
 *
 * @param head as in the sheet, such as {@code drag(v [m/s], A [m²]) [N]}
 * @param routine what works it out
 */
public record PublishedFunction(String head, Routine routine) {}
