package whorl.diagnostic;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeMap;

/**
 * A diagnostic as plain text: problem, the lines it points at with carets and labels, reason, fix.
 */
public final class DiagnosticText {
  private static final int LONGEST_LINE = 110;

  private DiagnosticText() {}

  /** Renders a diagnostic over the text it points into. */
  public static String render(Diagnostic diagnostic, Source source) {
    var parts = new ArrayList<String>();
    parts.add(diagnostic.problem());
    parts.add(excerpt(diagnostic, source));
    var advice = new ArrayList<String>();
    if (!diagnostic.reason().isEmpty()) {
      advice.add(diagnostic.reason());
    }
    if (!diagnostic.fix().isEmpty()) {
      advice.add(diagnostic.fix());
    }
    if (!advice.isEmpty()) {
      parts.add(String.join("\n", advice));
    }
    return String.join("\n\n", parts);
  }

  /** The lines a diagnostic points at, with carets and labels under them. */
  public static String excerpt(Diagnostic diagnostic, Source source) {
    var byLine = new TreeMap<Integer, List<Diagnostic.Label>>();
    var labels = new ArrayList<>(diagnostic.further());
    labels.add(new Diagnostic.Label(diagnostic.span(), diagnostic.label()));
    for (var label : labels) {
      int line = source.line(Math.min(label.span().start(), source.length()));
      byLine.computeIfAbsent(line, key -> new ArrayList<>()).add(label);
    }
    int width = String.valueOf(byLine.lastKey()).length();
    var rows = new ArrayList<String>();
    for (var entry : byLine.entrySet()) {
      var placed = entry.getValue();
      placed.sort(Comparator.comparing(label -> label.span().start()));
      rows.addAll(marked(entry.getKey(), width, placed, source));
    }
    return String.join("\n", rows);
  }

  private static List<String> marked(
      int line, int width, List<Diagnostic.Label> labels, Source source) {
    Span whole = source.lineSpan(line);
    int[] text = source.lineText(line).codePoints().map(DiagnosticText::visible).toArray();
    // A line too long for a screen is cut around the first place it points at.
    int first = labels.get(0).span().start() - whole.start();
    int from = text.length <= LONGEST_LINE || first < 70 ? 0 : first - 40;
    int to = Math.min(text.length, from + LONGEST_LINE);
    String margin = " ".repeat(width + 5);
    String number = String.format("  %" + width + "d | ", line);
    var rows = new ArrayList<String>();
    rows.add(
        number
            + (from > 0 ? "…" : "")
            + new String(text, from, to - from)
            + (to < text.length ? "…" : ""));
    int shift = from > 0 ? 1 : 0;
    var carets = new StringBuilder();
    for (var label : labels) {
      int start = clamp(label.span().start() - whole.start() - from, to - from) + shift;
      int end = clamp(label.span().end() - whole.start() - from, to - from) + shift;
      pad(carets, start);
      carets.append("^".repeat(Math.max(1, end - start)));
    }
    rows.add(margin + carets);
    // Labels stand under their carets, from the right; one that would run into the label to its
    // right takes a row of its own.
    var row = new StringBuilder();
    int rightNeighbour = Integer.MAX_VALUE;
    for (int i = labels.size() - 1; i >= 0; i--) {
      String words = labels.get(i).text();
      if (words.isEmpty()) {
        continue;
      }
      int start = clamp(labels.get(i).span().start() - whole.start() - from, to - from) + shift;
      int end = start + words.codePointCount(0, words.length());
      if (end >= rightNeighbour) {
        rows.add(margin + row);
        row = new StringBuilder();
      }
      if (row.length() == 0) {
        pad(row, start);
        row.append(words);
      } else {
        row.replace(start, end, words);
      }
      rightNeighbour = start;
    }
    if (row.length() > 0) {
      rows.add(margin + row);
    }
    return rows;
  }

  private static int visible(int codePoint) {
    return Character.isISOControl(codePoint) ? ' ' : codePoint;
  }

  private static int clamp(int value, int highest) {
    return Math.max(0, Math.min(value, highest));
  }

  private static void pad(StringBuilder text, int length) {
    while (text.codePointCount(0, text.length()) < length) {
      text.append(' ');
    }
  }
}
