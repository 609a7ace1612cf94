package whorl.units.kind;

import whorl.units.Rational;

/**
 * A π in a formula together with the numbers beside it that turn it into a conversion, as {@code 2
 * * π / 60}.
 *
 * @param text as the author wrote it
 * @param rest the number that is left of it when every π leaves with a 2, and conversions of units
 *     leave too: 1 for {@code 2 * π / 60}, 1/2 for {@code π}
 * @param power of π that it brings into the whole formula; negative below a fraction bar
 */
public record WrittenPi(String text, Rational rest, int power) {}
