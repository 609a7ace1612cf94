package whorl.syntax;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/**
 * Puts the lines of a text together to statements. A line goes on on the next one if it ends in an
 * operator or inside a parenthesis that is closed further down; it never swallows a line that
 * begins a statement of its own.
 */
final class LineSplitter {
  private final List<Token> tokens;
  private final BitSet closed;
  private final List<LogicalLine> lines = new ArrayList<>();
  private final List<Remark> remarks = new ArrayList<>();

  // The logical line at hand.
  private final List<Token> held = new ArrayList<>();
  private final List<String> heldRemarks = new ArrayList<>();
  private Span heldIndent = new Span(0, 0);
  private int open;

  /**
   * What the text falls into.
   *
   * @param remarks the remarks that stand alone
   */
  record Split(List<LogicalLine> lines, List<Remark> remarks) {}

  private LineSplitter(List<Token> tokens) {
    this.tokens = tokens;
    this.closed = closedOnes(tokens);
  }

  static Split split(List<Token> tokens) {
    var splitter = new LineSplitter(tokens);
    int start = 0;
    int margin = 0;
    for (int i = 0; i < tokens.size(); i++) {
      if (tokens.get(i).is(Kind.LINE_END)) {
        splitter.line(start, i, margin);
        start = i + 1;
        margin = tokens.get(i).span().end();
      }
    }
    splitter.finish();
    return new Split(splitter.lines, splitter.remarks);
  }

  /**
   * The indices of opening parentheses and brackets that are closed somewhere, and their closers.
   */
  private static BitSet closedOnes(List<Token> tokens) {
    var closed = new BitSet(tokens.size());
    var open = new ArrayList<Integer>();
    for (int i = 0; i < tokens.size(); i++) {
      Kind kind = tokens.get(i).kind();
      if (kind == Kind.OPEN || kind == Kind.OPEN_BRACKET) {
        open.add(i);
      } else if ((kind == Kind.CLOSE || kind == Kind.CLOSE_BRACKET) && !open.isEmpty()) {
        int last = open.get(open.size() - 1);
        if (tokens.get(last).is(Kind.OPEN) == (kind == Kind.CLOSE)) {
          open.remove(open.size() - 1);
          closed.set(last);
          closed.set(i);
        }
      }
    }
    return closed;
  }

  /** Takes in the tokens of one line of the text, which begins at offset {@code margin}. */
  private void line(int start, int end, int margin) {
    boolean remarked = end > start && tokens.get(end - 1).is(Kind.REMARK);
    int last = remarked ? end - 1 : end;
    if (last == start) {
      if (remarked) {
        standing(tokens.get(start));
      }
      return;
    }
    if (!held.isEmpty() && (!goesOn() || beginsAnother(start, last, margin))) {
      finish();
    }
    if (held.isEmpty()) {
      heldIndent = new Span(margin, tokens.get(start).span().start());
    }
    for (int i = start; i < last; i++) {
      Kind kind = tokens.get(i).kind();
      if (closed.get(i)) {
        open = Math.max(0, open + (kind == Kind.OPEN || kind == Kind.OPEN_BRACKET ? 1 : -1));
      }
      held.add(tokens.get(i));
    }
    if (remarked) {
      heldRemarks.add(tokens.get(last).text());
    }
  }

  /** A remark alone on its line belongs to the statement that it stands in, or to none. */
  private void standing(Token remark) {
    if (!held.isEmpty() && goesOn()) {
      heldRemarks.add(remark.text());
    } else {
      remarks.add(new Remark(remark.span(), remark.text()));
    }
  }

  private boolean goesOn() {
    Token last = held.get(held.size() - 1);
    return open > 0
        || last.kind().isOperator()
        || last.isWord("if")
        || last.isWord("then")
        || last.isWord("else")
        || last.isWord("and")
        || last.isWord("or")
        || last.isWord("with")
        || (last.is(Kind.COLON) && !headsBlock());
  }

  private boolean headsBlock() {
    return held.get(0).isWord("cases") || held.get(0).isWord("data");
  }

  /**
   * Whether a line begins a statement of its own although the one at hand is unfinished: it stands
   * at the margin and begins with a statement word or, where no named value can stand, defines.
   */
  private boolean beginsAnother(int start, int end, int margin) {
    Token first = tokens.get(start);
    if (first.span().start() > margin) {
      return false;
    }
    Token last = held.get(held.size() - 1);
    if (first.kind() == Kind.NAME && Words.STATEMENTS.contains(first.text())) {
      boolean rightSide = first.isWord("solve") || first.isWord("vary");
      return !(last.is(Kind.EQUALS) && rightSide);
    }
    return open == 0 && !last.is(Kind.COMMA) && Shapes.defines(tokens.subList(start, end));
  }

  private void finish() {
    if (held.isEmpty()) {
      return;
    }
    Span behind = held.get(held.size() - 1).span().behind();
    held.add(new Token(Kind.END, behind, "", false, null));
    heldRemarks.removeIf(String::isEmpty);
    lines.add(new LogicalLine(List.copyOf(held), heldIndent, String.join("; ", heldRemarks)));
    held.clear();
    heldRemarks.clear();
    open = 0;
  }
}
