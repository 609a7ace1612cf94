package whorl.units;

/**
 * A member of a unit, found in the catalogue.
 *
 * @param row of one symbol
 * @param prefix in front of the symbol, or none
 * @param exponent not zero
 */
record Member(CatalogueRow row, Prefix prefix, int exponent) {

  /** The symbol of the catalogue with its prefix, whatever alias was written. */
  String symbol() {
    return prefix.symbol() + row.symbol();
  }

  Member power(int outer) {
    return new Member(row, prefix, Math.multiplyExact(exponent, outer));
  }

  Factor factor() {
    return prefix.factor().times(row.factor()).power(exponent);
  }

  Dimension dimension() {
    return row.kind().dimension().power(Rational.of(exponent));
  }

  /**
   * What the member may be exchanged for without a change of what is measured: a unit of length for
   * a unit of length. Units of pure numbers are exchanged for nothing, since what they count is
   * told by their symbols only: a cycle is no per cent.
   */
  String exchange() {
    String kind = row.kind().name();
    return kind.equals("number") ? row.symbol() : kind;
  }
}
