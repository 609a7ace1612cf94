package whorl.syntax;

import java.util.List;
import java.util.Optional;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;

/**
 * The tokens of a statement, or of a row of a block, that may run over several lines of the text.
 *
 * @param tokens without remarks and line ends, never empty, and {@link Token.Kind#END} behind them
 * @param indent the blanks in front of the first token; an empty span for a line at the margin
 * @param remark the remarks behind its lines, joined
 */
public record LogicalLine(List<Token> tokens, Span indent, String remark) {
  /** The lines of a text, whether they can be read or not; none for one that is too long. */
  public static List<LogicalLine> in(Source source) {
    return source.length() > Parser.LONGEST_TEXT
        ? List.of()
        : LineSplitter.split(Lexer.tokens(source, new SyntaxMessages(source))).lines();
  }

  /** The first token. */
  public Token first() {
    return tokens.get(0);
  }

  /** The last token in front of the end. */
  public Token last() {
    return tokens.get(tokens.size() - 2);
  }

  /** Whether it stands behind the margin, as the rows of a block do. */
  public boolean isIndented() {
    return indent.length() > 0;
  }

  /** Where it stands, without its indentation and remark. */
  public Span span() {
    return first().span().to(last().span());
  }

  /** The name of a value or function that it begins to define, if it does. */
  public Optional<Expr.Name> defines() {
    return first().isFreeName() && Shapes.defines(tokens)
        ? Optional.of(first().name())
        : Optional.empty();
  }

  /** Whether it begins to define a function. */
  public boolean definesFunction() {
    return Shapes.definesFunction(tokens);
  }

  /** The index of what closes the parenthesis or bracket at an index, or -1. */
  public int closing(int open) {
    return Shapes.closing(tokens, open);
  }
}
