package whorl.laws;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The catalogue as pages to read, in Markdown: one for each room, and one that leads to them. */
public final class LawPages {
  private static final String NOTICE =
      "<!-- Written from the catalogue of laws; changes made here are lost. -->";

  private LawPages() {}

  /** The pages by file name. */
  public static Map<String, String> all() {
    var pages = new LinkedHashMap<String, String>();
    pages.put("README.md", contents());
    for (Room room : Room.values()) {
      pages.put(room.word() + ".md", page(room));
    }
    return pages;
  }

  private static List<Law> laws(Room room) {
    return Laws.all().stream().filter(law -> law.room() == room).toList();
  }

  private static String contents() {
    var lines = new ArrayList<String>();
    lines.add(NOTICE);
    lines.add("");
    lines.add("# Laws");
    lines.add("");
    lines.add(
        "A law is a formula with its papers: what it takes and gives, where it holds, where it comes"
            + " from, and a worked example that is run as a test. A question mark stands behind what"
            + " may be left out. Lengths, masses and so on take any unit of their kind.");
    for (Room room : Room.values()) {
      lines.add("");
      lines.add("## [" + room.title() + "](" + room.word() + ".md)");
      lines.add("");
      for (Law law : laws(room)) {
        lines.add("- `" + law.head() + "` " + law.title());
      }
    }
    return text(lines);
  }

  private static String page(Room room) {
    var lines = new ArrayList<String>();
    lines.add(NOTICE);
    lines.add("");
    lines.add("# " + room.title());
    for (Law law : laws(room)) {
      lines.add("");
      lines.addAll(entry(law));
    }
    return text(lines);
  }

  private static List<String> entry(Law law) {
    var lines = new ArrayList<String>();
    lines.add("## `" + law.head() + "`");
    lines.add("");
    lines.add(capital(law.title()) + ".");
    lines.add("");
    lines.add("> " + law.formula());
    lines.add("");
    lines.add("| parameter | symbol | takes | what it is |");
    lines.add("| --- | --- | --- | --- |");
    for (Parameter parameter : law.parameters()) {
      lines.add(
          "| `"
              + parameter.word()
              + "` | "
              + cell(parameter.symbol())
              + " | "
              + parameter.sort().withArticle()
              + " | "
              + cell(parameter.explanation() + needWords(law, parameter))
              + " |");
    }
    lines.add("");
    lines.add("Gives " + law.result().sort().withArticle() + about(law) + ".");
    for (Validity validity : law.validity()) {
      lines.add("");
      lines.add("Holds for " + validity.text() + ".");
    }
    lines.add("");
    lines.add("Source: " + law.source() + ".");
    lines.add("");
    lines.add("```");
    lines.addAll(law.example().lines());
    lines.add(law.example().expression());
    lines.add("```");
    lines.add("");
    lines.add("gives " + law.example().value() + " (" + law.example().source() + ").");
    return lines;
  }

  private static String about(Law law) {
    return law.result().about().isEmpty() ? "" : ", taken about `" + law.result().about() + "`";
  }

  private static String needWords(Law law, Parameter parameter) {
    if (parameter.need() instanceof Need.Optional optional) {
      return "; may be left out"
          + (optional.otherwise().isEmpty() ? "" : ": " + optional.otherwise());
    } else if (parameter.need() instanceof Need.OneOf one) {
      return law.group(one.group()).get(0).equals(parameter)
          ? ""
          : "; in place of `" + law.group(one.group()).get(0).word() + "`";
    }
    return parameter.need() instanceof Need.Known known
        ? "; may be left out where `" + known.of() + "` tells it"
        : "";
  }

  private static String cell(String text) {
    return text.replace("|", "\\|");
  }

  private static String capital(String words) {
    return Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }

  private static String text(List<String> lines) {
    return String.join("\n", lines) + "\n";
  }
}
