package whorl.syntax;

import whorl.diagnostic.Span;

/**
 * A word that was read as a unit only because no name of the sheet was spelled like it, as the g of
 * {@code 2 kg*g}. A later definition of that name would change what the line means.
 *
 * @param name the word as a name, folded
 * @param span where it stands
 */
public record UnitWord(String name, Span span) {}
