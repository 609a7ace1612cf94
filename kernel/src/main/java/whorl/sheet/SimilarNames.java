package whorl.sheet;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import whorl.check.Vocabulary;

/** Finds names that are spelled like one that has no definition. */
final class SimilarNames {
  private static final int MOST = 4;

  private record Candidate(String name, String folded) {}

  private record Near(String name, int distance) {}

  private final Collection<String> names;
  private final List<Candidate> candidates = new ArrayList<>();
  private final Map<String, List<String>> found = new HashMap<>();

  /** Looks among the names of a sheet and those at hand in every sheet. */
  SimilarNames(Collection<String> names) {
    this.names = names;
  }

  /** Up to four other names near to one, the nearest first; none if all are far. */
  List<String> to(String name) {
    return found.computeIfAbsent(name, this::search);
  }

  private List<String> search(String name) {
    if (candidates.isEmpty()) {
      Stream.concat(names.stream(), Vocabulary.atHand().stream())
          .map(other -> new Candidate(other, other.toLowerCase(Locale.ROOT)))
          .forEach(candidates::add);
    }
    // In a name of one or two letters any other name is near: only the case may differ.
    int reach = name.length() < 3 ? 0 : Math.max(1, name.length() / 3);
    String folded = name.toLowerCase(Locale.ROOT);
    var near = new ArrayList<Near>();
    for (Candidate candidate : candidates) {
      // A definition that waits itself is no hint for what waits for it.
      if (candidate.name().equals(name)) {
        continue;
      }
      int distance = distance(folded, candidate.folded(), reach);
      if (distance <= reach) {
        near.add(new Near(candidate.name(), distance));
      }
    }
    return near.stream()
        .sorted(Comparator.comparingInt(Near::distance).thenComparing(Near::name))
        .limit(MOST)
        .map(Near::name)
        .toList();
  }

  /**
   * Edits that turn one word into the other (a letter added, left out, changed, or two neighbours
   * exchanged), and more than {@code reach} as one more.
   */
  private static int distance(String a, String b, int reach) {
    if (Math.abs(a.length() - b.length()) > reach) {
      return reach + 1;
    }
    var rows = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        if (i == 0 || j == 0) {
          rows[i][j] = i + j;
          continue;
        }
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        int least =
            Math.min(rows[i - 1][j - 1] + change, Math.min(rows[i - 1][j], rows[i][j - 1]) + 1);
        boolean exchanged =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        rows[i][j] = exchanged ? Math.min(least, rows[i - 2][j - 2] + 1) : least;
      }
    }
    return rows[a.length()][b.length()];
  }
}
