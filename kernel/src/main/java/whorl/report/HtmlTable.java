package whorl.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import whorl.diagnostic.Source;

/** Sets rows as a ruled table in HTML that reads the same trusted or not, light or dark. */
final class HtmlTable implements Piece.Cases<Html> {
  /** Columns of the table: the result has three, for sign, number and unit. */
  private static final int COLUMNS = 7;

  private HtmlTable() {}

  /**
   * Sets a table.
   *
   * @param source the text of the cell, into which messages point
   */
  static Html of(List<Row> rows, Source source) {
    var table = new HtmlTable();
    var body = new ArrayList<Html>();
    for (Row row : rows) {
      body.add(table.row(row));
      if (row.card() != null) {
        body.add(below(row, ErrorCard.html(row.card(), source)));
      }
      if (row.drawing() != null) {
        body.add(below(row, row.drawing()));
      }
      if (row.grid() != null) {
        body.add(below(row, grid(row.grid())));
      }
    }
    return Html.styled(
        "div",
        Look.SCROLL,
        Html.styled("table", Look.TABLE, head(rows), Html.element("tbody", Html.all(body))));
  }

  private static Html head(List<Row> rows) {
    boolean nothingWentIn = rows.stream().allMatch(row -> row.with().isEmpty());
    var cells = new ArrayList<Html>();
    for (String word : Row.HEADS) {
      Html label = Html.styled("span", Look.QUIET, Html.text(word));
      String style = Look.head(word, nothingWentIn);
      cells.add(
          word.equals("gives")
              ? Html.styled("th", style, "colspan", "3", label)
              : Html.styled("th", style, "scope", "col", label));
    }
    return Html.element("thead", Html.styled("tr", Look.HEAD_ROW, Html.all(cells)));
  }

  private Html row(Row row) {
    var cells = new ArrayList<Html>();
    cells.add(quantity(row));
    cells.add(Html.styled("td", Look.RULE, lines(row.rule())));
    cells.add(Html.styled("td", Look.WITH, lines(row.with())));
    Html further = lines(row.further());
    if (row.gives().isEmpty()) {
      cells.add(Html.styled("td", Look.GIVES, "colspan", "3", further));
    } else {
      cells.add(Html.styled("td", Look.SIGN, column(row, Amount::sign)));
      cells.add(Html.styled("td", Look.NUMBER, column(row, Amount::number)));
      cells.add(Html.styled("td", Look.UNIT, column(row, Amount::scale), further));
    }
    cells.add(Html.styled("td", Look.WHY, lines(row.why())));
    return Html.styled("tr", Look.ROW, Html.all(cells));
  }

  private Html quantity(Row row) {
    String style = Look.QUANTITY + Look.rail(row.tone());
    Html content = pieces(row.quantity());
    return row.kind().isEmpty()
        ? Html.styled("td", style, content)
        : Html.styled("td", style, "title", row.kind(), content);
  }

  private static Html grid(Grid grid) {
    var heads = new ArrayList<Html>();
    for (Grid.Head head : grid.heads()) {
      Html unit =
          head.unit().isEmpty()
              ? Html.text("")
              : Html.styled("span", Look.QUIET, Html.text(" in " + head.unit()));
      heads.add(
          Html.styled("th", Look.GRID_HEAD, "scope", "col", FormulaHtml.of(head.symbol()), unit));
    }
    var rows = new ArrayList<Html>();
    rows.add(Html.styled("tr", Look.HEAD_ROW, Html.all(heads)));
    for (List<String> numbers : grid.rows()) {
      rows.add(
          Html.styled(
              "tr",
              Look.PLAIN_ROW,
              Html.all(
                  numbers.stream()
                      .map(number -> Html.styled("td", Look.GRID_NUMBER, math(number)))
                      .toList())));
    }
    return Html.styled("table", Look.SNUG_TABLE, Html.element("tbody", Html.all(rows)));
  }

  /** Something over the whole width under a row. */
  private static Html below(Row row, Html content) {
    return Html.styled(
        "tr",
        Look.ROW_BELOW,
        Html.styled(
            "td",
            Look.CARD + ";" + Look.rail(row.tone()),
            "colspan",
            Integer.toString(COLUMNS),
            content));
  }

  private Html lines(List<Line> lines) {
    return Html.all(lines.stream().map(line -> line(pieces(line))).toList());
  }

  private static Html line(Html content) {
    return Html.styled("div", Look.LINE, content);
  }

  private Html pieces(Line line) {
    return Html.all(line.pieces().stream().map(piece -> piece.match(this)).toList());
  }

  private static Html math(String text) {
    return Html.styled("span", Look.VALUE, FormulaHtml.value(text));
  }

  /** One column of the results, which stand one under another in the same three columns. */
  private static Html column(Row row, Function<Amount, String> part) {
    return Html.all(row.gives().stream().map(amount -> line(math(part.apply(amount)))).toList());
  }

  @Override
  public Html formula(Piece.Formula formula) {
    return FormulaHtml.of(formula.layout());
  }

  @Override
  public Html value(Piece.Value value) {
    return math(value.text());
  }

  @Override
  public Html words(Piece.Words words) {
    return words.quiet()
        ? Html.styled("span", Look.QUIET, Html.text(words.text()))
        : Html.text(words.text());
  }

  @Override
  public Html state(Piece.State state) {
    return Html.styled("span", Look.state(state.tone()), Html.text(state.text()));
  }
}
