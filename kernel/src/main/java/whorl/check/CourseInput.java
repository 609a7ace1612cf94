package whorl.check;

/**
 * A course that a formula reads, one value of it at a time.
 *
 * @param column name of the column, where a motion is read; empty for a course with a name of its
 *     own
 * @param sample type of one value
 * @param slot first slot of the value in the formula's frame
 * @param source where the motion or the course stands among the slots for things
 */
public record CourseInput(String column, Type sample, int slot, int source) {}
