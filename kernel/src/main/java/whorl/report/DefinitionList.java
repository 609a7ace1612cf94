package whorl.report;

import java.util.ArrayList;
import java.util.List;
import whorl.sheet.Definition;

/**
 * The definitions of a sheet, one a line, each with its value and the cell in which it stands.
 *
 * @param html a fragment that needs no style sheet and no script
 * @param text the same for a terminal
 */
public record DefinitionList(String html, String text) {
  private static final List<String> HEADS = List.of("cell", "definition", "value");

  private static final int GAP = 2;

  /** Lists definitions in the order given. */
  public static DefinitionList of(List<Definition> definitions) {
    if (definitions.isEmpty()) {
      String nothing = "The sheet defines nothing yet.";
      return new DefinitionList(
          Html.styled("div", Look.NOTE, Html.text(nothing)).toString(), nothing);
    }
    List<List<String>> rows = definitions.stream().map(DefinitionList::row).toList();
    return new DefinitionList(html(rows), text(rows));
  }

  private static List<String> row(Definition definition) {
    String place = definition.label().replaceFirst("^cell ", "");
    return List.of(place, definition.text(), value(definition));
  }

  private static String value(Definition definition) {
    if (definition.state() instanceof Definition.State.Waiting waiting) {
      return "waits for " + String.join(", ", waiting.names());
    } else if (definition.state() instanceof Definition.State.Broken) {
      return "has an error";
    }
    return definition.quantity() == null ? "function" : Amounts.of(definition.quantity()).signed();
  }

  private static String html(List<List<String>> rows) {
    var body = new ArrayList<Html>();
    for (List<String> row : rows) {
      body.add(
          Html.styled(
              "tr",
              Look.ROW,
              Html.styled("td", Look.RULE, Html.text(row.get(0))),
              Html.styled("td", Look.WITH + ";font-family:monospace", Html.text(row.get(1))),
              Html.styled(
                  "td", Look.RULE, Html.styled("span", Look.VALUE, Html.text(row.get(2))))));
    }
    List<Html> heads =
        HEADS.stream().map(head -> Html.styled("th", Look.HEAD, Html.text(head))).toList();
    return Html.styled(
            "div",
            Look.SCROLL,
            Html.styled(
                "table",
                Look.TABLE,
                Html.element("thead", Html.styled("tr", Look.HEAD_ROW, Html.all(heads))),
                Html.element("tbody", Html.all(body))))
        .toString();
  }

  private static String text(List<List<String>> rows) {
    var all = new ArrayList<List<String>>();
    all.add(HEADS);
    all.addAll(rows);
    int[] widths = new int[HEADS.size() - 1];
    for (List<String> row : all) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], TextWidth.of(row.get(i)));
      }
    }
    var lines = new ArrayList<String>();
    for (List<String> row : all) {
      var line = new StringBuilder();
      for (int i = 0; i < widths.length; i++) {
        line.append(TextWidth.padded(row.get(i), widths[i] + GAP));
      }
      lines.add(TextWrap.plain(line.append(row.get(widths.length)).toString()));
    }
    return String.join("\n", lines);
  }
}
