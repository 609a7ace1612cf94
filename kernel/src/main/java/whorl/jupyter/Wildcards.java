package whorl.jupyter;

/**
 * A pattern in which {@code *} stands for any characters and {@code ?} for one. Brackets stand for
 * themselves, for code is full of them.
 */
record Wildcards(String pattern) {
  boolean match(String text) {
    int inPattern = 0;
    int inText = 0;
    int star = -1;
    int startOfStar = 0;
    while (inText < text.length()) {
      char wanted = inPattern < pattern.length() ? pattern.charAt(inPattern) : 0;
      if (wanted == '*') {
        star = inPattern++;
        startOfStar = inText;
      } else if (inPattern < pattern.length() && (wanted == '?' || wanted == text.charAt(inText))) {
        inPattern++;
        inText++;
      } else if (star >= 0) {
        // The last star takes one character more.
        inPattern = star + 1;
        inText = ++startOfStar;
      } else {
        return false;
      }
    }
    while (inPattern < pattern.length() && pattern.charAt(inPattern) == '*') {
      inPattern++;
    }
    return inPattern == pattern.length();
  }
}
