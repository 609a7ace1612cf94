package whorl.sheet;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * A file of cases: remarks, then blocks that each begin with a line of four equal signs. A block
 * has a head, whose first line is its title, and sections that begin with four hyphens and a name.
 */
final class CaseTable {
  private static final String BLOCK_BREAK = "(?m)^====\n";
  private static final Pattern SECTION = Pattern.compile("(?ms)^---- (\\w+)\n(.*?)(?=^---- |\\z)");

  /**
   * A case.
   *
   * @param head its title and under it where it comes from
   * @param sections texts by name, in the order in which they stand
   */
  record Case(List<String> head, Map<String, String> sections) {
    String title() {
      return head.get(0);
    }

    boolean has(String section) {
      return sections.containsKey(section);
    }

    /** The text of a section that the case must have. */
    String section(String name) {
      String text = sections.get(name);
      if (text == null) {
        throw new IllegalStateException(title() + " has no section " + name);
      }
      return text;
    }

    /**
     * What stands in the head behind a word and a colon; empty if the word does not stand there.
     */
    String fact(String word) {
      return head.stream()
          .filter(line -> line.startsWith(word + ": "))
          .map(line -> line.substring(word.length() + 2))
          .findFirst()
          .orElse("");
    }

    Case with(String section, String text) {
      var changed = new LinkedHashMap<>(sections);
      changed.put(section, text);
      return new Case(head, changed);
    }

    private String text() {
      var text = new StringBuilder(String.join("\n", head)).append('\n');
      sections.forEach(
          (name, body) -> text.append("---- ").append(name).append('\n').append(body).append('\n'));
      return text.toString();
    }
  }

  private final Path file;

  CaseTable(String file) {
    this.file = Path.of("src/test/resources/whorl/sheet", file);
  }

  List<Case> cases() throws IOException {
    return parts().skip(1).map(CaseTable::read).toList();
  }

  /** Writes the cases anew under the remarks that stand above them. */
  void rewrite(List<Case> cases) throws IOException {
    var text = new StringBuilder(parts().findFirst().orElseThrow());
    cases.forEach(one -> text.append("====\n").append(one.text()));
    Files.writeString(file, text);
  }

  private Stream<String> parts() throws IOException {
    return Stream.of(Files.readString(file).split(BLOCK_BREAK, -1));
  }

  private static Case read(String block) {
    Matcher section = SECTION.matcher(block);
    var sections = new LinkedHashMap<String, String>();
    int end = block.length();
    while (section.find()) {
      end = Math.min(end, section.start());
      sections.put(section.group(1), section.group(2).stripTrailing());
    }
    return new Case(block.substring(0, end).lines().toList(), sections);
  }
}
