package whorl.assist;

import java.util.Collection;
import java.util.Locale;

/** How close what one typed comes to a word, the closest first. */
enum Closeness {
  /** It is the word. */
  IS,
  /** The word begins with it. */
  BEGINS,
  /** The word begins with it but for capitals. */
  BEGINS_IN_OTHER_CASE,
  /** A part of the word behind a low line begins with it, or another way to say the word. */
  ASIDE,
  NONE;

  /**
   * The closeness of what was typed to a word.
   *
   * @param typed spellings of what was typed
   * @param words spellings of the word
   */
  static Closeness of(Collection<String> typed, Collection<String> words) {
    var closest = NONE;
    for (String beginning : typed) {
      for (String word : words) {
        Closeness closeness = of(beginning, word);
        closest = closeness.compareTo(closest) < 0 ? closeness : closest;
      }
    }
    return closest;
  }

  private static Closeness of(String typed, String word) {
    if (word.startsWith(typed)) {
      return word.length() == typed.length() ? IS : BEGINS;
    }
    String lower = typed.toLowerCase(Locale.ROOT);
    String lowerWord = word.toLowerCase(Locale.ROOT);
    if (lowerWord.startsWith(lower)) {
      return BEGINS_IN_OTHER_CASE;
    }
    return lowerWord.contains("_" + lower) ? ASIDE : NONE;
  }
}
