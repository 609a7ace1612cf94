package whorl.page;

import java.util.List;

/** Puts lists into sentences. */
final class Words {
  private Words() {}

  /** {@code a, b and c}. */
  static String list(List<String> items) {
    int last = items.size() - 1;
    return last < 1
        ? String.join("", items)
        : String.join(", ", items.subList(0, last)) + " and " + items.get(last);
  }
}
