package whorl.eval;

import whorl.diagnostic.Span;

/**
 * A law was used where it does not hold.
 *
 * @param law its name
 * @param condition what does not hold, in the symbols of the law
 * @param span the use
 * @param inFunction the function in whose body the use stands, or empty
 */
public record Breach(String law, String condition, Span span, String inFunction) {}
