package whorl.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;

/**
 * Breaks a line that is too long for its column: in front of a sign such as {@code +} or {@code ≤}
 * if one stands late enough, else at a blank, best one in few parentheses, else in front of a dot,
 * and where all fail in between. No-break spaces hold, and so do the dots of a unit.
 */
final class TextWrap {
  /** Marks a place inside a word where a line may break; takes no room. */
  static final String MAY_BREAK = "\u200B";

  private static final String SIGNS = "+−±≤≥<>=≈×";
  private static final String INDENT = "  ";

  /** A line is looked for in this many times its width, since marks take no room. */
  private static final int HEAD = 4;

  private TextWrap() {}

  /** A text without the marks that say where it may break and where not. */
  static String plain(String text) {
    return text.replace(MAY_BREAK, "").replace('\u00A0', ' ');
  }

  /** The lines of a text; all but the first are indented. */
  static List<String> wrap(String text, int width) {
    var lines = new ArrayList<String>();
    int[] all = text.codePoints().toArray();
    int start = 0;
    while (true) {
      // A line is cut from the head of what is left, so that long texts take no longer a line.
      int end = Math.min(all.length, start + HEAD * width);
      String head = (lines.isEmpty() ? "" : INDENT) + new String(all, start, end - start);
      if (end == all.length && TextWidth.of(head) <= width) {
        lines.add(head);
        return lines;
      }
      int[] points = head.codePoints().toArray();
      int indent = lines.isEmpty() ? 0 : INDENT.length();
      int cut = cut(points, Math.max(indent + 1, fitting(points, width)), indent + 1);
      lines.add(new String(points, 0, cut).stripTrailing());
      start += cut - indent;
      while (start < all.length && Character.isWhitespace(all[start])) {
        start++;
      }
    }
  }

  /** How many code points fit. */
  private static int fitting(int[] points, int width) {
    int used = 0;
    for (int i = 0; i < points.length; i++) {
      used += TextWidth.of(Character.toString(points[i]));
      if (used > width) {
        return i;
      }
    }
    return points.length;
  }

  private static int cut(int[] points, int room, int least) {
    int[] depth = depths(points);
    IntPredicate beforeSign = i -> points[i - 1] == ' ' && SIGNS.indexOf(points[i]) >= 0;
    IntPredicate outside = i -> depth[i] == 0 && beforeSign.test(i);
    IntPredicate atBlank = i -> points[i] == ' ' || points[i - 1] == ' ';
    int shallowest = shallowest(depth, atBlank, Math.max(least, room / 3), room);
    IntPredicate atShallowBlank = i -> depth[i] == shallowest && atBlank.test(i);
    IntPredicate beforeDot = i -> points[i] == MAY_BREAK.charAt(0);
    IntPredicate dotOutside = i -> depth[i] == 0 && beforeDot.test(i);
    for (IntPredicate place :
        List.of(outside, dotOutside, beforeSign, atShallowBlank, atBlank, beforeDot)) {
      // A break that leaves most of the line empty is no gain over a lesser place.
      int earliest = place == atBlank || place == beforeDot ? least : Math.max(least, room / 3);
      for (int i = Math.min(room, points.length - 1); i >= earliest; i--) {
        if (place.test(i)) {
          return i;
        }
      }
    }
    return room;
  }

  /** The fewest parentheses that are open at a place where a line may end; −1 without a place. */
  private static int shallowest(int[] depth, IntPredicate place, int earliest, int room) {
    return IntStream.rangeClosed(earliest, Math.min(room, depth.length - 1))
        .filter(place)
        .map(i -> depth[i])
        .min()
        .orElse(-1);
  }

  /** How many parentheses are open in front of each code point. */
  private static int[] depths(int[] points) {
    int[] depths = new int[points.length];
    int open = 0;
    for (int i = 0; i < points.length; i++) {
      open -= points[i] == ')' ? 1 : 0;
      depths[i] = open;
      open += points[i] == '(' ? 1 : 0;
    }
    return depths;
  }
}
