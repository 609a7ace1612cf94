package whorl.mechanics.motion;

/**
 * The largest or least value of a number during a run.
 *
 * @param time when it was first reached, in s
 * @param value the value
 */
public record Extreme(double time, double value) {}
