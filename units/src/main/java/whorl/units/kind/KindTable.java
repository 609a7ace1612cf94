package whorl.units.kind;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import whorl.units.Dimension;

/** The kinds of {@code kinds.txt}, which explains its columns. */
final class KindTable {
  static final KindTable STANDARD = new KindTable(ResourceLines.of("kinds.txt"));

  private final List<Kind> kinds = new ArrayList<>();
  private final Map<String, Kind> byName = new HashMap<>();
  private final Map<String, Kind> byWords = new HashMap<>();

  KindTable(List<String> lines) {
    for (String line : lines) {
      add(kind(line.split("\\|", -1)));
    }
  }

  private Kind kind(String[] columns) {
    String name = column(columns, 0);
    String parent = column(columns, 3);
    String words = column(columns, 5);
    return new Kind(
        kinds.size(),
        name,
        words.isEmpty() ? name.replace('_', ' ') : words,
        column(columns, 2),
        Dimension.of(column(columns, 1)),
        parent.isEmpty() ? null : named(parent),
        marks(column(columns, 4)),
        list(column(columns, 6), ","));
  }

  private static String column(String[] columns, int index) {
    return index < columns.length ? columns[index].strip() : "";
  }

  private static Set<Kind.Mark> marks(String column) {
    Set<Kind.Mark> marks = EnumSet.noneOf(Kind.Mark.class);
    for (String mark : list(column, " ")) {
      marks.add(Kind.Mark.valueOf(mark.toUpperCase(Locale.ROOT)));
    }
    return marks;
  }

  private static List<String> list(String column, String separator) {
    return column.isEmpty() ? List.of() : List.of(column.split(separator + " *", -1));
  }

  private void add(Kind kind) {
    kinds.add(kind);
    if (byName.put(kind.name(), kind) != null) {
      throw new IllegalStateException("the kind " + kind + " stands twice in the table");
    }
    if (!kind.isInternal()) {
      byWords.put(key(kind.name()), kind);
      byWords.put(key(kind.words()), kind);
      for (String words : kind.alsoRead()) {
        byWords.put(key(words), kind);
      }
    }
  }

  private static String key(String words) {
    return words.strip().replace('_', ' ').replaceAll(" +", " ").toLowerCase(Locale.ROOT);
  }

  List<Kind> kinds() {
    return List.copyOf(kinds);
  }

  Kind named(String name) {
    @Nullable Kind kind = byName.get(name);
    if (kind == null) {
      throw new IllegalArgumentException("no kind of quantity is named \"" + name + "\"");
    }
    return kind;
  }

  Optional<Kind> find(String words) {
    return Optional.ofNullable(byWords.get(key(words)));
  }

  /** The kind of a pure number, which the rules for missing rules rest on. */
  Kind number() {
    return kinds.get(0);
  }
}
