package whorl.units;

import java.util.ArrayList;
import java.util.List;
import whorl.units.kind.Kind;

/** Reads the rows of {@code units.csv}, whose head explains the columns. */
final class CatalogueFile {

  private static final int COLUMNS = 11;

  private CatalogueFile() {}

  /** The rows in the order of the file. */
  static List<CatalogueRow> rows() {
    List<CatalogueRow> rows = new ArrayList<>();
    for (List<String> cells : CommaSeparated.lines("units.csv", COLUMNS)) {
      rows.add(row(cells));
    }
    return rows;
  }

  private static CatalogueRow row(List<String> cells) {
    String factor = cells.get(5);
    String zero = cells.get(6);
    return new CatalogueRow(
        UnitReader.read(cells.get(0)),
        CommaSeparated.units(cells.get(1)),
        CommaSeparated.words(cells.get(2)),
        cells.get(3),
        Kind.named(cells.get(4)),
        new Memo<>(() -> Factor.parse(factor)),
        zero.isEmpty() ? Rational.ZERO : Rational.parse(zero),
        CommaSeparated.words(cells.get(7)),
        cells.get(8).equals("SI"),
        cells.get(9));
  }
}
