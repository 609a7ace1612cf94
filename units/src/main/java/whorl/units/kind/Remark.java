package whorl.units.kind;

import whorl.units.Rational;

/**
 * A numeral that is in order but looks like a conversion done by hand: units carry their conversion
 * themselves.
 *
 * @param numeral as written
 * @param kind the quantity beside which it stands
 */
public record Remark(Rational numeral, Kind kind) {}
