package whorl.syntax;

import java.util.List;
import whorl.diagnostic.Span;

/**
 * The tokens of a statement, or of a row of a block, that may run over several lines of the text.
 *
 * @param tokens without remarks and line ends, never empty, and {@link Token.Kind#END} behind them
 * @param indent the blanks in front of the first token; an empty span for a line at the margin
 * @param remark the remarks behind its lines, joined
 */
record LogicalLine(List<Token> tokens, Span indent, String remark) {
  Token first() {
    return tokens.get(0);
  }

  /** The last token in front of the end. */
  Token last() {
    return tokens.get(tokens.size() - 2);
  }

  boolean isIndented() {
    return indent.length() > 0;
  }

  /** Where it stands, without its indentation and remark. */
  Span span() {
    return first().span().to(last().span());
  }
}
