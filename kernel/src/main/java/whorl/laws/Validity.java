package whorl.laws;

import java.util.function.Predicate;

/**
 * Where a law holds.
 *
 * @param text the condition in the symbols of its parameters, as {@code s ≤ D/10}
 * @param holds whether it does for what is given
 */
public record Validity(String text, Predicate<Given> holds) {}
