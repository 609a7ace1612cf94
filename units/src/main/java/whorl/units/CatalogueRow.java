package whorl.units;

import java.util.List;
import whorl.units.kind.Kind;

/**
 * A row of the catalogue; the head of {@code units.csv} explains the columns.
 *
 * @param text the unit as it is written
 * @param aliases other ways to write it
 * @param inFiles spellings read in data files only
 * @param name in words
 * @param kind of the quantities measured in it
 * @param size the factor, worked out when first needed, since a sheet uses few of the rows
 * @param zero added to a reading before the factor; zero but for scales of temperature
 * @param ucum codes; the first is written, all are read
 * @param prefixable whether SI prefixes may stand in front of it
 * @param source of the factor
 */
record CatalogueRow(
    UnitText text,
    List<UnitText> aliases,
    List<String> inFiles,
    String name,
    Kind kind,
    Memo<Factor> size,
    Rational zero,
    List<String> ucum,
    boolean prefixable,
    String source) {

  /** To coherent SI units. */
  Factor factor() {
    return size.get();
  }

  /** Whether the unit is written as one symbol, and not as a product of others. */
  boolean isSymbol() {
    return text.isSymbol();
  }

  /** The symbol of a row that is one symbol. */
  String symbol() {
    return text.over().get(0).symbol();
  }

  /** Whether the unit is that of a scale with its zero elsewhere than at absolute zero. */
  boolean isReading() {
    return !zero.isZero();
  }
}
