package whorl.report;

import java.util.List;

/**
 * Numbers in columns.
 *
 * @param heads what each column holds: a symbol, and its unit, empty for plain numbers
 * @param rows the digits, a list for each row
 */
record Grid(List<Head> heads, List<List<String>> rows) {
  /** Copies the lists. */
  Grid {
    heads = List.copyOf(heads);
    rows = rows.stream().map(List::copyOf).toList();
  }

  /** The head of a column. */
  record Head(Layout symbol, String unit) {}
}
