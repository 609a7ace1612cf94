package whorl.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;

/** Sets rows as a ruled table of plain text for a terminal. */
final class TextTable implements Piece.Cases<String> {
  static final int PAGE_WIDTH = 108;
  private static final int GAP = 2;
  private static final int GRID_MARGIN = 4;

  /** What a column is never narrowed below, in the order of the heads. */
  private static final int[] LEAST = {8, 22, 28, 24, 18};

  private TextTable() {}

  /**
   * Sets a table.
   *
   * @param source the text of the cell, into which messages point
   */
  static String of(List<Row> rows, Source source) {
    var table = new TextTable();
    int numberWidth =
        rows.stream()
            .flatMap(row -> row.gives().stream())
            .mapToInt(amount -> TextWidth.of(amount.number()))
            .max()
            .orElse(0);
    List<List<List<String>>> cells =
        rows.stream().map(row -> table.cells(row, numberWidth)).toList();
    int[] widths = widths(cells);
    int total = Arrays.stream(widths).sum() + GAP * (widths.length - 1);
    String rule = "─".repeat(total);
    var text = new ArrayList<String>();
    text.add(joined(Row.HEADS, widths));
    text.add(rule);
    for (int i = 0; i < rows.size(); i++) {
      text.addAll(set(cells.get(i), widths));
      Diagnostic card = rows.get(i).card();
      if (card != null) {
        text.add("");
        text.add(DiagnosticText.render(card, source).indent(4).stripTrailing());
        text.add("");
      }
      Grid grid = rows.get(i).grid();
      if (grid != null) {
        text.add("");
        text.addAll(grid(grid));
        text.add("");
      }
    }
    text.add(rule);
    return TextWrap.plain(String.join("\n", text));
  }

  /** A grid; one that is wider than the page in several parts, each with the first column. */
  private static List<String> grid(Grid grid) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(
        grid.heads().stream()
            .map(
                head ->
                    FormulaText.breakable(head.symbol())
                        + (head.unit().isEmpty() ? "" : " in " + head.unit()))
            .toList());
    rows.addAll(grid.rows());
    int[] widths = new int[grid.heads().size()];
    for (List<String> row : rows) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], TextWidth.of(row.get(i)));
      }
    }
    var lines = new ArrayList<String>();
    int first = 1;
    while (first < widths.length || lines.isEmpty()) {
      int total = GRID_MARGIN + widths[0];
      int end = first;
      while (end < widths.length
          && (end == first || total + GRID_MARGIN + widths[end] <= PAGE_WIDTH)) {
        total += GRID_MARGIN + widths[end++];
      }
      if (!lines.isEmpty()) {
        lines.add("");
      }
      for (List<String> row : rows) {
        var line = new StringBuilder(column(row.get(0), widths[0]));
        for (int i = first; i < end; i++) {
          line.append(column(row.get(i), widths[i]));
        }
        lines.add(line.toString().stripTrailing());
      }
      first = end;
    }
    return lines;
  }

  private static String column(String text, int width) {
    return " ".repeat(GRID_MARGIN) + TextWidth.padded(width, text);
  }

  private List<List<String>> cells(Row row, int numberWidth) {
    var gives = new ArrayList<String>();
    for (Amount amount : row.gives()) {
      String number = TextWidth.padded(numberWidth, amount.number());
      gives.add(amount.sign() + "\u00A0" + unbroken(number) + amount.scale());
    }
    gives.addAll(lines(row.further()));
    return List.of(
        List.of(line(row.quantity())),
        lines(row.rule()),
        lines(row.with()),
        gives,
        lines(row.why()));
  }

  private static String unbroken(String text) {
    return text.replace(' ', '\u00A0');
  }

  private List<String> lines(List<Line> lines) {
    return lines.stream().map(this::line).toList();
  }

  private String line(Line line) {
    return line.pieces().stream().map(piece -> piece.match(this)).collect(Collectors.joining());
  }

  private static int[] widths(List<List<List<String>>> rows) {
    int[] widths = Row.HEADS.stream().mapToInt(String::length).toArray();
    for (List<List<String>> row : rows) {
      for (int i = 0; i < widths.length; i++) {
        for (String line : row.get(i)) {
          widths[i] = Math.max(widths[i], TextWidth.of(line));
        }
      }
    }
    int excess = Arrays.stream(widths).sum() + GAP * (widths.length - 1) - PAGE_WIDTH;
    while (excess > 0) {
      int widest = -1;
      for (int i = 0; i < widths.length; i++) {
        if (widths[i] > LEAST[i] && (widest < 0 || widths[i] > widths[widest])) {
          widest = i;
        }
      }
      if (widest < 0) {
        break;
      }
      widths[widest]--;
      excess--;
    }
    return widths;
  }

  private static List<String> set(List<List<String>> cells, int[] widths) {
    var wrapped = new ArrayList<List<String>>();
    int height = 1;
    for (int i = 0; i < widths.length; i++) {
      var lines = new ArrayList<String>();
      for (String line : cells.get(i)) {
        lines.addAll(TextWrap.wrap(line, widths[i]));
      }
      wrapped.add(lines);
      height = Math.max(height, lines.size());
    }
    var rows = new ArrayList<String>();
    for (int k = 0; k < height; k++) {
      var row = new ArrayList<String>();
      for (List<String> lines : wrapped) {
        row.add(k < lines.size() ? lines.get(k) : "");
      }
      rows.add(joined(row, widths));
    }
    return rows;
  }

  private static String joined(List<String> cells, int[] widths) {
    var text = new StringBuilder();
    for (int i = 0; i < widths.length; i++) {
      text.append(TextWidth.padded(cells.get(i), widths[i])).append(" ".repeat(GAP));
    }
    return text.toString().stripTrailing();
  }

  @Override
  public String formula(Piece.Formula formula) {
    return FormulaText.breakable(formula.layout());
  }

  @Override
  public String value(Piece.Value value) {
    return value.text();
  }

  @Override
  public String words(Piece.Words words) {
    return words.text();
  }

  @Override
  public String state(Piece.State state) {
    return state.text();
  }
}
